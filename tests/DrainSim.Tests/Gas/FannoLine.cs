namespace DrainSim.Tests.Gas;

/// <summary>Adiabatic flow with friction in a duct of constant area behind an isentropic entry that loses K velocity
/// heads of stagnation pressure, by bisection on the Mach number; k = 1.4. Closed forms of Fanno flow (Shapiro 1953).</summary>
internal static class FannoLine
{
    private const double K = 1.4;

    /// <summary>W·√(R·T0)/(A·p0), 1.</summary>
    /// <param name="ratio">pressure behind the jet over the stagnation pressure in front, 1; above the choking one</param>
    /// <param name="friction">Darcy f·L/D, 1</param>
    /// <param name="entryLoss">K on the velocity head behind the entry, 1</param>
    public static double MassFlux(double ratio, double friction, double entryLoss)
    {
        (double low, double high) = (1e-9, 1.0);
        for (int turn = 0; turn < 100; turn++)
        {
            double mach = (low + high) / 2;
            if (ExitPressure(mach, friction, entryLoss) < ratio)
                high = mach;
            else
                low = mach;
        }
        double cooling = 1 / (1 + (K - 1) / 2 * low * low);
        return InletPressure(low, entryLoss) * Math.Sqrt(K / cooling) * low;
    }

    private static double InletPressure(double mach, double entryLoss)
    {
        double expansion = Math.Pow(1 / (1 + (K - 1) / 2 * mach * mach), K / (K - 1));
        return (1 - entryLoss * K / 2 * mach * mach * expansion) * expansion;
    }

    private static double ExitPressure(double mach, double friction, double entryLoss)
    {
        double left = Fanno(mach) - friction;
        if (left < 0)
            return 0;
        (double low, double high) = (mach, 1.0);
        for (int turn = 0; turn < 100; turn++)
        {
            double middle = (low + high) / 2;
            if (Fanno(middle) > left)
                low = middle;
            else
                high = middle;
        }
        return InletPressure(mach, entryLoss) * PressureShare(low) / PressureShare(mach);
    }

    private static double Fanno(double m) =>
        (1 - m * m) / (K * m * m) + (K + 1) / (2 * K) * Math.Log((K + 1) * m * m / (2 + (K - 1) * m * m));

    private static double PressureShare(double m) => Math.Sqrt((K + 1) / (2 + (K - 1) * m * m)) / m;
}
