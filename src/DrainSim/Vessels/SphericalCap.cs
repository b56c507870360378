namespace DrainSim.Vessels;

/// <summary>The cap of a sphere or, scaled along its axis, of a spheroid.</summary>
internal static class SphericalCap
{
    /// <summary>Volume of a cap as a share of the whole sphere's, 1.</summary>
    /// <remarks><code>
    /// v = s² · (3 − 2s)
    ///
    /// s   height of the cap as a share of the diameter, 1
    /// </code></remarks>
    public static double VolumeShare(double s) => s * s * (3 - 2 * s);

    /// <summary>Height of a cap as a share of the diameter, 1: the inverse of <see cref="VolumeShare"/>.</summary>
    /// <remarks><code>
    /// s = sin²(β/2) + (√3/2)·sin β,   β = (2/3)·asin √v
    /// </code>
    /// The trigonometric root s = 1/2 − sin(asin(1 − 2v)/3) of the cubic 2s³ − 3s² + v = 0, rearranged
    /// so that every term is positive and a small v loses no digits.
    /// </remarks>
    /// <param name="v">share of the volume, from 0 to 1; the caller keeps it there</param>
    public static double HeightShare(double v)
    {
        double beta = 2.0 / 3 * Math.Asin(Math.Sqrt(v));
        double half = Math.Sin(beta / 2);
        return half * half + Math.Sqrt(3) / 2 * Math.Sin(beta);
    }
}
