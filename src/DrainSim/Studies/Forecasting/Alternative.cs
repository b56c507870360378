using DrainSim.Draining;

namespace DrainSim.Studies.Forecasting;

/// <summary>A fit with one more unknown, beside the fit without it.</summary>
public sealed record Alternative
{
    /// <summary>Chance of a wrong alarm at which the unknown counts as found, 1.</summary>
    public const double Significance = 0.05;

    /// <summary>What is added.</summary>
    public required AlternativeKind Kind { get; init; }

    /// <summary>Its flow, m³/s: steady for an inflow, at the level of the first reading for a leak; 0 where the readings want none.</summary>
    public required double Flow { get; init; }

    /// <summary>Standard error of the flow, m³/s; null where the readings want none.</summary>
    public double? FlowError { get; init; }

    /// <summary>Chance that readings without it would look like these or more so: the F-test on one more parameter, 1.</summary>
    public required double PValue { get; init; }

    /// <summary>
    /// Akaike's criterion, corrected for few readings (C. M. Hurvich, C.-L. Tsai, Biometrika 76 (1989) 297–307), without it less that with
    /// it; above 0 where the fit with it is worth its parameter. Null where there are too few readings.
    /// </summary>
    public double? CriterionGain { get; init; }

    /// <summary>The run with it; null where the readings want none.</summary>
    public DrainResult? Run { get; init; }

    /// <summary>When the job's own lines are done with it, s; a leak may run on. Null where the readings want none.</summary>
    public double? FinishedAt => Run is null ? null
        : Kind == AlternativeKind.Leak ? Run.Lines.SkipLast(1).Max(line => line.StoppedAt)
        : Run.StoppedAt;

    /// <summary>Whether both tests find it.</summary>
    public bool IsFound => Flow > 0 && PValue < Significance && CriterionGain > 0;
}
