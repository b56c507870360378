using System.Diagnostics;
using DrainSim.Draining;

namespace DrainSim.Reports.Wording;

/// <summary>The outcomes as they are written in files and on the command line.</summary>
public static class OutcomeCodes
{
    /// <summary>Every code, in the order of <see cref="Outcome"/>.</summary>
    public static IReadOnlyList<string> All { get; } = [.. Enum.GetValues<Outcome>().Select(Code)];

    /// <summary>The code of an outcome.</summary>
    public static string Code(Outcome outcome) => outcome switch
    {
        Outcome.Emptied => "emptied",
        Outcome.InletUncovered => "inlet_uncovered",
        Outcome.VapourBreak => "vapour_break",
        Outcome.AirBreak => "air_break",
        Outcome.Levelled => "levelled",
        Outcome.VacuumHeld => "vacuum_held",
        Outcome.YieldHeld => "yield_held",
        Outcome.Balanced => "balanced",
        Outcome.ReceiverFull => "receiver_full",
        Outcome.Overflowed => "overflowed",
        Outcome.TargetReached => "target_reached",
        Outcome.TimeLimit => "time_limit",
        Outcome.NeverStarted => "never_started",
        _ => throw new UnreachableException(outcome.ToString()),
    };

    /// <summary>The outcome of a code; exact case.</summary>
    /// <returns>whether there is one</returns>
    public static bool TryParse(string code, out Outcome outcome)
    {
        foreach (Outcome candidate in Enum.GetValues<Outcome>())
        {
            if (Code(candidate) == code)
            {
                outcome = candidate;
                return true;
            }
        }
        outcome = default;
        return false;
    }
}
