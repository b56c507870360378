using System.Globalization;
using DrainSim.Lines;

namespace DrainSim.Scenarios.Reading;

/// <summary>Warns of a line that hardly fits its tank.</summary>
internal static class LineJudge
{
    /// <summary>Adds the warnings that fit.</summary>
    public static void Judge(BlockReader line, FilledTank tank, Inlet inlet, LinePath path)
    {
        if (inlet.Facing == InletFacing.Down && path.Crest > inlet.Elevation && path.Crest < tank.Vessel.Height)
        {
            line.Warn("path", string.Create(CultureInfo.InvariantCulture,
                $"the highest point of the line, {path.Crest:0.###} m, is below the rim of the tank, {tank.Vessel.Height:0.###} m"),
                "A hose over the rim has to clear it; through a nozzle in the wall all is well");
        }
    }
}
