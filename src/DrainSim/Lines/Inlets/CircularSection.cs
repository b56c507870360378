namespace DrainSim.Lines.Inlets;

/// <summary>The wetted part of a round bore, by its half angle φ at the axis.</summary>
/// <remarks><code>
/// y/D = sin²(φ/2),   T/D = sin φ,   A/D² = (φ − sin φ·cos φ)/4
///
/// y   depth, T surface width, D bore, m;  A  area, m²;  φ  from 0 (dry) to π (full), rad
/// </code></remarks>
internal readonly struct CircularSection
{
    // Below it φ − sin φ·cos φ is a difference of near equals; the series is good to 1e-15 there.
    private const double SeriesLimit = 0.05;

    public CircularSection(double halfAngle)
    {
        double half = Math.Sin(halfAngle / 2);
        Depth = half * half;
        Sine = Math.Sin(halfAngle);
        Cosine = Math.Cos(halfAngle);
        double square = halfAngle * halfAngle;
        Segment = halfAngle < SeriesLimit
            ? 2 * halfAngle * square / 3 * (1 - square / 5 * (1 - 2 * square / 21 * (1 - square / 18)))
            : halfAngle - Sine * Cosine;
    }

    /// <summary>y/D, 1.</summary>
    public double Depth { get; }

    /// <summary>sin φ = T/D, 1.</summary>
    public double Sine { get; }

    /// <summary>cos φ, 1.</summary>
    public double Cosine { get; }

    /// <summary>φ − sin φ·cos φ = 4·A/D², 1.</summary>
    public double Segment { get; }
}
