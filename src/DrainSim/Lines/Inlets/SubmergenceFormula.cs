using System.Diagnostics;

namespace DrainSim.Lines.Inlets;

/// <summary>A published form of the depth of liquid below which an inlet draws air.</summary>
/// <remarks><code>
/// Fr = V/√(g·D)
///
/// V   velocity in the inlet, m/s;  D  diameter of the inlet, m;  g  gravity, m/s²
/// </code>
/// The equations stand as text in the table. For hi_9_8 the diameter is the outside one of the rim or bell. Below
/// Fr 0.33, where the source of knauss gives 1 to 1.5 diameters, its value at 0.33 (1.16 diameters) is kept.
/// </remarks>
public sealed record SubmergenceFormula
{
    private const double KnaussLeastFroude = 0.33;

    /// <summary>Name in files.</summary>
    public required string Id { get; init; }

    /// <summary>Whether gas is really pulled through at that depth; otherwise a depth that avoids strong vortices.</summary>
    public required bool IsPullThrough { get; init; }

    /// <summary>The facing it is for; null for any.</summary>
    public InletFacing? Facing { get; init; }

    /// <summary>Height of the point that the depth is measured from above the inlet's lowest edge, diameters of a side inlet.</summary>
    public required double SideDatum { get; init => field = Require.Within(value, 0, 1, "datum of a submergence", "D"); }

    /// <summary>Whether it is for an inlet with a vortex suppressor.</summary>
    public required bool NeedsSuppressor { get; init; }

    /// <summary>The equation, for people.</summary>
    public required string Equation { get; init; }

    /// <summary>Where it is from, and "from memory" where the publication was not at hand.</summary>
    public required string Source { get; init; }

    /// <summary>Depth of liquid over the datum of the form, m.</summary>
    /// <param name="velocity">velocity in the inlet, m/s; at least 0</param>
    /// <param name="diameter">diameter of the inlet, m; greater than 0</param>
    /// <param name="gravity">acceleration of gravity, m/s²; greater than 0</param>
    public double Depth(double velocity, double diameter, double gravity)
    {
        double fr = velocity / Math.Sqrt(gravity * diameter);
        return Id switch
        {
            "hi_9_8" => diameter * (1 + 2.3 * fr),
            "gordon_symmetric" => 0.5434 * velocity * Math.Sqrt(diameter),
            "gordon_lateral" => 0.7245 * velocity * Math.Sqrt(diameter),
            "reddy_pickford" => diameter * (1 + fr),
            "reddy_pickford_suppressed" => diameter * fr,
            "knauss" => diameter * (0.5 + 2 * Math.Max(fr, KnaussLeastFroude)),
            "prosser" => 1.5 * diameter,
            "lubin_springer" => 0.345 * diameter * Math.Pow(32 * Square(Math.PI / 4 * fr), 0.2),
            "craya_side" => 0.625 * diameter * Math.Pow(fr, 0.4),
            _ => throw new UnreachableException($"no submergence form is called {Id}"),
        };
    }

    // Q²/(g·D⁵) is the square of π/4·Fr.
    private static double Square(double value) => value * value;
}
