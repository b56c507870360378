namespace DrainSim.Cli.Tests;

/// <summary>The templates, each as it comes out and each run.</summary>
public sealed class NewTests
{
    [Theory]
    [InlineData("over-the-rim", "inlet_uncovered")]
    [InlineData("bottom-drain", "emptied")]
    [InlineData("side-outlet", "target_reached")]
    [InlineData("pond-siphon", "target_reached")]
    [InlineData("boiling-crest", "vapour_break")]
    [InlineData("strapping-table", "inlet_uncovered")]
    [InlineData("us-units", "inlet_uncovered")]
    public void A_template_runs_as_it_is_and_ends_as_it_says(string template, string outcome)
    {
        using var folder = new TestFolder();
        Finished made = DrainSimProcess.Run(folder, "new", "job", "--from", template);
        Assert.Equal((0, ""), (made.ExitCode, made.Error));
        Finished run = DrainSimProcess.Run(folder, "run", "job.yaml", "--expect", outcome);
        Assert.Equal((0, ""), (run.ExitCode, run.Error));
    }

    [Fact]
    public void The_list_names_every_template_and_each_has_a_file()
    {
        using var folder = new TestFolder();
        Finished list = DrainSimProcess.Run(folder, "new", "--list");
        foreach (ScenarioTemplate template in ScenarioTemplate.All)
        {
            Assert.Contains(template.Name, list.Output, StringComparison.Ordinal);
            Assert.Contains("title:", template.Files("job")[0].Text, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void A_standing_file_is_not_overwritten()
    {
        using var folder = new TestFolder();
        folder.Write("job.yaml", "mine");
        Finished refused = DrainSimProcess.Run(folder, "new", "job");
        Assert.Equal(2, refused.ExitCode);
        Assert.Contains("'job.yaml' is already there", Assert.Single(refused.ErrorLines), StringComparison.Ordinal);
        Assert.Equal("mine", folder.Read("job.yaml"));
    }

    [Theory]
    [InlineData("../job")]
    [InlineData("a/b")]
    [InlineData(".hidden")]
    [InlineData("tank 1")]
    public void A_name_that_leaves_the_folder_or_needs_quoting_is_refused(string name)
    {
        using var folder = new TestFolder();
        Finished refused = DrainSimProcess.Run(folder, "new", name);
        Assert.Equal(2, refused.ExitCode);
        Assert.Empty(folder.Files);
    }
}
