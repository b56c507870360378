namespace DrainSim.Vessels;

/// <summary>A dished head: a spherical crown and a toroidal knuckle that meets the shell.</summary>
/// <remarks>
/// On a shell of radius R the crown radius is from R to 1000·R and the knuckle radius from 0 to 0.9·R; the
/// vessel refuses anything else. A knuckle radius of 0 is a plain spherical cap, a crown radius of R a
/// hemisphere.
/// </remarks>
public sealed record Torispherical : Head
{
    private const double MostFlat = 1000;
    private const double MostKnuckle = 0.9;

    /// <summary>Inside radius of the crown, m; greater than 0.</summary>
    public required double CrownRadius { get; init => field = Require.Positive(value, "crown radius", "m"); }

    /// <summary>Inside radius of the knuckle, m; at least 0.</summary>
    public required double KnuckleRadius { get; init => field = Require.NotNegative(value, "knuckle radius", "m"); }

    /// <summary>The Klöpper head of DIN 28011: crown = D, knuckle = 0.1·D.</summary>
    /// <param name="diameter">diameter D of the shell, m; greater than 0</param>
    public static Torispherical Kloepper(double diameter) =>
        new() { CrownRadius = diameter, KnuckleRadius = 0.1 * diameter };

    /// <summary>The Korbbogen (basket-arch) head of DIN 28013: crown = 0.8·D, knuckle = 0.154·D.</summary>
    /// <param name="diameter">diameter D of the shell, m; greater than 0</param>
    public static Torispherical Korbbogen(double diameter) =>
        new() { CrownRadius = 0.8 * diameter, KnuckleRadius = 0.154 * diameter };

    /// <summary>The flanged and dished head of ASME: crown = D, knuckle = 0.06·D.</summary>
    /// <param name="diameter">diameter D of the shell, m; greater than 0</param>
    public static Torispherical FlangedAndDished(double diameter) =>
        new() { CrownRadius = diameter, KnuckleRadius = 0.06 * diameter };

    /// <inheritdoc/>
    public override double DepthOn(double diameter) => ProfileOn(diameter / 2).Depth;

    internal override StandingHead Stand(double radius) => new StandingTorisphere(ProfileOn(radius));

    internal override LyingHead Lie(double radius) =>
        CrownRadius == radius ? new LyingSpheroid(radius, radius) : new LyingTorisphere(ProfileOn(radius));

    private DishProfile ProfileOn(double radius)
    {
        Require.Within(CrownRadius, radius, MostFlat * radius, "crown radius of a torispherical head on this shell", "m");
        Require.Within(KnuckleRadius, 0, MostKnuckle * radius, "knuckle radius of a torispherical head on this shell", "m");
        return new DishProfile(radius, CrownRadius, KnuckleRadius);
    }
}
