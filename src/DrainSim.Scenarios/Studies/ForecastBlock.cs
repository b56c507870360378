using DrainSim.Scenarios.Reading;

namespace DrainSim.Scenarios.Studies;

/// <summary>The block <c>forecast</c> of a scenario, as it is written.</summary>
internal sealed record ForecastBlock
{
    /// <summary>Values that are set before the fit, in the order of the file.</summary>
    public IReadOnlyList<(string Path, string Text)> Set { get; init; } = [];

    /// <summary>Name of the CSV file with the readings; null where it is not given.</summary>
    public string? Readings { get; init; }

    /// <summary>Paths of the parameters to fit.</summary>
    public IReadOnlyList<string> Fit { get; init; } = [];

    /// <summary>Smallest step of the instrument; null where it is not given.</summary>
    public string? Resolution { get; init; }

    /// <summary>Elevation of the point that ullages are measured from; null where it is not given.</summary>
    public string? GaugePoint { get; init; }

    /// <summary>The seed of the band; null where it is not given.</summary>
    public string? Seed { get; init; }

    /// <summary>Reads the block; an empty one where the file has none.</summary>
    public static ForecastBlock Read(BlockReader file)
    {
        if (file.Block("forecast") is not { } block)
            return new ForecastBlock();
        var read = new ForecastBlock
        {
            Set = StudyBlock.Texts(block),
            Readings = block.Word("readings"),
            Fit = UncertaintyBlock.Lines(block, "fit", "Give the paths of the parameters, such as [line.path.strainer.loss, tank.level]"),
            Resolution = block.Word("resolution"),
            GaugePoint = block.Word("gauge_point"),
            Seed = block.Word("seed"),
        };
        block.Finish();
        return read;
    }
}
