namespace DrainSim.Draining;

/// <summary>All that a run found.</summary>
public sealed record DrainResult
{
    private readonly Lazy<IReadOnlyList<DrainEvent>> events = new([]);
    private readonly Lazy<IReadOnlyList<RunWarning>> warnings = new([]);
    private readonly Lazy<SteadinessCheck> steadiness = new(new SteadinessCheck(0, 0, 0));

    /// <summary>The job that was run.</summary>
    public required Job Job { get; init; }

    /// <summary>How it ended.</summary>
    public required Outcome Outcome { get; init; }

    /// <summary>Why it never started; null when it did.</summary>
    public NoStart? NoStart { get; init; }

    /// <summary>When it ended, s since the start.</summary>
    public required double StoppedAt { get; init; }

    /// <summary>Volume in the tank at the start, m³.</summary>
    public required double InitialVolume { get; init; }

    /// <summary>Volume that left the tank, m³.</summary>
    public required double DrainedVolume { get; init; }

    /// <summary>Volume in the tank when the run stopped, before any fall-back from the line, m³.</summary>
    public required double LeftVolume { get; init; }

    /// <summary>Level in the tank when the run stopped, before any fall-back from the line, m.</summary>
    public required double FinalLevel { get; init; }

    /// <summary>Where the liquid in the line went when the column parted; null when it did not.</summary>
    public FallBack? FallBack { get; init; }

    /// <summary>Least pressure in the line, Pa absolute, and when.</summary>
    public required Extreme LeastLowPointPressure { get; init; }

    /// <summary>Least margin at the low point, Pa, and when.</summary>
    public required Extreme LeastMargin { get; init; }

    /// <summary>Index of the node at which the margin was least; as the line numbers them.</summary>
    public required int LeastMarginNode { get; init; }

    /// <summary>Largest flow, m³/s, and when.</summary>
    public required Extreme LargestFlow { get; init; }

    /// <summary>Largest velocity in the narrowest bore, m/s, and when.</summary>
    public required Extreme LargestVelocity { get; init; }

    /// <summary>The moments worth knowing, in time order; looked for when first asked for.</summary>
    public IReadOnlyList<DrainEvent> Events { get => events.Value; init => events = new(value); }

    /// <summary>The whole course of the run.</summary>
    public required Trace Trace { get; init; }

    /// <summary>What a siphon needs before it runs; null for a line that never rises above the level.</summary>
    public PrimeReport? Prime { get; init; }

    /// <summary>How fair the quasi-steady picture is; judged when first asked for.</summary>
    public SteadinessCheck Steadiness { get => steadiness.Value; init => steadiness = new(value); }

    /// <summary>What makes the result less sure; looked for when first asked for.</summary>
    public IReadOnlyList<RunWarning> Warnings { get => warnings.Value; init => warnings = new(value); }

    /// <summary>What was found for each line, in the order of the job.</summary>
    public required IReadOnlyList<LineResult> Lines { get; init; }

    /// <summary>The bounds of the job, kept or broken; empty where it has none.</summary>
    public IReadOnlyList<LimitCheck> LimitChecks { get; init; } = [];

    /// <summary>Largest vacuum in the headspace, Pa below the atmosphere, and when; null where the tank is open.</summary>
    public Extreme? LargestVacuum { get; init; }

    /// <summary>Level at which the inflow and the outflow balance, m; null where there is no inflow or no such level.</summary>
    public double? BalanceLevel { get; init; }

    /// <summary>Depth in the first receiving tank when the run stopped, m; null where there is none.</summary>
    public double? ReceiverLevel { get; init; }

    /// <summary>Pressure in the headspace when the run stopped, Pa absolute; null where the tank is open.</summary>
    public double? HeadspacePressure { get; init; }

    /// <summary>What would let it go on; empty where nothing is needed or nothing helps.</summary>
    public IReadOnlyList<Remedy> Remedies { get; init; } = [];

    /// <summary>The job as acts have made it by a time.</summary>
    /// <param name="time">since the start, s</param>
    public Job JobAt(double time) => PlantSource?.Invoke(time) ?? Job;

    /// <summary>Finds the job as acts have made it.</summary>
    internal Func<double, Job>? PlantSource { private get; init; }

    /// <summary>Looks for the events.</summary>
    internal Func<IReadOnlyList<DrainEvent>> EventSource { init => events = new(value); }

    /// <summary>Judges the steadiness.</summary>
    internal Func<SteadinessCheck> SteadinessSource { init => steadiness = new(value); }

    /// <summary>Looks for the warnings.</summary>
    internal Func<IReadOnlyList<RunWarning>> WarningSource { init => warnings = new(value); }

    /// <summary>What the run cost.</summary>
    public required Counters Counters { get; init; }
}
