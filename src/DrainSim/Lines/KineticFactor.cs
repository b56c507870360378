namespace DrainSim.Lines;

/// <summary>Kinetic energy factor α of the velocity profile.</summary>
public static class KineticFactor
{
    /// <summary>α, 1: 2 in laminar flow, 1 in turbulent flow, linear in Re between the limits.</summary>
    /// <param name="reynolds">Reynolds number, 1; at least 0</param>
    public static double At(double reynolds) => Math.Clamp(
        2 - (reynolds - FrictionFactor.LaminarLimit) / (FrictionFactor.TurbulentLimit - FrictionFactor.LaminarLimit), 1, 2);
}
