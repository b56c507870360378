namespace DrainSim.Studies;

/// <summary>A result of a run that a study sizes for, spreads or tells, under the name that scenarios and files call it by.</summary>
public sealed record ResultQuantity
{
    private readonly Func<RunSummary, double?> value;

    private ResultQuantity(string name, string siUnit, Func<RunSummary, double?> value) =>
        (Name, SiUnit, this.value) = (name, siUnit, value);

    /// <summary>The time that the job took, s; absent when it was not done.</summary>
    public static ResultQuantity DrainTime { get; } = new("drain_time", "s", run => run.DrainTime);

    /// <summary>When half of the drainable volume was gone, s; absent when it never was.</summary>
    public static ResultQuantity TimeTo50 { get; } = new("time_to_50", "s", run => run.TimeTo50);

    /// <summary>When 90 % of the drainable volume was gone, s; absent when it never was.</summary>
    public static ResultQuantity TimeTo90 { get; } = new("time_to_90", "s", run => run.TimeTo90);

    /// <summary>When 99 % of the drainable volume was gone, s; absent when it never was.</summary>
    public static ResultQuantity TimeTo99 { get; } = new("time_to_99", "s", run => run.TimeTo99);

    /// <summary>Volume left in the tank, m³.</summary>
    public static ResultQuantity LeftVolume { get; } = new("left_volume", "m3", run => run.LeftVolume);

    /// <summary>Level in the tank at the end, m.</summary>
    public static ResultQuantity FinalLevel { get; } = new("final_level", "m", run => run.FinalLevel);

    /// <summary>Least margin at the low point, Pa; absent when the line never started.</summary>
    public static ResultQuantity LeastMargin { get; } =
        new("least_margin", "Pa", run => run.NoStart is null ? run.LeastMargin : null);

    /// <summary>Largest flow, m³/s; absent when the line never started.</summary>
    public static ResultQuantity LargestFlow { get; } =
        new("largest_flow", "m3/s", run => run.NoStart is null ? run.LargestFlow : null);

    /// <summary>Largest velocity in the narrowest bore, m/s; absent when the line never started.</summary>
    public static ResultQuantity LargestVelocity { get; } =
        new("largest_velocity", "m/s", run => run.NoStart is null ? run.LargestVelocity : null);

    /// <summary>Largest vacuum in the headspace, Pa below the atmosphere; absent where the tank is open.</summary>
    public static ResultQuantity LargestVacuum { get; } = new("largest_vacuum", "Pa", run => run.LargestVacuum);

    /// <summary>Depth in the receiver at the end, m; absent where there is none.</summary>
    public static ResultQuantity ReceiverLevel { get; } = new("receiver_level", "m", run => run.ReceiverLevel);

    /// <summary>Every result, in the order of a table's columns.</summary>
    public static IReadOnlyList<ResultQuantity> All { get; } =
    [
        DrainTime, TimeTo50, TimeTo90, TimeTo99, LeftVolume, FinalLevel, LeastMargin, LargestFlow, LargestVelocity,
        LargestVacuum, ReceiverLevel,
    ];

    /// <summary>Name in scenarios and files, <c>drain_time</c>.</summary>
    public string Name { get; }

    /// <summary>The SI unit of its values.</summary>
    public string SiUnit { get; }

    /// <summary>The value of a run in SI; null where the run has none.</summary>
    public double? Of(RunSummary run)
    {
        ArgumentNullException.ThrowIfNull(run);
        return value(run);
    }

    /// <summary>The result of a name, exact case; null when there is none.</summary>
    public static ResultQuantity? Find(string name) => All.FirstOrDefault(quantity => quantity.Name == name);
}
