using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Published;

/// <summary>
/// Results that hydraulics texts share, derived again, with numbers chosen here: not published values. The tank with an inflow:
/// t = (2A/K²)·[K(√H₁ − √H₂) + Qi·ln((Qi − K√H₁)/(Qi − K√H₂))], K = Cd·a·√2g (from memory), 488.8 s and 0.336 m to
/// four and three digits, hence 0.1 % and half a millimetre. The sealed tank: p₀V₀/(V₀ + A·x) + ρg(h₀ − x) = p_atm,
/// 0.041 m and −17.2 kPa, hence half a unit of the last digit; its gas carries no vapour.
/// </summary>
public sealed class HydraulicsTextbookTests
{
    private static readonly Job FedTank = BookDrains.Of(Jobs.Prism(4, 4), 3, Jobs.Orifice(0.08, 0.62), 1.5) with
    {
        Inflow = Inflow.Constant(0.008),
    };

    private static readonly Job SealedTank = BookDrains.Of(Jobs.Prism(1, 2), 1.8, Jobs.Orifice(0.05, 0.62)) with
    {
        Liquid = BookDrains.Thin with { VapourPressure = 0 },
        Headspace = new ClosedHeadspace(),
        Run = new RunSettings { SettledWithin = 1e-6 },
    };

    [Fact]
    public void The_fed_tank_falls_in_the_time_of_the_formula() => BookDrains.AssertTime(488.8, 1e-3, FedTank);

    [Fact]
    public void The_fed_tank_balances_at_the_level_of_the_formula() =>
        Assert.Equal(0.336, Jobs.Run(FedTank).BalanceLevel!.Value, 5e-4);

    [Fact]
    public void The_vacuum_stops_the_sealed_tank_after_41_mm()
    {
        DrainResult result = Jobs.Run(SealedTank);
        Assert.Equal(Outcome.VacuumHeld, result.Outcome);
        Assert.Equal(0.041, 1.8 - result.FinalLevel, 5e-4);
        Assert.Equal(-17.2e3, result.HeadspacePressure!.Value - 101325, 50.0);
    }
}
