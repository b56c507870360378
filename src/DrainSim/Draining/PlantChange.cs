using DrainSim.Gas;
using DrainSim.Lines;

namespace DrainSim.Draining;

/// <summary>Carries what differs between two plants over to a third.</summary>
/// <remarks>Part by part, down to the item of a line's path: two acts that turn two valves do not undo each other.</remarks>
internal static class PlantChange
{
    /// <summary>The headspace with the difference.</summary>
    public static Headspace OfHeadspace(Headspace now, Headspace before, Headspace after) =>
        AreSame(before, after) ? now : after;

    /// <summary>The inflow with the difference.</summary>
    public static Inflow? OfInflow(Inflow? now, Inflow? before, Inflow? after) =>
        before == after || (before is not null && after is not null && before.Points.SequenceEqual(after.Points)) ? now : after;

    /// <summary>The line and its receiving surface with the difference; a receiving tank stays as it is.</summary>
    public static DrawOff OfDrawOff(DrawOff now, DrawOff before, DrawOff after) => now with
    {
        Line = OfLine(now.Line, before.Line, after.Line),
        Receiver = now.Receiver is ReceivingTank ? now.Receiver : Pick(now.Receiver, before.Receiver, after.Receiver),
    };

    private static Line OfLine(Line now, Line before, Line after) => now with
    {
        Bore = Pick(now.Bore, before.Bore, after.Bore),
        Roughness = Pick(now.Roughness, before.Roughness, after.Roughness),
        Parallel = Pick(now.Parallel, before.Parallel, after.Parallel),
        Inlet = Pick(now.Inlet, before.Inlet, after.Inlet),
        Path = OfPath(now.Path, before.Path, after.Path),
        AtVapour = Pick(now.AtVapour, before.AtVapour, after.AtVapour),
        LeastPressure = Pick(now.LeastPressure, before.LeastPressure, after.LeastPressure),
        AirBreak = Pick(now.AirBreak, before.AirBreak, after.AirBreak),
        VacuumRating = Pick(now.VacuumRating, before.VacuumRating, after.VacuumRating),
    };

    // A throttle that was added at the end of a path stays there; a path of another make is taken whole.
    private static IReadOnlyList<PathItem> OfPath(
        IReadOnlyList<PathItem> now, IReadOnlyList<PathItem> before, IReadOnlyList<PathItem> after)
    {
        if (before.Count != after.Count || now.Count < after.Count)
            return after;
        return [.. now.Select((item, i) => i < after.Count ? Pick(item, before[i], after[i]) : item)];
    }

    private static T Pick<T>(T now, T before, T after) =>
        EqualityComparer<T>.Default.Equals(before, after) ? now : after;

    private static bool AreSame(Headspace one, Headspace other) => (one, other) switch
    {
        (VentedHeadspace a, VentedHeadspace b) => a with { Openings = b.Openings } == b && a.Openings.SequenceEqual(b.Openings),
        _ => one == other,
    };
}
