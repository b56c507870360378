using DrainSim.Integration;

namespace DrainSim.Draining;

/// <summary>Runs a job from its start to its end.</summary>
public static class Simulation
{
    /// <summary>Follows the falling level until the job is done or can go no further.</summary>
    /// <param name="job">the job</param>
    /// <param name="cancellation">ends the run early</param>
    /// <returns>what was found; every run ends in an outcome</returns>
    /// <exception cref="ArgumentOutOfRangeException">the level stands above the tank</exception>
    /// <exception cref="OperationCanceledException">the run was cancelled</exception>
    public static DrainResult Run(Job job, CancellationToken cancellation = default)
    {
        Plant plant = Compile(job);
        LineMode[] modes = StartModes(plant);
        var model = new DrainModel(plant, modes);
        if (AtRest(plant, modes) is { } ending)
            return RunFindings.OfNoRun(model, ending);

        var trajectory = new Trajectory(model.Dimension, FirstSteps);
        Span<double> start = stackalloc double[model.Dimension];
        model.StartState(start);
        var options = new IntegrationOptions { RelativeTolerance = job.Run.Tolerance, EventSamplesPerStep = EventSamples };
        IntegrationResult integration = new Integrator<DrainModel>(model)
            .Run(0, start, job.Run.Until, options, trajectory, cancellation);
        cancellation.ThrowIfCancellationRequested();
        return RunFindings.Of(model, integration, trajectory);
    }

    /// <summary>Steps for which a trajectory has room at first: most runs need no more.</summary>
    private const int FirstSteps = 16;

    /// <summary>Parts of a step at whose ends the events are looked at: what a run watches rarely turns back within one.</summary>
    private const int EventSamples = 2;

    /// <summary>The numbers of a job at its first instant, without a run.</summary>
    /// <param name="job">the job</param>
    /// <exception cref="ArgumentOutOfRangeException">the level stands above the tank</exception>
    public static FirstInstant Begin(Job job)
    {
        Plant plant = Compile(job);
        double gas = StartGas(plant);
        NoStart? refusal = StartCheck.Refusal(plant.Job, plant.Lines[0], gas);
        var model = new DrainModel(plant, StartModes(plant));
        Span<double> start = stackalloc double[model.Dimension];
        model.StartState(start);
        return new FirstInstant(model.At(0, start), refusal, StartCheck.Prime(plant.Job, plant.Lines[0]));
    }

    private static Plant Compile(Job job)
    {
        ArgumentNullException.ThrowIfNull(job);
        Require.Within(job.Level, 0, job.Vessel.Height, "level", "m");
        return new Plant(job.Timeline.Any(act => act.IsDueAtStart(job.Level)) ? AfterFirstActs(job) : job);
    }

    /// <summary>The job with the acts done that are due before the first instant; they stay in the timeline, for the record.</summary>
    private static Job AfterFirstActs(Job job)
    {
        Job start = job with { Timeline = [.. job.Timeline.Select(act => act with { Before = act.Before ?? job })] };
        return start.Timeline.Where(act => act.IsDueAtStart(job.Level)).Aggregate(start, (sofar, act) => act.ChangeOf(sofar, start));
    }

    /// <summary>How each line works at the first instant: free, held at its threshold, or ended before it began.</summary>
    private static LineMode[] StartModes(Plant plant)
    {
        double gas = StartGas(plant), level = plant.Job.Level;
        return [.. plant.Lines.Select(ModeOf)];

        LineMode ModeOf(CompiledLine line)
        {
            if (StartCheck.Refusal(plant.Job, line, gas) is not null)
                return new LineMode(false, Outcome.NeverStarted);
            if (line.DrawOff.Line.AirBreak >= level)
                return new LineMode(false, Outcome.AirBreak);
            if (line.Filling is not null)
                return new LineMode(false, Segment: 0);
            double flow = line.Flow(new LineConditions(level, gas, 0, false));
            if (line.Margin(flow, level, gas) > 0)
                return new LineMode(false);
            return line.HoldsAtVapour ? new LineMode(true) : new LineMode(false, Outcome.VapourBreak);
        }
    }

    private static double StartGas(Plant plant) =>
        plant.Gas.Pressure(plant.Vessel.Volume(plant.Job.Level), plant.Gas.StartMass);

    private static Outcome? AtRest(Plant plant, LineMode[] modes)
    {
        Job job = plant.Job;
        bool mayRise = job.Inflow is not null || job.Timeline.Any();
        if (!mayRise && job.Level <= job.Run.SettledWithin && plant.Lines.All(l => l.Hydraulics.InletElevation <= job.Run.SettledWithin))
            return Outcome.Emptied;
        if (job.Level <= job.Run.StopAtLevel || plant.Vessel.Volume(job.Level) <= job.Run.StopAtVolume)
            return Outcome.TargetReached;
        return modes.Any(m => m.IsAtWork) ? null : modes.FirstOrDefault(m => m.Ending != Outcome.NeverStarted).Ending ?? Outcome.NeverStarted;
    }
}
