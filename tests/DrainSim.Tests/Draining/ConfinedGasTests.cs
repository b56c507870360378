using DrainSim.Draining;
using DrainSim.Gas;
using MathNet.Numerics;
using MathNet.Numerics.RootFinding;

namespace DrainSim.Tests.Draining;

/// <summary>A tank that no gas enters: p = p_v + (p₀ − p_v)·(V₀/V)^n over the liquid.</summary>
public sealed class ConfinedGasTests
{
    private const double Atmosphere = 101325, Area = 2, Height = 4, Start = 3;

    [Theory]
    [InlineData(1.0, 2339)]
    [InlineData(1.0, 0)]
    [InlineData(1.4, 2339)]
    public void The_vacuum_holds_the_level_of_the_closed_form(double exponent, double vapour)
    {
        Job job = Closed(exponent, vapour);
        DrainResult result = Jobs.Run(job);
        double level = Brent.FindRoot(h => Head(job, exponent, h) - job.Run.SettledWithin, 0, Start, 1e-13);
        Assert.Equal(Outcome.VacuumHeld, result.Outcome);
        Assert.Equal(level, result.FinalLevel, 1e-9);
        Assert.Equal(Pressure(job, exponent, level), result.HeadspacePressure!.Value, 1e-3);
        Assert.Equal(Atmosphere - Pressure(job, exponent, level), result.LargestVacuum!.Value.Value, 1e-3);
    }

    [Theory]
    [InlineData(1.0)]
    [InlineData(1.4)]
    public void It_comes_to_rest_in_the_time_of_the_quadrature(double exponent)
    {
        Job job = Closed(exponent, 2339);
        DrainResult result = Jobs.Run(job);
        double time = Integrate.GaussKronrod(
            h => Area / (Jobs.OrificeFactor() * Math.Sqrt(Head(job, exponent, h))), result.FinalLevel, Start, 1e-12);
        Assert.Equal(time, result.StoppedAt, 1e-6 * time);
    }

    /// <summary>The vacuum holds the liquid, and its flow follows what runs in: as stiff as a vent, and stepped as that is.</summary>
    /// <remarks>3e-6 m: at the end the flow is 2 % off the inflow, 4 % off in the head of 0.4 mm, an eighth of which is level.</remarks>
    [Fact]
    public void A_closed_tank_that_is_fed_gives_what_it_gets_and_costs_few_steps()
    {
        const double last = 1e-4;
        Job job = Closed(1, 2339) with
        {
            Inflow = new Inflow { Points = [(0, 1e-3), (1000, last)] },
            Run = new RunSettings { Until = 1000 },
        };
        DrainResult result = Jobs.Run(job);
        double head = Math.Pow(last / Jobs.OrificeFactor(), 2);
        double level = Brent.FindRoot(h => Head(job, 1, h) - head, 0, Start, 1e-13);
        Assert.Equal(level, result.FinalLevel, 3e-6);
        Assert.InRange(result.Counters.Steps, 1, 300);
    }

    [Fact]
    public void The_vacuum_rating_is_passed_at_its_own_pressure()
    {
        Job job = Closed(1, 2339) with { VacuumRating = 5000 };
        DrainResult result = Jobs.Run(job);
        DrainEvent passed = Assert.Single(result.Events, e => e.Code == EventCode.VacuumRatingPassed);
        Assert.Equal(Atmosphere - 5000, Pressure(job, 1, passed.Level), 1e-2);
        Assert.Contains(result.Warnings, warning => warning.Code == WarningCode.VacuumRatingPassed);
    }

    /// <summary>A supply at a constant overpressure Δp stands for a head Δp/ρg.</summary>
    [Fact]
    public void A_held_overpressure_drives_like_the_head_that_it_is()
    {
        const double over = 20e3;
        Job job = Jobs.OrificeDrain(Area, Height, Start) with { Headspace = new HeldPressure { Overpressure = over } };
        DrainResult result = Jobs.Run(job);
        double head = over / (job.Liquid.Density * Site.StandardGravity);
        double time = 2 * Area / Jobs.OrificeFactor() * (Math.Sqrt(Start + head) - Math.Sqrt(head));
        Assert.Equal(time, result.StoppedAt, 1e-6 * time);
        Assert.Equal(Outcome.Emptied, result.Outcome);
    }

    private static Job Closed(double exponent, double vapour) => Jobs.OrificeDrain(Area, Height, Start) with
    {
        Liquid = Jobs.Inviscid with { VapourPressure = vapour },
        Headspace = new ClosedHeadspace { PolytropicExponent = exponent },
    };

    private static double Pressure(Job job, double exponent, double level) => job.Liquid.VapourPressure
        + (Atmosphere - job.Liquid.VapourPressure) * Math.Pow((Height - Start) / (Height - level), exponent);

    private static double Head(Job job, double exponent, double level) =>
        level + (Pressure(job, exponent, level) - Atmosphere) / (job.Liquid.Density * Site.StandardGravity);
}
