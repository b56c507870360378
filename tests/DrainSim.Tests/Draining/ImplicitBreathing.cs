using MathNet.Numerics.RootFinding;

namespace DrainSim.Tests.Draining;

/// <summary>
/// A prism with an orifice below and a vent above, stepped by the implicit trapezoidal rule with equal steps and its error
/// taken off by Richardson: written here for the tests alone, with its own formulas of both orifices
/// and the gas constant of ISO 2533.
/// </summary>
/// <param name="Area">area of the tank, m²</param>
/// <param name="Height">its height, m</param>
/// <param name="Level">level at the start, m</param>
/// <param name="Factor">K of the outlet, flow K·√head, m^2.5/s</param>
/// <param name="VentArea">Cd·a of the vent, m²</param>
internal sealed record ImplicitBreathing(double Area, double Height, double Level, double Factor, double VentArea)
{
    private const double Atmosphere = 101325, Temperature = 293.15, Air = 287.05287, Kappa = 1.4;
    private const double Density = 998.2, Gravity = 9.80665, Vapour = 2339;

    /// <summary>Level at a time, m.</summary>
    /// <param name="time">time, s</param>
    /// <param name="steps">number of steps of the coarser of two runs</param>
    public double LevelAt(double time, int steps)
    {
        double coarse = Run(time, steps), fine = Run(time, 2 * steps);
        return fine + (fine - coarse) / 3;
    }

    private double Run(double time, int steps)
    {
        double gas = Area * (Height - Level), p = Atmosphere, dt = time / steps;
        double mass = (p - Vapour) * gas / (Air * Temperature);
        for (int i = 0; i < steps; i++)
        {
            double outflow = Outflow(gas, p), inflow = VentFlow(p);
            double gasNow = gas, massNow = mass;
            p = Brent.FindRoot(next => Residual(next) / Area, p - 500, p + 500, 1e-13);
            mass = MassAfter(p);
            gas = mass * Air * Temperature / (p - Vapour);

            double MassAfter(double next) => massNow + dt / 2 * (inflow + VentFlow(next));
            double Residual(double next)
            {
                double volume = MassAfter(next) * Air * Temperature / (next - Vapour);
                return volume - gasNow - dt / 2 * (outflow + Outflow(volume, next));
            }
        }

        return Height - gas / Area;
    }

    private double Outflow(double gas, double p)
    {
        double head = Height - gas / Area + (p - Atmosphere) / (Density * Gravity);
        return head > 0 ? Factor * Math.Sqrt(head) : 0;
    }

    /// <summary>W = Cd·a·p₁·√{2k/((k−1)·R·T)·[r^(2/k) − r^((k+1)/k)]}, subsonic.</summary>
    private double VentFlow(double p)
    {
        double up = Math.Max(p, Atmosphere), r = Math.Min(p, Atmosphere) / up;
        double square = 2 * Kappa / ((Kappa - 1) * Air * Temperature) * (Math.Pow(r, 2 / Kappa) - Math.Pow(r, (Kappa + 1) / Kappa));
        return Math.Sign(Atmosphere - p) * VentArea * up * Math.Sqrt(Math.Max(0, square));
    }
}
