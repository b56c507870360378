namespace DrainSim.Lines.Inlets;

/// <summary>A round opening that looks up; the depth counts from its rim.</summary>
/// <remarks><code>
/// Q = Ce · (2/3) · √(2·g) · π·D · h^1.5
///
/// Q   flow, m³/s;  Ce  discharge coefficient, 1;  g  gravity, m/s²;  D  bore, h depth over the rim, m
/// </code>
/// The sharp-crested weir of full width, Ce = 0.602 + 0.075·h/P, with P, the height of the crest, far above h (C. E. Kindsvater,
/// R. W. Carter, Trans. ASCE 124 (1959) 772; from memory), laid round the rim. A rim flush with the floor has no fall behind
/// the crest and passes 1/√3 = 0.577 instead, critical depth on the floor: 4 % less. The rim counts as straight, which holds for h
/// well below D; beyond about D/2 the line itself is the limit. Films of a few millimetres run slower than this.
/// </remarks>
public sealed record FloorOpening : PartFullInlet
{
    /// <summary>Ce of a sharp crest high above the floor, 1.</summary>
    public const double SharpCrest = 0.602;

    /// <summary>Discharge coefficient Ce, 1; greater than 0, at most 1.</summary>
    public double WeirCoefficient
    {
        get;
        init => field = Require.Within(Require.Positive(value, "weir coefficient", ""), 0, 1, "weir coefficient", "");
    } = SharpCrest;

    /// <inheritdoc/>
    public override double Limit(double depth, double gravity, out double slope) =>
        RimWeir(depth, Bore, WeirCoefficient, gravity, out slope);

    /// <summary>The weir round a rim, m³/s.</summary>
    internal static double RimWeir(double depth, double bore, double coefficient, double gravity, out double slope)
    {
        slope = 0;
        if (depth <= 0)
            return 0;
        slope = coefficient * Math.Sqrt(2 * gravity * depth) * Math.PI * bore;
        return slope * depth / 1.5;
    }
}
