using System.Text.RegularExpressions;
using DrainSim.Lines;
using DrainSim.Tests.Liquids;

namespace DrainSim.Tests.Lines;

/// <summary>
/// Loss coefficients against the check table, whose rows name their source and tolerance. The rows by equivalent
/// length check the turbulent part, the printed coefficient; the laminar rise is added to it.
/// </summary>
public sealed partial class FittingCheckValuesTests
{
    private const double Inch = 0.0254;

    [Fact]
    public void Every_loss_coefficient_meets_its_check_value()
    {
        var checks = CheckTable.Rows("Lines.fittings-check-values.csv");
        Assert.Equal(32, checks.Count);
        Assert.Empty(checks.Select(row => row.Miss(row.Number("value"), Ours(row))).OfType<string>());
    }

    private static double Ours(IReadOnlyDictionary<string, string> row)
    {
        string id = row["fitting_id"];
        string inputs = row["inputs"];
        double[] numbers = [.. Number().Matches(inputs).Select(match =>
            NumberText.TryRead(match.Value, out double value) ? value : throw new InvalidDataException(inputs))];
        if (id.StartsWith("K_from", StringComparison.Ordinal))
        {
            return id == "K_from_Kv"
                ? FlowCoefficient.Loss(numbers[0], numbers[1])
                : FlowCoefficient.Loss(numbers[0] * FlowCoefficient.KvPerCv, numbers[1] * Inch);
        }
        if (inputs.StartsWith("beta", StringComparison.Ordinal))
            return Change(id, numbers[0], numbers[1] * Math.PI / 180);
        LossLaw law = (FittingTable.Find(id)?.Loss ?? ValveTable.Find(id)?.Loss)!;
        return inputs.Contains("f_T", StringComparison.Ordinal)
            ? law.Turbulent(numbers[0])
            : law.At(numbers[1], numbers[0] * Inch);
    }

    private static double Change(string id, double beta, double angle) => id switch
    {
        "sudden_contraction" => BoreChange.Sudden(1, beta),
        "sudden_expansion" => BoreChange.Sudden(beta, 1),
        "gradual_contraction_large_angle" => BoreChange.Cone(1, beta, angle),
        _ => BoreChange.Cone(beta, 1, angle),
    };

    [GeneratedRegex(@"(?<=\s)[0-9][0-9.e+]*")]
    private static partial Regex Number();
}
