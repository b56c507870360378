using DrainSim.Lines;
using DrainSim.Reports.Measures;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;

namespace DrainSim.Cli;

/// <summary>A standard size beside a bore that a sizing found, and what it gives.</summary>
/// <param name="Size">the size</param>
/// <param name="Result">what it gives</param>
internal sealed record StandardCase(PipeSize Size, CaseResult Result)
{
    /// <summary>The next smaller and the next larger hose and pipe beside every bore found; none where no bore is sized.</summary>
    /// <param name="plan">the sizing</param>
    /// <param name="result">what it found</param>
    /// <param name="units">whether hoses are counted in millimetres or in inches</param>
    /// <param name="cancellation">ends the runs early</param>
    public static IReadOnlyList<StandardCase> Beside(SizePlan plan, SizingResult result, UnitSystem units, CancellationToken cancellation)
    {
        if (!plan.Parameter.Path.EndsWith(".bore", StringComparison.Ordinal))
            return [];
        CaseReader reader = plan.Scenario.NewReader();
        return
        [
            .. result.Values.SelectMany(value => SizeTable.Beside(value.Value, row => IsOffered(row, units))).Distinct().OrderBy(size => size.Bore)
                .Select(size => new StandardCase(size, reader.Run([plan.Parameter.Of(size.Bore)], cancellation))),
        ];
    }

    /// <summary>Steel pipe of the usual schedule, and hose of the metric or the inch series.</summary>
    private static bool IsOffered(PipeSize row, UnitSystem units) => row.Schedule is { } schedule
        ? schedule == SizeTable.DefaultSchedule
        : row.Standard.Contains("inch", StringComparison.Ordinal) == (units == UnitSystem.Us);
}
