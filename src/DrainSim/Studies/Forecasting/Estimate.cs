namespace DrainSim.Studies.Forecasting;

/// <summary>What the readings say of a parameter.</summary>
/// <param name="Parameter">the parameter</param>
/// <param name="Value">the value that fits best, in SI</param>
/// <param name="StandardError">its standard error; infinite where the readings do not tell it</param>
/// <param name="Low">lower end of the 95 % interval</param>
/// <param name="High">upper end of the 95 % interval</param>
public sealed record Estimate(FittedParameter Parameter, double Value, double StandardError, double Low, double High);
