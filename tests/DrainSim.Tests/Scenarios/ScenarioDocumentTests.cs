using DrainSim.Lines;
using DrainSim.Scenarios;

namespace DrainSim.Tests.Scenarios;

public sealed class ScenarioDocumentTests
{
    private static readonly ScenarioDocument Good = ScenarioDocument.FromText(GoodScenario.Text, "rinse.yaml", ".");

    [Fact]
    public void The_document_names_its_parameters()
    {
        Assert.Contains("line.path.outer_leg.length", Good.Parameters);
        Assert.Contains("line.path[2].count", Good.Parameters);
        Assert.Contains("tank.level", Good.Parameters);
    }

    [Fact]
    public void Every_parameter_can_be_set_to_what_it_is()
    {
        ScenarioDocument same = Good.Parameters.Where(path => !path.EndsWith("name", StringComparison.Ordinal) || path == "liquid.name")
            .Aggregate(Good, (document, path) => document.With(path,
                Good.Read().Scenario!.Understood.Single(value => value.Path == path).Written));
        Assert.Equal(Good.Read().Scenario!.Understood, same.Read().Scenario!.Understood);
    }

    [Fact]
    public void A_longer_hose_keeps_the_elevation_of_its_end()
    {
        StraightRun run = (StraightRun)Good.With("line.path.outer_leg.length", "9 m").Read().Scenario!.Job.Line.Path[2];
        Assert.Equal((9.0, -1.5 - 3.15), (run.Length, run.Rise));
    }

    [Fact]
    public void Setting_a_value_leaves_the_document_as_it_was()
    {
        Good.With("tank.level", "1 m");
        Assert.Equal(2.6, Good.Read().Scenario!.Job.Level);
    }

    [Fact]
    public void A_key_that_the_file_lacks_is_added()
    {
        Assert.Equal(3, Good.With("line.parallel", "3").Read().Scenario!.Job.Line.Parallel);
        Assert.Equal(-0.4, Good.With("receiver.surface", "-0.4 m").Read().Scenario!.Job.ReceiverSurface);
    }

    [Theory]
    [InlineData("line.path.outer_lag.length", "9 m", "rinse.yaml: line.path.outer_lag.length: no such parameter; did you mean 'line.path.outer_leg.length'?")]
    [InlineData("line.path[9].length", "9 m", "rinse.yaml: line.path[9].length: no such parameter; did you mean 'line.path[2].count'?")]
    [InlineData("tank", "9 m", "rinse.yaml: tank: no such parameter. 'drainsim check' lists them.")]
    [InlineData("tank..level", "9 m", "rinse.yaml: tank..level: no such parameter; did you mean 'tank.level'?")]
    [InlineData("", "9 m", "rinse.yaml: no such parameter. 'drainsim check' lists them.")]
    [InlineData("tank.levl", "2 m", "rinse.yaml: tank.levl: no such key; did you mean 'level'?")]
    [InlineData("line.bore", "38", "rinse.yaml: line.bore: '38' has no unit. A length reads 38 mm, 1.5 in or 0.038 m.")]
    [InlineData("line.path.outer_leg.length", "2 m", "rinse.yaml: line.path.outer_leg.length: a run of 2 m cannot fall 4.65 m. Give a longer run, or another 'to'.")]
    public void A_bad_setting_is_a_problem_without_a_line(string path, string text, string problem) =>
        Assert.Equal(problem, Good.With(path, text).Read().Problems.Single().Text("rinse.yaml"));

    [Fact]
    public void A_setting_of_a_broken_file_tells_the_break_alone() =>
        Assert.Single(ScenarioDocument.FromText("tank: [", "a.yaml", ".").With("tank.level", "1 m").Read().Problems);
}
