namespace DrainSim.Cli.Tests;

/// <summary>The help pages and what is said about a wrong command line.</summary>
public sealed class HelpTests
{
    [Theory]
    [InlineData("")]
    [InlineData("run")]
    [InlineData("check")]
    [InlineData("sweep")]
    [InlineData("size")]
    [InlineData("uncertainty")]
    [InlineData("forecast")]
    [InlineData("new")]
    [InlineData("liquids")]
    [InlineData("fittings")]
    [InlineData("materials")]
    [InlineData("sizes")]
    [InlineData("shapes")]
    [InlineData("units")]
    public void The_help_of_a_command_is_the_approved_text(string command)
    {
        using var folder = new TestFolder();
        Finished help = DrainSimProcess.Run(folder, command.Length == 0 ? ["--help"] : [command, "--help"]);
        Assert.Equal(0, help.ExitCode);
        Assert.Empty(help.Error);
        Approved.Matches(command.Length == 0 ? "help" : $"help-{command}", help.Output);
    }

    [Fact]
    public void The_version_is_one_line()
    {
        using var folder = new TestFolder();
        Finished version = DrainSimProcess.Run(folder, "--version");
        Assert.Matches(@"^\d+\.\d+\.\d+\n$", version.Output);
    }

    [Theory]
    [InlineData("no command", "no command is given", new string[0])]
    [InlineData("misspelt command", "did you mean 'run'?", new[] { "rnu", "a.yaml" })]
    [InlineData("misspelt option", "did you mean '--quiet'?", new[] { "run", "a.yaml", "--queit" })]
    [InlineData("no scenario", "See 'drainsim run --help'", new[] { "run" })]
    [InlineData("unknown outcome", "emptied", new[] { "run", "a.yaml", "--expect", "drained" })]
    [InlineData("unknown units", "metric", new[] { "run", "a.yaml", "--units", "imperial" })]
    [InlineData("temperature without unit", "has no unit", new[] { "liquids", "--temperature", "-5" })]
    public void A_wrong_command_line_is_refused_in_one_line(string what, string said, string[] args)
    {
        using var folder = new TestFolder();
        Finished refused = DrainSimProcess.Run(folder, args);
        Assert.Equal(2, refused.ExitCode);
        Assert.Empty(refused.Output);
        string line = Assert.Single(refused.ErrorLines);
        Assert.True(line.Contains(said, StringComparison.Ordinal), $"{what}: {line}");
        Assert.Empty(folder.Files);
    }

    [Fact]
    public void A_negative_temperature_is_a_value_and_no_option()
    {
        using var folder = new TestFolder();
        Finished cold = DrainSimProcess.Run(folder, "liquids", "--temperature", "-5 degC");
        Assert.Equal(0, cold.ExitCode);
        Assert.Contains("at −5 °C", cold.Output, StringComparison.Ordinal);
    }
}
