namespace DrainSim.Lines.Inlets;

/// <summary>Heights of the surface above an inlet's lowest edge at which air may be drawn.</summary>
/// <param name="Least">least of the published design depths, m; below it a vortex that draws air is likely</param>
/// <param name="Most">most of them, m; above it one is unlikely</param>
/// <param name="PullThrough">where gas is pulled through without any swirl, m; null where no form is known</param>
public readonly record struct SubmergenceBand(double Least, double Most, double? PullThrough);
