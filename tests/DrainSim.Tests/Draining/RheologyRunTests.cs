using CsCheck;
using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Liquids;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using MathNet.Numerics;

namespace DrainSim.Tests.Draining;

/// <summary>Runs of liquids that are not Newtonian against closed forms and independent quadrature.</summary>
public sealed class RheologyRunTests
{
    private const double G = Site.StandardGravity;
    private const double Rho = 1150;

    /// <summary>H = h + L drives V = (D/2)·n/(3n+1)·(ρ·g·D·H/(4·L·K))^(1/n): t = A/c·[H^(1−1/n)]/(1/n − 1).</summary>
    [Theory]
    [InlineData(0.4, 8)]
    [InlineData(0.8, 4)]
    [InlineData(1.3, 1)]
    public void A_power_law_liquid_drains_through_a_capillary_in_the_closed_time(double n, double k)
    {
        const double d = 0.003, length = 2, from = 0.6, to = 0.2, area = 0.05;
        Job job = Down(new PowerLaw { Consistency = k, FlowIndex = n }, d, length, area, from) with
        {
            Run = new RunSettings { StopAtLevel = to, Until = 1e15 },
        };
        double factor = Math.PI / 4 * d * d * d / 2 * n / (3 * n + 1) * Math.Pow(Rho * G * d / (4 * length * k), 1 / n);
        double p = 1 - 1 / n;
        double time = area / factor * (Math.Pow(from + length, p) - Math.Pow(to + length, p)) / p;
        Assert.Equal(1, Jobs.Run(job).StoppedAt / time, 1e-6);
    }

    /// <summary>
    /// t = ∫A/Q·dH/dτ·dτ over the wall stress, with Buckingham and Reiner's flow and H = 4·τ·L/(ρ·g·D) + (K + 2)·V²/2g.
    /// </summary>
    [Theory]
    [InlineData(2.0, 0.4)]
    [InlineData(20.0, 0.9)]
    public void A_Bingham_liquid_drains_in_the_time_of_an_independent_quadrature(double yield, double plastic)
    {
        const double d = 0.04, length = 3, area = 1.5, from = 2.5, settled = 5e-3, edge = 0.5;
        Job job = Down(new Bingham { YieldStress = yield, PlasticViscosity = plastic }, d, length, area, from, edge) with
        {
            Vessel = Jobs.Prism(area, 3),
            Run = new RunSettings { SettledWithin = settled, Until = 1e12, StopAtLevel = 0.3 },
        };
        double first = StressAt(from + length), last = StressAt(0.3 + length);
        double time = Integrate.GaussKronrod(
            stress => area / (Math.PI / 4 * d * d * Velocity(stress)) * (Head(stress * (1 + 1e-6)) - Head(stress * (1 - 1e-6))) / (2e-6 * stress),
            last, first, 1e-10, 20);
        DrainResult result = Jobs.Run(job);
        Assert.Equal(Outcome.TargetReached, result.Outcome);
        Assert.Equal(1, result.StoppedAt / time, 1e-6);

        double Velocity(double stress)
        {
            double phi = yield / stress;
            return stress * d / (8 * plastic) * (1 - 4 * phi / 3 + phi * phi * phi * phi / 3);
        }

        double Head(double stress) => 4 * stress * length / (Rho * G * d) + (edge + 2) * Velocity(stress) * Velocity(stress) / (2 * G);

        double StressAt(double head) => MathNet.Numerics.RootFinding.Brent.FindRoot(stress => Head(stress) / head - 1, yield, 1e4, 1e-14, 200);
    }

    [Fact]
    public void A_liquid_stops_at_the_level_at_which_its_yield_stress_holds_it()
    {
        const double yield = 30, d = 0.03, length = 1.5, settled = 0.02;
        Job job = Down(new Bingham { YieldStress = yield, PlasticViscosity = 0.2 }, d, length, 0.4, 1.2) with
        {
            Run = new RunSettings { SettledWithin = settled, Until = 1e9 },
        };
        job = job with { DrawOffs = Jobs.Only(job.Line with { Path = [new StraightRun { Length = length, Rise = -0.2 }] }) };
        double held = 4 * yield * length / (Rho * G * d);
        DrainResult result = Jobs.Run(job);
        Assert.Equal(Outcome.YieldHeld, result.Outcome);
        Assert.Equal(held + settled - 0.2, result.FinalLevel, 1e-9);
        Assert.Equal(held, result.Lines[0].YieldHead!.Value, 1e-12);
        Assert.Equal(EventCode.YieldHeld, result.Events[^1].Code);
        Assert.EndsWith("at 0.352 m the liquid's yield stress holds it; it takes a head of more than 0.532 m to move it.",
            Verdict.Sentence(result, new MeasureFormat(UnitSystem.Metric)), StringComparison.Ordinal);
        Assert.Equal(result.InitialVolume, result.DrainedVolume + result.LeftVolume, 1e-9 * result.InitialVolume);
    }

    [Fact]
    public void A_liquid_held_from_the_start_never_starts_until_its_outlet_is_lower()
    {
        Job job = Siphon(new HerschelBulkley { YieldStress = 60, Consistency = 1, FlowIndex = 0.6 });
        DrainResult result = Jobs.Run(job);
        Assert.Equal((Outcome.NeverStarted, NoStart.YieldHolds), (result.Outcome, result.NoStart));
        Remedy remedy = Assert.Single(RemedySearch.Find(result, TestContext.Current.CancellationToken));
        Assert.Equal(RemedyKind.LowerOutlet, remedy.Kind);
        // each metre lower adds a metre of head and of hose
        double perMetre = 4 * 60 / (Rho * G * 0.032), length = 9.7, driving = 2.2 + 1.8;
        Assert.True(remedy.Change >= (perMetre * length - driving) / (1 - perMetre));
        Assert.Equal(Outcome.TimeLimit, remedy.ProvedOutcome); // just enough to creep
    }

    [Fact]
    public void A_held_siphon_is_told_the_drop_that_lets_it_run_to_its_inlet()
    {
        Job job = Siphon(new Bingham { YieldStress = 25, PlasticViscosity = 0.05 });
        DrainResult result = Jobs.Run(job);
        Assert.Equal(Outcome.YieldHeld, result.Outcome);
        Remedy remedy = Assert.Single(RemedySearch.Find(result, TestContext.Current.CancellationToken));
        Assert.Equal(Outcome.InletUncovered, remedy.ProvedOutcome);
        Line lower = LineChanges.WithLowerOutlet(job.Line, remedy.Change - 3e-3)!;
        Assert.Equal(Outcome.YieldHeld, Jobs.Run(job with { DrawOffs = Jobs.Only(lower) }).Outcome);
    }

    [Fact]
    public void Turbulent_flow_of_a_Bingham_liquid_warns_that_the_forms_differ()
    {
        DrainResult thin = Jobs.Run(Siphon(new Bingham { YieldStress = 0.5, PlasticViscosity = 0.002 }));
        RunWarning warning = Assert.Single(thin.Warnings, w => w.Code == WarningCode.FrictionDiffers);
        Assert.InRange(warning.Number, 0.1, 0.6);
        DrainResult thick = Jobs.Run(Siphon(new Bingham { YieldStress = 0.5, PlasticViscosity = 0.2 }));
        Assert.DoesNotContain(thick.Warnings, w => w.Code == WarningCode.FrictionDiffers);
    }

    /// <summary>In laminar flow; between laminar and turbulent a thicker liquid may well run faster, as oils do.</summary>
    [Fact]
    public void More_yield_stress_consistency_or_length_never_drains_faster() =>
        Gen.Select(Gen.Double[0, 20], Gen.Double[0.3, 3], Gen.Double[0.4, 1.2], Gen.Double[0.02, 0.08], Gen.Double[0, 10], Gen.Double[1, 1.5], Gen.Double[0, 3])
            .Sample((yield, k, n, bore, more, thicker, longer) =>
            {
                var rheology = new HerschelBulkley { YieldStress = yield, Consistency = 3 * k, FlowIndex = n };
                DrainResult plain = Run(rheology, 2);
                if (plain.Events.Any(e => e.Code == EventCode.BecameLaminar))
                    return;
                Check(Run(rheology with { YieldStress = yield + more }, 2));
                Check(Run(rheology with { Consistency = rheology.Consistency * thicker }, 2));
                Check(Run(rheology, 2 + longer));

                DrainResult Run(Rheology of, double length) => Simulation.Run(
                    Down(of, bore, 2, 1, 2) with
                    {
                        DrawOffs = Jobs.Only(Jobs.Orifice(bore, 1) with { Path = [new StraightRun { Length = length, Rise = -2 }] }),
                        Run = new RunSettings { StopAtLevel = 1, Until = 1e9 },
                    }, CancellationToken.None);

                void Check(DrainResult worse)
                {
                    bool isReached = worse.Outcome == Outcome.TargetReached;
                    Assert.True(!isReached || (plain.Outcome == Outcome.TargetReached && worse.StoppedAt >= plain.StoppedAt * (1 - 1e-7)));
                    Assert.Equal(worse.InitialVolume, worse.DrainedVolume + worse.LeftVolume, 1e-9 * worse.InitialVolume);
                }
            }, iter: 60);

    private static Job Down(Rheology rheology, double bore, double length, double area, double level, double edge = 0) => new()
    {
        Liquid = new Liquid { Name = "mud", Density = Rho, Viscosity = 1, VapourPressure = 2000, Rheology = rheology },
        Vessel = Jobs.Prism(area, 3),
        Level = level,
        DrawOffs = Jobs.Only(Jobs.Orifice(bore, 1) with
        {
            Inlet = new Inlet { Elevation = 0, EdgeLoss = edge },
            Path = [new StraightRun { Length = length, Rise = -length }],
        }),
    };

    private static Job Siphon(Rheology rheology) => Jobs.Siphon() with
    {
        Liquid = new Liquid { Name = "mud", Density = Rho, Viscosity = 1, VapourPressure = 2000, Rheology = rheology },
        Run = new RunSettings { Until = 1e9 },
    };
}
