using System.Globalization;
using DrainSim.Scenarios;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies.Forecasting;

namespace DrainSim.Tests.Scenarios.Studies;

/// <summary>Readings from files, good and hostile.</summary>
public sealed class ForecastPlanTests : IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("drainsim-readings-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Theory]
    [InlineData("time [min],level [mm]\n0,1200\n10,1100\n20,1010\n")]
    [InlineData("elapsed (s), dip (cm)\n0, 120\n600, 110\n1200, 101\n")]
    [InlineData("time_s,level_m\n0,1.2\n600,1.1\n1200,1.01\n")]
    [InlineData("# a crew's dips\nnote,time [min],ullage [mm]\nfirst,0,300\n\"second, late\",10,400\n,20,490\n")]
    [InlineData("clock,level [mm]\n23:55,1200\n00:05,1100\n00:15,1010\n")]
    [InlineData("clock,level [mm]\n2031-05-12 23:55,1200\n2031-05-13T00:05,1100\n2031-05-13 00:15:00,1010\n")]
    public void Times_and_levels_are_read_in_every_form(string text)
    {
        ForecastCase plan = Read(text, out List<Problem> problems)!;
        Assert.Empty(problems);
        Assert.Equal([0, 600, 1200], plan.Study.Readings.Select(reading => reading.Time));
        Assert.Equal([1.2, 1.1, 1.01], plan.Study.Readings.Select(reading => Math.Round(reading.Level, 12)));
        Assert.All(plan.Study.Readings, reading => Assert.Equal(0.005, reading.Resolution));
    }

    [Fact]
    public void The_clock_counts_from_the_start_that_the_scenario_gives()
    {
        ForecastCase plan = Read("clock,level [mm]\n22:05,1150\n00:10,800\n00:15,780\n", out List<Problem> problems, begins: "2031-05-12 22:00 +01:00")!;
        Assert.Empty(problems);
        Assert.Equal([300, 7800, 8100], plan.Study.Readings.Select(reading => reading.Time));
        Assert.True(plan.Clock!.HasDate);
        Assert.Equal(new DateTimeOffset(2031, 5, 12, 22, 0, 0, TimeSpan.FromHours(1)), plan.Clock.Time);
    }

    [Fact]
    public void Each_reading_may_have_its_own_resolution_and_the_gauge_point_may_be_given()
    {
        ForecastCase plan = Read("time [min],ullage [mm],resolution [mm]\n0,800,1\n10,900,10\n20,990,10\n", out List<Problem> problems,
            request: new ForecastRequest { GaugePoint = "2 m" })!;
        Assert.Empty(problems);
        Assert.Equal([0.001, 0.01, 0.01], plan.Study.Readings.Select(reading => reading.Resolution));
        Assert.Equal(1.2, plan.Study.Readings[0].Level, 1e-12);
    }

    [Theory]
    [InlineData("", 0, 0, "the file is empty")]
    [InlineData("time [min],level [mm]\n", 0, 0, "the file has no readings")]
    [InlineData("time [min],level [mm]\n0,1200\n10\n20,1000\n", 3, 1, "the row has 1 cells and the first line 2")]
    [InlineData("time [min],level [mm]\n0,1200\n10,1100,7\n20,1000\n", 3, 1, "the row has 3 cells")]
    [InlineData("time [min],level [mm]\n0,1200\n20,1100\n10,1000\n", 4, 1, "the time does not rise")]
    [InlineData("time [min],level [mm]\n0,1200\n10,1100\n10,1000\n", 4, 1, "the time does not rise")]
    [InlineData("clock,level [mm]\n10:00,1200\n10:20,1100\n10:10,1000\n", 4, 1, "the time does not rise")]
    [InlineData("clock,level [mm]\n10:00,1200\n25:10,1100\n10:30,1000\n", 3, 1, "'25:10' is no clock")]
    [InlineData("clock,level [mm]\n10:00,1200\n,1100\n10:30,1000\n", 3, 1, "the clock is missing")]
    [InlineData("time [min],level\n0,1200\n", 1, 12, "the column 'level' has no unit")]
    [InlineData("time [min],level [min]\n0,1200\n", 1, 12, "has a unit 'min' that is no unit of length")]
    [InlineData("time [mins.],level [mm]\n0,1200\n", 1, 1, "has a unit 'mins.' that is no unit of time")]
    [InlineData("time [min],depth [mm]\n0,1200\n", 1, 12, "there is no column 'depth [mm]'")]
    [InlineData("time [min],level [mm],dip [mm]\n0,1,1\n", 1, 23, "a second column of the level")]
    [InlineData("time [min]\n0\n", 1, 1, "there is no column of the level")]
    [InlineData("time [min],level [mm]\n0,1200\n10,NaN\n20,1000\n", 3, 4, "'NaN' is not a finite number")]
    [InlineData("time [min],level [mm]\n0,1200\n10,1e999\n20,1000\n", 3, 4, "is not a finite number")]
    [InlineData("time [min],level [mm]\n0,1200\n10,\"1,100\"\n20,1000\n", 3, 4, "has a comma")]
    [InlineData("time [min],level [mm]\n0,1200\n10,\n20,1000\n", 3, 4, "the cell is empty")]
    [InlineData("time [min],level [mm]\n-5,1200\n10,1100\n20,1000\n", 2, 1, "before the job begins")]
    [InlineData("time [min],level [m]\n0,1200\n10,1100\n20,1000\n", 2, 3, "lies above the tank's 1.5 m")]
    [InlineData("time [min],ullage [mm]\n0,300\n10,1600\n20,1700\n", 3, 4, "below the tank's lowest point")]
    [InlineData("time [min],level [mm],resolution [mm]\n0,1200,0\n10,1100,5\n", 2, 8, "the resolution is not greater than 0")]
    [InlineData("time [min],level [mm]\n0,1200\n", 0, 0, "1 readings cannot tell 1 parameters")]
    [InlineData("time [min],level [mm]\n0,\"1200\n10,1100\n", 2, 1, "the row cannot be read")]
    public void A_hostile_file_is_refused_with_its_place(string text, int line, int column, string said)
    {
        Assert.Null(Read(text, out List<Problem> problems));
        Problem problem = problems[0];
        Assert.Contains(said, problem.Fault, StringComparison.Ordinal);
        Assert.Equal((line, column, "dips.csv"), (problem.Line, problem.Column, problem.File));
    }

    [Fact]
    public void Many_faults_are_told_at_once_and_not_without_end()
    {
        string rows = string.Concat(Enumerable.Range(0, 500).Select(i => string.Create(CultureInfo.InvariantCulture, $"{i},x\n")));
        Assert.Null(Read("time [min],level [mm]\n" + rows, out List<Problem> problems));
        Assert.Equal(20, problems.Count);
    }

    [Theory]
    [InlineData("forecast: {fit: [tank.level]}", "forecast.readings", "is missing")]
    [InlineData("forecast: {readings: dips.csv}", "forecast.fit", "nothing is fitted")]
    [InlineData("forecast: {readings: ../dips.csv, fit: [tank.level]}", "forecast.readings", "leaves the scenario's folder")]
    [InlineData("forecast: {readings: /etc/hostname, fit: [tank.level]}", "forecast.readings", "leaves the scenario's folder")]
    [InlineData("forecast: {readings: none.csv, fit: [tank.level]}", "", "there is no such file")]
    [InlineData("forecast: {readings: dips.csv, fit: [tank.levl]}", "tank.levl", "no such parameter")]
    [InlineData("forecast: {readings: dips.csv, fit: [line.material]}", "line.material", "is a word")]
    [InlineData("forecast: {readings: dips.csv, fit: [tank.level], resolution: 5}", "forecast.resolution", "has no unit")]
    [InlineData("forecast: {readings: dips.csv, fit: [tank.level], resolution: 0 mm}", "forecast.resolution", "is not greater than 0")]
    [InlineData("forecast: {readings: dips.csv, fit: {tank.level: 1}}", "forecast.fit", "holds keys or a list")]
    [InlineData("forecast: {readings: dips.csv, fit: [tank.level, tank.level]}", "tank.level", "is varied twice")]
    public void A_block_that_cannot_be_is_refused_in_words(string block, string key, string said)
    {
        File.WriteAllText(Path.Combine(folder, "dips.csv"), "time [min],level [mm]\n0,1200\n10,1100\n20,1010\n");
        List<Problem> problems = [];
        Assert.Null(ForecastPlan.Read(SmallScenario.With(block, folder), new ForecastRequest(), problems));
        Assert.Contains(problems, problem => problem.Key == key && problem.Fault.Contains(said, StringComparison.Ordinal));
    }

    /// <summary>The invented dips of the ready scenario were made with a strainer's loss of 3.1 and a level of 2.685 m, the pond being done at 191.97 min.</summary>
    [Fact]
    public void The_ready_forecast_finds_what_its_dips_were_made_of()
    {
        List<Problem> problems = [];
        string path = Path.Combine(House.Repository.Root, "scenarios", "pond-crews-dips.yaml");
        ForecastCase plan = ForecastPlan.Read(ScenarioDocument.Load(path), new ForecastRequest(), problems)!;
        Assert.Empty(problems);
        ForecastResult forecast = plan.Study.Run(TestContext.Current.CancellationToken);
        Assert.InRange(3.1, forecast.Estimates[0].Low, forecast.Estimates[0].High);
        Assert.InRange(2.685, forecast.Estimates[1].Low, forecast.Estimates[1].High);
        Assert.InRange(191.97 * 60, forecast.Finish.Low!.Value, forecast.Finish.High!.Value);
        Assert.DoesNotContain(forecast.Alternatives, one => one.IsFound);
    }

    /// <summary>Bore, loss and roughness act alike; the search ends far out, beside values that make no job.</summary>
    [Fact]
    public void Too_many_parameters_are_not_told_apart_and_the_best_fit_is_still_a_job()
    {
        List<Problem> problems = [];
        string path = Path.Combine(House.Repository.Root, "scenarios", "pond-crews-dips.yaml");
        var request = new ForecastRequest { Fit = ["line.bore", "line.path.strainer.loss", "line.roughness", "tank.level"] };
        ForecastResult forecast = ForecastPlan.Read(ScenarioDocument.Load(path), request, problems)!.Study.Run(TestContext.Current.CancellationToken);
        Assert.Equal(Separation.NotApart, forecast.Separation);
        Assert.Null(forecast.Band);
        Assert.Equal((null, null), (forecast.Finish.Low, forecast.Finish.High));
        Assert.InRange(forecast.Scatter, 0, 2);
    }

    private ForecastCase? Read(string text, out List<Problem> problems, string? begins = null, ForecastRequest? request = null)
    {
        problems = [];
        File.WriteAllText(Path.Combine(folder, "dips.csv"), text);
        string scenario = "forecast: {readings: dips.csv, fit: line.path.strainer.loss}\n" + (begins is null
            ? SmallScenario.Text
            : SmallScenario.Text.Replace("run: {", $"run: {{begins: {begins}, ", StringComparison.Ordinal));
        return ForecastPlan.Read(ScenarioDocument.FromText(scenario, "small.yaml", folder), request ?? new ForecastRequest(), problems);
    }
}
