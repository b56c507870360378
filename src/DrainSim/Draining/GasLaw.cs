using DrainSim.Gas;

namespace DrainSim.Draining;

/// <summary>The pressure over the liquid for a volume of liquid and a mass of gas.</summary>
internal sealed class GasLaw
{
    /// <summary>Least share of the tank that the gas is taken to fill, 1: a brimful closed tank has no gas to stretch.</summary>
    private const double LeastGas = 1e-6;

    /// <summary>
    /// Relaxation time of the gas over the time to empty below which its storage is left out, 1. What is left out is of the
    /// order of this ratio times the vacuum's own effect on the time, and a gas that is not much faster than the level
    /// costs the explicit stepper no more than some hundred steps.
    /// </summary>
    private const double FastGas = 1e-3;

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

    /// <summary>Whether the vents are so wide that the gas is at every instant where inflow and outflow put it.</summary>
    public bool IsSteady { get; private set; }

    /// <summary>Whether the mass of gas has a rate of its own.</summary>
    public bool HasRate => vents is not null && !IsSteady;

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

    /// <summary>Mass of gas over a volume of liquid at a pressure, kg.</summary>
    /// <param name="pressure">pressure on the liquid, Pa absolute</param>
    /// <param name="liquid">volume of liquid in the tank, m³</param>
    public double MassAt(double pressure, double liquid) => space?.Mass(pressure, GasVolume(liquid)) ?? 0;

    /// <summary>Decides whether the storage of gas can be left out.</summary>
    /// <param name="outflow">flow of all lines at the start, m³/s</param>
    /// <param name="liquid">volume of liquid at the start, m³</param>
    public void Settle(double outflow, double liquid)
    {
        if (vents is null || space is null || outflow <= 0)
            return;
        double pressure = SteadyPressure(outflow) ?? outside.Pressure;
        vents.MassFlow(pressure, outside, out double slope);
        double slowest = space.RelaxationTime(MassAt(pressure, 0), capacity, slope);
        IsSteady = slowest < FastGas * liquid / outflow;
    }

    /// <summary>Pressure at which the vents pass just what the liquid leaves free, Pa absolute; null where they cannot.</summary>
    /// <param name="outflow">flow of liquid out less what runs in, m³/s</param>
    public double? SteadyPressure(double outflow) =>
        Breathing.SteadyPressure(vents!, outflow, space!.VapourPressure, outside, out _);

    /// <summary>Mass flow of gas into the headspace, kg/s.</summary>
    /// <param name="pressure">pressure on the liquid, Pa absolute</param>
    public double MassFlow(double pressure) => vents?.MassFlow(pressure, outside, out _) ?? 0;

    private double GasVolume(double liquid) => Math.Max(LeastGas * capacity, capacity - liquid);
}
