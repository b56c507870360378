namespace DrainSim.Lines.Inlets;

/// <summary>A bore that looks down on a floor close below; the depth counts from that floor.</summary>
/// <remarks><code>
/// weir   Q = (1/√3) · (2/3) · √(2·g) · π·D · h^1.5
/// gate   Q = Cc · π·D·c · √(2·g·h) / √(1 + Cc·c/h),   Cc = 0.611
///
/// Q   flow, m³/s;  g  gravity, m/s²;  D  bore, c height of the rim above the floor, h depth of liquid on the floor, m
/// </code>
/// The lesser of the two, blended as in <see cref="FlowBlend"/>; the weir gives way to the gate at h = 1.31·c. The weir is critical
/// depth on the floor, (2/3)·h, round the rim; the gate is the free sluice gate (F. M. Henderson, Open Channel Flow (1966), section
/// 6.4; from memory) bent round the rim. To lay both round a circle is common practice, no source. The limit is let go while the
/// surface rises from 0.2 to 0.5 bores above the rim; the slot is then a loss, <see cref="SlotLoss"/>.
/// </remarks>
public sealed record DipLegOverFloor : PartFullInlet
{
    private const double Contraction = 0.611;
    private static readonly double CriticalWeir = 1 / Math.Sqrt(3);

    /// <summary>Height of the rim above the floor, m; greater than 0.</summary>
    public required double Clearance { get; init => field = Require.Positive(value, "floor clearance", "m"); }

    /// <summary>Loss coefficient of the slot under a well covered rim on the velocity head in the bore, 1; 0 for a wide slot.</summary>
    /// <remarks><code>
    /// K = [ D/(4·c·Cc) − 1 ]²   while the jet through the slot, Cc·π·D·c, is narrower than the bore, π·D²/4
    /// </code>
    /// Borda–Carnot's sudden expansion from the contracted jet to the bore, to be added to the loss of the edge; common practice,
    /// no source. It is 0 from a clearance of 0.41 bores upwards.
    /// </remarks>
    /// <param name="bore">inside diameter, m; greater than 0</param>
    /// <param name="clearance">height of the rim above the floor, m; greater than 0</param>
    public static double SlotLoss(double bore, double clearance)
    {
        double excess = Require.Positive(bore, "inlet bore", "m")
            / (4 * Contraction * Require.Positive(clearance, "floor clearance", "m")) - 1;
        return excess > 0 ? excess * excess : 0;
    }

    /// <inheritdoc/>
    public override double Limit(double depth, double gravity, out double slope)
    {
        double weir = FloorOpening.RimWeir(depth, Bore, CriticalWeir, gravity, out double weirSlope);
        double gate = Gate(depth, gravity, out double gateSlope);
        double flow = FlowBlend.Lesser(weir, gate, out double weirShare, out double gateShare);
        slope = weirShare * weirSlope + gateShare * gateSlope;
        return Release(flow, depth - Clearance, ref slope);
    }

    // √h/√(1 + Cc·c/h) is h/√(h + Cc·c), which has no pole at h = 0.
    private double Gate(double depth, double gravity, out double slope)
    {
        slope = 0;
        if (depth <= 0)
            return 0;
        double jet = Contraction * Clearance;
        double scale = Math.PI * Bore * jet * Math.Sqrt(2 * gravity / (depth + jet));
        slope = scale * (1 - depth / (2 * (depth + jet)));
        return scale * depth;
    }
}
