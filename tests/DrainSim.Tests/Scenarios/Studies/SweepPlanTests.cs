using DrainSim.Scenarios;
using DrainSim.Scenarios.Studies;

namespace DrainSim.Tests.Scenarios.Studies;

/// <summary>What a sweep reads: values, grids, tables, and what it says of bad ones.</summary>
public sealed class SweepPlanTests : IDisposable
{
    private const string Good = GoodScenario.Text + "\n";

    private readonly string folder = Directory.CreateTempSubdirectory("drainsim-test-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Theory]
    [InlineData("tank.level=1 m, 50 cm, 3 ft", "1;0.5;0.9144")]
    [InlineData("tank.level=1 m..2 m in 5", "1;1.25;1.5;1.75;2")]
    [InlineData("tank.level=100 cm..2 m in 3", "1;1.5;2")]
    [InlineData("line.bore=1 mm..1 m in 4 log", "0.001;0.01;0.1;1")]
    [InlineData("tank.level=2 m..1 m in 3", "2;1.5;1")]
    [InlineData("line.path.outlet_valve.opening=10 %..100 % in 2", "0.1;1")]
    [InlineData("line.path[2].count=1, 4", "1;4")]
    [InlineData("receiver.surface=-1 m..-0.5 m in 3", "-1;-0.75;-0.5")]
    public void Values_are_read_with_their_units(string vary, string expected)
    {
        SweepCases cases = Read(new StudyRequest { Vary = [vary] });
        double[] values = [.. Enumerable.Range(0, (int)cases.Count).Select(i => ValueOf(cases, i).Si)];
        double[] wanted = [.. expected.Split(';').Select(text => double.Parse(text, System.Globalization.CultureInfo.InvariantCulture))];
        Assert.Equal(wanted.Length, values.Length);
        Assert.All(wanted.Zip(values), pair => Assert.Equal(pair.First, pair.Second, 1e-12));
    }

    [Fact]
    public void A_grid_varies_its_last_parameter_fastest()
    {
        SweepCases cases = Read(new StudyRequest { Vary = ["line.material=smooth_hose, cast_iron", "tank.level=1 m, 2 m"] });
        var values = new ParameterValue[2];
        List<string> texts = [];
        for (int i = 0; i < cases.Count; i++)
        {
            cases.Read(i, values);
            texts.Add($"{values[0].Text} {values[1].Text}");
        }

        Assert.Equal(["smooth_hose 1 m", "smooth_hose 2 m", "cast_iron 1 m", "cast_iron 2 m"], texts);
    }

    [Fact]
    public void The_block_and_the_command_line_are_the_same_thing()
    {
        const string Block = """
            sweep:
              set: {tank.level: 2 m}
              vary:
                line.bore: [25 mm, 32 mm]
                line.path.outer_leg.length: 5 m..9 m in 3

            """;
        SweepCases block = Read(new StudyRequest(), Good + Block);
        SweepCases line = Read(new StudyRequest { Set = ["tank.level=2 m"], Vary = ["line.bore=25 mm, 32 mm", "line.path.outer_leg.length=5 m..9 m in 3"] });
        Assert.Equal(6, block.Count);
        Assert.Equal(block.Fingerprint(), line.Fingerprint());
        Assert.NotEqual(block.Fingerprint(), Read(new StudyRequest { Set = ["tank.level=2.1 m"], Vary = ["line.bore=25 mm, 32 mm", "line.path.outer_leg.length=5 m..9 m in 3"] }).Fingerprint());
        Assert.Equal(3, Read(new StudyRequest { Vary = ["line.bore=25 mm"] }, Good + Block).Count);
    }

    [Fact]
    public void A_file_with_blocks_of_studies_runs_as_if_they_were_not_there()
    {
        ScenarioReading reading = ScenarioReader.ReadText(Good + "sweep: {vary: {tank.level: 1 m..2 m in 3}}\nsize: {parameter: line.bore, target: drain_time = 1 h}\n", "rinse.yaml", ".");
        Assert.Empty(reading.Problems);
        Assert.Equal(2.6, reading.Scenario!.Job.Level);
    }

    [Fact]
    public void Rows_of_a_table_are_the_cases()
    {
        File.WriteAllText(Path.Combine(folder, "cases.csv"), "# a comment\nline.bore (mm),tank.level,line.material\n25,1.5 m,smooth_hose\n32,2 m,cast_iron\n");
        SweepCases cases = Read(new StudyRequest(), Good + "sweep: {cases: cases.csv}\n");
        var values = new ParameterValue[3];
        cases.Read(1, values);
        Assert.Equal((0.032, 2.0, "cast_iron"), (values[0].Si, values[1].Si, values[2].Text));
        Assert.Equal(["line.bore_m", "tank.level_m", "line.material"], cases.Scenario.Parameters.Select(parameter => parameter.Column));
    }

    [Theory]
    [InlineData("tank.levl=1 m", "rinse.yaml: tank.levl: no such parameter. The nearest are 'tank.level'")]
    [InlineData("line.path.outer_lag.length=1 m", "no such parameter. The nearest are 'line.path.outer_leg.length'")]
    [InlineData("tank=1 m", "no such parameter")]
    [InlineData("[[[[=1 m", "no such parameter")]
    [InlineData("tank..level=1 m", "no such parameter")]
    [InlineData("=1 m", "does not read PATH=VALUE")]
    [InlineData("tank.level", "does not read PATH=VALUE")]
    [InlineData("tank.level=", "does not read PATH=VALUE")]
    [InlineData("tank.level=1", "'1' has no unit")]
    [InlineData("tank.level=1,5 m", "'1' has no unit")]
    [InlineData("tank.level=1 m,,2 m", "has an empty value")]
    [InlineData("tank.level=1 m..2 m", "is no range")]
    [InlineData("tank.level=1 m..2 m in 1", "is no count of values")]
    [InlineData("tank.level=1 m..2 m in 99999999999999999999", "is no count of values")]
    [InlineData("tank.level=1 m..2 m in 3 ln", "is no range")]
    [InlineData("tank.level=1 m..NaN m in 3", "is not a finite number")]
    [InlineData("tank.level=1 m..2 kg in 3", "'2 kg'")]
    [InlineData("tank.level=0 m..2 m in 3 log", "both ends above 0")]
    [InlineData("line.material=a..b in 3", "a range needs numbers")]
    [InlineData("title\u0007=x", "no such parameter")]
    public void A_bad_value_is_refused_before_anything_runs(string vary, string said) =>
        Assert.Contains(said, Assert.Single(Refused(new StudyRequest { Vary = [vary] })), StringComparison.Ordinal);

    [Fact]
    public void A_grid_beyond_measure_or_no_values_at_all_are_refused()
    {
        Assert.Contains("makes 1e10 cases", Refused(new StudyRequest { Vary = ["tank.level=1 m..2 m in 100000", "line.bore=1 mm..2 mm in 100000"] }).Single(), StringComparison.Ordinal);
        Assert.Contains("nothing is varied", Refused(new StudyRequest()).Single(), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("", "the file is empty")]
    [InlineData("tank.level (m)\n", "has no rows")]
    [InlineData("tank.level (m),tank.level\n1,2 m\n", "stands twice")]
    [InlineData("tank.level (m),\n1,2\n", "has no title")]
    [InlineData("tank.level (m)\n1\nx\n", "cases.csv:3:1: tank.level: 'x m'")]
    [InlineData("tank.level (m)\n1e999\n", "is not a finite number")]
    [InlineData("tank.level\n\"1,5 m\"\n", "has a comma")]
    [InlineData("tank.level (m),line.bore (mm)\n1\n", "1 cells and the first line 2")]
    [InlineData("tank.level (m),line.bore (mm)\n1,\n", "the cell is empty")]
    [InlineData("tank.levl (m)\n1\n", "The nearest are 'tank.level'")]
    [InlineData("tank.level (parsec)\n1\n", "parsec")]
    public void A_bad_table_is_refused_before_anything_runs(string csv, string said)
    {
        File.WriteAllText(Path.Combine(folder, "cases.csv"), csv);
        Assert.Contains(said, string.Join('\n', Refused(new StudyRequest { Cases = Path.Combine(folder, "cases.csv") })), StringComparison.Ordinal);
    }

    [Fact]
    public void A_table_named_in_the_scenario_stays_in_its_folder() =>
        Assert.Contains("leaves the scenario's folder", Refused(new StudyRequest(), Good + "sweep: {cases: ../../etc/passwd}\n").Single(), StringComparison.Ordinal);

    [Theory]
    [InlineData("sweep: {vary: {tank.level: 1 m..2 m}}", "sweep.vary.tank.level: '1 m..2 m' is no range")]
    [InlineData("sweep: {varry: {tank.level: 1 m}}", "sweep.varry: no such key; did you mean 'vary'?")]
    [InlineData("sweep: {vary: {tank.level: [[1 m]]}}", "is no list of values")]
    [InlineData("sweep: 3", "sweep: is no block of keys")]
    [InlineData("size: {parametre: line.bore}", "size.parametre: no such key; did you mean 'parameter'?")]
    public void A_bad_block_is_a_problem_of_the_file(string block, string said) =>
        Assert.Contains(said, string.Join('\n', ScenarioReader.ReadText(Good + block + "\n", "rinse.yaml", ".").Problems.Select(problem => problem.Text("rinse.yaml"))), StringComparison.Ordinal);

    [Fact]
    public void A_key_that_takes_the_place_of_another_may_be_varied()
    {
        Assert.Equal(2, Read(new StudyRequest { Vary = ["line.size=DN40, DN50"] }).Count);
        Assert.Equal(2, Read(new StudyRequest { Vary = ["tank.fill=50 %, 60 %"] }).Count);
        Assert.Equal(1, Read(new StudyRequest { Vary = ["line.roughness=0.1 mm"] }).Count);
    }

    [Theory]
    [InlineData("line.bore", "drain_time = 4 h", null, "")]
    [InlineData("line.bore", "limits kept", null, "has no limits to keep")]
    [InlineData("line.bore", "drain_tme = 4 h", null, "did you mean 'drain_time'?")]
    [InlineData("line.bore", "drain_time = 4", null, "'4' has no unit")]
    [InlineData("line.bore", "drain_time", null, "is no target")]
    [InlineData("line.bore", "drain_time = 4 h", "2 mm", "is no range")]
    [InlineData("line.bore", "drain_time = 4 h", "80 mm..20 mm", "does not rise")]
    [InlineData("line.material", "drain_time = 4 h", null, "is no number")]
    [InlineData("line.boar", "drain_time = 4 h", null, "'line.bore'")]
    [InlineData(null, "drain_time = 4 h", null, "is missing")]
    public void A_sizing_is_read_or_refused(string? parameter, string target, string? between, string said)
    {
        List<Problem> problems = [];
        SizePlan? plan = SizePlan.Read(ScenarioDocument.FromText(Good, "rinse.yaml", folder),
            new StudyRequest { Parameter = parameter, Target = target, Between = between }, problems);
        Assert.Equal(said.Length == 0, plan is not null);
        Assert.Contains(said, string.Join('\n', problems.Select(problem => problem.Text("rinse.yaml"))), StringComparison.Ordinal);
    }

    private static ParameterValue ValueOf(SweepCases cases, int number)
    {
        var values = new ParameterValue[1];
        cases.Read(number, values);
        return values[0];
    }

    private SweepCases Read(StudyRequest request, string text = Good)
    {
        List<Problem> problems = [];
        SweepCases? cases = SweepPlan.Read(ScenarioDocument.FromText(text, "rinse.yaml", folder), request, problems);
        Assert.Empty(problems.Select(problem => problem.Text("rinse.yaml")));
        return cases!;
    }

    private List<string> Refused(StudyRequest request, string text = Good)
    {
        List<Problem> problems = [];
        Assert.Null(SweepPlan.Read(ScenarioDocument.FromText(text, "rinse.yaml", folder), request, problems));
        return [.. problems.Select(problem => problem.Text("rinse.yaml"))];
    }
}
