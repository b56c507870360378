using System.Diagnostics;

namespace DrainSim.Cli.Tests;

/// <summary>Sweeps as a user starts them: the same bytes whatever the threads, the parts, the kills and the neighbours.</summary>
public sealed class SweepTests
{
    private const string Lengths = "line.path.outer_leg.length=1 m..40 m in 1000";
    private const string Table = "out/siphon.sweep.csv";

    [Fact]
    public void The_table_does_not_depend_on_the_threads()
    {
        using TestFolder folder = Siphon();
        byte[] one = Sweep(folder, "--threads", "1");
        Assert.Equal(one, Sweep(folder, "--threads", "2"));
        Assert.Equal(one, Sweep(folder, "--threads", "7"));
        Assert.Equal(["out/siphon.sweep.csv", "out/siphon.sweep.csv.state", "out/siphon.sweep.png", "siphon.yaml"], folder.Files);
    }

    [Theory]
    [InlineData(2)]
    [InlineData(7)]
    public void Parts_joined_are_the_whole(int parts)
    {
        using TestFolder folder = Siphon();
        byte[] whole = Sweep(folder);
        List<byte> joined = [];
        for (int part = 1; part <= parts; part++)
        {
            Assert.Equal(0, DrainSimProcess.Run(folder, "sweep", "siphon.yaml", "--vary", Lengths, "--shard", $"{part}/{parts}").ExitCode);
            joined.AddRange(folder.Bytes($"out/siphon.sweep.{part}-of-{parts}.csv"));
        }

        Assert.Equal(whole, joined);
    }

    /// <summary>The moments are of a fixed seed; where a run has ended before, it is gone on with all the same.</summary>
    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(3)]
    public void Killed_at_random_moments_and_gone_on_with_it_is_the_same_table(int seed)
    {
        using TestFolder folder = Siphon();
        byte[] whole = Sweep(folder);
        var random = new Random(seed);
        folder.Delete("out");
        int kills = 0;
        for (int attempt = 0; attempt < 6; attempt++)
        {
            using Process run = Start(folder);
            if (!run.WaitForExit(random.Next(60, 700)))
            {
                run.Kill();
                run.WaitForExit();
                kills++;
            }
        }

        Assert.True(kills > 0, "no run was killed");
        Assert.Equal(whole, Sweep(folder, "--resume"));
    }

    [Fact]
    public void A_run_that_was_stopped_goes_on_behind_its_last_whole_row()
    {
        using TestFolder folder = Siphon();
        byte[] whole = Sweep(folder);
        folder.WriteBytes(Table + ".partial", whole[..(whole.Length / 2)]);
        folder.Delete(Table);
        Assert.Equal(whole, Sweep(folder, "--resume"));
    }

    [Fact]
    public void An_interrupted_sweep_says_how_to_go_on_and_does()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "there is no SIGINT to send");
        using TestFolder folder = Siphon();
        byte[] whole = Sweep(folder);
        folder.Delete("out");
        Process run = Start(folder);
        while (!File.Exists(folder.Full(Table + ".partial")) && !run.HasExited)
            Thread.Sleep(5);
        using (Process kill = Process.Start("kill", ["-INT", $"{run.Id}"]))
            kill.WaitForExit();
        Finished interrupted = DrainSimProcess.Wait(run);
        Assert.Equal(130, interrupted.ExitCode);
        Assert.Contains("--resume", interrupted.Error, StringComparison.Ordinal);
        Assert.Equal(whole, Sweep(folder, "--resume"));
    }

    [Fact]
    public void Other_values_are_not_gone_on_with()
    {
        using TestFolder folder = Siphon();
        Sweep(folder);
        Finished other = DrainSimProcess.Run(folder, "sweep", "siphon.yaml", "--vary", "line.path.outer_leg.length=1 m..41 m in 1000", "--resume");
        Assert.Equal(2, other.ExitCode);
        Assert.Contains("other values", Assert.Single(other.ErrorLines), StringComparison.Ordinal);
    }

    [Fact]
    public void Of_two_runs_in_one_folder_one_writes_and_the_other_says_so()
    {
        using TestFolder folder = Siphon();
        byte[] whole = Sweep(folder);
        folder.Delete("out");
        Process[] runs = [Start(folder), Start(folder), Start(folder)];
        Finished[] ended = [.. runs.Select(DrainSimProcess.Wait)];
        Assert.Contains(ended, run => run.ExitCode == 0);
        Assert.All(ended.Where(run => run.ExitCode != 0), run =>
        {
            Assert.Equal(3, run.ExitCode);
            Assert.Contains("another run", run.Error, StringComparison.Ordinal);
        });
        Assert.Equal(whole, folder.Bytes(Table));
    }

    [Fact]
    public void An_impossible_length_is_a_row_with_its_cause()
    {
        using TestFolder folder = Siphon();
        Sweep(folder);
        string[] rows = folder.Read(Table).Split('\n');
        Assert.StartsWith("1,1,impossible,line.path.outer_leg.length: a run of 1 m cannot fall 2.65 m,", rows[1], StringComparison.Ordinal);
        Assert.StartsWith("1000,40,inlet_uncovered,", rows[1000], StringComparison.Ordinal);
        Assert.Equal(1002, rows.Length);
    }

    [Fact]
    public void The_file_of_the_cases_is_not_overwritten()
    {
        using TestFolder folder = Siphon();
        folder.Write(Table, "tank.level\n1 m\n");
        Finished refused = DrainSimProcess.Run(folder, "sweep", "siphon.yaml", "--cases", Table);
        Assert.Equal(2, refused.ExitCode);
        Assert.Contains("would be overwritten", refused.Error, StringComparison.Ordinal);
        Assert.Equal("tank.level\n1 m\n", folder.Read(Table));
    }

    [Fact]
    public void Rows_of_a_table_are_run_in_their_order()
    {
        using TestFolder folder = Siphon();
        folder.Write("cases.csv", "tank.level,line.bore (mm)\n1 m,38\n1.2 m,25\n");
        Assert.Equal(0, DrainSimProcess.Run(folder, "sweep", "siphon.yaml", "--cases", "cases.csv").ExitCode);
        string[] rows = folder.Read(Table).Split('\n');
        Assert.StartsWith("case,tank.level_m,line.bore_m,outcome,", rows[0], StringComparison.Ordinal);
        Assert.StartsWith("1,1,0.038,inlet_uncovered,", rows[1], StringComparison.Ordinal);
        Assert.StartsWith("2,1.2,0.025,inlet_uncovered,", rows[2], StringComparison.Ordinal);
    }

    [Fact]
    public void A_piped_sweep_shows_no_bar()
    {
        using TestFolder folder = Siphon();
        Assert.Empty(DrainSimProcess.Run(folder, "sweep", "siphon.yaml", "--vary", Lengths).Error);
    }

    [Theory]
    [InlineData("tank.levl=1 m", "The nearest are 'tank.level'")]
    [InlineData("tank.level=1", "has no unit")]
    public void A_bad_parameter_is_refused_and_nothing_written(string vary, string said)
    {
        using TestFolder folder = Siphon();
        Finished refused = DrainSimProcess.Run(folder, "sweep", "siphon.yaml", "--vary", vary);
        Assert.Equal(2, refused.ExitCode);
        Assert.Contains(said, refused.Error, StringComparison.Ordinal);
        Assert.Equal(["siphon.yaml"], folder.Files);
    }

    [Theory]
    [InlineData("--shard", "0/3")]
    [InlineData("--shard", "4/3")]
    [InlineData("--shard", "x")]
    [InlineData("--threads", "0")]
    [InlineData("--threads", "1,5")]
    public void A_bad_option_is_refused_in_one_line(string option, string value)
    {
        using TestFolder folder = Siphon();
        Finished refused = DrainSimProcess.Run(folder, "sweep", "siphon.yaml", "--vary", Lengths, option, value);
        Assert.Equal(2, refused.ExitCode);
        Assert.Contains(option, Assert.Single(refused.ErrorLines), StringComparison.Ordinal);
    }

    [Fact]
    public void A_bore_is_sized_and_the_standard_sizes_beside_it_are_run()
    {
        using TestFolder folder = Siphon();
        Finished sized = DrainSimProcess.Run(folder, "size", "siphon.yaml", "-p", "line.bore", "-t", "drain_time = 30 min");
        Assert.Equal(0, sized.ExitCode);
        Assert.Contains("gives 30 min (inlet_uncovered; residual", sized.Output, StringComparison.Ordinal);
        Assert.Contains("HOSE_", sized.Output, StringComparison.Ordinal);
        Assert.Contains("DN", sized.Output, StringComparison.Ordinal);
        Assert.Equal(["out/siphon.size.csv", "out/siphon.size.png", "siphon.yaml"], folder.Files);
    }

    [Fact]
    public void A_sizing_without_a_value_says_what_is_reached_and_ends_with_1()
    {
        using TestFolder folder = Siphon();
        Finished sized = DrainSimProcess.Run(folder, "size", "siphon.yaml", "-p", "line.bore", "-t", "drain_time = 1 s", "--between", "20 mm..50 mm");
        Assert.Equal(1, sized.ExitCode);
        Assert.Contains("No value reaches it: drain_time goes from", sized.Output, StringComparison.Ordinal);
    }

    private static TestFolder Siphon()
    {
        var folder = new TestFolder();
        folder.Write("siphon.yaml", Jobs.Siphon);
        return folder;
    }

    private static Process Start(TestFolder folder) =>
        DrainSimProcess.Start(folder, DrainSimProcess.Executable, DrainSimProcess.AsItIs, "sweep", "siphon.yaml", "--vary", Lengths, "--resume");

    private static byte[] Sweep(TestFolder folder, params string[] options)
    {
        Finished run = DrainSimProcess.Run(folder, ["sweep", "siphon.yaml", "--vary", Lengths, .. options]);
        Assert.Equal((0, ""), (run.ExitCode, run.Error));
        return folder.Bytes(Table);
    }
}
