using System.Globalization;
using System.Security.Cryptography;
using System.Text;

namespace DrainSim.Scenarios.Studies;

/// <summary>The cases of a sweep: which values its parameters take in each, made when they are asked for.</summary>
public sealed class SweepCases
{
    private readonly IReadOnlyList<ValueList> axes;
    private readonly CaseTable? table;

    private SweepCases(VariedScenario scenario, IReadOnlyList<ValueList> axes, CaseTable? table, long count) =>
        (Scenario, this.axes, this.table, Count) = (scenario, axes, table, count);

    /// <summary>The scenario with its parameters.</summary>
    public VariedScenario Scenario { get; }

    /// <summary>Number of cases.</summary>
    public long Count { get; }

    /// <summary>Full path of the file whose rows the cases are; null for a grid.</summary>
    public string? TableFile => table?.FullPath;

    /// <summary>Whether the cases are a grid over the parameters, and not rows of a table.</summary>
    public bool IsGrid => table is null;

    /// <summary>A grid: every value of each parameter with every value of the others; the last one varies fastest.</summary>
    /// <param name="scenario">the scenario with its parameters</param>
    /// <param name="axes">the resolved values of each parameter</param>
    /// <param name="count">their product</param>
    internal static SweepCases Grid(VariedScenario scenario, IReadOnlyList<ValueList> axes, long count) =>
        new(scenario, axes, null, count);

    /// <summary>The rows of a table.</summary>
    /// <param name="scenario">the scenario with its parameters</param>
    /// <param name="table">the rows</param>
    internal static SweepCases Rows(VariedScenario scenario, CaseTable table) => new(scenario, [], table, table.Count);

    /// <summary>Number of values of a parameter; the number of cases where they are rows of a table.</summary>
    /// <param name="parameter">index of the parameter</param>
    public long CountOf(int parameter) => IsGrid ? axes[parameter].Count : Count;

    /// <summary>Whether a parameter's values stand at even ratios.</summary>
    /// <param name="parameter">index of the parameter</param>
    public bool IsLogarithmic(int parameter) => IsGrid && axes[parameter].IsLogarithmic;

    /// <summary>A number that tells these cases from all others: of the scenario as it was understood and of all values.</summary>
    public string Fingerprint()
    {
        using var hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        foreach (UnderstoodValue value in Scenario.Base.Understood)
            Add(string.Create(CultureInfo.InvariantCulture, $"{value.Path}={value.Value:R}={value.Written}"));
        foreach (string file in Scenario.InputFiles.Where(File.Exists))
            hash.AppendData(File.ReadAllBytes(file));
        for (int i = 0; i < Scenario.Parameters.Count; i++)
        {
            Add(Scenario.Parameters[i].Path);
            if (IsGrid)
                Add(string.Create(CultureInfo.InvariantCulture, $"{axes[i].Count} {axes[i].IsLogarithmic} {string.Join('|', axes[i].Texts)}"));
        }

        for (int row = 0; row < table?.Count; row++)
        {
            for (int i = 0; i < Scenario.Parameters.Count; i++)
                Add(table.At(row, i).Text);
        }

        return Convert.ToHexStringLower(hash.GetHashAndReset());

        void Add(string text) => hash.AppendData(Encoding.UTF8.GetBytes(text + "\n"));
    }

    /// <summary>Writes the values of a case.</summary>
    /// <param name="number">from 0</param>
    /// <param name="values">receives one value per parameter</param>
    public void Read(long number, Span<ParameterValue> values)
    {
        if (table is not null)
        {
            for (int i = 0; i < values.Length; i++)
                values[i] = table.At((int)number, i);
            return;
        }

        for (int i = axes.Count - 1; i >= 0; i--)
        {
            number = Math.DivRem(number, axes[i].Count, out long index);
            values[i] = axes[i].At((int)index);
        }
    }
}
