namespace DrainSim.Draining;

/// <summary>Where the liquid in the line goes when the column parts.</summary>
/// <param name="IntoTank">volume of the inner leg above the level, which falls back into the tank, m³</param>
/// <param name="OutOfOutlet">volume of the outer leg, which runs out at the outlet, m³</param>
/// <param name="LevelAfter">level in the tank when the inner leg has fallen back, m</param>
public sealed record FallBack(double IntoTank, double OutOfOutlet, double LevelAfter);
