namespace DrainSim.Tests.Integration.Problems;

/// <summary>An event function that a test writes as a lambda.</summary>
public delegate double EventFunction(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt);
