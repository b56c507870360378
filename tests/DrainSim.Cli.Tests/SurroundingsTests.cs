using System.Diagnostics;
using DrainSim.Draining;
using DrainSim.Reports;
using DrainSim.Reports.Files;
using DrainSim.Scenarios;

namespace DrainSim.Cli.Tests;

/// <summary>The machine around the program: locale, fonts, interruption.</summary>
public sealed class SurroundingsTests
{
    [Theory]
    [InlineData("de_DE.UTF-8")]
    [InlineData("tr_TR.UTF-8")]
    public void The_locale_changes_no_byte(string locale)
    {
        using var folder = new TestFolder();
        folder.Write("SIPHON.yaml", Jobs.Siphon);
        var plain = new Dictionary<string, string> { ["LANG"] = "C", ["LC_ALL"] = "C" };
        var local = new Dictionary<string, string> { ["LANG"] = locale, ["LC_ALL"] = locale };
        Finished here = DrainSimProcess.Run(folder, plain, "run", "SIPHON.yaml", "--out", "out");
        IReadOnlyList<byte[]> expected = Contents(folder);
        Finished there = DrainSimProcess.Run(folder, local, "run", "SIPHON.yaml", "--out", "out");
        Assert.Equal(here, there);
        Assert.Equal(expected, Contents(folder));
    }

    [Fact]
    public void A_decimal_comma_is_refused_in_every_locale()
    {
        using var folder = new TestFolder();
        folder.Write("comma.yaml", Jobs.Siphon.Replace("1.2 m, height", "1,2 m, height", StringComparison.Ordinal)
            .Replace("diameter: 1,2 m", "diameter: '1,2 m'", StringComparison.Ordinal));
        var german = new Dictionary<string, string> { ["LANG"] = "de_DE.UTF-8", ["LC_ALL"] = "de_DE.UTF-8" };
        Assert.Equal(2, DrainSimProcess.Run(folder, german, "check", "comma.yaml").ExitCode);
    }

    [Fact]
    public void The_pictures_are_those_that_the_library_draws()
    {
        using var folder = new TestFolder();
        folder.Write("siphon.yaml", Jobs.Siphon);
        DrainSimProcess.Run(folder, "run", "siphon.yaml", "--out", "process");
        Scenario scenario = ScenarioReader.Read(folder.Full("siphon.yaml")).Scenario!;
        var report = new RunReport { Name = "siphon", Result = Simulation.Run(scenario.Job, TestContext.Current.CancellationToken) };
        RunFiles.Write(folder.Full("library"), report, TestContext.Current.CancellationToken);
        Assert.Equal(folder.Bytes("library/siphon.png"), folder.Bytes("process/siphon.png"));
        Assert.Equal(folder.Bytes("library/siphon.line.png"), folder.Bytes("process/siphon.line.png"));
    }

    [Fact]
    public void The_pictures_are_the_same_on_a_machine_without_fonts()
    {
        using var folder = new TestFolder();
        folder.Write("siphon.yaml", Jobs.Siphon);
        Assert.SkipUnless(CanHideFonts(folder), "hiding the fonts takes a mount namespace, which is not allowed here");
        DrainSimProcess.Run(folder, "run", "siphon.yaml", "--out", "with");
        string script = $"mount -t tmpfs none /usr/share/fonts && exec '{DrainSimProcess.Executable}' run siphon.yaml --out without";
        Finished bare = DrainSimProcess.Wait(DrainSimProcess.Start(
            folder, "unshare", DrainSimProcess.AsItIs, "--mount", "sh", "-c", script));
        Assert.Equal((0, ""), (bare.ExitCode, bare.Error));
        Assert.Equal(folder.Bytes("with/siphon.png"), folder.Bytes("without/siphon.png"));
        Assert.Equal(folder.Bytes("with/siphon.line.png"), folder.Bytes("without/siphon.line.png"));
    }

    [Fact]
    public void An_interrupt_ends_with_130_and_leaves_whole_runs_alone()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "there is no SIGINT to send");
        using var folder = new TestFolder();
        string[] names = [.. Enumerable.Range(0, 400).Select(i => $"tank{i:000}.yaml")];
        foreach (string name in names)
            folder.Write(name, Jobs.Siphon);
        Process process = DrainSimProcess.Start(
            folder, DrainSimProcess.Executable, DrainSimProcess.AsItIs, ["run", .. names]);
        while (!process.HasExited && !File.Exists(folder.Full("out/tank001.json")))
            Thread.Sleep(10);
        using (Process kill = Process.Start("kill", ["-INT", $"{process.Id}"]))
            kill.WaitForExit();
        Finished interrupted = DrainSimProcess.Wait(process);
        Assert.Equal(130, interrupted.ExitCode);
        Assert.Contains("interrupted", Assert.Single(interrupted.ErrorLines), StringComparison.Ordinal);
        string[] written = [.. folder.Files.Where(file => file.StartsWith("out/", StringComparison.Ordinal))];
        Assert.DoesNotContain(written, file => file.EndsWith(".partial", StringComparison.Ordinal));
        Assert.All(written.GroupBy(file => file[..file.IndexOf('.', StringComparison.Ordinal)]), run => Assert.Equal(5, run.Count()));
        Assert.True(written.Length < 5 * names.Length, "all runs were over before the interrupt");
    }

    [Fact]
    public void A_full_disk_under_the_output_ends_with_3_and_one_line()
    {
        Assert.SkipUnless(File.Exists("/dev/full"), "there is no /dev/full here");
        using var folder = new TestFolder();
        Finished full = DrainSimProcess.Wait(DrainSimProcess.Start(folder, "sh", DrainSimProcess.AsItIs,
            "-c", $"'{DrainSimProcess.Executable}' liquids > /dev/full"));
        Assert.Equal(3, full.ExitCode);
        Assert.Contains("cannot be written", Assert.Single(full.ErrorLines), StringComparison.Ordinal);
    }

    private static bool CanHideFonts(TestFolder folder)
    {
        if (!OperatingSystem.IsLinux() || !Directory.Exists("/usr/share/fonts"))
            return false;
        try
        {
            return DrainSimProcess.Wait(DrainSimProcess.Start(folder, "unshare", DrainSimProcess.AsItIs,
                "--mount", "sh", "-c", "mount -t tmpfs none /usr/share/fonts")).ExitCode == 0;
        }
        catch (System.ComponentModel.Win32Exception)
        {
            return false;
        }
    }

    private static IReadOnlyList<byte[]> Contents(TestFolder folder) => [.. folder.Files.Select(folder.Bytes)];
}
