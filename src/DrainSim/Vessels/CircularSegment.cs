namespace DrainSim.Vessels;

/// <summary>The segment of a circle below a chord: its area is R²/2·(θ − sin θ), θ the angle of the chord at the centre.</summary>
internal static class CircularSegment
{
    private const double SeriesEnds = 1;

    /// <summary>θ − sin θ without cancellation, 1.</summary>
    /// <param name="theta">angle of the chord, rad; from 0 to π</param>
    public static double AngleLessSine(double theta)
    {
        if (theta >= SeriesEnds)
            return theta - Math.Sin(theta);
        double square = theta * theta;
        double sum = 1;
        for (int n = 18; n >= 4; n -= 2)
            sum = 1 - square / (n * (n + 1)) * sum;
        return theta * square / 6 * sum;
    }

    /// <summary>The angle whose θ − sin θ is m, within 1.5 %; a start for Newton's method.</summary>
    /// <remarks><code>
    /// θ ≈ s + s³/60 + s⁵/1400 + s⁷/25200,   s = (6·m)^(1/3)
    /// </code>
    /// The series of Kepler's equation at eccentricity 1, cut off.
    /// </remarks>
    /// <param name="m">from 0 to π, rad</param>
    public static double AngleNear(double m)
    {
        double s = Math.Cbrt(6 * m);
        double square = s * s;
        return s * (1 + square * (1.0 / 60 + square * (1.0 / 1400 + square / 25200)));
    }
}
