namespace DrainSim.Studies;

/// <summary>What a sizing is to reach: a value of a result, or all limits of the job kept.</summary>
public sealed record SizingTarget
{
    private SizingTarget(ResultQuantity? quantity, double value) => (Quantity, Value) = (quantity, value);

    /// <summary>All limits of the job kept.</summary>
    public static SizingTarget LimitsKept { get; } = new(null, 0);

    /// <summary>The result that has to have a value; null where the limits have to be kept.</summary>
    public ResultQuantity? Quantity { get; }

    /// <summary>The value that the result has to have, in its SI unit.</summary>
    public double Value { get; }

    /// <summary>A value of a result.</summary>
    /// <param name="quantity">the result</param>
    /// <param name="value">the value, in its SI unit</param>
    public static SizingTarget Of(ResultQuantity quantity, double value)
    {
        ArgumentNullException.ThrowIfNull(quantity);
        return new SizingTarget(quantity, Require.Finite(value, quantity.Name, quantity.SiUnit));
    }

    /// <summary>How far a case is above the target, as a share of it, 1; null where the case has no such result.</summary>
    /// <remarks>For limits: 1 where all are kept, −1 where one is broken.</remarks>
    internal double? Excess(CaseResult result)
    {
        if (result.Run is not { } run)
            return null;
        if (Quantity is null)
            return run.BrokenLimits.IsEmpty && run.NoStart is null ? 1 : -1;
        return Quantity.Of(run) is { } value && double.IsFinite(value) ? (value - Value) / (Value == 0 ? 1 : Math.Abs(Value)) : null;
    }
}
