using DrainSim.Integration;

namespace DrainSim.Draining;

/// <summary>The states of a run at its knots, read from the trajectory without solving for a flow again.</summary>
internal sealed class RunHistory
{
    private readonly DrainModel model;
    private readonly Trajectory? trajectory;
    private readonly double[] state, slope;

    /// <summary>A run.</summary>
    /// <param name="model">the balance, run to its end</param>
    /// <param name="trajectory">its course</param>
    /// <param name="end">when it ended, s</param>
    public RunHistory(DrainModel model, Trajectory trajectory, double end)
        : this(model)
    {
        this.trajectory = trajectory;
        Knots = KnotsOf(trajectory, end, [.. model.Epochs.Zip(model.Epochs.Skip(1)).Where(e => e.First.Plant != e.Second.Plant).Select(e => e.Second.From)]);
        Instants = [.. Knots.Select(t => t == end ? At(t) : Read(t))]; // the last step was cut short: its flow is solved anew
    }

    /// <summary>A job that never moved.</summary>
    /// <param name="model">the balance at its first instant</param>
    public RunHistory(DrainModel model)
    {
        this.model = model;
        state = new double[model.Dimension];
        slope = new double[model.Dimension];
        model.StartState(state);
        Knots = [0];
        Instants = [model.At(0, state)];
    }

    /// <summary>Times that bound smooth pieces, rising, the first 0, the last the end of the run, s.</summary>
    public IReadOnlyList<double> Knots { get; }

    /// <summary>The states at the knots.</summary>
    public Instant[] Instants { get; }

    /// <summary>When the run ended, s.</summary>
    public double EndTime => Knots[^1];

    /// <summary>The state vector at a time.</summary>
    public ReadOnlySpan<double> State(double t)
    {
        trajectory?.Evaluate(t, state);
        return state;
    }

    /// <summary>The flows of the dense output at a time, m³/s.</summary>
    public ReadOnlySpan<double> Flows(double t)
    {
        trajectory?.EvaluateDerivative(t, slope);
        return slope;
    }

    /// <summary>The state at a time, the flows solved anew.</summary>
    public Instant At(double t) => model.At(t, State(t));

    /// <summary>The state at a time, with the flows of the dense output.</summary>
    public Instant Read(double t) => model.At(t, State(t), Flows(t));

    /// <summary>The volume in the tank at a time, m³.</summary>
    public double Volume(double t) => model.Volume(model.EpochAt(t), t, State(t));

    /// <summary>The run as its reader sees it.</summary>
    public Trace ToTrace() => new(Knots, At, Volume, Array.ConvertAll(Instants, instant => instant.Volume));

    /// <summary>The ends of the steps; behind an act the first instant of the changed plant too, where the flow is another one.</summary>
    private static List<double> KnotsOf(Trajectory trajectory, double end, double[] acts)
    {
        var times = new List<double>(trajectory.StepCount + 1) { 0 };
        for (int i = 0; i < trajectory.StepCount; i++)
        {
            if (trajectory.Step(i).End is var time && time > times[^1] && time < end)
                times.Add(time);
        }

        if (end > 0)
            times.Add(end);
        foreach (double act in acts.Where(act => act > 0 && act < end))
        {
            if (times.BinarySearch(Math.BitIncrement(act)) is < 0 and var place)
                times.Insert(~place, Math.BitIncrement(act));
        }

        return times;
    }
}
