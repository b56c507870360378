using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Lines;
using DrainSim.Scenarios;
using DrainSim.Vessels;

namespace DrainSim.Tests.Scenarios;

/// <summary>What couples to the line, read from a scenario.</summary>
public sealed class PlantScenarioTests
{
    [Theory]
    [InlineData("open", typeof(OpenHeadspace))]
    [InlineData("closed", typeof(ClosedHeadspace))]
    [InlineData("{overpressure: 20 kPa}", typeof(HeldPressure))]
    [InlineData("{polytropic_exponent: 1.2}", typeof(ClosedHeadspace))]
    [InlineData("{vent: {bore: 50 mm}}", typeof(VentedHeadspace))]
    [InlineData("{vent: {bore: 50 mm, free_area: 0 %}}", typeof(ClosedHeadspace))]
    public void Every_headspace_is_read(string text, Type type) => Assert.IsType(type, JobOf(headspace: text).Headspace);

    [Fact]
    public void Openings_are_read_with_their_measures()
    {
        VentedHeadspace headspace = Assert.IsType<VentedHeadspace>(JobOf(headspace: """
            {polytropic_exponent: 1.1, initial_pressure: 103 kPa,
             vents: [{name: gooseneck, bore: 40 mm, length: 3 m, losses: 1.2, roughness: 0.05 mm}, {bore: 30 mm, coefficient: 0.8, free_area: 25 %}],
             relief_valve: {bore: 80 mm, set_pressure: 2 kPa, full_open_pressure: 3 kPa},
             vacuum_break: {bore: 100 mm, set_pressure: 0.3 kPa, full_open_pressure: 0.5 kPa, coefficient: 0.5}}
            """).Headspace);
        Assert.Equal((1.1, 103e3), (headspace.PolytropicExponent, headspace.InitialPressure));
        Opening[] expected =
        [
            new VentLine { Name = "gooseneck", Bore = 0.04, Length = 3, Losses = 1.2, Roughness = 0.05e-3 },
            new VentOrifice { Bore = 0.015, DischargeCoefficient = 0.8 },
            new ReliefValve { Bore = 0.08, SetPressure = 2e3, OpeningRise = 1e3 },
            new VacuumBreak { Bore = 0.1, SetPressure = 300, OpeningRise = 200, DischargeCoefficient = 0.5 },
        ];
        Assert.Equal(expected, headspace.Openings);
    }

    [Fact]
    public void Ratings_inflow_and_limits_are_read()
    {
        Job job = JobOf(tank: "vacuum_rating: 2 kPa, pressure_rating: 5 kPa, inflow: [{at: 0 s, flow: 1 L/s}, {at: 1 h, flow: 0 L/s}]", rest: """
            limits:
              drain_time: {at_least: 1 h, at_most: 3 h}
              left_volume: 50 L
              largest_flow: 4 L/s
              largest_velocity: 3 m/s
              fastest_fall: 0.5 m/h
              least_margin: 10 kPa
              largest_vacuum: 1 kPa
              receiver_level: 2 m
            """);
        Assert.Equal((2e3, 5e3), (job.VacuumRating!.Value, job.PressureRating!.Value));
        Assert.Equal([(0.0, 1e-3), (3600.0, 0.0)], job.Inflow!.Points);
        Assert.Equal(
            new JobLimits
            {
                DrainTimeAtLeast = 3600,
                DrainTimeAtMost = 3 * 3600,
                LeftVolume = 0.05,
                LargestFlow = 4e-3,
                LargestVelocity = 3,
                FastestFall = 0.5 / 3600,
                LeastMargin = 10e3,
                LargestVacuum = 1e3,
                ReceiverLevel = 2,
            },
            job.Limits);
    }

    [Fact]
    public void A_receiver_is_a_tank_with_the_elevation_of_its_bottom()
    {
        Job job = JobOf(rest: "receiver: {shape: vertical_cylinder, diameter: 2 m, height: 1 m, bottom_head: hemisphere, bottom: -3 m, level: 20 cm, brim: 1.5 m}");
        ReceivingTank tank = Assert.IsType<ReceivingTank>(job.DrawOffs[0].Receiver);
        Assert.Equal((-3, 0.2, 1.5), (tank.Bottom, tank.Level, tank.Brim));
        Assert.IsType<Hemisphere>(Assert.IsType<VerticalCylinder>(tank.Vessel).Bottom);
    }

    [Fact]
    public void Several_lines_are_read_each_with_its_receiver()
    {
        ScenarioDocument document = ScenarioDocument.FromText("""
            liquid: {name: water, temperature: 18 degC}
            tank: {shape: box, length: 2 m, width: 1 m, height: 2 m, level: 1.5 m}
            lines:
              - {name: drain, bore: 50 mm, material: pvc, inlet: {elevation: 0 m, facing: down, floor_clearance: 20 mm, air_draw: break}, path: [{name: leg, length: 1 m, rise: -1 m}]}
              - name: hose
                bore: 25 mm
                material: pvc
                air_break: 1.2 m
                vacuum_rating: 40 kPa
                inlet: {elevation: 1 m, facing: down}
                path: [{length: 1 m, rise: 1 m}, {name: leg, length: 4 m, rise: -4 m}]
                receiver: {surface: -1 m}
            """, "two.yaml", ".");
        Assert.Equal("", ProblemReport.Refusal(document.Read()));
        Job job = document.Read().Scenario!.Job;
        Assert.Equal(["drain", "hose"], job.DrawOffs.Select(drawOff => drawOff.Line.Name));
        Assert.Equal((0.02, AirDraw.Break), (job.Line.Inlet.FloorClearance!.Value, job.Line.Inlet.AirDraw));
        Assert.Equal((1.2, 40e3), (job.DrawOffs[1].Line.AirBreak!.Value, job.DrawOffs[1].Line.VacuumRating!.Value));
        Assert.Equal(new FixedSurface { Elevation = -1 }, job.DrawOffs[1].Receiver);
        Assert.Equal(0.032, document.With("lines.hose.bore", "32 mm").Read().Scenario!.Job.DrawOffs[1].Line.Bore, 1e-15);
        Assert.Equal(5, ((StraightRun)document.With("lines.hose.path.leg.length", "5 m").Read().Scenario!.Job.DrawOffs[1].Line.Path[1]).Length);
    }

    [Fact]
    public void What_a_tank_is_fitted_with_is_found_without_the_tank()
    {
        ScenarioDocument document = Document(headspace: "{vent: {bore: 50 mm}}");
        Assert.Equal(0.02, ((VentedHeadspace)document.With("headspace.vent.bore", "20 mm").Read().Scenario!.Job.Headspace).Openings[0].Bore, 1e-15);
        Assert.Equal(1e-3, document.With("inflow", "1 L/s").Read().Scenario!.Job.Inflow!.Flow(0), 1e-15);
    }

    [Fact]
    public void Acts_are_read_and_told()
    {
        Job job = JobOf(headspace: "{vent: {bore: 50 mm}}", rest: """
            timeline:
              - {at: 10 min, set: {line.path.valve.opening: 50 %}}
              - {at: 80 cm, text: the vent is blocked, set: {headspace.vent.free_area: 0 %, line.path.valve.opening: 100 %}}
            """);
        Assert.Equal((600, null), (job.Timeline[0].Time, job.Timeline[0].Level));
        Assert.Equal("line.path.valve.opening set to 50 %", job.Timeline[0].Text);
        Assert.Equal((null, 0.8, "the vent is blocked"), (job.Timeline[1].Time, job.Timeline[1].Level, job.Timeline[1].Text));
        Job half = job.Timeline[0].ChangeOf(job, job), blocked = job.Timeline[1].ChangeOf(half, job);
        Assert.Equal(0.5, ((Valve)half.Line.Path[0]).Opening);
        Assert.Equal(1, ((Valve)blocked.Line.Path[0]).Opening);
        Assert.IsType<VentedHeadspace>(half.Headspace);
        Assert.IsType<ClosedHeadspace>(blocked.Headspace);
    }

    [Fact]
    public void An_act_does_not_undo_what_it_does_not_name()
    {
        Job job = JobOf(rest: "timeline: [{at: 10 min, set: {line.path.valve.opening: 50 %}}]");
        PathItem leg = ((StraightRun)job.Line.Path[1]) with { Length = 3, Rise = -3 };
        Job lowered = job with { DrawOffs = [job.DrawOffs[0] with { Line = job.Line with { Path = [job.Line.Path[0], leg] } }] };
        Assert.Equal(leg, job.Timeline[0].ChangeOf(lowered, job).Line.Path[1]);
    }

    [Theory]
    [InlineData("2031-05-04 06:30 +02:00", 2)]
    [InlineData("2031-05-04T06:30:00+02:00", 2)]
    [InlineData("2031-05-04 06:30Z", 0)]
    public void The_clock_is_read_with_its_zone(string text, int hours) =>
        Assert.Equal(new DateTimeOffset(2031, 5, 4, 6, 30, 0, TimeSpan.FromHours(hours)),
            Document(rest: $"run: {{begins: {text}}}").Read().Scenario!.Begins);

    private static Job JobOf(string headspace = "open", string tank = "pressure_rating: 9 kPa", string rest = "")
    {
        ScenarioReading reading = Document(headspace, tank, rest).Read();
        Assert.Equal("", ProblemReport.Refusal(reading));
        return reading.Scenario!.Job;
    }

    private static ScenarioDocument Document(string headspace = "open", string tank = "pressure_rating: 9 kPa", string rest = "") =>
        ScenarioDocument.FromText($$"""
            liquid: {name: water, temperature: 18 degC}
            tank: {shape: box, length: 2 m, width: 1 m, height: 2 m, level: 1.5 m, headspace: {{headspace}}, {{tank}}}
            line:
              bore: 38 mm
              material: pvc
              inlet: {elevation: 0 m, facing: up}
              path:
                - {valve: ball, name: valve, opening: 100 %}
                - {name: leg, length: 1 m, rise: -1 m}
            {{rest}}
            """, "plant.yaml", ".");
}
