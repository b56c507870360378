namespace DrainSim.Lines;

/// <summary>A conical change of bore; its <see cref="PathItem.Bore"/> is the bore behind it.</summary>
public sealed record Reducer : PathItem
{
    /// <summary>Included angle of the cone, rad; greater than 0, at most π.</summary>
    public required double Angle { get; init => field = Require.Within(value, 1e-6, Math.PI, "reducer angle", "rad"); }
}
