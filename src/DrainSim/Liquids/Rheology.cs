namespace DrainSim.Liquids;

/// <summary>How a liquid answers to steady shear.</summary>
/// <remarks>A closed set: the cases live beside this file.</remarks>
public abstract record Rheology
{
    /// <summary>Least flow index, 1: the friction laws were measured from 0.36 up and are drawn on to here.</summary>
    public const double LeastFlowIndex = 0.1;

    /// <summary>Largest flow index, 1: at 2 the Reynolds number would no longer rise with the flow.</summary>
    public const double LargestFlowIndex = 1.5;

    private protected Rheology()
    {
    }

    /// <summary>The flow curve.</summary>
    /// <param name="viscosity">the liquid's viscosity, Pa·s, which counts for a Newtonian liquid alone</param>
    public abstract FlowCurve Curve(double viscosity);

    private protected static double FlowIndexOf(double value) =>
        Require.Within(value, LeastFlowIndex, LargestFlowIndex, "flow index", "");
}
