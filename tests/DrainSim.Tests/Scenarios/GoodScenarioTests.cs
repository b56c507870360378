using System.Globalization;
using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Lines;
using DrainSim.Liquids;
using DrainSim.Scenarios;
using DrainSim.Vessels;

namespace DrainSim.Tests.Scenarios;

public sealed class GoodScenarioTests
{
    private static ScenarioReading Read(string text) => ScenarioReader.ReadText(text, "yard/rinse.yaml", ".");

    [Fact]
    public void The_job_is_the_one_built_by_hand()
    {
        ScenarioReading reading = Read(GoodScenario.Text);
        Assert.Equal("", ProblemReport.Refusal(reading));
        Job job = reading.Scenario!.Job;
        Assert.Equal(LiquidLibrary.Find("water")!.At(291.15).Liquid, job.Liquid);
        Assert.Equal(new Site { AtmosphericPressure = StandardAtmosphere.Pressure(120) }, job.Site);
        Assert.Equal(new VerticalCylinder { Diameter = 2.4, ShellHeight = 3, Bottom = new Flat(), Top = new Flat() }, job.Vessel);
        Assert.Equal(2.6, job.Level);
        Assert.Equal(new Inlet { Elevation = 0.05, Facing = InletFacing.Down, EdgeLoss = EdgeTable.Find("re_entrant")!.Loss }, job.Line.Inlet);
        Assert.Equal(new RunSettings { Until = 43200 }, job.Run);
        Assert.Null(job.ReceiverSurface);
        PathItem[] expected =
        [
            new StraightRun { Name = "inner_leg", Length = 3.2, Rise = 3.15 - 0.05 },
            new Fitting { Kind = FittingTable.Find("bend_90")!, Count = 2 },
            new StraightRun { Name = "outer_leg", Length = 6.0, Rise = -1.5 - 3.15 },
            new Valve { Name = "outlet_valve", Kind = ValveTable.Find("ball")!, Opening = 1 },
        ];
        Assert.Equal(expected, job.Line.Path);
        Assert.Equal((0.038, MaterialTable.Find("smooth_hose")!.Roughness, 1), (job.Line.Bore, job.Line.Roughness, job.Line.Parallel));
    }

    [Fact]
    public void The_name_is_that_of_the_file_and_stands_for_a_missing_title()
    {
        Scenario scenario = Read(GoodScenario.With("title: Rinse tank over the rim into the yard sump", "notes: none")).Scenario!;
        Assert.Equal(("rinse", "rinse", "none"), (scenario.Name, scenario.Title, scenario.Notes));
    }

    [Fact]
    public void Nothing_is_suspicious_in_a_plain_scenario() => Assert.Empty(Read(GoodScenario.Text).Warnings);

    [Fact]
    public void A_decimal_comma_of_the_machine_changes_nothing()
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        string refused = ProblemReport.Refusal(Read(GoodScenario.With("12 h", "12.5 H")));
        UnderstoodValue[] understood = [.. Read(GoodScenario.Text).Scenario!.Understood];
        try
        {
            // A culture made by hand, since the program runs without the system's own.
            CultureInfo comma = (CultureInfo)CultureInfo.InvariantCulture.Clone();
            comma.NumberFormat.NumberDecimalSeparator = ",";
            comma.NumberFormat.NumberGroupSeparator = ".";
            comma.NumberFormat.NegativeSign = "−";
            CultureInfo.CurrentCulture = comma;
            Assert.Equal(refused, ProblemReport.Refusal(Read(GoodScenario.With("12 h", "12.5 H"))));
            Assert.Equal(understood, Read(GoodScenario.Text).Scenario!.Understood);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Everything_understood_is_echoed_with_its_defaults()
    {
        string text = string.Concat(Read(GoodScenario.Text).Scenario!.Understood.Select(value => string.Create(
            CultureInfo.InvariantCulture, $"{value.Path} = {value.Value} {value.Unit} | {value.Written}{(value.IsDefault ? " (default)" : "")}\n")));
        ApprovedText.Matches("understood", text);
    }

    [Fact]
    public void Other_units_give_the_same_job()
    {
        string text = GoodScenario.Text.Replace("2.4 m", "240 cm", StringComparison.Ordinal).Replace("2.6 m", "2600 mm", StringComparison.Ordinal)
            .Replace("12 h", "720 min", StringComparison.Ordinal).Replace("18 degC", "64.4 degF", StringComparison.Ordinal);
        Job job = Read(text).Scenario!.Job;
        Job metric = Read(GoodScenario.Text).Scenario!.Job;
        Assert.Equal(metric.Run, job.Run);
        Assert.Equal(metric.Level, job.Level, 1e-15);
        Assert.Equal(metric.Liquid.Density, job.Liquid.Density, 1e-9);
    }

    [Theory]
    [InlineData("shape: vertical_cylinder, diameter: 2 m, height: 2 m, bottom: torispherical, top: ellipsoidal", "VerticalCylinder")]
    [InlineData("shape: vertical_cylinder, diameter: 2 m, height: 2 m, bottom: {shape: cone, depth: 0.5 m}, top: hemisphere", "VerticalCylinder")]
    [InlineData("shape: vertical_cylinder, diameter: 2 m, height: 2 m, bottom: {shape: cone, angle: 90 deg}, top: {shape: flat}", "VerticalCylinder")]
    [InlineData("shape: vertical_cylinder, diameter: 2 m, height: 2 m, bottom: {shape: torispherical, crown_radius: 2 m, knuckle_radius: 0.2 m}", "VerticalCylinder")]
    [InlineData("shape: vertical_cylinder, diameter: 2 m, height: 2 m, bottom: {shape: torispherical, proportions: korbbogen}", "VerticalCylinder")]
    [InlineData("shape: horizontal_cylinder, diameter: 2 m, length: 4 m", "HorizontalCylinder")]
    [InlineData("shape: horizontal_cylinder, diameter: 2 m, length: 4 m, heads: kloepper", "HorizontalCylinder")]
    [InlineData("shape: horizontal_cylinder, diameter: 2 m, length: 4 m, heads: [flat, {shape: ellipsoidal, depth: 0.4 m}]", "HorizontalCylinder")]
    [InlineData("shape: sphere, diameter: 2 m", "Sphere")]
    [InlineData("shape: box, length: 2 m, width: 1 m, height: 1.5 m", "Box")]
    [InlineData("shape: cone, bottom_diameter: 0 m, top_diameter: 2 m, height: 1.5 m", "Cone")]
    [InlineData("shape: basin, bottom_length: 20 m, bottom_width: 10 m, side_slope: 2, depth: 3 m", "Basin")]
    [InlineData("shape: stack, sections: [{shape: cone, bottom_diameter: 0.2 m, top_diameter: 2 m, height: 0.5 m}, {name: shell, shape: vertical_cylinder, diameter: 2 m, height: 3 m}]", "Stack")]
    public void Every_shape_is_read_and_filled_by_share(string tank, string type)
    {
        ScenarioReading reading = Read($$"""
            liquid: {name: water, temperature: 10 degC}
            tank: { {{tank}}, fill: 50 %}
            line: {bore: 50 mm, material: pvc, inlet: {elevation: 0 m, facing: up}, path: [{length: 1 m, rise: -1 m}]}
            """);
        Assert.Equal("", ProblemReport.Refusal(reading));
        Job job = reading.Scenario!.Job;
        Assert.Equal(type, job.Vessel.GetType().Name);
        Assert.Equal(0.5, job.Vessel.Volume(job.Level) / job.Vessel.Capacity, 1e-12);
    }

    [Fact]
    public void A_strapping_table_is_read_in_the_units_of_its_header()
    {
        ScenarioReading reading = ScenarioReader.ReadText("""
            liquid: {name: water, temperature: 10 degC}
            tank: {shape: table, file: tables/strapping.csv, contents: 500 L}
            line: {bore: 50 mm, material: pvc, inlet: {elevation: 0 m, facing: up}, path: [{length: 1 m, rise: -1 m}]}
            """, "table.yaml", ApprovedText.Beside("Hostile"));
        Assert.Equal("", ProblemReport.Refusal(reading));
        Assert.Equal(
            new StrappingTable { Rows = [(0, 0), (0.25, 0.5), (0.5, 1.1), (1, 2.4)] },
            reading.Scenario!.Job.Vessel);
        Assert.Equal(0.25, reading.Scenario.Job.Level, 1e-12);
    }

    [Fact]
    public void Every_key_of_a_line_and_a_run_is_read()
    {
        ScenarioReading reading = Read("""
            liquid: {density: 0.9 kg/L, kinematic_viscosity: 46 cSt, vapour_pressure: 0 Pa, name: my oil}
            site: {atmospheric_pressure: 99.9 kPa, gravity: 9.81 m/s2}
            tank: {shape: box, length: 2 m, width: 1 m, height: 1.5 m, contents: 2 m3}
            line:
              size: DN50
              schedule: 40
              roughness: 0.05 mm
              parallel: 3
              at_vapour: limit
              least_pressure: 30 kPa
              start: primed
              inlet: {elevation: 10 cm, facing: side, loss: 0.4}
              path:
                - {length: 1 m, rise: 0 m, roughness: 0.1 mm}
                - {reducer: cone, angle: 20 deg, bore: 25 mm}
                - {valve: gate, cv: 10, opening: 0.5}
                - {valve: gate, kv: 10}
                - {loss: 2.5, name: screen}
                - {length: 2 m, to: -1 m, bore: 1 1/2 in, material: pvc}
            receiver: {surface: -0.4 m}
            run: {until: 1 d, stop_at_level: 20 cm, settled_within: 2 mm, report_every: 30 s, units: us, tolerance: 1e-9}
            """);
        Assert.Equal("", ProblemReport.Refusal(reading));
        Job job = reading.Scenario!.Job;
        Assert.Equal(900, job.Liquid.Density, 1e-9);
        Assert.Equal(900 * 46e-6, job.Liquid.Viscosity, 1e-12);
        Assert.Equal((99900.0, 9.81), (job.Site.AtmosphericPressure, job.Site.Gravity));
        Assert.Equal((SizeTable.Find("DN50", "40")!.Bore, 3, AtVapour.Limit, 30e3), (job.Line.Bore, job.Line.Parallel, job.Line.AtVapour, job.Line.LeastPressure));
        Assert.Equal(new Inlet { Elevation = 0.1, Facing = InletFacing.Side, EdgeLoss = 0.4 }, job.Line.Inlet);
        Assert.Equal(0.1e-3, Assert.IsType<StraightRun>(job.Line.Path[0]).Roughness);
        Assert.Equal(new Reducer { Angle = 20 * (Math.PI / 180), Bore = 0.025 }, job.Line.Path[1]);
        Assert.Equal((10 * FlowCoefficient.KvPerCv, 0.5), (((Valve)job.Line.Path[2]).FlowCoefficient, ((Valve)job.Line.Path[2]).Opening));
        Assert.Equal(10, ((Valve)job.Line.Path[3]).FlowCoefficient);
        Assert.Equal(new PlainLoss { Coefficient = 2.5, Name = "screen" }, job.Line.Path[4]);
        Assert.Equal(-1.1, ((StraightRun)job.Line.Path[5]).Rise, 1e-15);
        Assert.Equal(0.0381, job.Line.Path[5].Bore!.Value, 1e-15);
        Assert.Equal(-0.4, job.ReceiverSurface);
        Assert.Equal(new RunSettings { Until = 86400, StopAtLevel = 0.2, SettledWithin = 2e-3, ReportEvery = 30, Tolerance = 1e-9 }, job.Run);
        Assert.Equal(ResultUnits.Us, reading.Scenario.Units);
    }

    [Fact]
    public void Every_rheology_is_read_without_a_viscosity()
    {
        Assert.Equal(new PowerLaw { Consistency = 2.5, FlowIndex = 0.6 }, Of("model: power_law, consistency: 2500 mPa.s^n, flow_index: 60 %"));
        Assert.Equal(new Bingham { YieldStress = 12, PlasticViscosity = 0.04 }, Of("model: bingham, yield_stress: 120 dyn/cm2, plastic_viscosity: 40 cP"));
        Assert.Equal(new HerschelBulkley { YieldStress = 3, Consistency = 0.5, FlowIndex = 0.4 },
            Of("model: herschel_bulkley, yield_stress: 3 Pa, consistency: 0.5 Pa s^n, flow_index: 0.4"));
        Assert.Equal(new Newtonian(), Read(GoodScenario.With("temperature: 18 degC", "temperature: 18 degC\n  rheology: {model: newtonian}")).Scenario!.Job.Liquid.Rheology);

        static Rheology Of(string rheology)
        {
            ScenarioReading reading = Read(GoodScenario.With(
                "  name: water\n  temperature: 18 degC", $"  density: 1100 kg/m3\n  vapour_pressure: 2 kPa\n  rheology: {{{rheology}}}"));
            Assert.Equal("", ProblemReport.Refusal(reading));
            return reading.Scenario!.Job.Liquid.Rheology;
        }
    }

    [Fact]
    public void A_front_in_the_outer_leg_is_read()
    {
        ScenarioReading reading = Read(GoodScenario.With("  inlet: {", "  start: {front: 120 cm}\n  inlet: {"));
        Assert.Equal("", ProblemReport.Refusal(reading));
        Assert.Equal(1.2, reading.Scenario!.Job.DrawOffs[0].Front);
        Assert.Null(Read(GoodScenario.With("  inlet: {", "  start: primed\n  inlet: {")).Scenario!.Job.DrawOffs[0].Front);
    }

    [Fact]
    public void An_inlet_above_the_level_is_left_to_the_run() =>
        Assert.False(Read(GoodScenario.With("elevation: 50 mm", "elevation: 2.8 m")).IsRefused);

    [Theory]
    [InlineData("down", "re_entrant")]
    [InlineData("up", "flush")]
    [InlineData("side", "flush")]
    public void The_usual_edge_follows_the_facing(string facing, string edge)
    {
        Scenario scenario = Read(GoodScenario.With("facing: down, edge: re_entrant", "facing: " + facing)).Scenario!;
        Assert.Equal(EdgeTable.Find(edge)!.Loss, scenario.Job.Line.Inlet.EdgeLoss);
    }
}
