using DrainSim.Scenarios.Units;
using DrainSim.Scenarios.Yaml;
using DrainSim.Vessels;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the shape of a tank and its dimensions.</summary>
internal static class ShapeReader
{
    private static readonly (string Word, ShapeOf Read)[] Shapes =
    [
        ("vertical_cylinder", (block, _, bottomHead) => VerticalCylinder(block, bottomHead)),
        ("horizontal_cylinder", (block, _, _) => HorizontalCylinder(block)),
        ("sphere", (block, _, _) => Sphere(block)),
        ("box", (block, _, _) => Box(block)),
        ("cone", (block, _, _) => Cone(block)),
        ("basin", (block, _, _) => Basin(block)),
        ("stack", (block, folder, _) => Stack(block, folder)),
        ("table", (block, folder, _) => StrappingFileReader.Read(block, folder)),
    ];

    private delegate Vessel? ShapeOf(BlockReader block, string folder, string bottomHead);

    /// <summary>The vessel; null when it is refused.</summary>
    /// <param name="block">the block that has the key <c>shape</c></param>
    /// <param name="folder">folder in which a strapping table is looked for</param>
    /// <param name="bottomHead">key of the lower head where <c>bottom</c> says something else</param>
    public static Vessel? Read(BlockReader block, string folder, string bottomHead = "bottom")
    {
        if (!block.Has("shape"))
            block.Miss("is missing", $"The shapes are {string.Join(", ", Shapes.Select(shape => shape.Word))}", "shape");
        ShapeOf? read = block.Choice<ShapeOf?>("shape", null, [.. Shapes]);
        if (read is not null)
            return read(block, folder, bottomHead);
        // Without the shape nobody knows which dimensions belong to it: they are not unknown keys.
        foreach (string dimension in Dimensions)
            block.Has(dimension);
        return null;
    }

    private static readonly string[] Dimensions =
    [
        "diameter", "height", "length", "width", "depth", "bottom", "top", "heads", "bottom_diameter", "top_diameter",
        "bottom_length", "bottom_width", "side_slope", "sections", "file", "bottom_head",
    ];

    private static VerticalCylinder? VerticalCylinder(BlockReader block, string bottomHead)
    {
        double? diameter = Dimension(block, "diameter");
        double? height = Dimension(block, "height");
        Head? bottom = HeadReader.Read(block, bottomHead, diameter);
        Head? top = HeadReader.Read(block, "top", diameter);
        return diameter is { } d && height is { } h && bottom is not null && top is not null
            ? block.Build(() => new VerticalCylinder { Diameter = d, ShellHeight = h, Bottom = bottom, Top = top })
            : null;
    }

    private static HorizontalCylinder? HorizontalCylinder(BlockReader block)
    {
        double? diameter = Dimension(block, "diameter");
        double? length = Dimension(block, "length");
        (Head? first, Head? second) = HeadReader.Pair(block, "heads", diameter);
        return diameter is { } d && length is { } l && first is not null && second is not null
            ? block.Build(() => new HorizontalCylinder { Diameter = d, Length = l, FirstHead = first, SecondHead = second })
            : null;
    }

    private static Sphere? Sphere(BlockReader block) =>
        Dimension(block, "diameter") is { } d ? block.Build(() => new Sphere { Diameter = d }) : null;

    private static Box? Box(BlockReader block)
    {
        double? length = Dimension(block, "length");
        double? width = Dimension(block, "width");
        double? height = Dimension(block, "height");
        return length is { } l && width is { } w && height is { } h
            ? block.Build(() => new Box { Length = l, Width = w, WallHeight = h })
            : null;
    }

    private static Cone? Cone(BlockReader block)
    {
        double? bottom = block.Needed("bottom_diameter", Quantities.Length, Allowed.NotNegative);
        double? top = block.Needed("top_diameter", Quantities.Length, Allowed.NotNegative);
        double? height = Dimension(block, "height");
        return bottom is { } b && top is { } t && height is { } h
            ? block.Build(() => new Cone { BottomDiameter = b, TopDiameter = t, ConeHeight = h })
            : null;
    }

    private static Basin? Basin(BlockReader block)
    {
        double? length = Dimension(block, "bottom_length");
        double? width = Dimension(block, "bottom_width");
        double? slope = block.Needed("side_slope", Quantities.Ratio, Allowed.NotNegative);
        double? depth = Dimension(block, "depth");
        return length is { } l && width is { } w && slope is { } m && depth is { } h
            ? block.Build(() => new Basin { BottomLength = l, BottomWidth = w, SideSlope = m, Depth = h })
            : null;
    }

    private static Stack? Stack(BlockReader block, string folder)
    {
        if (!block.Has("sections"))
            block.Miss("is missing", "List the sections from the bottom up, each with its shape", "sections");
        if (block.List("sections") is not { } list)
            return null;
        List<Vessel?> sections = [];
        for (int i = 0; i < list.Items.Count; i++)
        {
            string path = ParameterPath.OfItem(block.PathOf("sections"), list.Items[i], i);
            if (list.Items[i] is not BlockNode node)
            {
                block.Findings.Refuse(list.Items[i].At, path, "is no section", "A section has a shape and its dimensions");
                sections.Add(null);
                continue;
            }
            BlockReader section = new(node, path, node.At, block.Findings);
            section.Word("name");
            sections.Add(Read(section, folder));
            section.Finish();
        }
        return sections.Contains(null) ? null : block.Build(() => new Stack { Sections = [.. sections.OfType<Vessel>()] });
    }

    private static double? Dimension(BlockReader block, string key) =>
        block.Needed(key, Quantities.Length, Allowed.Positive);
}
