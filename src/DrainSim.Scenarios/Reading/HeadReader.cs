using DrainSim.Scenarios.Units;
using DrainSim.Scenarios.Yaml;
using DrainSim.Vessels;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads heads and bottoms: a word, or a block with the shape and its measures.</summary>
internal static class HeadReader
{
    private enum Kind
    {
        Unknown,
        Flat,
        Cone,
        Hemisphere,
        Ellipsoidal,
        Torispherical,
        Kloepper,
        Korbbogen,
        FlangedAndDished,
    }

    /// <summary>The head under a key, flat when there is none; null when it is refused.</summary>
    /// <param name="block">the tank</param>
    /// <param name="key">the key</param>
    /// <param name="diameter">diameter of the shell, m; null when it was refused</param>
    public static Head? Read(BlockReader block, string key, double? diameter)
    {
        if (block.BlockIfAny(key) is { } inner)
            return FromBlock(inner, diameter);
        return FromWord(block, key, block.Choice(key, block.Has(key) ? Kind.Unknown : Kind.Flat, Words()), diameter);
    }

    /// <summary>The two heads of a lying shell: one for both, or a list of two.</summary>
    public static (Head? First, Head? Second) Pair(BlockReader block, string key, double? diameter)
    {
        if (block.ListIfAny(key) is not { } list)
        {
            Head? both = Read(block, key, diameter);
            return (both, both);
        }
        if (list.Items.Count != 2)
        {
            block.Refuse(key, "does not list two heads", "Give one head for both ends, or a list of two");
            return (null, null);
        }
        return (Item(block, key, list, 0, diameter), Item(block, key, list, 1, diameter));
    }

    private static Head? Item(BlockReader block, string key, ListNode list, int index, double? diameter)
    {
        // An item is read as a key of a block of its own, so that its path and place are right.
        string item = ParameterPath.OfItem(key, list.Items[index], index);
        Entry entry = new(item, list.Items[index].At, list.Items[index]);
        return Read(new BlockReader(new BlockNode([entry], list.At), block.Path, list.At, block.Findings), item, diameter);
    }

    private static Head? FromBlock(BlockReader block, double? diameter)
    {
        if (!block.Has("shape"))
            block.Miss("is missing", $"The heads are {string.Join(", ", Words().Select(word => word.Word))}", "shape");
        Kind kind = block.Choice("shape", Kind.Unknown, Words());
        Head? head = kind switch
        {
            Kind.Cone => Cone(block),
            Kind.Ellipsoidal => Ellipsoid(block),
            Kind.Torispherical => Torispherical(block, diameter),
            _ => FromWord(block, "shape", kind, diameter),
        };
        if (kind == Kind.Unknown)
        {
            foreach (string measure in new[] { "depth", "angle", "proportions", "crown_radius", "knuckle_radius" })
                block.Has(measure);
        }
        block.Finish();
        return head;
    }

    private static ConeHead? Cone(BlockReader block)
    {
        string? given = block.OnlyOne("Give the depth, or the included angle at the apex", "depth", "angle");
        double? depth = block.Amount("depth", Quantities.Length, Allowed.Positive);
        double? angle = block.Amount("angle", Quantities.Angle, Allowed.Within(0.01, 3.14, "from 0.6 deg to 179.9 deg"));
        if (given is null)
            return null;
        return depth is { } d ? block.Build(() => ConeHead.OfDepth(d))
            : angle is { } a ? block.Build(() => ConeHead.OfAngle(a)) : null;
    }

    private static Ellipsoidal? Ellipsoid(BlockReader block)
    {
        double? depth = block.Amount("depth", Quantities.Length, Allowed.Positive);
        return block.Has("depth") && depth is null ? null : block.Build(() => new Ellipsoidal { Depth = depth });
    }

    private static Torispherical? Torispherical(BlockReader block, double? diameter)
    {
        block.AtMostOne("Give the radii or the proportions", "crown_radius", "proportions");
        if (!block.Has("crown_radius") && !block.Has("knuckle_radius"))
            return Proportioned(block.Choice("proportions", Kind.Kloepper, ProportionWords()), diameter);
        double? crown = block.Needed("crown_radius", Quantities.Length, Allowed.Positive);
        double? knuckle = block.Needed("knuckle_radius", Quantities.Length, Allowed.NotNegative);
        return crown is { } c && knuckle is { } k && diameter is { } d
            ? block.BuildAt("crown_radius", () => Fitting(new Torispherical { CrownRadius = c, KnuckleRadius = k }, d))
            : null;
    }

    private static Torispherical? Proportioned(Kind kind, double? diameter) => (kind, diameter) switch
    {
        (Kind.Kloepper, { } d) => Vessels.Torispherical.Kloepper(d),
        (Kind.Korbbogen, { } d) => Vessels.Torispherical.Korbbogen(d),
        (Kind.FlangedAndDished, { } d) => Vessels.Torispherical.FlangedAndDished(d),
        _ => null,
    };

    private static Head? FromWord(BlockReader block, string key, Kind kind, double? diameter)
    {
        switch (kind)
        {
            case Kind.Flat:
                return new Flat();
            case Kind.Hemisphere:
                return new Hemisphere();
            case Kind.Ellipsoidal:
                return new Ellipsoidal();
            case Kind.Cone:
                block.Refuse(key, "a cone needs its depth or its angle", "Write {shape: cone, depth: 0.4 m} or {shape: cone, angle: 90 deg}");
                return null;
            case Kind.Torispherical:
                // The commonest dished head where only the word is given; the echo shows it.
                block.Note(key + ".proportions", null, null, "kloepper", isDefault: true);
                return Proportioned(Kind.Kloepper, diameter);
            default:
                return Proportioned(kind, diameter);
        }
    }

    /// <summary>The head, when it fits the shell.</summary>
    /// <exception cref="ArgumentOutOfRangeException">it does not; names the quantity and its unit</exception>
    private static T Fitting<T>(T head, double diameter)
        where T : Head
    {
        head.DepthOn(diameter);
        return head;
    }

    private static (string Word, Kind Kind)[] Words() =>
    [
        ("flat", Kind.Flat), ("cone", Kind.Cone), ("hemisphere", Kind.Hemisphere), ("ellipsoidal", Kind.Ellipsoidal),
        ("torispherical", Kind.Torispherical), .. ProportionWords(),
    ];

    private static (string Word, Kind Kind)[] ProportionWords() =>
    [
        ("kloepper", Kind.Kloepper), ("korbbogen", Kind.Korbbogen), ("flanged_and_dished", Kind.FlangedAndDished),
    ];
}
