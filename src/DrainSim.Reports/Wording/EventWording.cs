using System.Diagnostics;
using DrainSim.Draining;
using DrainSim.Reports.Measures;

namespace DrainSim.Reports.Wording;

/// <summary>What the events, warnings and remedies of a run say to people.</summary>
public static class EventWording
{
    /// <summary>The text of an event, without a full stop.</summary>
    /// <param name="moment">the event</param>
    /// <param name="job">the job it happened in</param>
    public static string Text(DrainEvent moment, Job job) => moment.Code switch
    {
        EventCode.TenthGone => $"{MeasureFormat.Number(Math.Round(10 * moment.Number))} % of the volume is gone",
        EventCode.RunsFull => "the liquid reaches the outlet; the line runs full",
        EventCode.LeftTurbulent => $"the flow leaves the turbulent range{Reynolds(moment)}",
        EventCode.BecameLaminar => $"the flow becomes laminar{Reynolds(moment)}",
        EventCode.LeftLaminar => $"the flow leaves the laminar range{Reynolds(moment)}",
        EventCode.BecameTurbulent => $"the flow becomes turbulent{Reynolds(moment)}",
        EventCode.VapourLimitBegins =>
            $"the low point reaches {Verdict.LimitName(job)}; from here the flow is held there",
        EventCode.VapourLimitEnds => $"the low point rises from {Verdict.LimitName(job)}; the flow is free again",
        EventCode.AirMayBeDrawn => "a vortex may draw air into the inlet from here",
        EventCode.AirDrawn => "air is likely drawn into the inlet from here",
        EventCode.BoreUncovered => "the inlet's bore is uncovered; it goes on partly full",
        EventCode.OutletCovered => "the receiver covers the outlet",
        EventCode.OutletFreed => "the receiver falls below the outlet",
        EventCode.VacuumRatingPassed => "the headspace passes the tank's vacuum rating",
        EventCode.PressureRatingPassed => "the headspace passes the tank's pressure rating",
        EventCode.HoseRatingPassed => "the low point passes the hose's vacuum rating",
        EventCode.Act => job.Timeline[(int)moment.Number - 1].Text,
        EventCode.AirBreak => "the vent on the line lets air in",
        EventCode.VacuumHeld => "the vacuum in the headspace holds the liquid up",
        EventCode.YieldHeld => "the liquid's yield stress holds it",
        EventCode.Balanced => "as much runs in as out",
        EventCode.ReceiverFull => "the receiver is full to its brim",
        EventCode.Overflowed => "the tank overflows",
        EventCode.VapourBreak => $"the low point reaches {Verdict.LimitName(job)} and the column parts",
        EventCode.InletUncovered => "air reaches the inlet",
        EventCode.Emptied => "the tank is empty but for a film",
        EventCode.Levelled => "the driving head is used up",
        EventCode.TargetReached => "the target is reached",
        EventCode.TimeLimit => "the longest time given is over",
        EventCode.NeverStarted => "the line carries no flow",
        _ => throw new UnreachableException(moment.Code.ToString()),
    };

    /// <summary>The text of a warning, with its full stop.</summary>
    public static string Text(RunWarning warning, MeasureFormat format) => warning.Code switch
    {
        WarningCode.InertiaMatters =>
            "The liquid in the line takes long to change its speed: its inertia time is up to "
            + $"{MeasureFormat.Percent(warning.Number)} of the time in which the head changes. "
            + "The first and last moments are less sure.",
        WarningCode.SurfaceVelocityMatters =>
            "The surface falls fast: its velocity head is up to "
            + $"{MeasureFormat.Percent(warning.Number)} of the driving head. The flow may be larger than told.",
        WarningCode.TransitionFlow =>
            $"For {MeasureFormat.Percent(warning.Number)} of the time the flow is between laminar and turbulent, "
            + "where friction is least sure.",
        WarningCode.AirMayBeDrawn =>
            $"A vortex may draw air into the inlet once it is less than {format.Length(warning.Number)} under the surface; "
            + "the published forms differ widely.",
        WarningCode.VacuumRatingPassed =>
            $"The headspace goes to {format.Pressure(warning.Number)} below the atmosphere, past the tank's vacuum rating.",
        WarningCode.PressureRatingPassed =>
            $"The headspace goes to {format.Pressure(warning.Number)} above the atmosphere, past the tank's pressure rating.",
        WarningCode.HoseMayFlatten =>
            $"The low point goes to {format.Pressure(warning.Number)} below the atmosphere, past the hose's vacuum rating: it may flatten.",
        WarningCode.GasMayGather =>
            $"For {MeasureFormat.Percent(warning.Number)} of the time the low point is below a third of an atmosphere: "
            + "gas from the liquid may gather at the crest (low confidence).",
        WarningCode.NeverEmpties =>
            $"The line keeps up with an inflow of at most {format.Flow(warning.Number)} down to the inlet; this one is more.",
        WarningCode.AirStaysInLeg =>
            $"Air may stay in the outer leg: its Froude number is {MeasureFormat.Number(warning.Number)} at most, and air pockets clear from "
            + (warning.Number < 0.3 ? "about 1 up; below 0.3 they rise back to the crest." : "about 1 up; below it they go irregularly."),
        WarningCode.FrictionDiffers =>
            "The flow of a liquid with a yield stress is turbulent here, and the published forms differ: by one of them the friction is up to "
            + $"{MeasureFormat.Percent(warning.Number)} less, and the job shorter.",
        WarningCode.ThinMargin =>
            $"At the worst moment only {format.Pressure(warning.Number)} is left at the low point. "
            + "Warmer liquid, a lower barometer or a rise in the hose would use it up.",
        _ => throw new UnreachableException(warning.Code.ToString()),
    };

    /// <summary>The text of a remedy, with its full stop.</summary>
    public static string Text(Remedy remedy, MeasureFormat format)
    {
        string proof = $"would let it run on: run so, {Proof(remedy, format)}.";
        string change = format.Length(remedy.Change);
        string value = format.Length(remedy.Value);
        return remedy.Kind switch
        {
            RemedyKind.LowerOutlet => $"Lowering the outlet by {change} (to {value}) {proof}",
            RemedyKind.LowerReceiver => $"Lowering the outlet and the receiver with it by {change} (the outlet to {value}) {proof}",
            RemedyKind.LowerCrest => $"Lowering the crest by {change} (to {value}) {proof}",
            RemedyKind.LowerInlet => $"Lowering the inlet by {change} (to {value}) {proof}",
            RemedyKind.WidenVent =>
                $"One more free vent of {change} bore (a sharp-edged hole) would let the tank breathe: run so, {Proof(remedy, format)}.",
            RemedyKind.LessInflow => $"No more inflow than {format.Flow(remedy.Value)} ({MeasureFormat.Percent(1 - remedy.Change)} of what is given) {proof}",
            RemedyKind.HigherBrim => $"A receiver with its brim {change} higher (at a depth of {value}) {proof}",
            RemedyKind.ThrottleOutlet =>
                $"Throttling at the outlet by a loss coefficient of {MeasureFormat.Number(remedy.Change)} {proof}",
            _ => throw new UnreachableException(remedy.Kind.ToString()),
        };
    }

    private static string Proof(Remedy remedy, MeasureFormat format)
    {
        string time = MeasureFormat.Duration(remedy.ProvedTime);
        string level = format.Length(remedy.ProvedLevel);
        return remedy.ProvedOutcome switch
        {
            Outcome.Emptied => $"it empties in {time}",
            Outcome.InletUncovered => $"it goes down to the inlet, at {level}, in {time}",
            Outcome.VapourBreak => $"the column parts at {level} after {time}",
            Outcome.AirBreak => $"the vent lets air in at {level} after {time}",
            Outcome.VacuumHeld => $"the vacuum holds it at {level} after {time}",
            Outcome.YieldHeld => $"it stands still at {level} after {time}",
            Outcome.Balanced => $"it balances at {level} after {time}",
            Outcome.ReceiverFull => $"the receiver is full at {level} after {time}",
            Outcome.Overflowed => $"the tank overflows after {time}",
            Outcome.Levelled => $"it comes to rest at {level} after {time}",
            Outcome.TargetReached => $"it reaches its target, at {level}, in {time}",
            Outcome.TimeLimit => $"it still runs at {level} after {time}",
            Outcome.NeverStarted => "it does not start",
            _ => throw new UnreachableException(remedy.ProvedOutcome.ToString()),
        };
    }

    private static string Reynolds(DrainEvent moment) =>
        moment.Number > 0 ? $" (Re {MeasureFormat.Number(Math.Round(moment.Number))})" : "";
}
