using System.Globalization;
using DrainSim.Draining;
using DrainSim.Scenarios.Units;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the block <c>run</c>.</summary>
internal static class RunReader
{
    private static readonly RunSettings Usual = new();

    /// <summary>The settings; the usual ones for what the block does not say.</summary>
    /// <param name="given">the block; null when the file has none</param>
    /// <param name="tank">the tank, for judging the targets; null when it was refused</param>
    /// <param name="findings">what the reading gathers</param>
    public static RunBlock Read(BlockReader? given, FilledTank? tank, Findings findings)
    {
        BlockReader block = given ?? new BlockReader(new BlockNode([], Position.Outside), "run", Position.Outside, findings);
        double until = block.AmountOr("until", Quantities.Time, Allowed.Positive, Usual.Until, "30 d");
        block.AtMostOne("Give the one at which the job is done", "stop_at_level", "stop_at_volume");
        double? level = block.Amount("stop_at_level", Quantities.Length, Allowed.NotNegative);
        double? volume = block.Amount("stop_at_volume", Quantities.Volume, Allowed.NotNegative);
        double settled = block.AmountOr("settled_within", Quantities.Length, Allowed.Positive, Usual.SettledWithin, "1 mm");
        double? every = block.Amount("report_every", Quantities.Time, Allowed.Positive);
        double tolerance = block.AmountOr("tolerance", Quantities.Ratio, Allowed.Within(1e-13, 1e-2, "from 1e-13 to 0.01"),
            Usual.Tolerance, Usual.Tolerance.ToString("0e0", CultureInfo.InvariantCulture));
        DateTimeOffset? begins = ClockReader.Read(block, "begins");
        ResultUnits? units = block.Choice<ResultUnits?>("units", null, ("metric", ResultUnits.Metric), ("us", ResultUnits.Us));
        if (tank is not null)
            JudgeTargets(block, tank, level, volume);
        if (every < until / 1e6)
            block.Refuse("report_every", "makes more than a million rows within 'until'", "Give a longer interval");
        block.Finish();
        return new RunBlock(block.Build(() => new RunSettings
        {
            Until = until,
            StopAtLevel = level,
            StopAtVolume = volume,
            SettledWithin = settled,
            ReportEvery = every,
            Tolerance = tolerance,
        }) ?? Usual, units, begins);
    }

    private static void JudgeTargets(BlockReader block, FilledTank tank, double? level, double? volume)
    {
        if (level >= tank.Level)
            block.Refuse("stop_at_level", "the tank stands at this level or lower from the start", "Give a level below that at the start");
        if (volume >= tank.Vessel.Volume(tank.Level))
            block.Refuse("stop_at_volume", "the tank holds this volume or less from the start", "Give a volume below that at the start");
    }
}
