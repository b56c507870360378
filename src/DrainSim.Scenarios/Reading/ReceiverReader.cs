using System.Globalization;
using DrainSim.Draining;
using DrainSim.Scenarios.Units;
using DrainSim.Vessels;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads a block <c>receiver</c>: a surface that stays where it is, or a tank that fills.</summary>
internal static class ReceiverReader
{
    /// <summary>The receiver; null when it is refused.</summary>
    /// <param name="block">the block</param>
    /// <param name="folder">folder in which a strapping table is looked for</param>
    public static Receiver? Read(BlockReader block, string folder)
    {
        if (block.Has("shape"))
            return Tank(block, folder);
        foreach (string key in new[] { "bottom", "level", "brim" })
        {
            if (block.Has(key))
                block.Refuse(key, "belongs to a receiver that is a tank", "Give its shape and dimensions too, or the 'surface' alone");
        }
        double? surface = block.Needed("surface", Quantities.Length, Allowed.Any);
        block.Finish();
        return surface is { } z ? block.Build(() => new FixedSurface { Elevation = z }) : null;
    }

    private static ReceivingTank? Tank(BlockReader block, string folder)
    {
        if (block.Has("surface"))
            block.Refuse("surface", "stands beside 'shape'", "A tank has a 'level'; a fixed surface has no shape");
        Vessel? vessel = ShapeReader.Read(block, folder, bottomHead: "bottom_head");
        double? bottom = block.Needed("bottom", Quantities.Length, Allowed.Any);
        double level = block.AmountOr("level", Quantities.Length, Allowed.NotNegative, 0, "0 m");
        double? brim = block.Amount("brim", Quantities.Length, Allowed.Positive);
        block.Finish();
        if (vessel is null || bottom is not { } z)
            return null;
        if (brim > vessel.Height)
        {
            block.Refuse("brim", string.Create(CultureInfo.InvariantCulture,
                $"the brim is above the receiver, which is {vessel.Height:0.####} m high inside"), "Depths count from its lowest inside point");
            return null;
        }
        if (level >= Math.Min(brim ?? vessel.Height, vessel.Height))
        {
            block.Refuse("level", "the receiver is full from the start", "Give a level below its brim");
            return null;
        }
        return block.Build(() => new ReceivingTank { Vessel = vessel, Bottom = z, Level = level, Brim = brim });
    }
}
