using CsCheck;
using DrainSim.Lines;
using DrainSim.Tests.Liquids;

namespace DrainSim.Tests.Lines;

/// <summary>
/// Friction factors of Newtonian liquids against the check table, whose rows name their source and tolerance. Its rows of
/// Churchill's formula are for a law that lines do not use.
/// </summary>
public sealed class FrictionFactorTests
{
    [Theory]
    [InlineData("colebrook_white", 58)]
    [InlineData("laminar", 5)]
    [InlineData("fully_rough", 4)]
    [InlineData("crane_fT", 8)]
    public void The_friction_factor_meets_its_check_values(string model, int rows)
    {
        var checks = CheckTable.Rows("Lines.friction-check-values.csv").Where(row => row["model"] == model).ToList();
        Assert.Equal(rows, checks.Count);
        Assert.Empty(checks.Select(row => row.Miss(row.Number("value"), Ours(row))).OfType<string>());
    }

    [Fact]
    public void Colebrook_White_is_solved_to_the_last_bits() =>
        Gen.Select(Gen.Double[Math.Log(4e3), Math.Log(1e9)], Gen.Double[0, 0.1]).Sample((logRe, k) =>
        {
            double re = Math.Exp(logRe);
            double x = 1 / Math.Sqrt(FrictionFactor.ColebrookWhite(re, k));
            double right = -2 * Math.Log10(k / 3.7 + 2.51 / re * x);
            return Math.Abs(right / x - 1) < 4e-15; // a few roundings of the logarithm
        });

    [Theory]
    [InlineData(0)]
    [InlineData(1e-3)]
    [InlineData(0.05)]
    [InlineData(0.5)]
    public void The_regimes_join_without_a_step(double k)
    {
        foreach (double limit in new[] { FrictionFactor.LaminarLimit, FrictionFactor.TurbulentLimit })
        {
            double below = FrictionFactor.Darcy(Math.BitDecrement(limit), k);
            double above = FrictionFactor.Darcy(Math.BitIncrement(limit), k);
            Assert.Equal(1, above / below, 1e-12);
            Assert.Equal(1, KineticFactor.At(Math.BitIncrement(limit)) / KineticFactor.At(Math.BitDecrement(limit)), 1e-12);
        }
    }

    [Fact]
    public void The_bridge_is_a_straight_line_from_0_032_to_Colebrook_White_at_4000()
    {
        Assert.Equal(0.032, FrictionFactor.Darcy(2000, 0.01), 1e-16);
        double middle = (0.032 + FrictionFactor.ColebrookWhite(4000, 0.01)) / 2;
        Assert.Equal(middle, FrictionFactor.Darcy(3000, 0.01), 1e-16);
        Assert.Equal(1.5, KineticFactor.At(3000));
    }

    [Fact]
    public void A_rougher_wall_never_lowers_the_friction_factor() =>
        Gen.Select(Gen.Double[1, 20], Gen.Double[0, 0.5], Gen.Double[0, 0.4]).Sample((logRe, k, dk) =>
            FrictionFactor.Darcy(Math.Exp(logRe), k + dk) >= FrictionFactor.Darcy(Math.Exp(logRe), k) * (1 - 1e-15));

    [Fact]
    public void The_slope_is_the_derivative() =>
        Gen.Select(Gen.OneOf(Gen.Double[10, 1999], Gen.Double[2001, 3999], Gen.Double[4001, 1e7]), Gen.Double[0, 0.1])
            .Sample((re, k) =>
            {
                var wall = new PipeWall(k, 1);
                double f = wall.Factor(re, out double slope);
                double d = 1e-5;
                double measured = (wall.Factor(re * (1 + d), out _) - wall.Factor(re * (1 - d), out _)) / (2 * d * f);
                return Math.Abs(measured - slope) < 1e-8 || CrossesLimit(re, d); // central difference, d² and ε/d
            });

    [Fact]
    public void The_velocity_head_of_a_jet_never_falls_with_the_flow() =>
        Gen.Select(Gen.Double[0, 6000], Gen.Double[0, 100]).Sample((re, more) =>
            KineticFactor.At(re + more) * (re + more) * (re + more) >= KineticFactor.At(re) * re * re * (1 - 1e-15));

    private static bool CrossesLimit(double re, double d) =>
        new[] { FrictionFactor.LaminarLimit, FrictionFactor.TurbulentLimit }
            .Any(limit => re * (1 - d) < limit && re * (1 + d) > limit);

    private static double Ours(IReadOnlyDictionary<string, string> row) => row["model"] switch
    {
        "colebrook_white" => FrictionFactor.ColebrookWhite(row.Number("reynolds"), row.Number("relative_roughness")),
        "laminar" => FrictionFactor.Laminar(row.Number("reynolds")),
        _ => FrictionFactor.FullyRough(row.Number("relative_roughness")),
    };
}
