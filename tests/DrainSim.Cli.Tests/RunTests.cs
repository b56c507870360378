using System.Text.Json;

namespace DrainSim.Cli.Tests;

/// <summary>What 'drainsim run' says, writes and returns.</summary>
public sealed class RunTests
{
    private static readonly string[] SiphonFiles =
        ["out/siphon.csv", "out/siphon.events.csv", "out/siphon.json", "out/siphon.line.png", "out/siphon.png"];

    [Fact]
    public void A_run_says_the_verdict_first_and_writes_five_files()
    {
        using TestFolder folder = With("siphon", Jobs.Siphon);
        Finished run = DrainSimProcess.Run(folder, "run", "siphon.yaml");
        Assert.Equal((0, ""), (run.ExitCode, run.Error));
        Assert.Equal([.. SiphonFiles, "siphon.yaml"], folder.Files);
        using JsonDocument json = JsonDocument.Parse(folder.Read("out/siphon.json"));
        Assert.Equal(json.RootElement.GetProperty("sentence").GetString(), run.OutputLines[1]);
        Assert.Equal("inlet_uncovered", json.RootElement.GetProperty("outcome").GetString());
    }

    [Fact]
    public void The_block_of_one_run_fits_a_screen()
    {
        using TestFolder folder = With("siphon", Jobs.Siphon);
        Finished run = DrainSimProcess.Run(folder, "run", "siphon.yaml");
        Assert.InRange(run.OutputLines.Count, 15, 45);
        Assert.All(run.OutputLines, line => Assert.InRange(line.Length, 0, 100));
        Assert.Contains("Levels to expect", run.OutputLines);
        Assert.Contains("Cautions", run.OutputLines);
    }

    [Fact]
    public void Quiet_leaves_the_verdict_alone()
    {
        using TestFolder folder = With("siphon", Jobs.Siphon);
        Finished run = DrainSimProcess.Run(folder, "run", "siphon.yaml", "--quiet");
        Assert.StartsWith("Stops after", Assert.Single(run.OutputLines), StringComparison.Ordinal);
    }

    [Fact]
    public void Units_change_what_is_said_and_not_the_series()
    {
        using TestFolder folder = With("siphon", Jobs.Siphon);
        Finished metric = DrainSimProcess.Run(folder, "run", "siphon.yaml", "--out", "metric");
        Finished us = DrainSimProcess.Run(folder, "run", "siphon.yaml", "--out", "us", "--units", "us");
        Assert.Contains(" gal", us.Output, StringComparison.Ordinal);
        Assert.DoesNotContain(" gal", metric.Output, StringComparison.Ordinal);
        Assert.Equal(folder.Bytes("metric/siphon.csv"), folder.Bytes("us/siphon.csv"));
    }

    [Fact]
    public void Several_runs_close_with_one_table_of_them()
    {
        using TestFolder folder = With("siphon", Jobs.Siphon);
        folder.Write("drain.yaml", Jobs.Drain);
        Finished run = DrainSimProcess.Run(folder, "run", "siphon.yaml", "drain.yaml", "--out", "results");
        Assert.Equal((0, ""), (run.ExitCode, run.Error));
        int heading = run.OutputLines.ToList().FindIndex(line => line.StartsWith("scenario ", StringComparison.Ordinal));
        Assert.Matches("^siphon +inlet_uncovered ", run.OutputLines[heading + 2]);
        Assert.Matches("^drain +emptied ", run.OutputLines[heading + 3]);
        Assert.Equal(10, folder.Files.Count(file => file.StartsWith("results/", StringComparison.Ordinal)));
    }

    [Fact]
    public void A_scenario_gives_the_same_files_alone_and_among_others()
    {
        using TestFolder folder = With("siphon", Jobs.Siphon);
        folder.Write("drain.yaml", Jobs.Drain);
        DrainSimProcess.Run(folder, "run", "drain.yaml", "siphon.yaml", "--out", "both");
        DrainSimProcess.Run(folder, "run", "siphon.yaml", "--out", "alone");
        Assert.All(SiphonFiles.Select(Path.GetFileName), file =>
            Assert.Equal(folder.Bytes($"alone/{file}"), folder.Bytes($"both/{file}")));
    }

    [Fact]
    public void A_met_expectation_ends_with_0_and_another_outcome_with_1()
    {
        using TestFolder folder = With("siphon", Jobs.Siphon);
        Finished met = DrainSimProcess.Run(folder, "run", "siphon.yaml", "--expect", "inlet_uncovered");
        Finished missed = DrainSimProcess.Run(folder, "run", "siphon.yaml", "--expect", "emptied");
        Assert.Equal((0, 1), (met.ExitCode, missed.ExitCode));
        Assert.Contains("expected to end as emptied, and it ends as inlet_uncovered", Assert.Single(missed.ErrorLines), StringComparison.Ordinal);
    }

    [Fact]
    public void One_refused_scenario_among_good_ones_stops_all_of_them()
    {
        using TestFolder folder = With("siphon", Jobs.Siphon);
        folder.Write("faulty.yaml", Jobs.Faulty);
        Finished run = DrainSimProcess.Run(folder, "run", "siphon.yaml", "faulty.yaml", "missing.yaml");
        Assert.Equal((2, ""), (run.ExitCode, run.Output));
        Assert.Equal(["faulty.yaml", "siphon.yaml"], folder.Files);
        Approved.Matches("refused-among-good", run.Error);
    }

    [Fact]
    public void Two_scenarios_of_one_name_are_refused_before_either_is_run()
    {
        using TestFolder folder = With("north/tank", Jobs.Siphon);
        folder.Write("south/tank.yaml", Jobs.Drain);
        Finished run = DrainSimProcess.Run(folder, "run", "north/tank.yaml", "south/tank.yaml");
        Assert.Equal((2, ""), (run.ExitCode, run.Output));
        Assert.Contains("'north/tank.yaml' and 'south/tank.yaml' would both write", run.Error, StringComparison.Ordinal);
        Assert.Equal(["north/tank.yaml", "south/tank.yaml"], folder.Files);
    }

    [Fact]
    public void A_name_that_ends_like_another_scenarios_file_is_refused()
    {
        using TestFolder folder = With("tank", Jobs.Siphon);
        folder.Write("tank.events.yaml", Jobs.Drain);
        Finished run = DrainSimProcess.Run(folder, "run", "tank.yaml", "tank.events.yaml");
        Assert.Equal(2, run.ExitCode);
        Assert.Contains("tank.events.csv", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void A_strapping_table_is_not_overwritten_by_the_results()
    {
        using TestFolder folder = new();
        DrainSimProcess.Run(folder, "new", "old", "--from", "strapping-table");
        folder.Write("old.csv", folder.Read("old.strapping.csv"));
        folder.Write("old.yaml", folder.Read("old.yaml").Replace("old.strapping.csv", "old.csv", StringComparison.Ordinal));
        string before = folder.Read("old.csv");
        Finished run = DrainSimProcess.Run(folder, "run", "old.yaml", "--out", ".");
        Assert.Equal(2, run.ExitCode);
        Assert.Contains("is read by 'old.yaml' and would be overwritten", run.Error, StringComparison.Ordinal);
        Assert.Equal(before, folder.Read("old.csv"));
    }

    [Fact]
    public void A_second_run_replaces_its_own_files_and_leaves_others_alone()
    {
        using TestFolder folder = With("siphon", Jobs.Siphon);
        folder.Write("out/notes.txt", "mine");
        folder.Write("out/siphon.csv", new string('x', 1_000_000));
        DrainSimProcess.Run(folder, "run", "siphon.yaml");
        byte[] first = folder.Bytes("out/siphon.csv");
        DrainSimProcess.Run(folder, "run", "siphon.yaml");
        Assert.Equal(first, folder.Bytes("out/siphon.csv"));
        Assert.StartsWith("time_s,", folder.Read("out/siphon.csv"), StringComparison.Ordinal);
        Assert.Equal("mine", folder.Read("out/notes.txt"));
    }

    [Theory]
    [InlineData("taken/below")]
    [InlineData("/proc/drainsim")]
    public void An_output_that_cannot_be_written_ends_with_3_and_the_reason(string target)
    {
        Assert.SkipWhen(target.StartsWith("/proc", StringComparison.Ordinal) && !Directory.Exists("/proc"), "there is no /proc here");
        using TestFolder folder = With("siphon", Jobs.Siphon);
        folder.Write("taken", "a file where a folder is wanted");
        Finished run = DrainSimProcess.Run(folder, "run", "siphon.yaml", "--out", target);
        Assert.Equal(3, run.ExitCode);
        Assert.Contains("cannot be written", Assert.Single(run.ErrorLines), StringComparison.Ordinal);
        Assert.Contains("Stops after", run.Output, StringComparison.Ordinal);
        Assert.Equal(["siphon.yaml", "taken"], folder.Files);
    }

    [Fact]
    public void A_file_that_cannot_be_replaced_leaves_none_of_the_run_half_written()
    {
        using TestFolder folder = With("siphon", Jobs.Siphon);
        folder.Write("out/siphon.json/in-the-way", "");
        Finished run = DrainSimProcess.Run(folder, "run", "siphon.yaml");
        Assert.Equal(3, run.ExitCode);
        Assert.Equal(["out/siphon.json/in-the-way", "siphon.yaml"], folder.Files);
    }

    private static TestFolder With(string name, string scenario)
    {
        var folder = new TestFolder();
        folder.Write(name + ".yaml", scenario);
        return folder;
    }
}
