using DrainSim.Lines;
using MathNet.Numerics;
using MathNet.Numerics.RootFinding;

namespace DrainSim.Draining;

/// <summary>The extremes of a run, line by line, and the fairness of its assumptions.</summary>
internal sealed class RunSurvey
{
    /// <summary>
    /// Share of the starting volume below which the surface's own velocity is not looked at, 1: in a cone or a
    /// sphere it grows without limit over the last drops, which take no time.
    /// </summary>
    private const double LastDrops = 0.01;

    private readonly DrainModel model;
    private readonly RunHistory history;

    /// <param name="model">the balance, run to its end</param>
    /// <param name="history">its course</param>
    public RunSurvey(DrainModel model, RunHistory history) => (this.model, this.history) = (model, history);

    /// <summary>Least of a quantity over the run; sought on between the knots where it lies inside.</summary>
    /// <param name="quantity">the quantity of a state</param>
    public Extreme Least(Func<Instant, double> quantity)
    {
        Instant[] instants = history.Instants;
        int least = 0;
        for (int i = 1; i < instants.Length; i++)
        {
            double noise = 1e-12 * Math.Abs(quantity(instants[least]));
            if (quantity(instants[i]) < quantity(instants[least]) - noise)
                least = i;
        }

        var atKnot = new Extreme(quantity(instants[least]), instants[least].Time);
        if (least == 0 || least == instants.Length - 1)
            return atKnot;
        (double from, double to) = (instants[least - 1].Time, instants[least + 1].Time);
        double time = FindMinimum.OfScalarFunctionConstrained( // it widens the bracket where the minimum lies at an end
            t => quantity(history.Read(Math.Clamp(t, from, to))), from, to, 1e-9 * history.EndTime);
        time = Math.Clamp(time, from, to);
        double value = quantity(history.Read(time));
        return value < atKnot.Value ? new Extreme(value, time) : atKnot;
    }

    /// <summary>Largest of a quantity over the run.</summary>
    /// <param name="quantity">the quantity of a state</param>
    public Extreme Largest(Func<Instant, double> quantity)
    {
        Extreme least = Least(i => -quantity(i));
        return least with { Value = -least.Value };
    }

    /// <summary>Least margin of one line while it works, Pa.</summary>
    public Extreme LeastMargin(int line) => model.LineCount == 1
        ? Least(i => i.LowPointMargin)
        : Least(i => model.EpochAt(i.Time) is var epoch && ((epoch.Modes[line].IsAtWork && !epoch.Modes[line].IsFilling) || history.EndTime == 0)
            ? epoch.Plant.Lines[line].Margin(FlowOf(i, line), i.Level, i.HeadspacePressure ?? model.Job.Site.AtmosphericPressure)
            : NotAtWork);

    /// <summary>A margin above every real one, Pa, for a line that no longer works.</summary>
    private const double NotAtWork = 1e12;

    /// <summary>Largest flow of one line, m³/s.</summary>
    public Extreme LargestFlow(int line) => Largest(i => FlowOf(i, line));

    /// <summary>Largest flow of one line while it runs full, m³/s; 0 where it never does.</summary>
    public double LargestFullFlow(int line) =>
        Largest(i => model.EpochAt(i.Time).Modes[line].IsFilling ? 0 : FlowOf(i, line)).Value;

    /// <summary>Node at which a line's pressure is least at a time.</summary>
    public int LowPointNode(int line, double time)
    {
        Instant instant = history.Read(time);
        double gas = instant.HeadspacePressure ?? model.Job.Site.AtmosphericPressure;
        model.EpochAt(time).Plant.Lines[line].Hydraulics
            .LowPointPressure(Math.Max(0, FlowOf(instant, line)), instant.Level, gas, out int node);
        return node;
    }

    /// <summary>First time at which a quantity of the state falls to zero, s; null when it never does.</summary>
    /// <param name="line">index of a line; looked at while it works</param>
    /// <param name="quantity">the quantity of a state</param>
    public double? FirstFall(int line, Func<Instant, double> quantity)
    {
        Instant[] instants = history.Instants;
        double last = 0;
        for (int i = 0; i < instants.Length && model.EpochAt(instants[i].Time).Modes[line].IsAtWork; i++)
        {
            double value = quantity(instants[i]);
            if (value <= 0)
            {
                return i == 0 ? 0
                    : Brent.TryFindRoot(t => quantity(history.Read(t)) / (last - value), instants[i - 1].Time, instants[i].Time, 1e-12, 100, out double root)
                        ? root : instants[i].Time;
            }

            last = value;
        }

        return null;
    }

    /// <summary>Pressure at the low point of one line at a state, Pa absolute.</summary>
    public double LowPointPressure(int line, Instant instant)
    {
        CompiledLine compiled = model.EpochAt(instant.Time).Plant.Lines[line];
        double gas = instant.HeadspacePressure ?? model.Job.Site.AtmosphericPressure;
        return compiled.Margin(FlowOf(instant, line), instant.Level, gas) + compiled.Threshold;
    }

    /// <summary>The state at a time, with the flows of the dense output, and a quantity of it.</summary>
    public (Instant Instant, double Quantity) At(double time, Func<Instant, double> quantity)
    {
        Instant instant = history.Read(time);
        return (instant, quantity(instant));
    }

    /// <summary>Share of the run with the low point below a pressure, to the nearest hundredth, 1.</summary>
    /// <param name="pressure">pressure, Pa absolute</param>
    public double ShareBelow(double pressure)
    {
        const int Parts = 100;
        if (history.EndTime == 0 || history.Instants.All(instant => instant.LowPointPressure > pressure))
            return 0;
        int below = 0;
        for (int i = 0; i < Parts; i++)
            below += history.Read((i + 0.5) / Parts * history.EndTime).LowPointPressure < pressure ? 1 : 0;
        return (double)below / Parts;
    }

    /// <summary>How fair the quasi-steady picture is.</summary>
    /// <param name="passed">the changes of regime, in time order</param>
    public SteadinessCheck Steadiness(IReadOnlyList<DrainEvent> passed)
    {
        if (history.EndTime == 0)
            return new SteadinessCheck(0, 0, 0);
        double inertia = 0, velocity = 0;
        foreach (Instant instant in history.Instants.Where(i => i is { Flow: > 0, Head: > 0 } && !model.EpochAt(i.Time).Modes[0].IsFilling))
        {
            LineHydraulics first = model.EpochAt(instant.Time).Plant.Lines[0].Hydraulics;
            inertia = Math.Max(inertia, first.InertiaTime(Math.Max(0, FlowOf(instant, 0)), instant.Head));
            double surface = instant.Flow / model.Job.Vessel.Area(instant.Level);
            if (instant.Volume > LastDrops * model.StartVolume && double.IsFinite(surface))
                velocity = Math.Max(velocity, surface * surface / (2 * model.Job.Site.Gravity * instant.Head));
        }

        return new SteadinessCheck(inertia / history.EndTime, velocity, TransitionShare(passed));
    }

    /// <summary>Flow of one line at a state, m³/s.</summary>
    public static double FlowOf(Instant instant, int line) => instant.LineFlows is { } flows ? flows[line] : instant.Flow;

    private double TransitionShare(IReadOnlyList<DrainEvent> passed)
    {
        double[] bounds = [0, .. passed.Where(e => e is { Line: 0, Number: > 0 }).Select(e => e.Time), history.EndTime];
        double inside = 0;
        for (int i = 1; i < bounds.Length; i++)
        {
            if (history.Read((bounds[i - 1] + bounds[i]) / 2).Reynolds is > FrictionFactor.LaminarLimit and < FrictionFactor.TurbulentLimit)
                inside += bounds[i] - bounds[i - 1];
        }

        return inside / history.EndTime;
    }
}
