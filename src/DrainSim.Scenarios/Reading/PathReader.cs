using DrainSim.Lines;
using DrainSim.Scenarios.Units;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the list <c>line.path</c>, item by item from the inlet to the outlet.</summary>
internal static class PathReader
{
    /// <summary>Relative roughness at which the chart of L. F. Moody, Trans. ASME 66 (1944) 671, ends.</summary>
    private const double RoughestWall = 0.05;

    private const string Help = "An item is a run with its length, a fitting, a valve, a reducer or a loss";

    /// <summary>The path; null when an item is refused.</summary>
    /// <param name="line">the block of the line</param>
    /// <param name="start">elevation of the inlet, m; null when it was refused</param>
    /// <param name="bore">bore at the inlet, m; null when it was refused</param>
    public static LinePath? Read(BlockReader line, double? start, double? bore)
    {
        if (!line.Has("path"))
            line.Miss("is missing", $"List what the liquid passes. {Help}", "path");
        if (line.List("path") is not { } list)
            return null;
        PathWalk walk = new(start, bore);
        List<PathItem?> items = [];
        HashSet<string> names = [];
        for (int i = 0; i < list.Items.Count; i++)
        {
            string path = ParameterPath.OfItem(line.PathOf("path"), list.Items[i], i);
            if (list.Items[i] is BlockNode node)
            {
                items.Add(Item(new BlockReader(node, path, node.At, line.Findings), names, walk));
                continue;
            }
            line.Findings.Refuse(list.Items[i].At, path, "is no item of a path", Help);
            items.Add(null);
        }
        return items.Contains(null) ? null : new LinePath([.. items.OfType<PathItem>()], walk.NeedsRoughness, walk.Crest);
    }

    /// <summary>The roughness that a line or a run gives, by itself or by its material, m; null when it gives none.</summary>
    public static double? Roughness(BlockReader block)
    {
        Material? material = block.Row("material", "material", MaterialTable.Find,
            () => MaterialTable.All.Select(row => row.Id).Concat(MaterialTable.Aliases.Select(alias => alias.Name)), "drainsim materials");
        if (material is not null)
            block.Note("roughness", material.Roughness, "m", $"that of {material.Id}", isDefault: true);
        return block.Amount("roughness", Quantities.Length, Allowed.NotNegative) ?? material?.Roughness;
    }

    /// <summary>Warns of a wall that is too rough for its bore.</summary>
    /// <param name="block">the line or the run that gives the roughness</param>
    /// <param name="roughness">roughness, m; null when it gives none</param>
    /// <param name="bore">bore there, m; null when it is not known</param>
    public static void JudgeWall(BlockReader block, double? roughness, double? bore)
    {
        if (roughness > RoughestWall * bore)
            block.Warn(block.Has("material") ? "material" : "roughness", "the wall is rougher than a twentieth of the bore",
                "The friction law is not known there");
    }

    /// <summary>The bore that a line or an item gives, m; null when it gives none.</summary>
    public static double? OwnBore(BlockReader block)
    {
        double? bore = block.Amount("bore", Quantities.Length, Allowed.Positive);
        if (bore is > 1 or < 1e-3)
            block.Warn("bore", "few lines are so wide or so narrow", "Most lie from 4 mm to 600 mm");
        return bore;
    }

    private static PathItem? Item(BlockReader block, HashSet<string> names, PathWalk walk)
    {
        string? name = NameReader.Read(block, names);
        string? kind = block.OnlyOne(Help, "length", "fitting", "valve", "reducer", "loss");
        double? bore = OwnBore(block);
        if (block.Has("bore"))
            walk.Bore = bore;
        PathItem? item = kind switch
        {
            "length" => RunItemReader.Read(block, walk),
            "fitting" => FittingItem(block),
            "valve" => ValveItemReader.Read(block),
            "reducer" => ReducerItem(block),
            "loss" => LossItem(block),
            _ => Unknown(block),
        };
        block.Finish();
        return item is null ? null : item with { Name = name, Bore = bore };
    }

    private static Fitting? FittingItem(BlockReader block)
    {
        FittingKind? kind = block.Row("fitting", "fitting", FittingTable.Find,
            () => FittingTable.All.Select(row => row.Id).Concat(FittingTable.Aliases.Select(alias => alias.Name)), "drainsim fittings");
        int count = block.CountOr1("count");
        return kind is null ? null : block.Build(() => new Fitting { Kind = kind, Count = count });
    }

    private static Reducer? ReducerItem(BlockReader block)
    {
        block.Choice("reducer", true, ("cone", true));
        double? angle = block.Needed("angle", Quantities.Angle, Allowed.Within(1e-3, Math.PI, "from 0.1 deg to 180 deg"));
        if (!block.Has("bore"))
            block.Miss("is missing", "Give the bore behind the reducer", "bore");
        return angle is { } a && block.Has("bore") ? block.Build(() => new Reducer { Angle = a }) : null;
    }

    private static PlainLoss? LossItem(BlockReader block) =>
        block.Needed("loss", Quantities.Ratio, Allowed.NotNegative) is { } k
            ? block.Build(() => new PlainLoss { Coefficient = k })
            : null;

    /// <summary>Keeps the keys of an item without a kind from being told as unknown.</summary>
    private static PathItem? Unknown(BlockReader block)
    {
        foreach (string key in new[] { "to", "rise", "roughness", "material", "count", "opening", "kv", "cv", "angle" })
            block.Has(key);
        return null;
    }
}
