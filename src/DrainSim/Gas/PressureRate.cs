namespace DrainSim.Gas;

/// <summary>How fast the pressure in a headspace changes, and how that answers to what it depends on.</summary>
/// <param name="Rate">dp/dt, Pa/s</param>
/// <param name="ByPressure">its slope by the pressure, 1/s</param>
/// <param name="ByVolume">its slope by the volume of the headspace, Pa/(s·m³)</param>
/// <param name="ByGrowth">its slope by the rate at which that volume grows, Pa/m³</param>
public readonly record struct PressureRate(double Rate, double ByPressure, double ByVolume, double ByGrowth);
