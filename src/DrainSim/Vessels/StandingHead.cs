namespace DrainSim.Vessels;

/// <summary>A head with its axis upright and its apex down, on a shell of one radius.</summary>
internal abstract class StandingHead(double depth, double capacity)
{
    /// <summary>From the apex to the tangent line, m.</summary>
    public double Depth { get; } = depth;

    /// <summary>Volume up to the tangent line, m³.</summary>
    public double Capacity { get; } = capacity;

    /// <summary>Height above the apex where the profile changes inside the head, m; null when it does not.</summary>
    public virtual double? Kink => null;

    /// <summary>Volume up to a height h above the apex, from 0 to the depth, m³.</summary>
    public abstract double Volume(double h);

    /// <summary>Area of the surface at a height h above the apex, m².</summary>
    public abstract double Area(double h);

    /// <summary>Height above the apex that holds a volume, from 0 to the capacity, m.</summary>
    public abstract double Level(double volume);
}
