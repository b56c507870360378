using DrainSim.Gas;

namespace DrainSim.Draining;

/// <summary>The pressure over the liquid for a volume of liquid and a mass of gas.</summary>
internal sealed class GasLaw
{
    /// <summary>Least share of the tank that the gas is taken to fill, 1: a brimful closed tank has no gas to stretch.</summary>
    private const double LeastGas = 1e-6;

    private readonly double held;
    private readonly GasSpace? space;
    private readonly VentedHeadspace? vents;
    private readonly Surroundings outside;
    private readonly double capacity;

    /// <param name="job">the job</param>
    public GasLaw(Job job)
    {
        capacity = job.Vessel.Capacity;
        double atmosphere = job.Site.AtmosphericPressure;
        held = atmosphere + ((job.Headspace as HeldPressure)?.Overpressure ?? 0);
        outside = new Surroundings(atmosphere, job.Liquid.Temperature);
        vents = job.Headspace as VentedHeadspace;
        if (job.Headspace is not ConfinedHeadspace confined)
            return;
        double pressure = confined.InitialPressure ?? atmosphere;
        space = new GasSpace(pressure, job.Liquid.Temperature, job.Liquid.VapourPressure, confined.PolytropicExponent);
        StartMass = space.Mass(pressure, GasVolume(job.Vessel.Volume(job.Level)));
    }

    /// <summary>Whether gas comes and goes.</summary>
    public bool Breathes => vents is not null;

    /// <summary>Mass of gas at the start, kg; 0 where its mass does not matter.</summary>
    public double StartMass { get; }

    /// <summary>Whether the gas has a pressure of its own that the fall of the level changes.</summary>
    public bool IsConfined => space is not null;

    /// <summary>Whether air comes in at any vacuum, so that in the end there is none: an open vent does it, a valve does not.</summary>
    public bool LosesVacuum => vents is not null && vents.MassFlow(outside.Pressure * (1 - 1e-6), outside, out _) > 0;

    /// <summary>Pressure on the liquid, Pa absolute.</summary>
    /// <param name="liquid">volume of liquid in the tank, m³</param>
    /// <param name="mass">mass of gas over it, kg</param>
    public double Pressure(double liquid, double mass) =>
        space is null ? held : space.Pressure(Math.Max(mass, double.Epsilon), GasVolume(liquid));

    /// <summary>How fast the pressure of a confined gas changes; its slope by volume is that by the gas.</summary>
    /// <param name="pressure">pressure on the liquid, Pa absolute</param>
    /// <param name="liquid">volume of liquid in the tank, m³</param>
    /// <param name="growth">flow of liquid out less what runs in, m³/s</param>
    public PressureRate Rate(double pressure, double liquid, double growth)
    {
        double slope = 0, massFlow = vents?.MassFlow(pressure, outside, out slope) ?? 0;
        double volume = GasVolume(liquid);
        PressureRate rate = space!.Rate(pressure, volume, massFlow, slope, growth);
        return volume > LeastGas * capacity ? rate : rate with { ByVolume = 0 };
    }

    private double GasVolume(double liquid) => Math.Max(LeastGas * capacity, capacity - liquid);
}
