namespace DrainSim.Gas;

/// <summary>A vent pipe of one bore, with gas going either way.</summary>
/// <remarks><code>
/// (f·L/D + ΣK + 1) · W² = A² · (p1² − p2²) / (R·T)
///
/// W   mass flow, kg/s;  A  area of the bore, m²;  L  length, D bore, m
/// f   Darcy friction factor at Re = W·D/(A·μ), 1;  ΣK  losses, 1;  the 1 is the jet's velocity head
/// p1  upstream, p2 downstream absolute pressure, Pa;  R  gas constant, J/(kg·K);  T  temperature, K
/// μ = 1.458e-6 · T^1.5/(T + 110.4)   viscosity of air, Pa·s (ISO 2533:1975, Sutherland's form)
/// </code>
/// Isothermal flow with 2·ln(p1/p2) left out, for pressure drops up to 10 % of p1. Against adiabatic flow with friction in a
/// duct of constant area it is high, by at most 0.3 % at a drop of 1 %, 3.4 % at 10 %, 7.7 % at 20 % with an entry loss up to 0.5,
/// by twice that with losses of 5 all at the entry, and by less than 3 % at 20 % once f·L/D is 5. Choking is not in
/// it: a vent that comes near it has long failed its tank. The friction is finite at rest, so the slope is too.
/// Source: Perry's Chemical Engineers' Handbook, isothermal gas flow in pipes (from memory).
/// </remarks>
public sealed record VentLine : Opening
{
    private const int MostTurns = 100;

    /// <summary>Developed length, m; greater than 0.</summary>
    public required double Length { get; init => field = Require.Positive(value, "vent length", "m"); }

    /// <summary>Equivalent sand-grain roughness, m; 0 for a smooth wall.</summary>
    public double Roughness { get; init => field = Require.NotNegative(value, "roughness", "m"); }

    /// <summary>Sum of the loss coefficients of entry and fittings, without the jet's velocity head, 1; at least 0.</summary>
    public double Losses { get; init => field = Require.NotNegative(value, "vent losses", ""); } = 0.5;

    /// <inheritdoc/>
    public override double MassFlow(double pressure, in Surroundings outside, out double slope)
    {
        double t = outside.Temperature;
        double mu = 1.458e-6 * t * Math.Sqrt(t) / (t + 110.4);
        double scale = Bore * Bore / (IdealGas.Air.SpecificGasConstant * t * mu * mu);
        double drive = scale * (outside.Pressure - pressure) * (outside.Pressure + pressure);
        double re = Reynolds(Math.Abs(drive), out double driveByRe);
        double flowByRe = Area * mu / Bore;
        slope = -2 * pressure * scale * flowByRe / driveByRe;
        return Math.CopySign(re * flowByRe, drive);
    }

    // The Reynolds number at which (f·L/D + ΣK + 1)·Re² is the drive: Newton from above, kept in a bracket.
    private double Reynolds(double drive, out double driveByRe)
    {
        double low = 0;
        double high = Math.Min(Math.Sqrt(drive / (Losses + 1)), drive * Bore / (64 * Length));
        double re = high;
        for (int turn = 0; turn < MostTurns; turn++)
        {
            double excess = Drive(re, out driveByRe) - drive;
            if (excess > 0)
                high = re;
            else
                low = re;
            double step = excess / driveByRe;
            // A step below the last bits may point out of the bracket; it is an end, not a reason to halve.
            if (Math.Abs(step) <= 1e-15 * re)
                break;
            double next = re - step;
            re = next > low && next < high ? next : (low + high) / 2;
        }
        Drive(re, out driveByRe);
        return re;
    }

    private double Drive(double re, out double slope)
    {
        if (re <= 0)
        {
            slope = 64 * Length / Bore;
            return 0;
        }
        double friction = ChurchillFriction.Darcy(re, Roughness / Bore, out double exponent) * Length / Bore;
        slope = ((2 + exponent) * friction + 2 * (Losses + 1)) * re;
        return (friction + Losses + 1) * re * re;
    }
}
