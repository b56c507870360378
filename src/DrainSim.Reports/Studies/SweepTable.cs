using System.Globalization;
using CsvHelper;
using DrainSim.Reports.Wording;
using DrainSim.Studies;

namespace DrainSim.Reports.Studies;

/// <summary>The rows of a sweep as CSV: SI, invariant, shortest round-trip numbers; for one thread.</summary>
public sealed class SweepTable : IDisposable
{
    /// <summary>The outcome of a case that its values make impossible.</summary>
    public const string Impossible = "impossible";

    private static readonly CsvWriterOptions Options = new() { NewLine = "\n" };

    private static readonly string[] ResultColumns =
    [
        "outcome", "reason", "stopped_at_s", "drain_time_s", "time_to_50_s", "time_to_90_s", "time_to_99_s", "left_volume_m3",
        "final_level_m", "least_margin_Pa", "largest_flow_m3_s", "largest_velocity_m_s", "limits_broken",
        "steps", "rejected_steps", "derivatives", "flow_solutions", "event_evaluations",
    ];

    private readonly StringWriter page = new(CultureInfo.InvariantCulture) { NewLine = "\n" };
    private readonly CsvWriter csv;

    /// <summary>A writer of rows.</summary>
    public SweepTable() => csv = CsvWriter.Create(page, Options);

    /// <summary>The columns behind the number of the case and the parameters.</summary>
    public static IReadOnlyList<string> Results => ResultColumns;

    /// <summary>The first line, with its line feed.</summary>
    /// <param name="parameters">names of the parameters' columns</param>
    public static string Header(IReadOnlyList<string> parameters)
    {
        using var table = new SweepTable();
        table.csv.WriteField("case");
        foreach (string name in (string[])[.. parameters, .. ResultColumns])
            table.csv.WriteField(name);
        return table.Line();
    }

    /// <summary>A row, with its line feed.</summary>
    /// <param name="number">number of the case, from 1</param>
    /// <param name="cells">the values of its parameters</param>
    /// <param name="result">what became of it</param>
    public string Row(long number, ReadOnlySpan<ParameterCell> cells, CaseResult result)
    {
        csv.WriteField(number);
        foreach (ParameterCell cell in cells)
        {
            if (cell.Word is { } word)
                csv.WriteField(word);
            else
                csv.WriteField(cell.Number);
        }

        if (result.Run is { } run)
            WriteRun(run);
        else
            WriteImpossible(result.Cause);
        return Line();
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        csv.Dispose();
        page.Dispose();
    }

    private void WriteRun(RunSummary run)
    {
        csv.WriteField(OutcomeCodes.Code(run.Outcome));
        csv.WriteField(run.NoStart is { } reason ? ReportCodes.Of(reason) : "");
        csv.WriteField(run.StoppedAt);
        Write(run.DrainTime);
        Write(run.TimeTo50);
        Write(run.TimeTo90);
        Write(run.TimeTo99);
        csv.WriteField(run.LeftVolume);
        csv.WriteField(run.FinalLevel);
        Write(ResultQuantity.LeastMargin.Of(run));
        csv.WriteField(run.LargestFlow);
        csv.WriteField(run.LargestVelocity);
        csv.WriteField(run.BrokenLimits.Length == 0 ? "" : string.Join(' ', run.BrokenLimits.Select(LimitWording.Code)));
        csv.WriteField(run.Counters.Steps);
        csv.WriteField(run.Counters.Rejected);
        csv.WriteField(run.Counters.Derivatives);
        csv.WriteField(run.Counters.FlowSolutions);
        csv.WriteField(run.Counters.EventEvaluations);
    }

    private void WriteImpossible(string cause)
    {
        csv.WriteField(Impossible);
        csv.WriteField(cause.ReplaceLineEndings(" "));
        for (int i = 2; i < ResultColumns.Length; i++)
            csv.WriteField("");
    }

    private void Write(double? value)
    {
        if (value is { } number && double.IsFinite(number))
            csv.WriteField(number);
        else
            csv.WriteField("");
    }

    private string Line()
    {
        csv.EndRecord();
        csv.Flush();
        string line = page.ToString();
        page.GetStringBuilder().Clear();
        return line;
    }
}
