namespace DrainSim.Studies;

/// <summary>What a sizing found.</summary>
public sealed record SizingResult
{
    /// <summary>The target.</summary>
    public required SizingTarget Target { get; init; }

    /// <summary>Lower end of the range searched, in the parameter's SI unit.</summary>
    public required double From { get; init; }

    /// <summary>Upper end of the range searched.</summary>
    public required double To { get; init; }

    /// <summary>The values found, rising; empty where there is none. For limits: the values between kept and broken.</summary>
    public required IReadOnlyList<SizedValue> Values { get; init; }

    /// <summary>The cases looked at on the way through the range, rising.</summary>
    public required IReadOnlyList<(double Value, CaseResult Result)> Scan { get; init; }

    /// <summary>Number of runs in all.</summary>
    public required int Runs { get; init; }

    /// <summary>Least and largest value of the result on the way, in its SI unit; null where no case has it.</summary>
    public (double Least, double Most)? Reached
    {
        get
        {
            double[] reached = Target.Quantity is { } quantity
                ? [.. Scan.Select(point => point.Result.Run is { } run ? quantity.Of(run) : null).OfType<double>()]
                : [];
            return reached.Length == 0 ? null : (reached.Min(), reached.Max());
        }
    }
}
