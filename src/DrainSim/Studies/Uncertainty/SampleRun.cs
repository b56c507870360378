namespace DrainSim.Studies.Uncertainty;

/// <summary>One run of an uncertainty study.</summary>
/// <param name="Number">number of the run, from 0</param>
/// <param name="Repetition">the independent repetition of the plan that it belongs to, from 0</param>
/// <param name="Values">the values of the parameters, in their order, in SI</param>
/// <param name="Run">what came out; null where the values make no job</param>
/// <param name="Fault">why the values make no job; null where they do</param>
public sealed record SampleRun(int Number, int Repetition, IReadOnlyList<double> Values, RunSummary? Run, string? Fault);
