using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Lines;
using DrainSim.Lines.Inlets;
using DrainSim.Liquids;
using DrainSim.Tests.Draining;
using DrainSim.Vessels;

namespace DrainSim.Tests.Published;

/// <summary>Rules of standards and agencies that a run of the whole job has to agree with.</summary>
public sealed class TradeRulesTests
{
    /// <summary>
    /// API Standard 2000, 7th edition (2014), as quoted on secondary pages: emptying draws in 1 m³ of air at 0 °C and 1 atm, per m³ of
    /// liquid; the 5th edition's 5.6 scf per 42 gal barrel is 0.94. At 20 °C the liquid leaves room for 0.93 of that: hence 0.9 to 1.
    /// </summary>
    [Fact]
    public void A_tank_with_a_wide_vent_breathes_as_much_air_as_the_rule_for_emptying()
    {
        // Cold oil: hardly any vapour of its own fills the space.
        Job job = Jobs.Siphon() with
        {
            Liquid = Jobs.Water with { VapourPressure = 0 },
            Headspace = new VentedHeadspace { Openings = [new VentOrifice { Bore = 0.2 }] },
        };
        DrainResult result = Jobs.Run(job);
        const double AirConstant = 287.05;
        double before = job.Vessel.Capacity - result.InitialVolume, after = job.Vessel.Capacity - result.LeftVolume;
        double drawn = (result.HeadspacePressure!.Value * after - job.Site.AtmosphericPressure * before) / (AirConstant * job.Liquid.Temperature);
        double normal = drawn * AirConstant * 273.15 / 101325;
        Assert.InRange(normal / result.DrainedVolume, 0.9, 1.0);
    }

    /// <summary>
    /// California Code of Regulations, Title 8, section 5592(b): a normal vent at least as large as the larger of the fill and withdrawal
    /// connections. The rule is taken to say that such a vent hardly holds the draining back; 0.5 % is ours.
    /// </summary>
    [Fact]
    public void A_vent_as_wide_as_the_drain_hardly_delays_it()
    {
        Job open = Jobs.OrificeDrain(bore: 0.08);
        Job vented = open with { Headspace = new VentedHeadspace { Openings = [new VentOrifice { Bore = 0.08 }] } };
        DrainResult result = Jobs.Run(vented);
        Assert.InRange(result.LargestVacuum!.Value.Value, 1, 500);
        Assert.Equal(Jobs.Run(open).StoppedAt, result.StoppedAt, 0.005 * result.StoppedAt);
    }

    /// <summary>
    /// FEMA 484, Technical Manual: Conduits through Embankment Dams (2005), siphon section: a dam siphon drains 20 to 25 ft of depth,
    /// in practice. Ours, the limit without losses or wave, must lie above that and below the barometer's 34 ft.
    /// </summary>
    [Fact]
    public void A_dam_siphon_reaches_at_least_as_deep_as_practice_says() =>
        Assert.InRange(LiftLimit(288.15) / 0.3048, 25, 34);

    /// <summary>
    /// McNally Institute, technical paper 15-12: warm cooling water is siphoned no higher than 26 to 28 ft, theory 33.96 ft. At 50 °C the
    /// vapour alone takes the limit to within that practice's upper end and the theory.
    /// </summary>
    [Fact]
    public void Warm_water_lifts_less_high() => Assert.InRange(LiftLimit(323.15) / 0.3048, 28, 31);

    /// <summary>
    /// ASDSO Dam Safety Toolbox, citing Morrison Maierle (2012): three 18 in HDPE siphons carried at most 60 cfs together, and vortices
    /// began when some 16 ft were left to lift. The bore is taken as nominal: 3.45 m/s, Froude 1.63, and by ANSI/HI 9.8 2.17 m
    /// (7 ft) of submergence. Inlet depth and length are not given: an order of magnitude.
    /// </summary>
    [Fact]
    public void Three_large_dam_siphons_need_some_two_metres_over_their_inlets()
    {
        const double Foot = 0.3048, Bore = 18 * 0.0254;
        double velocity = 60 * Foot * Foot * Foot / 3 / (Math.PI / 4 * Bore * Bore);
        Assert.Equal(3.45, velocity, 0.01);
        Assert.Equal(2.17, SubmergenceTable.Find("hi_9_8")!.Depth(velocity, Bore, 9.81), 0.02);
        Job job = new()
        {
            Liquid = Jobs.Water,
            Vessel = new Basin { BottomLength = 100, BottomWidth = 60, SideSlope = 3, Depth = 8 },
            Level = 7.5,
            DrawOffs = Jobs.Only(new Line
            {
                Bore = Bore,
                Roughness = 1e-5,
                Parallel = 3,
                Inlet = new Inlet { Elevation = 1.5, EdgeLoss = 0.5 },
                Path = [new StraightRun { Length = 20, Rise = 7 }, new StraightRun { Length = 40, Rise = -7.5 }],
            }),
        };
        DrainResult result = Jobs.Run(job);
        Assert.InRange(result.LargestVelocity.Value, 3.45 / 2, 2 * 3.45);
        DrainEvent air = result.Events.First(e => e.Code == EventCode.AirMayBeDrawn);
        Assert.InRange(air.Number, 2.17 / 2, 2 * 2.17);
    }

    /// <summary>
    /// Laboratory tests reported by IWA Publishing, table view 3238922 (title not shown): a short drowned siphon conduit has an overall
    /// coefficient of 0.623 to 0.687. Conduit and bends are not shown: a short line of usual edges and two bends must lie there.
    /// </summary>
    [Fact]
    public void A_short_drowned_siphon_has_the_measured_coefficient()
    {
        const double Bore = 0.1;
        LineHydraulics line = new(new Line
        {
            Bore = Bore,
            Roughness = 0,
            Inlet = new Inlet { Elevation = 0, Facing = InletFacing.Down, EdgeLoss = EdgeTable.Find("flush")!.Loss },
            Path =
            [
                new StraightRun { Length = 0.3, Rise = 0.3 },
                new Fitting { Kind = FittingTable.Find("bend_90")! , Count = 2 },
                new StraightRun { Length = 0.6, Rise = -0.6 },
            ],
        }, Jobs.Water, Site.StandardGravity);
        double head = 6 * Bore; // five to six conduit heights, as tested
        double coefficient = line.Flow(head, 0) / (Math.PI / 4 * Bore * Bore * Math.Sqrt(2 * Site.StandardGravity * head));
        Assert.InRange(coefficient, 0.6, 0.72);
    }

    private static double LiftLimit(double temperature) => Simulation.Begin(
        Jobs.Siphon() with { Liquid = LiquidLibrary.Find("water")!.At(temperature).Liquid! }).Prime!.LiftLimit;
}
