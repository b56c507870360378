namespace DrainSim.Cli.Terminal;

/// <summary>A column of a <see cref="ColumnTable"/>.</summary>
internal sealed record Column
{
    /// <summary>Heading for people; null for a column that stands in CSV alone.</summary>
    public string? Title { get; init; }

    /// <summary>Heading in CSV, with the unit in its name; null for a column that stands on the terminal alone.</summary>
    public string? Key { get; init; }

    /// <summary>Whether the cells are numbers and stand to the right.</summary>
    public bool IsNumber { get; init; }

    /// <summary>Whether long cells are broken into lines.</summary>
    public bool IsWrapped { get; init; }
}
