namespace DrainSim.Integration;

/// <summary>The usual answers to <see cref="IOdeSystem.ErrorScale"/>.</summary>
public static class ErrorScales
{
    /// <summary>Accuracy relative to the component itself: scale = |y| + floor.</summary>
    /// <param name="y">state</param>
    /// <param name="floor">magnitude below which a component no longer matters, in its unit; greater than 0</param>
    /// <param name="scale">receives the scale, one value per component</param>
    public static void Magnitude(ReadOnlySpan<double> y, double floor, Span<double> scale)
    {
        for (int i = 0; i < y.Length; i++)
            scale[i] = Math.Abs(y[i]) + floor;
    }

    /// <summary>Accuracy in time: scale = |dy/dt|·duration + floor, so that the error allowed in a component is
    /// what it covers in that share of the duration. It holds the time of arrival where y comes to rest.</summary>
    /// <param name="dydt">derivative</param>
    /// <param name="duration">time that the relative tolerance is a share of; greater than 0</param>
    /// <param name="floor">magnitude below which a component no longer matters, in its unit; greater than 0</param>
    /// <param name="scale">receives the scale, one value per component</param>
    public static void Time(ReadOnlySpan<double> dydt, double duration, double floor, Span<double> scale)
    {
        for (int i = 0; i < dydt.Length; i++)
            scale[i] = Math.Abs(dydt[i]) * duration + floor;
    }
}
