using System.Globalization;
using DrainSim.Lines;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads a straight run of a path.</summary>
internal static class RunItemReader
{
    /// <summary>A length measured along a run is no shorter than its rise, but for the rounding of differences, m.</summary>
    private const double Rounding = 1e-9;

    /// <summary>The run; null when it is refused.</summary>
    /// <param name="block">the item</param>
    /// <param name="walk">where the path has got to; moved to the end of the run</param>
    public static StraightRun? Read(BlockReader block, PathWalk walk)
    {
        double? length = block.Needed("length", Quantities.Length, Allowed.Positive);
        double? rise = Rise(block, walk, out string? key);
        block.AtMostOne("Give the roughness or the material", "roughness", "material");
        double? roughness = PathReader.Roughness(block);
        walk.NeedsRoughness |= !block.Has("roughness") && !block.Has("material");
        if (length is { } l && rise is { } climb && l < Math.Abs(climb) - Rounding)
        {
            string verb = climb > 0 ? "climb" : "fall";
            block.Refuse("length", string.Create(CultureInfo.InvariantCulture,
                $"a run of {l:0.####} m cannot {verb} {Math.Abs(climb):0.####} m"), $"Give a longer run, or another '{key}'");
            return null;
        }
        PathReader.JudgeWall(block, roughness, walk.Bore);
        return length is { } run && rise is { } z
            ? block.Build(() => new StraightRun { Length = run, Rise = z, Roughness = roughness })
            : null;
    }

    private static double? Rise(BlockReader block, PathWalk walk, out string? key)
    {
        key = block.OnlyOne("Give the elevation of its end, or how much it rises (negative where it falls)", "to", "rise");
        double? to = block.Amount("to", Quantities.Length, Allowed.Any);
        double? rise = block.Amount("rise", Quantities.Length, Allowed.Any);
        double? from = walk.Elevation;
        walk.MoveTo(to ?? from + rise);
        if (key == "rise")
            return rise;
        // Where the elevation before is not known the scenario is refused already, and 0 stands for the rise.
        return to is null ? null : to - from ?? 0;
    }
}
