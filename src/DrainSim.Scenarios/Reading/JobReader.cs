using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Liquids;
using DrainSim.Scenarios.Studies;
using DrainSim.Scenarios.Units;
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
        Liquid? liquid = Needed(file, "liquid", "Give name and temperature, or density, viscosity and vapour_pressure")
            is { } liquidBlock ? LiquidReader.Read(liquidBlock) : null;
        Site site = file.Block("site") is { } siteBlock ? SiteReader.Read(siteBlock) : SiteReader.Usual(findings);
        FilledTank? tank = Needed(file, "tank", "Give its shape, dimensions and level")
            is { } tankBlock ? TankReader.Read(tankBlock, folder) : null;
        Line? line = Needed(file, "line", "Give its bore, inlet and path")
            is { } lineBlock ? LineReader.Read(lineBlock, tank) : null;
        double? surface = file.Block("receiver") is { } receiver ? Surface(receiver) : null;
        RunBlock run = RunReader.Read(file.Block("run"), tank, findings);
        StudyBlock.Check(file);
        file.Finish();
        if (liquid is null || tank is null || line is null)
            return null;
        Job? job = file.Build(() => new Job
        {
            Title = title,
            Liquid = liquid,
            Site = site,
            Vessel = tank.Vessel,
            Level = tank.Level,
            DrawOffs =
            [
                new DrawOff
                {
                    Line = line,
                    Receiver = surface is { } elevation ? new FixedSurface { Elevation = elevation } : null,
                },
            ],
            Run = run.Settings,
        });
        return job is null ? null : new Scenario
        {
            Name = name,
            Title = title,
            Notes = notes,
            Job = job,
            Units = run.Units,
            Understood = findings.Understood,
            Warnings = findings.Warnings,
        };
    }

    private static BlockReader? Needed(BlockReader file, string key, string help)
    {
        if (!file.Has(key))
            file.Miss("is missing", help, key);
        return file.Block(key);
    }

    private static double? Surface(BlockReader receiver)
    {
        if (receiver.Has("shape"))
        {
            receiver.Refuse("shape", "not read by this version", LaterWork.Find("receiver.shape")!);
            return null;
        }
        double? surface = receiver.Needed("surface", Quantities.Length, Allowed.Any);
        receiver.Finish();
        return surface;
    }
}
