namespace DrainSim.Lines;

/// <summary>Darcy friction factor of a Newtonian liquid in a round pipe.</summary>
public static class FrictionFactor
{
    /// <summary>Reynolds number up to which the flow is taken as laminar, 1.</summary>
    public const double LaminarLimit = 2000;

    /// <summary>Reynolds number from which the flow is taken as turbulent, 1.</summary>
    public const double TurbulentLimit = 4000;

    /// <summary>The Darcy friction factor, 1.</summary>
    /// <param name="reynolds">Reynolds number, 1; greater than 0</param>
    /// <param name="relativeRoughness">roughness over bore, 1; at least 0</param>
    public static double Darcy(double reynolds, double relativeRoughness) => throw new NotSupportedException($"{reynolds} {relativeRoughness}");
}
