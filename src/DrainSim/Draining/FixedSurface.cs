namespace DrainSim.Draining;

/// <summary>A receiving water so large that its surface stays where it is.</summary>
public sealed record FixedSurface : Receiver
{
    /// <summary>Elevation of the surface above the source tank's lowest inside point, m.</summary>
    public required double Elevation { get; init => field = Require.Finite(value, "receiver surface", "m"); }
}
