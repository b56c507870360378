namespace DrainSim.Tests.Integration.Problems;

/// <summary>A test's answer to a restart.</summary>
public delegate bool RestartAnswer(int index, double t, Span<double> y);
