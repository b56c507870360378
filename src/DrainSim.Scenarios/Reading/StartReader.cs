using System.Globalization;
using DrainSim.Lines;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the key <c>start</c> of a line: primed, or with the liquid's front partway down its outer leg.</summary>
internal static class StartReader
{
    private const string Help = "Write primed, or {front: 1.2 m} with the elevation of the liquid's front in the outer leg";

    /// <summary>Elevation of the front, m; null for a line that is primed and where the key is refused.</summary>
    /// <param name="line">the block of the line</param>
    /// <param name="inlet">its inlet; null when it was refused</param>
    /// <param name="path">its path; null when it was refused</param>
    public static double? Read(BlockReader line, Inlet? inlet, LinePath? path)
    {
        if (line.BlockIfAny("start") is not { } start)
        {
            if (!line.Has("start"))
                line.Note("start", null, null, "primed", isDefault: true);
            else if (line.Word("start") is { } word and not "primed")
                line.Refuse("start", $"{Quote.Of(word)} is not known here", Help);
            return null;
        }
        double? front = start.Needed("front", Quantities.Length, Allowed.Any);
        start.Finish();
        if (front is not { } z || inlet is null || path is null)
            return null;
        double outlet = inlet.Elevation + path.Items.OfType<StraightRun>().Sum(run => run.Rise);
        if (z <= path.Crest && z > outlet)
            return front;
        start.Refuse("front", z > path.Crest
            ? string.Create(CultureInfo.InvariantCulture, $"stands above the highest point of the line, {path.Crest:0.###} m")
            : string.Create(CultureInfo.InvariantCulture, $"stands no higher than the outlet, at {outlet:0.###} m"),
            z > path.Crest ? "Give an elevation between the outlet and the highest point" : "A line full to its outlet is primed: write start: primed");
        return null;
    }
}
