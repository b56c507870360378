namespace DrainSim.Studies.Sampling;

/// <summary>That two uncertain parameters go together.</summary>
/// <param name="First">number of a parameter, from 0</param>
/// <param name="Second">number of another one</param>
/// <param name="Coefficient">Spearman's rank correlation, strictly between −1 and 1</param>
public readonly record struct RankCorrelation(int First, int Second, double Coefficient);
