using System.Globalization;
using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Scenarios.Units;
using DrainSim.Vessels;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the block <c>tank</c>.</summary>
internal static class TankReader
{
    private const string Help = "Give the level, the contents or the fill";

    /// <summary>The tank and its level; null when either is refused.</summary>
    /// <param name="block">the block</param>
    /// <param name="folder">folder in which a strapping table is looked for</param>
    public static FilledTank? Read(BlockReader block, string folder)
    {
        Vessel? vessel = ShapeReader.Read(block, folder);
        string? given = block.OnlyOne(Help, "level", "contents", "fill");
        double? level = block.Amount("level", Quantities.Length, Allowed.NotNegative);
        double? contents = block.Amount("contents", Quantities.Volume, Allowed.NotNegative);
        double? fill = block.Amount("fill", Quantities.Ratio, Allowed.Share);
        Headspace headspace = HeadspaceReader.Read(block);
        Inflow? inflow = InflowReader.Read(block);
        double? vacuumRating = block.Amount("vacuum_rating", Quantities.Pressure, Allowed.NotNegative);
        double? pressureRating = block.Amount("pressure_rating", Quantities.Pressure, Allowed.NotNegative);
        block.Finish();
        if (vessel is null || given is null)
            return null;
        if (level > vessel.Height)
        {
            block.Refuse("level", Text($"the level is above the tank, which is {vessel.Height:0.####} m high inside"), "");
            return null;
        }
        if (contents > vessel.Capacity)
        {
            block.Refuse("contents", Text($"the tank holds no more than {vessel.Capacity:0.####} m3"), "");
            return null;
        }
        double? start = level ?? (contents ?? fill * vessel.Capacity) switch
        {
            { } volume => vessel.Level(volume),
            null => null,
        };
        if (start == 0)
            block.Warn(given, "the tank is empty at the start", "");
        if (start is not { } found)
            return null;
        return new FilledTank(vessel, found)
        {
            Headspace = headspace,
            Inflow = inflow,
            VacuumRating = vacuumRating,
            PressureRating = pressureRating,
        };
    }

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
