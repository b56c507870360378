using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Vessels;
using MathNet.Numerics;

namespace DrainSim.Tests.Draining;

/// <summary>Drain times against closed forms; 1e-6 of the time is the accuracy that the program promises.</summary>
public sealed class ClosedFormTests
{
    private const double Promise = 1e-6;
    private const double G = Site.StandardGravity;

    /// <summary>√h = √h₀ − Cd·(a/A)·√(g/2)·t.</summary>
    [Theory]
    [InlineData(3.0, 0.5)]
    [InlineData(5.0, 0.0)]
    [InlineData(0.4, 0.01)]
    public void A_prism_falls_by_the_square_root_law_through_an_orifice(double from, double to)
    {
        const double area = 3.2, bore = 0.05, cd = 0.6;
        Job job = Drain(Jobs.Prism(area, 6), from, to, bore, cd);
        double time = 2 * area * (Math.Sqrt(from) - Math.Sqrt(to)) / (cd * Area(bore) * Math.Sqrt(2 * G));
        AssertTime(time, Jobs.Run(job));
    }

    /// <summary>t = π(2/3·D·h^1.5 − 2/5·h^2.5)/(Cd·a·√2g).</summary>
    [Fact]
    public void A_sphere_empties_in_the_closed_time()
    {
        const double d = 3, h = 2.75, bore = 0.03, cd = 0.55;
        Job job = Drain(new Sphere { Diameter = d }, h, 0, bore, cd);
        double time = Math.PI * (2.0 / 3 * d * Math.Pow(h, 1.5) - 2.0 / 5 * Math.Pow(h, 2.5))
            / (cd * Area(bore) * Math.Sqrt(2 * G));
        AssertTime(time, Jobs.Run(job));
    }

    /// <summary>A cone of slope s = r/h on its point: t = 2/5·π·s²·h^2.5/(Cd·a·√2g).</summary>
    [Fact]
    public void A_pointed_cone_empties_in_the_closed_time()
    {
        const double h = 1.6, bore = 0.04, cd = 0.62, slope = 0.5;
        var cone = new Cone { BottomDiameter = 0, TopDiameter = 4 * slope, ConeHeight = 2 };
        double time = 0.4 * Math.PI * slope * slope * Math.Pow(h, 2.5) / (cd * Area(bore) * Math.Sqrt(2 * G));
        AssertTime(time, Jobs.Run(Drain(cone, h, 0, bore, cd)));
    }

    /// <summary>t = 4L[D^1.5 − (D − h₀)^1.5]/(3·Cd·a·√2g).</summary>
    [Fact]
    public void A_lying_cylinder_empties_in_the_closed_time()
    {
        const double d = 2, length = 6, h = 1.5, bore = 0.08, cd = 0.62;
        var tank = new HorizontalCylinder { Diameter = d, Length = length, FirstHead = new Flat(), SecondHead = new Flat() };
        double time = 4 * length * (Math.Pow(d, 1.5) - Math.Pow(d - h, 1.5)) / (3 * cd * Area(bore) * Math.Sqrt(2 * G));
        AssertTime(time, Jobs.Run(Drain(tank, h, 0, bore, cd)));
    }

    /// <summary>A pipe of constant loss: the orifice law with the head counted from the outlet.</summary>
    [Fact]
    public void A_dropping_pipe_of_constant_loss_empties_in_the_closed_time()
    {
        const double area = 2.0, bore = 0.04, drop = 1.5, k = 12.5, h = 2.4;
        Job job = Drain(Jobs.Prism(area, 3), h, 0, bore, 1) with
        {
            DrawOffs = Jobs.Only(Jobs.Orifice(bore, 1) with
            {
                Roughness = 1e-4, // so rough for the inviscid liquid that the friction factor no longer varies
                Path = [new PlainLoss { Coefficient = k }, new StraightRun { Length = drop, Rise = -drop }],
            }),
            Liquid = Jobs.Inviscid,
        };
        var hydraulics = new LineHydraulics(job.Line, job.Liquid, G);
        double speed = hydraulics.Flow(1, 0);
        double time = 2 * area * (Math.Sqrt(h + drop) - Math.Sqrt(drop)) / speed;
        AssertTime(time, Jobs.Run(job));
    }

    /// <summary>Poiseuille flow alone: t = ln(1 + Z₀/h)/C, C = ρ·g·d⁴/(32·μ·L·D²).</summary>
    [Fact]
    public void A_capillary_empties_a_tank_exponentially()
    {
        const double d = 0.004, length = 2.0, tank = 0.3, z = 0.5;
        var oil = Jobs.Water with { Density = 900, Viscosity = 5 };
        Job job = new()
        {
            Liquid = oil,
            Vessel = Jobs.Cylinder(tank, 1),
            Level = z,
            DrawOffs = Jobs.Only(Jobs.Orifice(d, 1) with { Path = [new StraightRun { Length = length, Rise = -length }] }),
            Run = new RunSettings { Until = 1e9 },
        };
        double c = oil.Density * G * Math.Pow(d, 4) / (32 * oil.Viscosity * length * tank * tank);
        AssertTime(Math.Log(1 + z / length) / c, Jobs.Run(job));
    }

    /// <summary>Towards a fixed receiving surface the square-root law holds for the difference of the surfaces.</summary>
    [Fact]
    public void A_tank_levels_with_a_fixed_surface_in_the_closed_time()
    {
        const double area = 1.5, bore = 0.05, cd = 0.7, surface = 0.8, h = 2.0, settled = 1e-3;
        Job job = Drain(Jobs.Prism(area, 3), h, 0, bore, cd) with
        {
            DrawOffs = Jobs.Only(Jobs.Orifice(bore, cd), surface),
            Run = new RunSettings { SettledWithin = settled },
        };
        double time = 2 * area * (Math.Sqrt(h - surface) - Math.Sqrt(settled)) / (cd * Area(bore) * Math.Sqrt(2 * G));
        DrainResult result = Jobs.Run(job);
        Assert.Equal(Outcome.Levelled, result.Outcome);
        Assert.Equal(surface + settled, result.FinalLevel, 1e-9);
        AssertTime(time, result);
    }

    /// <summary>t = ∫ A·dh/Q over the very same line, by adaptive Gauss–Kronrod quadrature.</summary>
    [Fact]
    public void A_siphon_agrees_with_the_quadrature_of_its_own_flow()
    {
        Job job = Jobs.Siphon();
        var line = new LineHydraulics(job.Line, job.Liquid, G);
        double area = job.Vessel.Area(1);
        double time = Integrate.GaussKronrod(h => area / line.Flow(h - line.OutletElevation, 0), 0.12, 2.2, 1e-12);
        DrainResult result = Jobs.Run(job);
        Assert.Equal(Outcome.InletUncovered, result.Outcome);
        AssertTime(time, result);
    }

    private static Job Drain(Vessel vessel, double from, double to, double bore, double cd) => new()
    {
        Liquid = Jobs.Inviscid,
        Vessel = vessel,
        Level = from,
        DrawOffs = Jobs.Only(Jobs.Orifice(bore, cd)),
        Run = new RunSettings { StopAtLevel = to > 0 ? to : null, SettledWithin = 0 },
    };

    private static double Area(double bore) => Math.PI * bore * bore / 4;

    private static void AssertTime(double expected, DrainResult result) =>
        Assert.InRange(result.StoppedAt / expected - 1, -Promise, Promise);
}
