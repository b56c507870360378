using System.Text.Json;

namespace DrainSim.Cli.Tests;

/// <summary>What 'drainsim forecast' says, writes and returns.</summary>
public sealed class ForecastTests
{
    private const string Dips = "time [min],level [mm]\n0,1200\n2,1120\n4,1045\n6,970\n8,895\n10,825\n";

    [Fact]
    public void A_forecast_says_the_finish_first_and_writes_three_files()
    {
        using TestFolder folder = With(Dips);
        Finished run = DrainSimProcess.Run(folder, "forecast", "siphon.yaml", "--readings", "dips.csv", "--fit", "line.bore", "tank.level");
        Assert.Equal((0, ""), (run.ExitCode, run.Error));
        Assert.Equal(["dips.csv", "out/siphon.forecast.csv", "out/siphon.forecast.json", "out/siphon.forecast.png", "siphon.yaml"], folder.Files);
        Assert.Contains("after the start, between", run.OutputLines[1], StringComparison.Ordinal);
        Assert.Contains(run.OutputLines, line => line.StartsWith("  - line.bore: ", StringComparison.Ordinal));
        Assert.All(run.OutputLines, line => Assert.InRange(line.Length, 0, 112));
        using JsonDocument json = JsonDocument.Parse(folder.Read("out/siphon.forecast.json"));
        Assert.True(json.RootElement.GetProperty("converged").GetBoolean());
    }

    [Fact]
    public void A_limit_that_will_be_broken_ends_with_1()
    {
        using TestFolder folder = With(Dips);
        folder.Write("siphon.yaml", Jobs.Siphon + "\nlimits: {drain_time: {at_most: 1 min}}\n");
        Finished run = DrainSimProcess.Run(folder, "forecast", "siphon.yaml", "--readings", "dips.csv", "--fit", "line.bore");
        Assert.Equal(1, run.ExitCode);
        Assert.Contains("will break a limit: Drain time at most 1 min", Assert.Single(run.ErrorLines), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(Dips, "forecast.readings: is missing", new[] { "--fit", "line.bore" })]
    [InlineData(Dips, "nothing is fitted", new[] { "--readings", "dips.csv" })]
    [InlineData(Dips, "there is no such file", new[] { "--readings", "none.csv", "--fit", "line.bore" })]
    [InlineData("time [min],level [mm]\n0,1200\n2,x\n", "dips.csv:3:3: 'x' is not a finite number", new[] { "--readings", "dips.csv", "--fit", "line.bore" })]
    public void What_cannot_be_fitted_is_refused_with_2_and_nothing_written(string dips, string said, string[] options)
    {
        using TestFolder folder = With(dips);
        Finished refused = DrainSimProcess.Run(folder, ["forecast", "siphon.yaml", .. options]);
        Assert.Equal((2, ""), (refused.ExitCode, refused.Output));
        Assert.Contains(said, refused.Error, StringComparison.Ordinal);
        Assert.Equal(["dips.csv", "siphon.yaml"], folder.Files);
    }

    [Fact]
    public void Readings_are_not_overwritten_by_their_forecast()
    {
        using TestFolder folder = With(Dips);
        folder.Write("siphon.forecast.csv", Dips);
        Finished refused = DrainSimProcess.Run(folder, "forecast", "siphon.yaml", "--readings", "siphon.forecast.csv", "--fit", "line.bore", "--out", ".");
        Assert.Equal(2, refused.ExitCode);
        Assert.Equal(Dips, folder.Read("siphon.forecast.csv"));
    }

    private static TestFolder With(string dips)
    {
        var folder = new TestFolder();
        folder.Write("siphon.yaml", Jobs.Siphon);
        folder.Write("dips.csv", dips);
        return folder;
    }
}
