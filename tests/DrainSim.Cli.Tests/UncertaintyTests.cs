using System.Text.Json;

namespace DrainSim.Cli.Tests;

/// <summary>What 'drainsim uncertainty' says, writes and returns.</summary>
public sealed class UncertaintyTests
{
    private static readonly string[] Options = ["--vary", "tank.level=normal(10 mm)", "--vary", "line.bore=usual", "--samples", "64"];

    [Fact]
    public void A_study_says_the_verdict_first_and_writes_three_files()
    {
        using var folder = new TestFolder();
        folder.Write("siphon.yaml", Jobs.Siphon);
        Finished run = DrainSimProcess.Run(folder, ["uncertainty", "siphon.yaml", .. Options]);
        Assert.Equal((0, ""), (run.ExitCode, run.Error));
        Assert.Equal(["out/siphon.uncertainty.csv", "out/siphon.uncertainty.json", "out/siphon.uncertainty.png", "siphon.yaml"], folder.Files);
        Assert.StartsWith("Takes ", run.OutputLines[1], StringComparison.Ordinal);
        Assert.All(run.OutputLines, line => Assert.InRange(line.Length, 0, 112));
        using JsonDocument json = JsonDocument.Parse(folder.Read("out/siphon.uncertainty.json"));
        Assert.StartsWith(run.OutputLines[1], json.RootElement.GetProperty("sentence").GetString(), StringComparison.Ordinal);
    }

    [Fact]
    public void The_number_of_threads_changes_no_byte()
    {
        using var folder = new TestFolder();
        folder.Write("siphon.yaml", Jobs.Siphon);
        DrainSimProcess.Run(folder, ["uncertainty", "siphon.yaml", .. Options, "--threads", "1", "--out", "one"]);
        DrainSimProcess.Run(folder, ["uncertainty", "siphon.yaml", .. Options, "--threads", "3", "--out", "three"]);
        foreach (string ending in (string[])["csv", "json", "png"])
            Assert.Equal(folder.Bytes($"one/siphon.uncertainty.{ending}"), folder.Bytes($"three/siphon.uncertainty.{ending}"));
    }

    [Theory]
    [InlineData("nothing is uncertain", new string[0])]
    [InlineData("The nearest are 'tank.level'", new[] { "--vary", "tank.levl=normal(1 %)" })]
    [InlineData("is no spread", new[] { "--vary", "tank.level=1.2 m" })]
    [InlineData("is no way of sampling", new[] { "--sampling", "dice" })]
    [InlineData("is out of range", new[] { "--vary", "tank.level=usual", "--samples", "many" })]
    public void What_cannot_be_run_is_refused_with_2_and_nothing_written(string said, string[] options)
    {
        using var folder = new TestFolder();
        folder.Write("siphon.yaml", Jobs.Siphon);
        Finished refused = DrainSimProcess.Run(folder, ["uncertainty", "siphon.yaml", .. options]);
        Assert.Equal((2, ""), (refused.ExitCode, refused.Output));
        Assert.Contains(said, refused.Error, StringComparison.Ordinal);
        Assert.Equal(["siphon.yaml"], folder.Files);
    }

    [Fact]
    public void A_folder_that_cannot_be_written_ends_with_3()
    {
        using var folder = new TestFolder();
        folder.Write("siphon.yaml", Jobs.Siphon);
        folder.Write("taken", "a file where a folder is wanted");
        Finished run = DrainSimProcess.Run(folder, ["uncertainty", "siphon.yaml", .. Options, "--out", "taken"]);
        Assert.Equal(3, run.ExitCode);
        Assert.Contains("cannot be written", Assert.Single(run.ErrorLines), StringComparison.Ordinal);
    }
}
