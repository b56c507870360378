using DrainSim.Gas;
using DrainSim.Scenarios.Units;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the openings of a headspace: vents, a relief valve, a vacuum break.</summary>
internal static class OpeningReader
{
    /// <summary>The openings that let gas through; an opening that is wholly blocked is not among them.</summary>
    /// <param name="headspace">the block of the headspace</param>
    public static List<Opening> Read(BlockReader headspace)
    {
        List<Opening> openings = [];
        headspace.AtMostOne("Give one 'vent', or a list of 'vents'", "vent", "vents");
        if (headspace.Block("vent") is { } vent)
            Add(openings, Vent(vent));
        if (headspace.List("vents") is { } list)
            ReadList(headspace, list, openings);
        if (headspace.Block("relief_valve") is { } relief)
            Add(openings, Valve(relief, isRelief: true));
        if (headspace.Block("vacuum_break") is { } vacuum)
            Add(openings, Valve(vacuum, isRelief: false));
        return openings;
    }

    private static void ReadList(BlockReader headspace, ListNode list, List<Opening> openings)
    {
        for (int i = 0; i < list.Items.Count; i++)
        {
            string path = ParameterPath.OfItem(headspace.PathOf("vents"), list.Items[i], i);
            if (list.Items[i] is BlockNode node)
                Add(openings, Vent(new BlockReader(node, path, node.At, headspace.Findings)));
            else
                headspace.Findings.Refuse(list.Items[i].At, path, "is no vent", "A vent has a bore, such as {bore: 50 mm}");
        }
    }

    private static void Add(List<Opening> openings, Opening? opening)
    {
        if (opening is not null)
            openings.Add(opening);
    }

    private static Opening? Vent(BlockReader block)
    {
        string? name = block.Word("name");
        double? bore = FreeBore(block);
        Opening? vent = block.Has("length") ? Pipe(block, name, bore) : Hole(block, name, bore);
        block.Finish();
        return vent;
    }

    private static VentOrifice? Hole(BlockReader block, string? name, double? bore)
    {
        double coefficient = Coefficient(block);
        foreach (string key in new[] { "losses", "roughness", "material" })
        {
            if (block.Has(key))
                block.Refuse(key, "belongs to a vent pipe", "Give the length of the pipe too, or the coefficient of the opening alone");
        }
        return bore is > 0 and { } d
            ? block.Build(() => new VentOrifice { Name = name, Bore = d, DischargeCoefficient = coefficient })
            : null;
    }

    private static VentLine? Pipe(BlockReader block, string? name, double? bore)
    {
        double? length = block.Amount("length", Quantities.Length, Allowed.Positive);
        block.AtMostOne("Give the roughness or the material", "roughness", "material");
        double roughness = PathReader.Roughness(block) ?? 0;
        double losses = block.AmountOr("losses", Quantities.Ratio, Allowed.NotNegative, 0.5, "0.5");
        if (block.Has("coefficient"))
            block.Refuse("coefficient", "belongs to a short opening", "A pipe has a length and 'losses' instead");
        return bore is > 0 and { } d && length is { } l
            ? block.Build(() => new VentLine { Name = name, Bore = d, Length = l, Roughness = roughness, Losses = losses })
            : null;
    }

    private static PressureValve? Valve(BlockReader block, bool isRelief)
    {
        string? name = block.Word("name");
        double? bore = FreeBore(block);
        double? set = block.Needed("set_pressure", Quantities.Pressure, Allowed.NotNegative);
        double? open = block.Needed("full_open_pressure", Quantities.Pressure, Allowed.Positive);
        double coefficient = Coefficient(block);
        if (open <= set)
        {
            block.Refuse("full_open_pressure", "is no higher than the set pressure",
                "A valve begins to open at the set pressure and is full open above it");
            open = null;
        }
        block.Finish();
        if (bore is not > 0 || set is not { } from || open is not { } to)
            return null;
        double d = bore.Value;
        return isRelief
            ? block.Build<PressureValve>(() => new ReliefValve
            {
                Name = name,
                Bore = d,
                SetPressure = from,
                OpeningRise = to - from,
                DischargeCoefficient = coefficient,
            })
            : block.Build<PressureValve>(() => new VacuumBreak
            {
                Name = name,
                Bore = d,
                SetPressure = from,
                OpeningRise = to - from,
                DischargeCoefficient = coefficient,
            });
    }

    /// <summary>The bore of the area that dirt, ice or a cover leaves free, m; 0 for a blocked opening, null for a refused one.</summary>
    private static double? FreeBore(BlockReader block)
    {
        double? bore = block.Needed("bore", Quantities.Length, Allowed.Positive);
        double free = block.AmountOr("free_area", Quantities.Ratio, Allowed.Share, 1, "100 %");
        return bore * Math.Sqrt(free);
    }

    private static double Coefficient(BlockReader block) => block.AmountOr(
        "coefficient", Quantities.Ratio, Allowed.Within(0.01, 1, "from 0.01 to 1"), VentOrifice.SharpEdge, "0.61");
}
