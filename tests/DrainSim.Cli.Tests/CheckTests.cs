namespace DrainSim.Cli.Tests;

/// <summary>What 'drainsim check' says.</summary>
public sealed class CheckTests
{
    [Fact]
    public void A_check_shows_the_values_their_defaults_and_the_first_instant()
    {
        using var folder = new TestFolder();
        folder.Write("siphon.yaml", Jobs.Siphon);
        Finished check = DrainSimProcess.Run(folder, "check", "siphon.yaml");
        Assert.Equal((0, ""), (check.ExitCode, check.Error));
        Assert.Matches(@"line\.path\.inner_leg\.length +1\.7 m", check.Output);
        Assert.Matches(@"run\.settled_within +1 mm .*default", check.Output);
        foreach (string label in (string[])["Flow", "Low point", "Static lift", "Prime"])
            Assert.Contains(check.OutputLines, line => line.StartsWith("  " + label, StringComparison.Ordinal));
    }

    [Fact]
    public void A_check_writes_nothing()
    {
        using var folder = new TestFolder();
        folder.Write("siphon.yaml", Jobs.Siphon);
        DrainSimProcess.Run(folder, "check", "siphon.yaml");
        Assert.Equal(["siphon.yaml"], folder.Files);
    }

    [Fact]
    public void All_problems_of_all_files_are_told_at_once()
    {
        using var folder = new TestFolder();
        folder.Write("siphon.yaml", Jobs.Siphon);
        folder.Write("faulty.yaml", Jobs.Faulty);
        folder.Write("worse.yaml", "title: [");
        Finished check = DrainSimProcess.Run(folder, "check", "faulty.yaml", "siphon.yaml", "worse.yaml");
        Assert.Equal((2, ""), (check.ExitCode, check.Output));
        Assert.Contains("faulty.yaml:5:", check.Error, StringComparison.Ordinal);
        Assert.Contains("did you mean 'length'?", check.Error, StringComparison.Ordinal);
        Assert.Contains("worse.yaml:", check.Error, StringComparison.Ordinal);
    }
}
