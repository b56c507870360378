namespace DrainSim.Studies.Forecasting;

/// <summary>A reading beside the fitted curve.</summary>
/// <param name="Reading">the reading</param>
/// <param name="Fitted">level of the curve at its time, m</param>
public readonly record struct ReadingResidual(LevelReading Reading, double Fitted)
{
    /// <summary>Reading less curve, m.</summary>
    public double Residual => Reading.Level - Fitted;

    /// <summary>The same in standard uncertainties of the instrument, 1.</summary>
    public double Standardised => Residual / Reading.Uncertainty;
}
