using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Integration;

namespace DrainSim.Tests.Draining;

/// <summary>A tank that breathes through a vent, from one that chokes it to one that it does not feel.</summary>
public sealed class BreathingTankTests
{
    private const double VentCoefficient = 0.61;

    /// <remarks>1e-6 m: the reference still moves by 4e-7 m when its steps are halved.</remarks>
    [Theory]
    [InlineData(0.003)]
    [InlineData(0.006)]
    [InlineData(0.012)]
    public void A_small_vent_agrees_with_an_implicit_integration(double vent)
    {
        const double time = 400;
        DrainResult result = Jobs.Run(Vented(vent) with { Run = new RunSettings { Until = time } });
        var reference = new ImplicitBreathing(2, 4, 3, Jobs.OrificeFactor(), VentCoefficient * Math.PI / 4 * vent * vent);
        double level = reference.LevelAt(time, 4000);
        Assert.Equal(level, result.FinalLevel, 1e-6);
    }

    /// <summary>A hundredth of a cubic metre of gas: the vacuum holds the liquid within seconds, and then it follows the vent.</summary>
    /// <remarks>1e-6 m, as above; steps of 5 ms resolve the first second.</remarks>
    [Theory]
    [InlineData(0.002)]
    [InlineData(0.004)]
    public void On_a_nearly_full_tank_too(double vent)
    {
        const double time = 100;
        DrainResult result = Jobs.Run(Vented(vent) with { Level = NearlyFull, Run = new RunSettings { Until = time } });
        var reference = new ImplicitBreathing(2, 4, NearlyFull, Jobs.OrificeFactor(), VentCoefficient * Math.PI / 4 * vent * vent);
        Assert.Equal(reference.LevelAt(time, 20_000), result.FinalLevel, 1e-6);
    }

    /// <summary>However slowly, an open vent lets the tank run empty: it is no vacuum that holds the liquid up.</summary>
    [Theory]
    [InlineData(0.004)]
    [InlineData(0.008)]
    public void A_vent_that_is_open_never_holds_the_liquid_for_good(double vent)
    {
        DrainResult result = Jobs.Run(Vented(vent));
        Assert.Equal(Outcome.Emptied, result.Outcome);
        Assert.Equal(1e-3, result.FinalLevel, 1e-9);
    }

    /// <summary>
    /// Air of nearly constant density takes a constant share r of the head: r = ρg²/(ρa·ρ)·(Cd·a/Cv·av)², ρa the air outside, ρg the
    /// gas that the vapour leaves room for; the time grows by √(1 + r).
    /// </summary>
    /// <remarks>
    /// 1e-5 of the time: where less than 0.1 Pa drives it the orifice's root is replaced by a cubic, which costs up to 0.017 Pa, 1.7e-6 m
    /// of head, and the last millimetre takes a 50th of the time; for the widest that is half of what is seen.
    /// </remarks>
    [Theory]
    [InlineData(0.04)]
    [InlineData(0.05)]
    [InlineData(0.1)]
    [InlineData(0.15)]
    [InlineData(0.5)]
    public void A_wide_vent_on_a_nearly_full_tank_costs_the_time_of_its_share_of_the_head(double vent)
    {
        const double outside = 101325 / (287.05287 * 293.15), inside = (101325 - 2339) / (287.05287 * 293.15);
        double areas = 0.6 * 0.05 * 0.05 / (VentCoefficient * vent * vent);
        double open = Jobs.Run(Jobs.OrificeDrain(level: NearlyFull)).StoppedAt;
        double time = open * Math.Sqrt(1 + inside * inside / (outside * Jobs.Water.Density) * areas * areas);
        Assert.Equal(time, Jobs.Run(Vented(vent) with { Level = NearlyFull }).StoppedAt, 1e-5 * open);
    }

    /// <summary>Explicit steps were 5000 under the narrowest and 2000 at 40 mm, for stability alone.</summary>
    [Theory]
    [InlineData(0.0005)]
    [InlineData(0.002)]
    [InlineData(0.003)]
    [InlineData(0.004)]
    [InlineData(0.006)]
    [InlineData(0.01)]
    [InlineData(0.02)]
    [InlineData(0.03)]
    [InlineData(0.04)]
    [InlineData(0.06)]
    [InlineData(0.1)]
    [InlineData(0.15)]
    [InlineData(0.5)]
    public void No_vent_costs_more_than_some_hundred_steps_and_the_time_holds_under_a_tighter_tolerance(double vent)
    {
        foreach (double level in new[] { 3, NearlyFull, 4 })
        {
            Job job = Vented(vent) with { Level = level };
            DrainResult result = Jobs.Run(job);
            DrainResult tight = Jobs.Run(job with { Run = job.Run with { Tolerance = 1e-3 * job.Run.Tolerance } });
            Assert.Equal(Outcome.Emptied, result.Outcome);
            Assert.InRange(result.Counters.Steps, 1, 250);
            Assert.InRange(result.Counters.FlowSolutions, 1, 2500);
            Assert.Equal(tight.StoppedAt, result.StoppedAt, 1e-6 * tight.StoppedAt);
        }
    }

    /// <summary>The vent of a siphon's own bore and thrice that, on a tank that is full but for a centimetre.</summary>
    [Theory]
    [InlineData(0.032)]
    [InlineData(0.1)]
    public void A_siphon_under_a_wide_vent_runs_as_in_the_open(double vent)
    {
        Job open = Jobs.Siphon() with { Level = 2.59 };
        DrainResult result = Jobs.Run(open with { Headspace = Vents(vent) });
        double time = Jobs.Run(open).StoppedAt;
        Assert.InRange(result.StoppedAt, time, time * (1 + 1e-3));
        Assert.InRange(result.Counters.Steps, 1, 100);
    }

    /// <summary>
    /// A wide valve holds the vacuum between its set and its full-open pressure until the vent beside it is enough: a step over the kink where
    /// it shuts would take its stiffness along, under which no error shows. The time was 2e-4 off.
    /// </summary>
    [Theory]
    [InlineData(0.0136, 0.173, 249, 0.3)]
    [InlineData(0.00631, 0.231, 3860, 0.1)]
    [InlineData(0.00308, 0.298, 252, 0.5)]
    [InlineData(0.01, 0.05, 100, 1)]
    public void Where_a_valve_shuts_the_time_holds_under_a_tighter_tolerance(double vent, double valve, double set, double rise)
    {
        foreach (double level in new[] { 3, NearlyFull })
        {
            Job job = Vented(vent) with { Level = level };
            job = job with
            {
                Headspace = new VentedHeadspace
                {
                    Openings =
                    [
                        new VentOrifice { Bore = vent, DischargeCoefficient = VentCoefficient },
                        new VacuumBreak { Bore = valve, SetPressure = set, OpeningRise = rise * set },
                    ],
                },
            };
            DrainResult result = Jobs.Run(job);
            DrainResult tight = Jobs.Run(job with { Run = job.Run with { Tolerance = 1e-3 * job.Run.Tolerance } });
            Assert.InRange(result.Counters.Steps, 1, 250);
            Assert.Equal(tight.StoppedAt, result.StoppedAt, 1e-6 * tight.StoppedAt);
        }
    }

    /// <summary>What events are located on: between its steps too a run is the one that a tighter tolerance gives.</summary>
    /// <remarks>A step may be 1e-8 of the 8 m³ to come off, and 1e-8 of an atmosphere: some ten of either.</remarks>
    [Theory]
    [InlineData(0.002)]
    [InlineData(0.02)]
    [InlineData(0.15)]
    public void The_dense_output_of_a_breathing_run_is_as_good_as_its_steps(double vent)
    {
        Trajectory coarse = PathOf(vent, 1e-8), fine = PathOf(vent, 1e-11);
        Span<double> y = [0, 0], exact = [0, 0];
        for (int i = 0; i < 4 * coarse.StepCount - 8; i++)
        {
            DenseStep step = coarse.Step(i / 4);
            double t = step.Start + (i % 4) / 4.0 * (step.End - step.Start);
            coarse.Evaluate(t, y);
            fine.Evaluate(t, exact);
            Assert.Equal(exact[0], y[0], 1e-6);
            Assert.Equal(exact[1], y[1], 1e-2);
        }

        static Trajectory PathOf(double vent, double tolerance)
        {
            var model = new DrainModel(new Plant(Vented(vent) with { Level = NearlyFull }), [new LineMode(false)]);
            var trajectory = new Trajectory(model.Dimension);
            double[] start = new double[model.Dimension];
            model.StartState(start);
            new Integrator<DrainModel>(model).Run(
                0, start, 1e6, new IntegrationOptions { RelativeTolerance = tolerance }, trajectory, TestContext.Current.CancellationToken);
            return trajectory;
        }
    }

    [Fact]
    public void A_breathing_run_of_many_steps_allocates_no_more_bytes_than_one_of_few()
    {
        var plant = new Plant(Vented(0.02) with { Level = NearlyFull });
        var model = new DrainModel(plant, [new LineMode(false)]);
        var integrator = new Integrator<DrainModel>(model);
        var trajectory = new Trajectory(model.Dimension, capacity: 1000);
        double[] start = new double[model.Dimension];
        model.StartState(start);
        long few = Least(0.01, out int fewSteps), many = Least(1000, out int manySteps);
        Assert.True(manySteps > fewSteps + 50);
        Assert.Equal(few, many);

        // The least of some runs: what the thread had left unused counts as allocated when another test sets off a collection.
        long Least(double end, out int steps)
        {
            long least = long.MaxValue;
            steps = 0;
            for (int i = 0; i < 5; i++)
            {
                long before = GC.GetAllocatedBytesForCurrentThread();
                steps = integrator.Run(0, start, end, new(), trajectory, TestContext.Current.CancellationToken).Counters.Steps;
                least = Math.Min(least, GC.GetAllocatedBytesForCurrentThread() - before);
            }
            return least;
        }
    }

    private const double NearlyFull = 3.99;

    private static Job Vented(double bore) => Jobs.OrificeDrain() with { Headspace = Vents(bore) };

    private static VentedHeadspace Vents(double bore) => new()
    {
        Openings = [new VentOrifice { Bore = bore, DischargeCoefficient = VentCoefficient }],
    };
}
