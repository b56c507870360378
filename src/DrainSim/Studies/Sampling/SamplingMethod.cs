namespace DrainSim.Studies.Sampling;

/// <summary>How the points of a study are laid out in the unit cube.</summary>
public enum SamplingMethod
{
    /// <summary>Sobol's sequence with Owen's nested scrambling.</summary>
    Sobol,

    /// <summary>A Latin hypercube: every parameter in as many equal strips as there are points, one point in each.</summary>
    LatinHypercube,
}
