using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Liquids;
using DrainSim.Tests.Draining;
using DrainSim.Vessels;

namespace DrainSim.Tests.Published;

/// <summary>Drain jobs as books set them: one constant coefficient, no friction that varies, the books' gravity.</summary>
internal static class BookDrains
{
    /// <summary>Water without the viscosity that the books leave out.</summary>
    public static Liquid Thin { get; } = Jobs.Inviscid;

    /// <summary>A tank and a line of constant losses, from a level down to a level or to the last drop.</summary>
    /// <param name="vessel">the tank</param>
    /// <param name="from">level at the start, m</param>
    /// <param name="line">the line</param>
    /// <param name="to">level at which the book stops, m; 0 for the last drop</param>
    /// <param name="gravity">gravity of the book, m/s²</param>
    public static Job Of(Vessel vessel, double from, Line line, double to = 0, double gravity = RoughLines.Gravity) => new()
    {
        Liquid = Thin,
        Site = new Site { Gravity = gravity },
        Vessel = vessel,
        Level = from,
        DrawOffs = Jobs.Only(line),
        Run = new RunSettings { StopAtLevel = to > 0 ? to : null, SettledWithin = 0, Until = 1e8 },
    };

    /// <summary>The time that such a job takes, s.</summary>
    public static double Time(Job job) => Jobs.Run(job).StoppedAt;

    /// <summary>Asserts that a time is the printed one within a share of it.</summary>
    /// <param name="printed">the printed time, s</param>
    /// <param name="share">share of it, 1</param>
    /// <param name="job">the job</param>
    public static void AssertTime(double printed, double share, Job job) =>
        Assert.InRange(Time(job) / printed - 1, -share, share);
}
