using System.Globalization;
using DrainSim.Lines;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the block <c>line</c>.</summary>
internal static class LineReader
{
    private const string RoughnessHelp = "Give the roughness, or the material ('drainsim materials' lists them)";

    /// <summary>The line; null when it is refused.</summary>
    /// <param name="block">the block</param>
    /// <param name="tank">the tank that it empties, for judging the geometry; null when it was refused</param>
    /// <param name="front">elevation of the liquid's front in the outer leg at the start, m; null for a primed line</param>
    public static Line? Read(BlockReader block, FilledTank? tank, out double? front)
    {
        double? bore = Bore(block);
        string? wall = block.AtMostOne(RoughnessHelp, "roughness", "material");
        double? roughness = PathReader.Roughness(block);
        PathReader.JudgeWall(block, roughness, bore);
        int parallel = block.CountOr1("parallel");
        Inlet? inlet = InletReader.Read(block, tank);
        LinePath? path = PathReader.Read(block, inlet?.Elevation, bore);
        AtVapour atVapour = block.Choice("at_vapour", AtVapour.Break, ("break", AtVapour.Break), ("limit", AtVapour.Limit));
        double? least = block.Amount("least_pressure", Quantities.Pressure, Allowed.NotNegative);
        double? airBreak = AirBreak(block, inlet, path);
        double? vacuumRating = block.Amount("vacuum_rating", Quantities.Pressure, Allowed.NotNegative);
        front = StartReader.Read(block, inlet, path);
        if (wall is null && path is { NeedsRoughness: true } && !block.Has("roughness") && !block.Has("material"))
            block.Miss("one of 'roughness' or 'material' is missing", RoughnessHelp, "roughness", "material");
        if (tank is not null && inlet is not null && path is not null)
            LineJudge.Judge(block, tank, inlet, path);
        block.Finish();
        if (bore is not { } d || inlet is null || path is null)
            return null;
        return block.Build(() => new Line
        {
            Bore = d,
            Roughness = roughness ?? 0,
            Parallel = parallel,
            Inlet = inlet,
            Path = path.Items,
            AtVapour = atVapour,
            LeastPressure = least,
            AirBreak = airBreak,
            VacuumRating = vacuumRating,
        });
    }

    private static double? AirBreak(BlockReader block, Inlet? inlet, LinePath? path)
    {
        double? hole = block.Amount("air_break", Quantities.Length, Allowed.NotNegative);
        if (path is null || inlet is null || hole is null || (hole > inlet.Elevation && hole <= path.Crest))
            return hole;
        block.Refuse("air_break", "no part of the line that the level passes is at this elevation",
            string.Create(CultureInfo.InvariantCulture, $"The inner leg rises from {inlet.Elevation:0.####} m to {path.Crest:0.####} m"));
        return null;
    }

    private static double? Bore(BlockReader block)
    {
        string? given = block.OnlyOne("Give the bore, or a nominal size ('drainsim sizes' lists them)", "bore", "size");
        double? bore = PathReader.OwnBore(block);
        string? size = block.Word("size");
        string? schedule = block.Word("schedule");
        if (given != "size")
        {
            if (schedule is not null && given == "bore")
                block.Refuse("schedule", "belongs to a nominal size", "Give the size instead of the bore, or leave the schedule out");
            return bore;
        }
        if (size is null)
            return null;
        if (SizeTable.Find(size, schedule) is { } row)
        {
            block.Note("bore", row.Bore, "m", $"that of {row.Id}", isDefault: true);
            return row.Bore;
        }
        bool isSize = SizeTable.All.Any(known => SizeTable.Find(size, known.Schedule) is not null);
        block.Refuse(isSize ? "schedule" : "size",
            isSize ? $"there is no {Quote.Of(size)} of that schedule" : $"no size is called {Quote.Of(size)}",
            "A size reads DN50, 2 in or 38 mm hose, a schedule 40, 80 or 10S; 'drainsim sizes' lists them");
        return null;
    }
}
