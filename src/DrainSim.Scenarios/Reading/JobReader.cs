using DrainSim.Draining;
using DrainSim.Liquids;
using DrainSim.Scenarios.Studies;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads a whole scenario, block by block.</summary>
internal static class JobReader
{
    /// <summary>The scenario; null when a part of it is missing or refused.</summary>
    public static Scenario? Read(BlockNode root, string name, string folder, Findings findings)
    {
        BlockReader file = new(root, "", root.At, findings);
        string title = file.Word("title") ?? name;
        string? notes = file.Word("notes");
        (Job? start, RunBlock run) = ReadJob(file, title, folder);
        List<Act> acts = TimelineReader.Read(file, root, start, (changed, found) => Changed(changed, title, folder, found));
        StudyBlock.Check(file);
        file.Finish();
        return start is null ? null : new Scenario
        {
            Name = name,
            Title = title,
            Notes = notes,
            Job = start with { Timeline = acts },
            Units = run.Units,
            Begins = run.Begins,
            Understood = findings.Understood,
            Warnings = findings.Warnings,
        };
    }

    private static Job? Changed(BlockNode root, string title, string folder, Findings findings)
    {
        BlockReader file = new(root, "", root.At, findings);
        (Job? job, _) = ReadJob(file, title, folder);
        return findings.IsRefused ? null : job;
    }

    private static (Job? Job, RunBlock Run) ReadJob(BlockReader file, string title, string folder)
    {
        Liquid? liquid = Needed(file, "liquid", "Give name and temperature, or density, viscosity and vapour_pressure")
            is { } liquidBlock ? LiquidReader.Read(liquidBlock) : null;
        Site site = file.Block("site") is { } siteBlock ? SiteReader.Read(siteBlock) : SiteReader.Usual(file.Findings);
        FilledTank? tank = Needed(file, "tank", "Give its shape, dimensions and level")
            is { } tankBlock ? TankReader.Read(tankBlock, folder) : null;
        IReadOnlyList<DrawOff>? drawOffs = DrawOffReader.Read(file, folder, tank);
        JobLimits? limits = file.Block("limits") is { } limitBlock ? LimitsReader.Read(limitBlock) : null;
        RunBlock run = RunReader.Read(file.Block("run"), tank, file.Findings);
        if (liquid is null || tank is null || drawOffs is null)
            return (null, run);
        Job? job = file.Build(() => new Job
        {
            Title = title,
            Liquid = liquid,
            Site = site,
            Vessel = tank.Vessel,
            Level = tank.Level,
            DrawOffs = drawOffs,
            Headspace = tank.Headspace,
            Inflow = tank.Inflow,
            VacuumRating = tank.VacuumRating,
            PressureRating = tank.PressureRating,
            Limits = limits,
            Run = run.Settings,
        });
        return (job, run);
    }

    private static BlockReader? Needed(BlockReader file, string key, string help)
    {
        if (!file.Has(key))
            file.Miss("is missing", help, key);
        return file.Block(key);
    }
}
