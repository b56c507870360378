using DrainSim.Integration;
using DrainSim.Vessels;

namespace DrainSim.Draining;

/// <summary>The balance of a tank, its lines, their receivers and its gas, as the integrator steps it.</summary>
/// <remarks>
/// State: y[i] is the volume that line i has taken out of the tank, m³, so that its slope is the line's flow, the volume in
/// the tank is V = V₀ + ∫inflow − Σy[i] and that in a receiver Vr₀ + y[i]: the balance closes by construction. Where a
/// confined gas has more than one line to answer to, its pressure, Pa, follows: not its mass, of which the pressure that drives
/// the vent would be a difference of near equals, kept by a balance of stiff terms at every trial state. Then comes the flow,
/// m³/s, of each line whose front has yet to reach the outlet, because there the inertia of the column counts. What is watched
/// on the way and the slopes for implicit steps stand in the other parts of the class.
/// </remarks>
internal sealed partial class DrainModel : IOdeSystem
{
    private readonly Vessel vessel;
    private readonly RunSettings run;
    private readonly double atmosphere;
    private readonly bool hasPressure;
    private readonly Watch[] watches;
    private readonly KnownFlow[] known;
    private readonly int[] flowAt; // component that holds the flow of a line that fills; 0 where none does
    private readonly double[] flowScales;
    private readonly List<Epoch> epochs;
    private int timeActsLeft;
    private Epoch now;

    /// <param name="plant">the plant at the start</param>
    /// <param name="modes">how its lines work at the start</param>
    public DrainModel(Plant plant, LineMode[] modes)
    {
        Job = plant.Job;
        (vessel, run, atmosphere) = (Job.Vessel, Job.Run, Job.Site.AtmosphericPressure);
        LineCount = plant.Lines.Length;
        StartVolume = vessel.Volume(Job.Level);
        timeActsLeft = Job.Timeline.Count(act => act.Time is not null && !act.IsDueAtStart(Job.Level));
        bool oneLineAlone = LineCount == 1 && Job.Inflow is null && Job.Timeline.Count == 0;
        hasPressure = plant.Gas.Breathes || (!oneLineAlone && MayConfine(plant.Job));
        StartMass = plant.Gas.StartMass;
        known = new KnownFlow[LineCount];
        (flowAt, flowScales) = (new int[LineCount], new double[LineCount]);
        int dimension = LineCount + (hasPressure ? 1 : 0);
        for (int i = 0; i < LineCount; i++)
        {
            if (modes[i] is { IsFilling: true, IsAtWork: true })
                (flowAt[i], flowScales[i]) = (dimension++, StartFlow(plant, i));
        }

        Dimension = dimension;
        watches = WatchList.Of(plant, TargetVolume);
        now = new Epoch(0, plant, modes, 0);
        epochs = [now];
    }

    /// <summary>The job.</summary>
    public Job Job { get; }

    /// <summary>Number of lines.</summary>
    public int LineCount { get; }

    /// <summary>Volume in the tank at the start, m³.</summary>
    public double StartVolume { get; }

    /// <summary>Mass of gas over the liquid at the start, kg.</summary>
    public double StartMass { get; }

    /// <summary>Solutions of a line for its flow so far.</summary>
    public long FlowSolutions { get; private set; }

    /// <summary>The stretches of the run so far, in time order.</summary>
    public IReadOnlyList<Epoch> Epochs => epochs;

    /// <inheritdoc/>
    public int Dimension { get; }

    /// <summary>Whether gas is shut in at some time of a job.</summary>
    private static bool MayConfine(Job job) =>
        job.Timeline.Select(act => act.After).Append(job).Any(plant => plant.Headspace is Gas.ConfinedHeadspace);

    private double? TargetVolume => (run.StopAtLevel, run.StopAtVolume) switch
    {
        ({ } level, { } volume) => Math.Max(vessel.Volume(level), volume),
        ({ } level, null) => vessel.Volume(level),
        (null, { } volume) => volume,
        _ => null,
    };

    /// <summary>Writes the state at the start.</summary>
    public void StartState(Span<double> y)
    {
        y.Clear();
        if (hasPressure)
            y[LineCount] = now.Plant.Gas.Pressure(StartVolume, StartMass);
    }

    /// <summary>The stretch that a time belongs to; at a restart the one before it.</summary>
    /// <param name="t">time, s</param>
    public Epoch EpochAt(double t)
    {
        int i = epochs.Count - 1;
        while (i > 0 && epochs[i].From >= t)
            i--;
        return epochs[i];
    }

    /// <summary>Volume in the tank, m³.</summary>
    public double Volume(Epoch epoch, double t, ReadOnlySpan<double> y)
    {
        double volume = StartVolume + epoch.InflowVolume(t);
        for (int i = 0; i < LineCount; i++)
            volume -= y[i];
        return Math.Clamp(volume, 0, vessel.Capacity);
    }

    /// <summary>Pressure on the liquid, Pa absolute.</summary>
    public double GasPressure(Epoch epoch, double volume, ReadOnlySpan<double> y) =>
        hasPressure && epoch.Plant.Gas.IsConfined ? y[LineCount] : epoch.Plant.Gas.Pressure(volume, StartMass);

    /// <summary>Flow of a line out of the tank, solved for, m³/s; 0 for a line that no longer works.</summary>
    public double Flow(Epoch epoch, int line, double surface, double gas, double delivered, bool limited) =>
        epoch.Modes[line].Flows ? Solve(epoch, line, surface, gas, delivered, limited) : 0;

    /// <summary>Flow of a line out of the tank, m³/s: a component of the state while the line fills, else solved for.</summary>
    private double Flow(Epoch epoch, int line, double surface, double gas, ReadOnlySpan<double> y) =>
        epoch.Modes[line] is { IsFilling: true, IsAtWork: true } ? y[flowAt[line]] : Flow(epoch, line, surface, gas, y[line], epoch.Modes[line].IsLimited);

    /// <summary>Flow of a full line at the first instant, m³/s: what the error in a flow is measured against.</summary>
    private static double StartFlow(Plant plant, int line)
    {
        double gas = plant.Gas.Pressure(plant.Vessel.Volume(plant.Job.Level), plant.Gas.StartMass);
        return Math.Max(LeastFlowScale, plant.Lines[line].Flow(new LineConditions(plant.Job.Level, gas, 0, false)));
    }

    private const double LeastFlowScale = 1e-15;

    private double Solve(Epoch epoch, int line, double surface, double gas, double delivered, bool limited)
    {
        FlowSolutions++;
        return epoch.Plant.Lines[line].Flow(new LineConditions(surface, gas, delivered, limited), ref known[line]);
    }

    /// <summary>The state of the job at a time, the flows solved anew.</summary>
    /// <param name="t">time, s</param>
    /// <param name="y">state then</param>
    public Instant At(double t, ReadOnlySpan<double> y)
    {
        Epoch epoch = EpochAt(t);
        double volume = Volume(epoch, t, y), surface = vessel.Level(volume), gas = GasPressure(epoch, volume, y);
        Span<double> flows = stackalloc double[LineCount];
        for (int i = 0; i < LineCount; i++)
        {
            // a column that parts at the first instant shows the flow that parts it
            bool parts = epoch.Modes[i] is { Ending: Outcome.VapourBreak } mode && mode.EndedAt == t;
            flows[i] = parts
                ? Solve(epoch, i, surface, gas, y[i], limited: false)
                : Flow(epoch, i, surface, gas, y);
        }

        return At(t, y, flows);
    }

    /// <summary>The state of the job at a time, for flows that are known.</summary>
    /// <param name="t">time, s</param>
    /// <param name="y">state then</param>
    /// <param name="flows">flow of each line then, m³/s</param>
    public Instant At(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> flows)
    {
        Epoch epoch = EpochAt(t);
        double volume = Volume(epoch, t, y), surface = vessel.Level(volume), gas = GasPressure(epoch, volume, y);
        (double pressure, double margin) = LowPoint(epoch, surface, gas, y, flows);
        CompiledLine first = epoch.Plant.Lines[0];
        double total = 0;
        foreach (double flow in flows[..LineCount])
            total += flow;
        return new Instant
        {
            Time = t,
            Level = surface,
            Volume = volume,
            Flow = total,
            Velocity = first.Hydraulics.Velocity(flows[0]),
            Reynolds = first.Hydraulics.Reynolds(Math.Abs(flows[0])),
            Head = first.Head(surface, gas, y[0]),
            LowPointPressure = pressure,
            LowPointMargin = margin,
            ReceiverLevel = ReceiverLevel(epoch, y),
            HeadspacePressure = Job.Headspace is Gas.OpenHeadspace ? null : gas,
            LineFlows = LineCount > 1 ? flows[..LineCount].ToArray() : null,
        };
    }

    /// <inheritdoc/>
    public void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt)
    {
        double volume = Volume(now, t, y), surface = vessel.Level(volume), gas = GasPressure(now, volume, y);
        double growth = -now.Inflow(t);
        for (int i = 0; i < LineCount; i++)
            growth += dydt[i] = Flow(now, i, surface, gas, y);
        if (hasPressure)
            dydt[LineCount] = now.Plant.Gas.IsConfined ? now.Plant.Gas.Rate(gas, volume, growth).Rate : 0;
        for (int i = 0; i < LineCount; i++)
        {
            if (flowAt[i] > 0)
                dydt[flowAt[i]] = Acceleration(now, i, surface, gas, y);
        }
    }

    private double Acceleration(Epoch epoch, int line, double surface, double gas, ReadOnlySpan<double> y) =>
        epoch.Modes[line] is { IsFilling: true, IsAtWork: true } mode
            ? epoch.Plant.Lines[line].Acceleration(mode.Segment, surface, gas, y[line], y[flowAt[line]])
            : 0;

    /// <summary>
    /// The tolerance is meant for the clock: an error in a delivered volume is measured against what the flow moves in
    /// the time since the start and what is still to come, so that the last centimetres of a head that goes to zero are
    /// timed as well as the first.
    /// </summary>
    public void ErrorScale(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> scale)
    {
        double volume = Volume(now, t, y), surface = vessel.Level(volume), gas = GasPressure(now, volume, y);
        for (int i = 0; i < LineCount; i++)
        {
            CompiledLine line = now.Plant.Lines[i];
            double toRest = vessel.Area(surface) * Math.Max(0, Math.Abs(RestHead(line, surface, gas, y[i])) - line.Hydraulics.YieldHead);
            double toAir = Math.Max(0, volume - line.UncoverVolume);
            scale[i] = now.Modes[i].Flows
                ? Math.Max(1e-12 * vessel.Capacity, Math.Abs(dydt[i]) * t + Math.Min(toRest, toAir))
                : vessel.Capacity; // what stands still has no error but rounding
            if (flowAt[i] == 0)
                continue;
            scale[flowAt[i]] = flowScales[i];
            if (now.Modes[i].IsFilling)
                scale[i] = Math.Min(scale[i], line.Filling!.Volume);
        }

        if (hasPressure)
            scale[LineCount] = atmosphere;
    }

    /// <inheritdoc/>
    public double LargestStep(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt) => double.PositiveInfinity;

    /// <summary>The line with the least margin: its low point's pressure and margin, Pa.</summary>
    private (double Pressure, double Margin) LowPoint(
        Epoch epoch, double surface, double gas, ReadOnlySpan<double> y, ReadOnlySpan<double> flows)
    {
        (double Pressure, double Margin) least = (double.PositiveInfinity, double.PositiveInfinity);
        bool anyAtWork = epoch.LinesAtWork > 0;
        for (int i = 0; i < LineCount; i++)
        {
            CompiledLine line = epoch.Plant.Lines[i];
            double margin = epoch.Modes[i] is { IsFilling: true, IsAtWork: true } mode
                ? line.FillingMargin(mode.Segment, surface, gas, flows[i], Acceleration(epoch, i, surface, gas, y))
                : line.Margin(flows[i], surface, gas);
            if (margin < least.Margin && (epoch.Modes[i].IsAtWork || !anyAtWork))
                least = (margin + line.Threshold, margin);
        }

        return least;
    }

    private double? ReceiverLevel(Epoch epoch, ReadOnlySpan<double> y)
    {
        for (int i = 0; i < LineCount; i++)
        {
            if (epoch.Plant.Lines[i].ReceiverDepth(y[i]) is { } depth)
                return depth;
        }

        return null;
    }
}
