namespace DrainSim.Studies.Uncertainty;

/// <summary>The level over time in bands.</summary>
public sealed record LevelFan
{
    private const int Steps = 160;

    /// <summary>Times, rising from 0, s.</summary>
    public required IReadOnlyList<double> Times { get; init; }

    /// <summary>The shares that the bands belong to, rising, 1.</summary>
    public required IReadOnlyList<double> Shares { get; init; }

    /// <summary>For each share the level that it does not pass, at each time, m.</summary>
    public required IReadOnlyList<IReadOnlyList<double>> Levels { get; init; }

    /// <summary>Draws the bands of many runs up to a time.</summary>
    internal static LevelFan Of(IReadOnlyList<LevelTrack> tracks, double end, IReadOnlyList<double> shares)
    {
        double[] times = [.. Enumerable.Range(0, Steps + 1).Select(i => end * i / Steps)];
        double[][] levels = [.. shares.Select(_ => new double[times.Length])];
        for (int i = 0; i < times.Length; i++)
        {
            double[] now = [.. tracks.Select(track => track.At(times[i])).Order()];
            for (int k = 0; k < levels.Length; k++)
                levels[k][i] = Percentiles.At(now, shares[k]);
        }

        return new LevelFan { Times = times, Shares = shares, Levels = levels };
    }
}
