namespace DrainSim.Studies;

/// <summary>A value of a parameter at which the target is met, or across which it comes to be met.</summary>
/// <param name="Value">the value, in the parameter's SI unit</param>
/// <param name="Least">lower end of the last bracket</param>
/// <param name="Most">upper end of the last bracket; the target lies between what the two ends give</param>
/// <param name="Residual">the result at the value less the target, in the result's SI unit; 0 for limits</param>
/// <param name="IsJump">whether the result jumps over the target there, as where the way a run ends changes</param>
/// <param name="Run">what the value gives</param>
public sealed record SizedValue(double Value, double Least, double Most, double Residual, bool IsJump, RunSummary Run);
