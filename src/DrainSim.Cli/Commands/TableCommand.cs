using System.CommandLine;

namespace DrainSim.Cli.Commands;

/// <summary>A command that shows one of the built-in tables.</summary>
internal abstract class TableCommand : ExplainedCommand
{
    private readonly Option<bool> csv = new("--csv") { Description = "As CSV, for a spreadsheet." };

    protected TableCommand(string name, string description) : base(name, description)
    {
        Options.Add(csv);
        SetAction(Show);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Example> Examples =>
    [
        new($"drainsim {Name}", "Shows the table."),
        new($"drainsim {Name} --csv > {Name}.csv", "Writes it for a spreadsheet."),
    ];

    /// <summary>The table, and what is to be known before its numbers are used.</summary>
    protected abstract ColumnTable Table();

    private int Show(ParseResult parsed)
    {
        TextWriter output = parsed.InvocationConfiguration.Output;
        if (parsed.GetValue(csv))
            Table().WriteCsv(output);
        else
            Table().WriteText(output);
        return ExitCode.Ran;
    }
}
