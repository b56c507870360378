namespace DrainSim.Scenarios.Reading;

/// <summary>Where a path has got to, while its items are read in order.</summary>
/// <param name="start">elevation of the inlet, m; null when it was refused</param>
/// <param name="bore">bore at the inlet, m; null when it was refused</param>
internal sealed class PathWalk(double? start, double? bore)
{
    /// <summary>Elevation so far, m; null when it is not known.</summary>
    public double? Elevation { get; private set; } = start;

    /// <summary>Highest elevation so far, m.</summary>
    public double Crest { get; private set; } = start ?? double.NegativeInfinity;

    /// <summary>Bore here, m; null when it is not known.</summary>
    public double? Bore { get; set; } = bore;

    /// <summary>Whether a run has no roughness of its own.</summary>
    public bool NeedsRoughness { get; set; }

    /// <summary>Goes on to an elevation.</summary>
    public void MoveTo(double? elevation)
    {
        Elevation = elevation;
        Crest = Math.Max(Crest, elevation ?? double.NegativeInfinity);
    }
}
