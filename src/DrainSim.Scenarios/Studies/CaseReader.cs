using DrainSim.Draining;
using DrainSim.Studies;

namespace DrainSim.Scenarios.Studies;

/// <summary>Makes jobs of the values of a study's parameters; for one thread.</summary>
/// <remarks>
/// Numbers that stand in the job as they are, such as a length or a loss, are changed there, which costs less than a
/// microsecond. For all others, and for every value that the reading might refuse, the scenario is read anew; the
/// last reading is kept, so that in a grid only the parameters that vary slowest are read.
/// </remarks>
public sealed class CaseReader
{
    private readonly ScenarioDocument document;
    private readonly Job baseJob;
    private readonly IReadOnlyList<StudyParameter> parameters;
    private readonly JobEdit?[] edits;
    private readonly ParameterValue[] lastRead;
    private Job? lastJob;
    private bool hasRead;

    internal CaseReader(ScenarioDocument document, Job baseJob, IReadOnlyList<StudyParameter> parameters)
    {
        (this.document, this.baseJob, this.parameters) = (document, baseJob, parameters);
        edits = [.. parameters.Select(parameter => parameter.Quantity is null ? null : JobEdits.Find(document, baseJob, parameter.Path))];
        lastRead = new ParameterValue[parameters.Count];
        if (edits.All(edit => edit is not null))
            (lastJob, hasRead) = (baseJob, true);
    }

    /// <summary>The job of a case, or why there is none.</summary>
    /// <param name="values">a value for each parameter, in their order</param>
    public CaseReading Read(ReadOnlySpan<ParameterValue> values)
    {
        if (ReadSlow(values) is { } job && TryEdit(job, values) is { } edited)
            return new CaseReading(edited, "");
        return ReadWhole(values);
    }

    /// <summary>Runs a case.</summary>
    /// <param name="values">a value for each parameter, in their order</param>
    /// <param name="cancellation">ends the run early</param>
    /// <exception cref="OperationCanceledException">the run was cancelled</exception>
    public CaseResult Run(ReadOnlySpan<ParameterValue> values, CancellationToken cancellation = default)
    {
        CaseReading reading = Read(values);
        return reading.Job is { } job ? CaseResult.Of(job, cancellation) : CaseResult.Impossible(reading.Cause);
    }

    /// <summary>The job with the values that have to be read; null when it is refused with the others as they stand.</summary>
    private Job? ReadSlow(ReadOnlySpan<ParameterValue> values)
    {
        bool isSame = hasRead;
        for (int i = 0; i < values.Length && isSame; i++)
            isSame = edits[i] is not null || values[i] == lastRead[i];
        if (isSame)
            return lastJob;
        ScenarioDocument changed = document;
        for (int i = 0; i < values.Length; i++)
        {
            lastRead[i] = values[i];
            if (edits[i] is null)
                changed = changed.With(parameters[i].Path, values[i].Text);
        }

        (lastJob, hasRead) = (changed.Read().Scenario?.Job, true);
        return lastJob;
    }

    private Job? TryEdit(Job job, ReadOnlySpan<ParameterValue> values)
    {
        Job? edited = job;
        for (int i = 0; i < values.Length && edited is not null; i++)
        {
            if (edits[i] is { } edit)
                edited = values[i].IsNumber ? edit(edited, values[i].Si) : null;
        }

        return edited;
    }

    private CaseReading ReadWhole(ReadOnlySpan<ParameterValue> values)
    {
        ScenarioDocument changed = document;
        for (int i = 0; i < values.Length; i++)
            changed = changed.With(parameters[i].Path, values[i].Text);
        ScenarioReading reading = changed.Read();
        return reading.IsRefused
            ? new CaseReading(null, Cause(reading.Problems[0]))
            : new CaseReading(reading.Scenario.Job, "");
    }

    private static string Cause(Problem problem) =>
        problem.Key.Length > 0 ? $"{problem.Key}: {problem.Fault}" : problem.Fault;
}
