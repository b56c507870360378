using System.Globalization;
using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using DrainSim.Scenarios;

namespace DrainSim.Cli.Terminal;

/// <summary>What a planner reads before a run: the values as understood, and the first instant.</summary>
internal static class CheckBlock
{
    /// <summary>Writes the block of one scenario.</summary>
    public static void Write(TextWriter output, ScenarioReading reading, FirstInstant first, UnitSystem units)
    {
        Scenario scenario = reading.Scenario!;
        var format = new MeasureFormat(units);
        output.WriteLine($"{reading.FileName}: {scenario.Title}");
        output.WriteLine();
        output.WriteLine("Understood");
        WriteUnderstood(output, scenario.Understood);
        output.WriteLine();
        output.WriteLine("At the start");
        foreach ((string label, string text) in Facts(scenario.Job, first, format))
        {
            foreach (string line in Paragraph.Lines($"  {label,-14}{text}", Paragraph.Width, hang: 16))
                output.WriteLine(line);
        }
        if (reading.Warnings.Count == 0)
            return;
        output.WriteLine();
        output.Write(ProblemReport.Entries(reading.FileName, reading.Warnings));
    }

    private static void WriteUnderstood(TextWriter output, IReadOnlyList<UnderstoodValue> values)
    {
        int path = values.Max(value => value.Path.Length);
        int written = Math.Min(28, values.Max(value => value.Written.Length));
        foreach (UnderstoodValue value in values)
        {
            string si = value.Value is { } number
                ? string.Create(CultureInfo.InvariantCulture, $"{number:G6} {value.Unit}")
                : "";
            string text = $"  {value.Path.PadRight(path)}  {value.Written.PadRight(written)}  {si,-18}"
                + (value.IsDefault ? "default" : "");
            output.WriteLine(text.TrimEnd());
        }
    }

    private static IEnumerable<(string Label, string Text)> Facts(Job job, FirstInstant first, MeasureFormat format)
    {
        Instant now = first.Instant;
        yield return ("Tank", $"{format.Volume(now.Volume)} of {format.Volume(job.Vessel.Capacity)} at a level of {format.Length(now.Level)}");
        yield return ("Liquid", $"{job.Liquid.Name}, {format.Temperature(job.Liquid.Temperature)}");
        yield return ("Driving head", format.Length(now.Head));
        if (first is { NoStart: null, Prime.Front: { } front })
            yield return ("Front", $"at {format.Length(front)} in the outer leg; the line has yet to run full");
        yield return ("Flow", first.NoStart is null
            ? $"{format.Flow(now.Flow)}, {format.Velocity(now.Velocity)}, Re {MeasureFormat.Number(Math.Round(now.Reynolds))}"
            : $"none: {Verdict.Reason(job, first.NoStart, first.Prime, format)}");
        yield return ("Low point", $"{format.Pressure(now.LowPointPressure)} absolute, {format.Pressure(now.LowPointMargin)} above its limit");
        if (first.Prime is not { } prime)
            yield break;
        yield return ("Static lift", $"{format.Length(prime.StaticLift)} of at most {format.Length(prime.LiftLimit)}");
        yield return ("Prime", $"{format.Volume(prime.LineVolume)}: inner leg {format.Volume(prime.InnerLegVolume)}, outer leg {format.Volume(prime.OuterLegVolume)}");
        yield return ("To start", $"front in the outer leg below {format.Length(prime.FrontElevation)}, or a suction of {format.Pressure(prime.Suction)} at the outlet"
            + (prime.DipFills is { } fills ? $", or by hand {MeasureFormat.Number(fills)} × dipped and capped" : ""));
    }
}
