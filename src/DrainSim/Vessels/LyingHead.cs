namespace DrainSim.Vessels;

/// <summary>A head with its axis level, on a shell of one radius R; it is symmetric about the axis, so only the lower half is given.</summary>
internal abstract class LyingHead
{
    /// <summary>Level between 0 and R, or R itself, at which the area is not smooth, m; null when there is none.</summary>
    public virtual double? Kink => null;

    /// <summary>Volume in the head below a level, m³.</summary>
    /// <param name="h">level above the shell's lowest line, from 0 to R, m</param>
    /// <param name="phi">half the angle that the surface spans at the axis, rad: h = R·(1 − cos φ)</param>
    public abstract double Volume(double h, double phi);

    /// <summary>Area of the surface in the head, m².</summary>
    /// <param name="h">level above the shell's lowest line, from 0 to R, m</param>
    public abstract double Area(double h);
}
