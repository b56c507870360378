using MathNet.Numerics.Interpolation;

namespace DrainSim.Lines;

/// <summary>How much of its full flow capacity a valve passes at an opening.</summary>
/// <remarks>
/// Points of relative capacity joined by a monotone cubic (F. N. Fritsch and R. E. Carlson, SIAM J. Numer. Anal.
/// 17 (1980) 238–246), so that it is continuous and rises strictly from 0 when shut to 1 when open.
/// </remarks>
public sealed class ValveCharacteristic
{
    private readonly CubicSpline curve;

    /// <summary>Joins points.</summary>
    /// <param name="id">name of the curve</param>
    /// <param name="source">where the curve is from</param>
    /// <param name="openings">openings, 1; strictly rising from 0 to 1, at least three</param>
    /// <param name="capacities">φ at those openings, 1; strictly rising from 0 to 1</param>
    /// <exception cref="ArgumentException">the points do not rise from 0 to 1</exception>
    public ValveCharacteristic(string id, string source, IReadOnlyList<double> openings, IReadOnlyList<double> capacities)
    {
        ArgumentNullException.ThrowIfNull(openings);
        ArgumentNullException.ThrowIfNull(capacities);
        if (!RiseFromZeroToOne(openings) || !RiseFromZeroToOne(capacities) || openings.Count != capacities.Count)
            throw new ArgumentException($"the points of valve curve {id} do not rise from 0 to 1");
        Id = id;
        Source = source;
        Openings = [.. openings];
        curve = CubicSpline.InterpolatePchipSorted([.. openings], [.. capacities]);
    }

    /// <summary>Name of the curve.</summary>
    public string Id { get; }

    /// <summary>Where the curve is from.</summary>
    public string Source { get; }

    /// <summary>The openings of its points, 1; rising from 0 to 1.</summary>
    public IReadOnlyList<double> Openings { get; }

    /// <summary>Relative flow capacity φ = Kv/Kv(full), 1; 0 when shut, 1 when open, strictly rising between.</summary>
    /// <param name="opening">opening, 1; from 0 to 1</param>
    public double RelativeCapacity(double opening) => Require.Within(opening, 0, 1, "valve opening", "") switch
    {
        0 => 0,
        1 => 1,
        _ => Math.Clamp(curve.Interpolate(opening), 0, 1),
    };

    private static bool RiseFromZeroToOne(IReadOnlyList<double> values)
    {
        for (int i = 1; i < values.Count; i++)
        {
            if (!(values[i] > values[i - 1]))
                return false;
        }
        return values.Count >= 3 && values[0] == 0 && values[^1] == 1;
    }
}
