using DrainSim.Scenarios;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;
using DrainSim.Studies.Sampling;
using DrainSim.Studies.Uncertainty;

namespace DrainSim.Tests.Scenarios.Studies;

/// <summary>Spreads as people write them, in the file and on the command line.</summary>
public sealed class UncertaintyPlanTests
{
    public static TheoryData<string, string, Spread> Spreads => new()
    {
        { "tank.level", "normal(1.2 m, 10 mm)", new NormalSpread { Mean = 1.2, Deviation = 0.01 } },
        { "tank.level", "normal(1 %)", new NormalSpread { Mean = 1.2, Deviation = 0.012 } },
        { "tank.level", " normal( 3 mm ) ", new NormalSpread { Mean = 1.2, Deviation = 0.003 } },
        { "tank.level", "usual", new NormalSpread { Mean = 1.2, Deviation = 0.003 } },
        { "line.bore", "uniform(30 mm, 34 mm)", new UniformSpread(0.03, 0.034) },
        { "line.bore", "usual", new UniformSpread(0.96 * 0.032, 1.04 * 0.032) },
        { "line.path.strainer.loss", "lognormal(1.5, 20 %)", new LogNormalSpread { Median = 1.5, LogDeviation = 0.2 } },
        { "line.path.strainer.loss", "lognormal(0.2)", new LogNormalSpread { Median = 1.5, LogDeviation = 0.2 } },
        { "line.path.strainer.loss", "triangular(1, 1.5, 3)", new TriangularSpread(1, 1.5, 3) },
        { "line.path.outer_leg.length", "triangular(0.5 m)", new TriangularSpread(3.5, 4, 4.5) },
        { "liquid.temperature", "normal(15 degC, 2 K)", new NormalSpread { Mean = 288.15, Deviation = 2 } },
        { "line.roughness", "uniform(0.001 mm, 0.01 mm)", new UniformSpread(1e-6, 1e-5) },
    };

    [Theory]
    [MemberData(nameof(Spreads))]
    public void A_spread_is_read_as_it_is_written(string path, string text, Spread expected)
    {
        UncertaintyCase plan = Read(SmallScenario.With(), new UncertaintyRequest { Vary = [$"{path}={text}"] })!;
        Assert.Equal(expected.At(0.9), plan.Study.Parameters[0].Spread.At(0.9), 1e-12);
        Assert.Equal(expected.At(0.1), plan.Study.Parameters[0].Spread.At(0.1), 1e-12);
        Assert.Equal(expected.GetType(), plan.Study.Parameters[0].Spread.GetType());
        Assert.Equal(text.Trim() == "usual", plan.Study.Parameters[0].Source is not null);
    }

    [Theory]
    [InlineData("tank.levl=normal(1 %)", "no such parameter")]
    [InlineData("tank.level=gauss(1 m, 1 mm)", "is no spread")]
    [InlineData("tank.level=normal(1 m, 1 mm, 2)", "is no spread")]
    [InlineData("tank.level=normal", "is no spread")]
    [InlineData("tank.level=", "does not read PATH=VALUE")]
    [InlineData("tank.level=normal(1.2, 10 mm)", "has no unit")]
    [InlineData("tank.level=normal(1.2 m, -1 mm)", "standard deviation must be greater than 0")]
    [InlineData("tank.level=normal(1.2 m, NaN mm)", "is not a finite number")]
    [InlineData("tank.level=uniform(1.3 m, 1.1 m)", "must lie below the largest")]
    [InlineData("tank.level=triangular(1 m, 3 m, 2 m)", "must rise")]
    [InlineData("line.material=normal(1 %)", "is a word")]
    [InlineData("line.path.inner_leg.length=usual", "has no usual spread")]
    [InlineData("liquid.temperature=normal(15 degC, 2 degC)", "is no difference of temperatures")]
    [InlineData("line.least_pressure=normal(1 %)", "no such parameter")]
    public void A_spread_that_cannot_be_is_refused_in_words(string vary, string said)
    {
        List<Problem> problems = [];
        Assert.Null(UncertaintyPlan.Read(SmallScenario.With(), new UncertaintyRequest { Vary = [vary] }, problems));
        Assert.Contains(problems, problem => problem.Sentence.Contains(said, StringComparison.Ordinal));
    }

    [Fact]
    public void The_block_says_the_same_as_the_command_line()
    {
        const string block = """
            uncertainty:
              parameters:
                tank.level: normal(10 mm)
                line.bore: usual
              correlations: ['tank.level, line.bore = 0.4']
              samples: 320
              seed: 9
              sampling: latin_hypercube
            """;
        UncertaintyRequest request = new()
        {
            Vary = ["tank.level=normal(10 mm)", "line.bore=usual"],
            Correlate = ["tank.level, line.bore = 0.4"],
            Samples = "320",
            Seed = "9",
            Sampling = "latin_hypercube",
        };
        UncertaintyResult written = Run(Read(SmallScenario.With(block), new UncertaintyRequest())!);
        UncertaintyResult asked = Run(Read(SmallScenario.With(), request)!);
        Assert.Equal(asked.DrainTime, written.DrainTime);
        Assert.Equal((320, 9, SamplingMethod.LatinHypercube), (written.Count, written.Study.Seed, written.Study.Method));
        Assert.Single(written.Study.Correlations);
        UncertaintyCase over = Read(SmallScenario.With(block), new UncertaintyRequest { Vary = ["tank.level=normal(20 mm)"], Seed = "3" })!;
        Assert.Equal((2, 3), (over.Study.Parameters.Count, over.Study.Seed));
        Assert.Equal(0.02, ((NormalSpread)over.Study.Parameters[0].Spread).Deviation, 1e-12);
    }

    [Theory]
    [InlineData("uncertainty: {}", "nothing is uncertain")]
    [InlineData("uncertainty: {parameters: {tank.level: often}}", "is no spread")]
    [InlineData("uncertainty: {parameters: {tank.level: normal(1 %)}, samples: 12}", "is out of range")]
    [InlineData("uncertainty: {parameters: {tank.level: normal(1 %)}, seed: -1}", "is out of range")]
    [InlineData("uncertainty: {parameters: {tank.level: normal(1 %)}, sampling: dice}", "is not known here")]
    [InlineData("uncertainty: {parameters: {tank.level: normal(1 %)}, correlations: [tank.level]}", "is no correlation")]
    [InlineData("uncertainty: {parameters: {tank.level: normal(1 %)}, smaples: 100}", "no such key")]
    [InlineData("uncertainty: [1]", "is no block of keys")]
    public void A_block_that_cannot_be_is_refused_in_words(string block, string said)
    {
        List<Problem> problems = [];
        Assert.Null(UncertaintyPlan.Read(SmallScenario.With(block), new UncertaintyRequest(), problems));
        Assert.Contains(problems, problem => problem.Sentence.Contains(said, StringComparison.Ordinal));
    }

    [Fact]
    public void A_sample_that_makes_the_geometry_impossible_is_counted_with_its_cause()
    {
        // The outer leg falls 2.6 m: shorter than that in every sixth sample.
        UncertaintyCase plan = Read(SmallScenario.With(), new UncertaintyRequest { Vary = ["line.path.outer_leg.length=uniform(2.5 m, 3.1 m)"], Samples = "96", Sampling = "latin_hypercube" })!;
        List<SampleRun> runs = [];
        UncertaintyResult result = plan.Study.Run(runs.Add, TestContext.Current.CancellationToken);
        Assert.Equal(16, result.Refused);
        Assert.Contains("cannot fall", result.FirstFault, StringComparison.Ordinal);
        Assert.All(runs.Where(run => run.Run is null), run => Assert.InRange(run.Values[0], 2.5, 2.6));
    }

    private static UncertaintyCase? Read(ScenarioDocument document, UncertaintyRequest request)
    {
        List<Problem> problems = [];
        UncertaintyCase? plan = UncertaintyPlan.Read(document, request, problems);
        Assert.Empty(problems);
        return plan;
    }

    private static UncertaintyResult Run(UncertaintyCase plan) =>
        (plan.Study with { Runs = new OrderedRuns { Threads = 2 } }).Run(null, TestContext.Current.CancellationToken);
}
