using CsCheck;
using DrainSim.Gas;

namespace DrainSim.Tests.Gas;

public sealed class VentedHeadspaceTests
{
    private const double Atmosphere = 101325;
    private static readonly Surroundings Outside = new(Atmosphere, 293.15);

    private static readonly VentedHeadspace Tank = new()
    {
        Openings =
        [
            new VentOrifice { Bore = 0.02 },
            new VentLine { Bore = 0.03, Length = 4 },
            new ReliefValve { Bore = 0.1, SetPressure = 3000, OpeningRise = 500 },
            new VacuumBreak { Bore = 0.1, SetPressure = 300, OpeningRise = 100 },
        ],
    };

    [Fact]
    public void The_flow_is_the_sum_over_the_openings() =>
        Gen.Double[-5000, 5000].Sample(over =>
        {
            double sum = 0;
            double slopes = 0;
            foreach (Opening opening in Tank.Openings)
            {
                sum += opening.MassFlow(Atmosphere + over, Outside, out double own);
                slopes += own;
            }
            return Tank.MassFlow(Atmosphere + over, Outside, out double slope) == sum && slope == slopes;
        });

    [Fact]
    public void The_flow_never_rises_with_the_pressure() =>
        Gen.Select(Gen.Double[1e4, 2e5], Gen.Double[1e-4, 1e3]).Sample((pressure, more) =>
            Tank.MassFlow(pressure + more, Outside, out _) <= Tank.MassFlow(pressure, Outside, out _));

    [Fact]
    public void The_flow_and_the_steady_pressure_take_no_memory()
    {
        double sum = Walk();
        long before = GC.GetAllocatedBytesForCurrentThread();
        sum += Walk();
        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
        Assert.True(double.IsFinite(sum));
    }

    [Fact]
    public void A_vented_headspace_without_an_opening_is_refused() => Assert.Contains("at least 1",
        Assert.Throws<ArgumentOutOfRangeException>(() => new VentedHeadspace { Openings = [] }).Message, StringComparison.Ordinal);

    [Fact]
    public void A_list_changed_later_does_not_change_the_headspace()
    {
        List<Opening> openings = [new VentOrifice { Bore = 0.02 }];
        VentedHeadspace headspace = new() { Openings = openings };
        openings.Clear();
        Assert.Single(headspace.Openings);
    }

    private static double Walk()
    {
        double sum = 0;
        for (int over = -50; over < 50; over++)
            sum += Tank.MassFlow(Atmosphere + 100 * over, Outside, out double slope) + slope;
        return sum;
    }
}
