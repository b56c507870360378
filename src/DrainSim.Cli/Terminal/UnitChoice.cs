using System.CommandLine;
using DrainSim.Reports.Measures;
using DrainSim.Scenarios;

namespace DrainSim.Cli.Terminal;

/// <summary>The option that chooses the units for people; the scenario's own where it is not given.</summary>
internal sealed class UnitChoice
{
    public UnitChoice()
    {
        Option.AcceptOnly("family of units", ["metric", "us"]);
    }

    /// <summary>The option, to be added to a command.</summary>
    public Option<string?> Option { get; } = new("--units")
    {
        Description = "Units for people: the scenario's unless given here. Files are SI whatever it is.",
        HelpName = "metric|us",
    };

    /// <summary>The units for a scenario.</summary>
    public UnitSystem For(ParseResult parsed, Scenario scenario) => parsed.GetValue(Option) switch
    {
        "us" => UnitSystem.Us,
        "metric" => UnitSystem.Metric,
        _ => scenario.Units == ResultUnits.Us ? UnitSystem.Us : UnitSystem.Metric,
    };
}
