using DrainSim.Draining;

namespace DrainSim.Studies.Uncertainty;

/// <summary>The level of one run at even parts of its time, small enough to keep thousands.</summary>
internal sealed class LevelTrack
{
    /// <summary>Parts of the run; straight lines between them are within a pixel of the curve.</summary>
    private const int Parts = 64;

    private readonly float[] levels = new float[Parts + 1];
    private readonly double end;

    /// <summary>Takes the track of a run.</summary>
    public LevelTrack(DrainResult result)
    {
        end = result.Trace.End;
        for (int i = 0; i <= Parts; i++)
            levels[i] = (float)result.Job.Vessel.Level(result.Trace.VolumeAt(Math.Min(end, end * i / Parts)));
    }

    /// <summary>The level at a time, m; the last one after the end.</summary>
    public double At(double time)
    {
        if (!(time < end))
            return levels[Parts];
        double place = time / end * Parts;
        int below = (int)place;
        return levels[below] + (place - below) * (levels[Math.Min(below + 1, Parts)] - levels[below]);
    }
}
