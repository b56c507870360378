using System.Diagnostics;
using DrainSim.Draining;
using DrainSim.Reports.Measures;

namespace DrainSim.Reports.Wording;

/// <summary>The plain sentence that says how a run ended.</summary>
public static class Verdict
{
    /// <summary>The sentence of a result, with its full stop.</summary>
    /// <param name="result">what the run found</param>
    /// <param name="format">writes the measures</param>
    public static string Sentence(DrainResult result, MeasureFormat format)
    {
        string time = MeasureFormat.Duration(result.StoppedAt);
        string left = format.Volume(result.LeftVolume);
        string level = format.Length(result.FinalLevel);
        string stops = $"Stops after {time} with {left} left";
        return Ending(result, format, time, left, level, stops) + Danger(result, format);
    }

    /// <summary>What no verdict may leave out: a rating of the tank that is passed on the way.</summary>
    private static string Danger(DrainResult result, MeasureFormat format)
    {
        if (result.LargestVacuum is { } vacuum && result.Job.VacuumRating is { } stands && vacuum.Value > stands)
            return $" The tank's vacuum rating of {format.Pressure(stands)} is passed {When(result, EventCode.VacuumRatingPassed)}.";
        bool isOver = result.Events.Any(moment => moment.Code == EventCode.PressureRatingPassed);
        return isOver && result.Job.PressureRating is { } rating
            ? $" The tank's pressure rating of {format.Pressure(rating)} is passed {When(result, EventCode.PressureRatingPassed)}."
            : "";
    }

    private static string When(DrainResult result, EventCode code)
    {
        double time = result.Events.FirstOrDefault(moment => moment.Code == code).Time;
        return time > 0 ? $"after {MeasureFormat.Duration(time)}" : "from the start";
    }


    private static string Ending(DrainResult result, MeasureFormat format, string time, string left, string level, string stops) =>
        result.Outcome switch
        {
            Outcome.Emptied => $"Empties in {time}; nothing but a film is left.",
            Outcome.InletUncovered => $"{stops}: air reaches the inlet at {level}.",
            Outcome.VapourBreak =>
                $"{stops}: at {level} the low point reaches {LimitName(result.Job)} and the column parts.",
            Outcome.AirBreak => $"{stops}: at {level} the vent on the line lets air in.",
            Outcome.VacuumHeld => $"{stops}: at {level} the vacuum in the headspace holds the liquid up.",
            Outcome.YieldHeld => $"{stops}: at {level} the liquid's yield stress holds it{YieldHead(result, format)}.",
            Outcome.Balanced => $"Never empties: after {time} as much runs in as out, at {level}, with {left} in the tank.",
            Outcome.ReceiverFull => $"{stops}: at {level} the receiver is full to its brim.",
            Outcome.Overflowed when result.DrainedVolume < 0 => $"Overflows after {time}: the receiver runs back into it.",
            Outcome.Overflowed => $"Overflows after {time}: more runs in than the line carries.",
            Outcome.Levelled => $"{stops}: at {level} it stands level with {FarEnd(result.Job, result.ReceiverLevel)}.",
            Outcome.TargetReached => Target(result, format, time),
            Outcome.TimeLimit => $"Not done after {time}, the longest time given: {left} left, at {level}.",
            Outcome.NeverStarted => $"Never starts: {Reason(result.Job, result.NoStart, result.Prime, format)}"
                + $"{(result.NoStart == NoStart.YieldHolds ? YieldHead(result, format) : "")}.",
            _ => throw new UnreachableException(result.Outcome.ToString()),
        };

    /// <summary>The outcome in a word or two, for a curve or a table.</summary>
    public static string Headline(Outcome outcome) => outcome switch
    {
        Outcome.Emptied => "Empty",
        Outcome.InletUncovered => "Air reaches the inlet",
        Outcome.VapourBreak => "The column parts",
        Outcome.AirBreak => "The vent lets air in",
        Outcome.Levelled => "Level, no head left",
        Outcome.VacuumHeld => "Held by the vacuum",
        Outcome.YieldHeld => "Held by its yield stress",
        Outcome.Balanced => "Inflow equals outflow",
        Outcome.ReceiverFull => "Receiver full",
        Outcome.Overflowed => "The tank overflows",
        Outcome.TargetReached => "Target reached",
        Outcome.TimeLimit => "Time is up",
        Outcome.NeverStarted => "Never starts",
        _ => throw new UnreachableException(outcome.ToString()),
    };

    /// <summary>The pressure that the low point must not reach, in words.</summary>
    internal static string LimitName(Job job) =>
        LineProfile.IsLimitGiven(job) ? "the least pressure allowed" : "the vapour pressure";

    /// <summary>What the liquid runs to, in words.</summary>
    internal static string FarEnd(Job job) => FarEnd(job, null);

    /// <summary>What the liquid has run to, in words.</summary>
    /// <param name="job">the job</param>
    /// <param name="depth">depth in the receiving tank by then, m; null where there is none</param>
    internal static string FarEnd(Job job, double? depth)
    {
        double outlet = new LineProfile(job.Line).Outlet;
        return job.ReceiverSurface > outlet ? "the receiving surface"
            : job.DrawOffs[0].Receiver is ReceivingTank tank && tank.Bottom + (depth ?? tank.Level) > outlet ? "the liquid in the receiver"
            : "the outlet";
    }

    /// <summary>Why a line does not start, as the rest of a sentence.</summary>
    /// <param name="job">the job</param>
    /// <param name="reason">why; null where nothing is known</param>
    /// <param name="prime">what the line needs before it runs; null for one that is no siphon</param>
    /// <param name="format">writes the measures</param>
    public static string Reason(Job job, NoStart? reason, PrimeReport? prime, MeasureFormat format)
    {
        string level = format.Length(job.Level);
        return reason switch
        {
            NoStart.InletAboveLevel =>
                $"the inlet, at {format.Length(job.Line.Inlet.Elevation)}, stands above the level of {level}",
            NoStart.NoDrivingHead =>
                $"{FarEnd(job)}, at {format.Length(FarElevation(job))}, stands no lower than the level of {level}",
            NoStart.YieldHolds => $"the liquid's yield stress holds it at the level of {level}",
            NoStart.LiftBeyondLimit when prime is not null =>
                $"the crest stands {format.Length(prime.StaticLift)} above the level, "
                + $"and no column higher than {format.Length(prime.LiftLimit)} holds together",
            NoStart.LiftBeyondLimit => "the crest stands higher above the level than a column holds together",
            NoStart.NoPrime => "the liquid's front in the outer leg does not stand below the level",
            NoStart.FrontStops => "the liquid's front comes to rest in the outer leg before it reaches the outlet",
            NoStart.ValveShut => "a valve on the line is shut",
            null => "the line never carries a flow",
            _ => throw new UnreachableException(reason.ToString()),
        };
    }

    private static string YieldHead(DrainResult result, MeasureFormat format) =>
        result.Lines.Select(line => line.YieldHead).Max() is { } head
            ? $"; it takes a head of more than {format.Length(head)} to move it"
            : "";

    private static double FarElevation(Job job)
    {
        double outlet = new LineProfile(job.Line).Outlet;
        double surface = job.DrawOffs[0].Receiver is ReceivingTank tank ? tank.Bottom + tank.Level : job.ReceiverSurface ?? outlet;
        return Math.Max(outlet, surface);
    }

    private static string Target(DrainResult result, MeasureFormat format, string time)
    {
        string level = format.Length(result.FinalLevel);
        string left = format.Volume(result.LeftVolume);
        return IsVolumeTarget(result)
            ? $"Reaches the volume asked for, {left}, after {time}; the level is {level}."
            : $"Reaches the level asked for, {level}, after {time} with {left} left.";
    }

    private static bool IsVolumeTarget(DrainResult result)
    {
        RunSettings run = result.Job.Run;
        return run.StopAtVolume is { } volume
            && (run.StopAtLevel is not { } level
                || Math.Abs(result.LeftVolume - volume) < 1e-6 * volume && result.FinalLevel > level);
    }
}
