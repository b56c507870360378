using System.Diagnostics;
using DrainSim.Draining;

namespace DrainSim.Reports.Wording;

/// <summary>The closed sets of a result, but for the outcome, as they are written in files.</summary>
public static class ReportCodes
{
    /// <summary>The code of an event.</summary>
    public static string Of(EventCode code) => code switch
    {
        EventCode.TenthGone => "tenth_gone",
        EventCode.RunsFull => "runs_full",
        EventCode.LeftTurbulent => "left_turbulent",
        EventCode.BecameLaminar => "became_laminar",
        EventCode.LeftLaminar => "left_laminar",
        EventCode.BecameTurbulent => "became_turbulent",
        EventCode.VapourLimitBegins => "vapour_limit_begins",
        EventCode.VapourLimitEnds => "vapour_limit_ends",
        EventCode.AirMayBeDrawn => "air_may_be_drawn",
        EventCode.AirDrawn => "air_drawn",
        EventCode.BoreUncovered => "bore_uncovered",
        EventCode.OutletCovered => "outlet_covered",
        EventCode.OutletFreed => "outlet_freed",
        EventCode.VacuumRatingPassed => "vacuum_rating_passed",
        EventCode.PressureRatingPassed => "pressure_rating_passed",
        EventCode.HoseRatingPassed => "hose_rating_passed",
        EventCode.Act => "act",
        EventCode.AirBreak => "air_break",
        EventCode.VacuumHeld => "vacuum_held",
        EventCode.YieldHeld => "yield_held",
        EventCode.Balanced => "balanced",
        EventCode.ReceiverFull => "receiver_full",
        EventCode.Overflowed => "overflowed",
        EventCode.VapourBreak => "vapour_break",
        EventCode.InletUncovered => "inlet_uncovered",
        EventCode.Emptied => "emptied",
        EventCode.Levelled => "levelled",
        EventCode.TargetReached => "target_reached",
        EventCode.TimeLimit => "time_limit",
        EventCode.NeverStarted => "never_started",
        _ => throw new UnreachableException(code.ToString()),
    };

    /// <summary>The code of a reason why a line never started.</summary>
    public static string Of(NoStart reason) => reason switch
    {
        NoStart.InletAboveLevel => "inlet_above_level",
        NoStart.NoDrivingHead => "no_driving_head",
        NoStart.YieldHolds => "yield_holds",
        NoStart.LiftBeyondLimit => "lift_beyond_limit",
        NoStart.NoPrime => "no_prime",
        NoStart.FrontStops => "front_stops",
        NoStart.ValveShut => "valve_shut",
        _ => throw new UnreachableException(reason.ToString()),
    };

    /// <summary>The code of a warning.</summary>
    public static string Of(WarningCode code) => code switch
    {
        WarningCode.InertiaMatters => "inertia_matters",
        WarningCode.SurfaceVelocityMatters => "surface_velocity_matters",
        WarningCode.TransitionFlow => "transition_flow",
        WarningCode.AirMayBeDrawn => "air_may_be_drawn",
        WarningCode.VacuumRatingPassed => "vacuum_rating_passed",
        WarningCode.PressureRatingPassed => "pressure_rating_passed",
        WarningCode.HoseMayFlatten => "hose_may_flatten",
        WarningCode.GasMayGather => "gas_may_gather",
        WarningCode.NeverEmpties => "never_empties",
        WarningCode.AirStaysInLeg => "air_stays_in_leg",
        WarningCode.FrictionDiffers => "friction_differs",
        WarningCode.ThinMargin => "thin_margin",
        _ => throw new UnreachableException(code.ToString()),
    };

    /// <summary>The code of a remedy.</summary>
    public static string Of(RemedyKind kind) => kind switch
    {
        RemedyKind.LowerOutlet => "lower_outlet",
        RemedyKind.LowerReceiver => "lower_receiver",
        RemedyKind.LowerCrest => "lower_crest",
        RemedyKind.ThrottleOutlet => "throttle_outlet",
        RemedyKind.LowerInlet => "lower_inlet",
        RemedyKind.WidenVent => "widen_vent",
        RemedyKind.LessInflow => "less_inflow",
        RemedyKind.HigherBrim => "higher_brim",
        _ => throw new UnreachableException(kind.ToString()),
    };
}
