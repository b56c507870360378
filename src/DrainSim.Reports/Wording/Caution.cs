namespace DrainSim.Reports.Wording;

/// <summary>A caution that fits a job.</summary>
/// <param name="Code">its name in files</param>
/// <param name="Text">what it says, with its full stop</param>
public sealed record Caution(string Code, string Text);
