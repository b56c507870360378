namespace DrainSim.Vessels;

/// <summary>The inside of a tank: volume against level, above its lowest inside point.</summary>
/// <remarks>
/// A closed set: the cases live beside this file. Over 0 ≤ level ≤ <see cref="Height"/> the three
/// functions agree: <see cref="Area"/> is the derivative of <see cref="Volume"/>, and
/// <see cref="Level"/> is its inverse to the last bits. Below 0 a level counts as 0, above the
/// height as the height, so that a trial step of the integrator never leaves the domain. Volumes
/// and levels near the bottom are good to 1e-13 of themselves, also in the tip of a cone. Where
/// the roof closes to a point the level is only as good as the volume allows: an error δ of the volume
/// is an error δ/Area of the level.
/// <para>
/// A new vessel is checked as a whole as soon as its last part is set. A copy made by <c>with</c> is checked
/// by its first use, since its parts may be set in any order. Nothing is allocated by a call.
/// </para>
/// </remarks>
public abstract record Vessel
{
    private protected Vessel()
    {
    }

    /// <summary>Inside height from the lowest to the highest point, m.</summary>
    public abstract double Height { get; }

    /// <summary>Volume when full, m³.</summary>
    public abstract double Capacity { get; }

    /// <summary>Volume of liquid below a level, m³; at level 0 it is 0, save for the bottoms of a <see cref="StrappingTable"/>.</summary>
    /// <param name="level">level above the lowest inside point, m</param>
    public abstract double Volume(double level);

    /// <summary>Area of the free surface, m²; where it steps, at the joint of a <see cref="Stack"/>, that of the upper side.</summary>
    /// <param name="level">level above the lowest inside point, m</param>
    public abstract double Area(double level);

    /// <summary>Level at which the vessel holds a volume, m; 0 below the least volume, the height above the capacity.</summary>
    /// <param name="volume">volume of liquid, m³</param>
    public abstract double Level(double volume);

    /// <summary>
    /// Levels strictly between 0 and the height, rising, at which the area or its slope has a kink or
    /// the formula changes, m.
    /// </summary>
    public virtual IReadOnlyList<double> SectionLevels => [];
}
