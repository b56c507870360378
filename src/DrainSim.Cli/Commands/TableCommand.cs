using System.CommandLine;
using System.Globalization;
using DrainSim.Cli.Terminal;

namespace DrainSim.Cli.Commands;

/// <summary>A command that shows one of the built-in tables.</summary>
internal abstract class TableCommand : ExplainedCommand
{
    private readonly Option<bool> csv = new("--csv") { Description = "As CSV, with all columns and sources." };

    protected TableCommand(string name, string description) : base(name, description)
    {
        Options.Add(csv);
        SetAction(Show);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Example> Examples =>
    [
        new($"drainsim {Name}", "Shows the table."),
        new($"drainsim {Name} --csv > {Name}.csv", "Writes it for a spreadsheet, sources included."),
    ];

    /// <summary>The table that the command line asks for.</summary>
    protected abstract ColumnTable Table(ParseResult parsed);

    /// <summary>A number for a spreadsheet: the shortest text that reads back as the same number; empty for none.</summary>
    protected static string Exact(double? number) => number?.ToString("R", CultureInfo.InvariantCulture) ?? "";

    /// <summary>A number in a unit that is a power of ten of the SI unit, without the noise of the conversion.</summary>
    protected static string Exact(double? value, double perSi) =>
        value is { } number ? ((decimal)number * (decimal)perSi).ToString("0.##########", CultureInfo.InvariantCulture) : "";

    private int Show(ParseResult parsed)
    {
        TextWriter output = parsed.InvocationConfiguration.Output;
        ColumnTable table = Table(parsed);
        if (parsed.GetValue(csv))
            table.WriteCsv(output);
        else
            table.WriteText(output);
        return ExitCode.Ran;
    }
}
