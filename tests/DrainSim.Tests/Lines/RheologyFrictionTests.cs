using CsCheck;
using DrainSim.Lines;
using DrainSim.Liquids;
using DrainSim.Tests.Liquids;
using MathNet.Numerics;

namespace DrainSim.Tests.Lines;

/// <summary>
/// Friction of liquids that are not Newtonian: against the check table, whose rows name their source and tolerance, against
/// the integral of the velocity profile, and where one rheology goes over into another.
/// </summary>
public sealed class RheologyFrictionTests
{
    private static readonly Gen<FlowCurve> AnyCurve = Gen.Select(
        Gen.OneOf(Gen.Const(0.0), Gen.Double[-4, 5].Select(Math.Exp)), Gen.Double[-6, 3], Gen.Double[0.1, 1.5],
        (yield, logK, n) => new FlowCurve(yield, Math.Exp(logK), n));

    private static readonly Gen<double> AnyBore = Gen.Double[-5, -1].Select(Math.Exp);

    [Theory]
    [InlineData("bingham_laminar", 11)]
    [InlineData("bingham_darby_melson", 5)]
    [InlineData("powerlaw_laminar", 4)]
    [InlineData("powerlaw_dodge_metzner", 12)]
    [InlineData("metzner_reed_number", 3)]
    public void The_friction_meets_its_check_values(string model, int rows)
    {
        var checks = CheckTable.Rows("Lines.friction-check-values.csv").Where(row => row["model"] == model).ToList();
        Assert.Equal(rows, checks.Count);
        Assert.Empty(checks.Select(row => row.Miss(row.Number("value"), Ours(row))).OfType<string>());
    }

    /// <summary>q = π·∫γ̇·r²·dr of the profile, with γ̇ = ((τ_w·r/R − τ_y)/K)^(1/n) outside the plug.</summary>
    [Fact]
    public void The_wall_stress_is_that_of_the_integrated_profile() =>
        Gen.Select(AnyCurve, AnyBore, Gen.Double[-4, 8]).Sample((curve, bore, logShear) =>
        {
            double area = Math.PI / 4 * bore * bore, q = Math.Exp(logShear) * bore / 8 * area;
            double wall = curve.YieldStress + new BoreStress(curve, 1000, bore).Excess(q, out _);
            double radius = bore / 2, plug = radius * curve.YieldStress / wall;
            double flow = Math.PI * Integrate.GaussKronrod(
                r => r * r * Math.Pow(Math.Max(0, wall * r / radius - curve.YieldStress) / curve.Consistency, 1 / curve.FlowIndex), plug, radius, 1e-11, 20);
            Assert.Equal(1, flow / q, 1e-7);
        }, iter: 300);

    [Fact]
    public void A_Herschel_Bulkley_liquid_reduces_to_the_three_others()
    {
        Check(new HerschelBulkley { YieldStress = 8, Consistency = 0.05, FlowIndex = 1 }, new Bingham { YieldStress = 8, PlasticViscosity = 0.05 });
        Check(new HerschelBulkley { YieldStress = 0, Consistency = 0.7, FlowIndex = 0.6 }, new PowerLaw { Consistency = 0.7, FlowIndex = 0.6 });
        Check(new HerschelBulkley { YieldStress = 0, Consistency = 0.004, FlowIndex = 1 }, new Newtonian());

        static void Check(Rheology general, Rheology special)
        {
            Liquid liquid = LinesForTests.Water with { Viscosity = 0.004 };
            LineHydraulics one = LinesForTests.Siphon.Compile(liquid with { Rheology = general });
            LineHydraulics other = LinesForTests.Siphon.Compile(liquid with { Rheology = special });
            foreach (double flow in (double[])[1e-6, 1e-5, 1e-4, 1e-3, 1e-2])
                Assert.Equal(other.HeadLoss(flow), one.HeadLoss(flow));
        }
    }

    /// <summary>Near n = 1 and τ_y = 0 the laminar law is met; Dodge and Metzner's is within 0.1 % of Colebrook and White's.</summary>
    [Theory]
    [InlineData(10, 1e-5)]
    [InlineData(1900, 1e-5)]
    [InlineData(3000, 0.03)] // the bridge is straight in other coordinates
    [InlineData(1e4, 1e-3)]
    [InlineData(1e6, 1e-3)]
    public void A_nearly_Newtonian_liquid_flows_like_a_Newtonian_one(double reynolds, double tolerance)
    {
        LineHydraulics water = LinesForTests.Siphon.Compile();
        double flow = reynolds / water.Reynolds(1);
        foreach (Rheology near in (Rheology[])[
            new PowerLaw { Consistency = 1.002e-3, FlowIndex = 1 - 1e-7 },
            new Bingham { YieldStress = 1e-12, PlasticViscosity = 1.002e-3 },
            new HerschelBulkley { YieldStress = 1e-12, Consistency = 1.002e-3, FlowIndex = 1 + 1e-7 }])
        {
            LineHydraulics line = LinesForTests.Siphon.Compile(LinesForTests.Water with { Rheology = near });
            Assert.Equal(1, line.HeadLoss(flow) / water.HeadLoss(flow), tolerance);
            Assert.Equal(1, line.Reynolds(flow) / reynolds, 1e-5);
        }
    }

    [Fact]
    public void A_rough_wall_raises_turbulent_friction_to_the_fully_rough_law() =>
        Gen.Select(Gen.Double[0.1, 1.5], Gen.Double[-12, -3], Gen.Double[9, 16]).Sample((n, logK, logRe) =>
        {
            double k = Math.Exp(logK), smooth = DodgeMetzner.FrictionFactor(Math.Exp(logRe), n, 0);
            double f = DodgeMetzner.FrictionFactor(Math.Exp(logRe), n, k);
            return f >= smooth * (1 - 1e-14) && f >= FrictionFactor.FullyRough(k) * (1 - 1e-14) // roundings of logarithms
                && Math.Abs(DodgeMetzner.FrictionFactor(1e60, n, k) / FrictionFactor.FullyRough(k) - 1) < 1e-6;
        });

    [Fact]
    public void Friction_rises_strictly_and_without_a_step_through_all_regimes() =>
        Gen.Select(AnyCurve, AnyBore, Gen.Double[0, 0.03], Gen.Double[-12, 12], Gen.Double[-9, 0]).Sample((curve, bore, k, logFlow, logMore) =>
        {
            var stress = new BoreStress(curve, 1000, bore);
            var wall = new StressWall(curve, 1000, stress, k);
            double q = stress.LaminarFlow * Math.Exp(logFlow);
            Assert.True(wall.Square(q * (1 + Math.Exp(logMore)), out _) > wall.Square(q, out double rise));
            Assert.True(rise > 0);
            foreach (double limit in (double[])[stress.LaminarFlow, wall.TurbulentFlow])
            {
                double below = wall.Square(limit * (1 - 1e-12), out _), above = wall.Square(limit * (1 + 1e-12), out _);
                Assert.Equal(1, above / below, 1e-10 * (1 + stress.YieldSquare / below)); // of the whole loss
            }
        }, iter: 2000);

    [Fact]
    public void A_jets_velocity_head_rises_with_the_flow() =>
        Gen.Select(AnyCurve, AnyBore, Gen.Double[-1, 5], Gen.Double[-6, 0]).Sample((curve, bore, logFlow, logMore) =>
        {
            var stress = new BoreStress(curve, 1000, bore);
            double q = stress.LaminarFlow * Math.Exp(logFlow), more = q * (1 + Math.Exp(logMore));
            return stress.KineticFactor(more, out _) * more * more > stress.KineticFactor(q, out _) * q * q;
        });

    private static double Ours(IReadOnlyDictionary<string, string> row)
    {
        // a bore of 1 m, 1 kg/m³ and 1 Pa·s^n make V the Reynolds and τ_y the Hedström number
        double re = row.Number("reynolds", 0), he = row.Number("hedstrom", 0), n = row.Number("n", 1), area = Math.PI / 4;
        var curve = new FlowCurve(he, 1, n);
        var bore = new BoreStress(curve, 1, 1);
        switch (row["model"])
        {
            case "bingham_laminar" when row["quantity"] == "tau_y_over_tau_wall":
                return he / (he + bore.Excess(re * area, out _));
            case "bingham_laminar":
                return FrictionFactor.Laminar(bore.Reynolds(re * area));
            case "bingham_darby_melson":
                return DarbyMelson.FrictionFactor(re, he, FrictionFactor.Laminar(bore.Reynolds(re * area)));
            case "powerlaw_laminar": // Re is of V^(2−n)
                double velocity = Math.Pow(re / MetznerReed.Reynolds(curve, 1, 1, 1), 1 / (2 - n));
                return FrictionFactor.Laminar(bore.Reynolds(velocity * area));
            case "powerlaw_dodge_metzner":
                return DodgeMetzner.FrictionFactor(re, n, 0);
            default:
                return MetznerReed.Reynolds(
                    new FlowCurve(0, InWords(row, "K"), n), InWords(row, "rho"), InWords(row, "V"), InWords(row, "D"));
        }
    }

    /// <summary>A number that a row gives in words: <c>Re_MR for D=0.05 m V=1 m/s …</c>.</summary>
    private static double InWords(IReadOnlyDictionary<string, string> row, string letter)
    {
        string word = row["quantity"].Split(' ').Single(w => w.StartsWith(letter + "=", StringComparison.Ordinal));
        return NumberText.TryRead(word.AsSpan(letter.Length + 1), out double value) ? value : throw new InvalidDataException(word);
    }
}
