using DrainSim.Draining;
using DrainSim.Gas;

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

    /// <summary>The vacuum of a wide vent is worth well below a thousandth of the time, and costs no steps.</summary>
    [Theory]
    [InlineData(0.05, 1e-3)]
    [InlineData(0.15, 2e-5)]
    public void A_wide_vent_on_a_nearly_full_tank_is_as_good_as_the_open_air(double vent, double share)
    {
        DrainResult result = Jobs.Run(Vented(vent) with { Level = 3.99 });
        double open = Jobs.Run(Jobs.OrificeDrain(level: 3.99)).StoppedAt;
        Assert.InRange(result.StoppedAt, open, open * (1 + share));
        Assert.InRange(result.Counters.Steps, 1, 100);
    }

    /// <summary>Gas so fast that its storage is left out: seen from both sides of the bore from which that is so.</summary>
    [Fact]
    public void Where_the_storage_of_gas_is_left_out_the_time_does_not_jump()
    {
        (double slow, double fast) = (0.04, 0.05);
        while (fast - slow > 1e-9)
        {
            double middle = (slow + fast) / 2;
            (slow, fast) = Jobs.Run(Vented(middle)).Counters.Steps > 100 ? (middle, fast) : (slow, middle);
        }

        (DrainResult stored, DrainResult left) = (Jobs.Run(Vented(slow)), Jobs.Run(Vented(fast)));
        Assert.True(stored.Counters.Steps > 2 * left.Counters.Steps);
        Assert.Equal(stored.StoppedAt, left.StoppedAt, 1e-6 * stored.StoppedAt);
    }

    private static Job Vented(double bore) => Jobs.OrificeDrain() with
    {
        Headspace = new VentedHeadspace
        {
            Openings = [new VentOrifice { Bore = bore, DischargeCoefficient = VentCoefficient }],
        },
    };
}
