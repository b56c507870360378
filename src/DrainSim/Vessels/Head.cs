namespace DrainSim.Vessels;

/// <summary>The closure of a cylindrical shell, dished or coned outwards.</summary>
/// <remarks>
/// A closed set: the cases live beside this file. Heads dished inwards are not among them. Whether a
/// head fits a shell is checked by the vessel, which knows the diameter.
/// </remarks>
public abstract record Head
{
    private protected Head()
    {
    }

    /// <summary>Inside depth from the tangent line to the apex on a shell, m.</summary>
    /// <param name="diameter">inside diameter of the shell, m</param>
    /// <exception cref="ArgumentOutOfRangeException">the head does not fit the shell; names the quantity and its unit</exception>
    public abstract double DepthOn(double diameter);

    /// <summary>The head as the bottom of an upright shell.</summary>
    /// <param name="radius">inside radius of the shell, m</param>
    internal abstract StandingHead Stand(double radius);

    /// <summary>The head as an end of a lying shell.</summary>
    /// <param name="radius">inside radius of the shell, m</param>
    internal abstract LyingHead Lie(double radius);
}
