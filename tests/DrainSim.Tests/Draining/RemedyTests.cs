using DrainSim.Draining;
using DrainSim.Lines;

namespace DrainSim.Tests.Draining;

public sealed class RemedyTests
{
    [Fact]
    public void A_stalled_line_is_told_the_least_drop_of_its_outlet()
    {
        Job job = Stalled();
        Remedy remedy = Assert.Single(Find(job));
        Assert.Equal(RemedyKind.LowerOutlet, remedy.Kind);
        // level with the inlet but for the settled head: anything less stalls above it
        Assert.Equal(0.6 - 0.12 + job.Run.SettledWithin, remedy.Change, 2e-3);
        Assert.Equal(Outcome.InletUncovered, remedy.ProvedOutcome);
        Assert.Equal(Outcome.Levelled, Jobs.Run(Lowered(job, remedy.Change - 3e-3)).Outcome);
        Assert.Equal(Outcome.InletUncovered, Jobs.Run(Lowered(job, remedy.Change)).Outcome);
    }

    [Fact]
    public void A_parted_column_is_told_a_lower_crest_and_a_throttle()
    {
        Job job = Jobs.Siphon() with { Liquid = Jobs.Water with { VapourPressure = 67e3 } };
        IReadOnlyList<Remedy> remedies = Find(job);
        Assert.Equal([RemedyKind.LowerCrest, RemedyKind.ThrottleOutlet], remedies.Select(remedy => remedy.Kind));
        double loss = remedies[1].Change;
        Assert.Equal(Outcome.VapourBreak, Jobs.Run(Throttled(job, 0.97 * loss)).Outcome);
        Assert.Equal(Outcome.InletUncovered, Jobs.Run(Throttled(job, loss)).Outcome);
    }

    [Fact]
    public void A_line_that_never_started_is_told_what_would_start_it()
    {
        Job job = Stalled() with { Level = 0.5 };
        Assert.Equal(NoStart.NoDrivingHead, Jobs.Run(job).NoStart);
        Remedy remedy = Assert.Single(Find(job));
        Assert.NotEqual(Outcome.NeverStarted, remedy.ProvedOutcome);
    }

    [Fact]
    public void No_crest_is_offered_below_the_rim_that_the_hose_hangs_over()
    {
        Job job = Jobs.Siphon() with { Liquid = Jobs.Water with { VapourPressure = 72e3 } };
        Assert.Equal(Outcome.VapourBreak, Jobs.Run(job).Outcome);
        Assert.DoesNotContain(Find(job), remedy => remedy.Kind == RemedyKind.LowerCrest && remedy.Value < job.Vessel.Height);
    }

    [Fact]
    public void A_lower_inlet_is_offered_only_when_it_drains_something()
    {
        Job job = Jobs.Siphon() with { Level = 0.08 };
        Remedy remedy = Assert.Single(Find(job));
        Assert.Equal(RemedyKind.LowerInlet, remedy.Kind);
        Assert.True(remedy.Value < 0.0801 && remedy.ProvedTime > 0);
    }

    [Fact]
    public void A_job_that_is_done_needs_no_remedy() => Assert.Empty(Find(Jobs.Siphon()));

    [Fact]
    public void A_tank_held_by_its_vacuum_is_let_go_by_a_vent_that_keeps_its_rating()
    {
        Job held = Jobs.OrificeDrain() with { Headspace = new DrainSim.Gas.ClosedHeadspace(), VacuumRating = 500 };
        Remedy remedy = Assert.Single(Find(held));
        Assert.Equal((RemedyKind.WidenVent, Outcome.Emptied), (remedy.Kind, remedy.ProvedOutcome));
        // Air let in at the flow of the liquid: Q = Cd·a·√(2·Δp/ρ), incompressible, ρ of air at 20 °C by the ideal gas law.
        double flow = Jobs.OrificeFactor() * Math.Sqrt(3), density = 101325 / (287.05 * 293.15);
        double area = flow / (0.61 * Math.Sqrt(2 * 500 / density));
        Assert.Equal(Math.Sqrt(4 * area / Math.PI), remedy.Value, 0.03 * remedy.Value); // the flow itself falls by the vacuum
    }

    [Fact]
    public void A_fed_tank_is_let_empty_by_an_inflow_that_its_line_keeps_up_with()
    {
        DrainResult fed = Jobs.Run(Jobs.Siphon() with { Inflow = Inflow.Constant(2.4e-3) });
        Assert.Equal(Outcome.Balanced, fed.Outcome);
        Remedy remedy = Assert.Single(RemedySearch.Find(fed, TestContext.Current.CancellationToken));
        Assert.Equal((RemedyKind.LessInflow, Outcome.InletUncovered), (remedy.Kind, remedy.ProvedOutcome));
        Assert.Equal(fed.Warnings.Single(w => w.Code == WarningCode.NeverEmpties).Number, remedy.Value, 4e-3 * remedy.Value);
    }

    [Fact]
    public void A_receiver_that_is_full_is_mended_by_a_higher_brim()
    {
        ReceivingTank tank = new() { Vessel = Jobs.Prism(4, 1), Bottom = -4 };
        Job full = Jobs.OrificeDrain() with { DrawOffs = [new DrawOff { Line = Jobs.Orifice(0.05, 0.6), Receiver = tank }] };
        Remedy remedy = Assert.Single(Find(full));
        Assert.Equal((RemedyKind.HigherBrim, Outcome.Emptied), (remedy.Kind, remedy.ProvedOutcome));
        Assert.Equal(0.5, remedy.Change, 2e-3); // 6 m³ into 4 m²
    }

    private static IReadOnlyList<Remedy> Find(Job job) =>
        RemedySearch.Find(Jobs.Run(job), TestContext.Current.CancellationToken);

    private static Job Stalled()
    {
        Line line = Jobs.SiphonLine();
        StraightRun outer = (StraightRun)line.Path[2] with { Rise = 0.6 - 2.75 };
        return Jobs.Siphon() with { DrawOffs = Jobs.Only(line with { Path = [.. line.Path.Take(2), outer] }) };
    }

    private static Job Lowered(Job job, double drop)
    {
        var outer = (StraightRun)job.Line.Path[2];
        outer = outer with { Rise = outer.Rise - drop, Length = outer.Length + drop };
        return job with { DrawOffs = Jobs.Only(job.Line with { Path = [.. job.Line.Path.Take(2), outer] }) };
    }

    private static Job Throttled(Job job, double loss) => job with
    {
        DrawOffs = Jobs.Only(job.Line with { Path = [.. job.Line.Path, new PlainLoss { Coefficient = loss }] }),
    };
}
