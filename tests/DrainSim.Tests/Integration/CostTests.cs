using DrainSim.Integration;
using DrainSim.Tests.Integration.Problems;

namespace DrainSim.Tests.Integration;

/// <summary>What runs cost, in derivatives. The bounds are regression values measured here, not outside figures.</summary>
public sealed class CostTests
{
    [Theory]
    [InlineData(1.0 / 2)]
    [InlineData(4.0 / 7)]
    [InlineData(1.0 / 6)]
    public void A_siphon_run_with_its_tenths_costs_at_most_forty_four_derivatives(double exponent)
    {
        PowerDrain siphon = new(exponent, 1e-3, 4.1);   // head over the outlet, m; the inlet uncovers at 1.55 m
        for (int tenth = 1; tenth < 10; tenth++)
        {
            double head = 4.1 - 0.255 * tenth;
            siphon.When((_, y, _) => y[0] - head, EventAction.Record);
        }
        siphon.When((_, y, _) => y[0] - 1.55, EventAction.Stop);
        IntegrationResult result = siphon.Solve(43_200).Result;
        Assert.Equal(10, result.Events.Length);
        Assert.All(result.Events, e => Assert.Equal(siphon.TimeAt(e.State[0]), e.Time, 1e-7 * result.EndTime));
        Assert.InRange(result.Counters.DerivativeEvaluations, 1, 44);
        Assert.Equal(0, result.Counters.RejectedSteps);
    }

    [Theory]
    [InlineData(1e-3, 230)]
    [InlineData(0, 390)]
    public void A_drain_towards_its_square_root_end_costs_no_more_than_before(double rest, int derivatives)
    {
        PowerDrain drain = new PowerDrain(0.5, 1e-3, 4.1).When((_, y, _) => y[0] - rest, EventAction.Stop);
        IntegrationCounters counters = drain.Solve(43_200).Result.Counters;
        Assert.InRange(counters.DerivativeEvaluations, 1, derivatives);
        Assert.Equal(0, counters.RejectedSteps);
    }

    [Fact]
    public void Locating_an_event_calls_no_derivative_and_few_event_functions()
    {
        Logistic plain = new Logistic().When((_, y, _) => y[0] - 2, EventAction.Record);
        Logistic crossed = new Logistic().When((_, y, _) => y[0] - 0.5, EventAction.Record);
        IntegrationCounters none = plain.Solve(9).Result.Counters;
        IntegrationCounters one = crossed.Solve(9).Result.Counters;
        Assert.Equal(none.DerivativeEvaluations, one.DerivativeEvaluations);
        Assert.InRange(one.EventEvaluations - none.EventEvaluations, 1, 10);
    }
}
