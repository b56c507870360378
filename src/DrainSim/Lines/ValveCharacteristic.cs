namespace DrainSim.Lines;

/// <summary>How much of its full flow capacity a valve passes at an opening.</summary>
public sealed record ValveCharacteristic
{
    /// <summary>Name of the curve.</summary>
    public required string Id { get; init; }

    /// <summary>Where the curve is from.</summary>
    public required string Source { get; init; }

    /// <summary>Relative flow capacity φ = Kv/Kv(full), 1; 0 when shut, 1 when open, strictly rising between.</summary>
    /// <param name="opening">opening, 1; from 0 to 1</param>
    public double RelativeCapacity(double opening) => Require.Within(opening, 0, 1, $"opening of curve {Id}", "");
}
