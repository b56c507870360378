using System.Collections.Immutable;

namespace DrainSim.Integration;

/// <summary>Watches the event functions along the steps of a run, by the rules at
/// <see cref="Integrator{TSystem}"/>.</summary>
/// <typeparam name="TSystem">the system whose events are watched</typeparam>
internal sealed class EventScan<TSystem> where TSystem : IOdeSystem, IEventSet
{
    /// <summary>Crossings closer than this share of a step are one instant: far below what the dense output
    /// can tell apart, far above what rounding does to one time computed in two ways.</summary>
    private const double SameInstantShare = 1e-12;

    private readonly Sign[] sides;
    private readonly double[] sideTimes;
    private readonly double[] sideValues;
    private readonly Sign[] keptSides;
    private readonly double[] keptTimes;
    private readonly double[] keptValues;
    private readonly double[] values;
    private readonly double[] probe;
    private readonly double[] state;
    private readonly double[] slope;
    private readonly Crossing[] found;
    private readonly List<LocatedEvent> log = [];
    private int keptLog;
    private int foundCount;
    private int instantStart;
    private int instantEnd;
    private TSystem system;

    public EventScan(TSystem system)
    {
        this.system = system;
        int count = system.EventCount;
        (sides, found) = (new Sign[count], new Crossing[count]);
        (sideTimes, sideValues) = (new double[count], new double[count]);
        (keptSides, keptTimes, keptValues) = (new Sign[count], new double[count], new double[count]);
        (values, probe) = (new double[count], new double[count]);
        (state, slope) = (new double[system.Dimension], new double[system.Dimension]);
    }

    private enum Sign
    {
        Below = -1,
        Undecided = 0,
        Above = 1,
    }

    /// <summary>Calls of the system's event functions in this run.</summary>
    public int Evaluations { get; private set; }

    /// <summary>The instant at which the step was cut.</summary>
    public double Instant { get; private set; }

    /// <summary>The state at that instant; the driver hands it to the restarts, which may change it.</summary>
    public Span<double> InstantState => state;

    /// <summary>The events of that instant, in the order in which they are acted on.</summary>
    public ReadOnlySpan<Crossing> InstantEvents => found.AsSpan(instantStart, instantEnd - instantStart);

    /// <summary>Whether one of them has a kink.</summary>
    public bool IsKink
    {
        get
        {
            foreach (ref readonly Crossing crossing in InstantEvents)
            {
                if (system.Rule(crossing.Index).IsKink)
                    return true;
            }
            return false;
        }
    }

    /// <summary>All events that fired in this run.</summary>
    public ImmutableArray<LocatedEvent> Events() => [.. log];

    /// <summary>Forgets the run before.</summary>
    public void Reset()
    {
        log.Clear();
        Evaluations = 0;
        Array.Clear(sides);
    }

    /// <summary>Takes the sides of all functions at the first instant of a run.</summary>
    public void Begin(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt)
    {
        EvaluateAt(t, y, dydt, values);
        Settle(t, isStepEnd: false);
    }

    /// <summary>Looks for events in a step; true when one of them cuts it, at <see cref="Instant"/>.</summary>
    public bool IsCut(DenseStep step, ReadOnlySpan<double> endState, ReadOnlySpan<double> endSlope, int samples)
    {
        Keep();
        for (int j = 1; j <= samples && sides.Length > 0; j++)
        {
            bool isEnd = j == samples;
            double t = isEnd ? step.End : step.Start + step.Length * j / samples;
            if (isEnd)
                EvaluateAt(t, endState, endSlope, values);
            else
                EvaluateOn(step, t, values);
            FindCrossings(step, t, isEnd);
            if (foundCount > 0 && ListUntilCut(step, endState))
                return true;
            Settle(t, isEnd);
        }
        return false;
    }

    /// <summary>Takes back what the last look at a step found, since the step is repeated.</summary>
    public void Rewind()
    {
        keptSides.CopyTo(sides, 0);
        keptTimes.CopyTo(sideTimes, 0);
        keptValues.CopyTo(sideValues, 0);
        log.RemoveRange(keptLog, log.Count - keptLog);
    }

    /// <summary>Takes the values after the restarts of an instant; true when a function that they carried
    /// across zero asks for a restart or a stop in its turn.</summary>
    public bool IsCutAgain(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt)
    {
        EvaluateAt(t, y, dydt, values);
        foundCount = 0;
        for (int i = 0; i < sides.Length; i++)
        {
            if (HasCrossed(i, isStepEnd: false) && system.Rule(i).Fires(DirectionFrom(sides[i])))
                found[foundCount++] = new Crossing(t, i, DirectionFrom(sides[i]), system.Rule(i).Action);
        }
        y.CopyTo(state);
        bool isCut = ListInstant(0, foundCount, t);
        if (isCut)
            return true;
        Settle(t, isStepEnd: false);
        return false;
    }

    private void Keep()
    {
        sides.CopyTo(keptSides, 0);
        sideTimes.CopyTo(keptTimes, 0);
        sideValues.CopyTo(keptValues, 0);
        keptLog = log.Count;
    }

    private void FindCrossings(DenseStep step, double t, bool isStepEnd)
    {
        foundCount = 0;
        for (int i = 0; i < sides.Length; i++)
        {
            if (!HasCrossed(i, isStepEnd))
                continue;
            EventDirection direction = DirectionFrom(sides[i]);
            EventRule rule = system.Rule(i);
            if (rule.Fires(direction))
                found[foundCount++] = new Crossing(Locate(step, i, t), i, direction, rule.Action);
        }
    }

    /// <summary>Lists what was found in time order, up to the first instant that cuts the step.</summary>
    private bool ListUntilCut(DenseStep step, ReadOnlySpan<double> endState)
    {
        found.AsSpan(0, foundCount).Sort(Crossing.ByTime);
        double same = Math.Max(SameInstantShare * step.Length, 4 * (Math.BitIncrement(step.End) - step.End));
        for (int first = 0, next; first < foundCount; first = next)
        {
            next = first + 1;
            while (next < foundCount && found[next].Time - found[first].Time <= same)
                next++;
            double instant = found[next - 1].Time;
            if (instant == step.End)    // the same double: the end itself was found
                endState.CopyTo(state);
            else
                step.Evaluate(instant, state);
            if (!ListInstant(first, next, instant))
                continue;
            for (int i = 0; i < first; i++)
                PassOver(found[i]);
            return true;
        }
        return false;
    }

    /// <summary>Lists the events of one instant, whose state is at hand; true when they cut the step.</summary>
    private bool ListInstant(int first, int next, double instant)
    {
        Span<Crossing> events = found.AsSpan(first, next - first);
        events.Sort(Crossing.ByAction);
        foreach (Crossing crossing in events)
            log.Add(new LocatedEvent(instant, crossing.Index, crossing.Direction, [.. state]));
        if (events.IsEmpty || events[^1].Action == EventAction.Record)
            return false;
        (Instant, instantStart, instantEnd) = (instant, first, next);
        foreach (Crossing crossing in events)
            sides[crossing.Index] = Sign.Undecided;     // so that it cannot fire again at this instant
        return true;
    }

    /// <summary>Gives a function that was listed before the cut the side that it went to.</summary>
    private void PassOver(in Crossing crossing)
    {
        int i = crossing.Index;
        (sides[i], sideTimes[i], sideValues[i]) = ((Sign)(-(int)sides[i]), crossing.Time, double.NaN);
    }

    /// <summary>Takes over the sides shown by the values at t; where there is none, the side stays.</summary>
    private void Settle(double t, bool isStepEnd)
    {
        for (int i = 0; i < sides.Length; i++)
        {
            Sign sign = SignOf(values[i]);
            bool isReached = isStepEnd && HasCrossed(i, isStepEnd) && sign == Sign.Undecided
                && system.Rule(i).Fires(DirectionFrom(sides[i]));
            if (isReached)
                sides[i] = Sign.Undecided;
            else if (sign != Sign.Undecided)
                (sides[i], sideTimes[i], sideValues[i]) = (sign, t, values[i]);
        }
    }

    private bool HasCrossed(int i, bool isStepEnd)
    {
        if (sides[i] == Sign.Undecided)
            return false;
        Sign sign = SignOf(values[i]);
        return sign == Sign.Undecided ? isStepEnd && values[i] == 0 : sign != sides[i];
    }

    private double Locate(DenseStep step, int i, double t)
    {
        bool isRising = sides[i] == Sign.Below;
        bool isInStep = sideTimes[i] >= step.Start;
        double near = isInStep ? sideTimes[i] : step.Start;
        CrossingBracket bracket = new(near, isInStep ? sideValues[i] : double.NaN, t, values[i], isRising);
        while (bracket.TryNext(out double x))
        {
            EvaluateOn(step, x, probe);
            bracket.Narrow(x, probe[i]);
        }
        return bracket.Far;
    }

    private void EvaluateOn(DenseStep step, double t, double[] result)
    {
        step.Evaluate(t, state);
        step.EvaluateDerivative(t, slope);
        EvaluateAt(t, state, slope, result);
    }

    private void EvaluateAt(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, double[] result)
    {
        if (result.Length == 0)
            return;
        Evaluations++;
        system.EventValues(t, y, dydt, result);
    }

    private static Sign SignOf(double value) =>
        value > 0 ? Sign.Above : value < 0 ? Sign.Below : Sign.Undecided;

    private static EventDirection DirectionFrom(Sign side) =>
        side == Sign.Below ? EventDirection.Rising : EventDirection.Falling;

    /// <summary>A crossing that fires.</summary>
    internal readonly record struct Crossing(double Time, int Index, EventDirection Direction, EventAction Action)
    {
        public static readonly Comparison<Crossing> ByTime = (a, b) => a.Time.CompareTo(b.Time);

        public static readonly Comparison<Crossing> ByAction = (a, b) =>
            a.Action != b.Action ? a.Action.CompareTo(b.Action) : a.Index.CompareTo(b.Index);
    }
}
