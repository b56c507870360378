using DrainSim.Liquids;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the block <c>liquid.rheology</c>.</summary>
internal static class RheologyReader
{
    private const string Help = "Give the model newtonian, power_law, bingham or herschel_bulkley";

    private static readonly string[] Keys = ["consistency", "flow_index", "yield_stress", "plastic_viscosity"];

    private static readonly Allowed FlowIndices =
        Allowed.Within(Rheology.LeastFlowIndex, Rheology.LargestFlowIndex, "from 0.1 to 1.5; one under 1 thins when it is sheared");

    /// <summary>The rheology; Newtonian where the block is left out, null when it is refused.</summary>
    /// <param name="liquid">the block of the liquid</param>
    public static Rheology? Read(BlockReader liquid)
    {
        if (!liquid.Has("rheology"))
            return new Newtonian();
        if (liquid.Block("rheology") is not { } block)
            return null;
        if (!block.Has("model"))
            block.Miss("is missing", Help, "model");
        Rheology? rheology = Model(block, block.Choice("model", "",
            ("newtonian", "newtonian"), ("power_law", "power_law"), ("bingham", "bingham"), ("herschel_bulkley", "herschel_bulkley")));
        block.Finish();
        return rheology;
    }

    private static Rheology? Model(BlockReader block, string model)
    {
        switch (model)
        {
            case "newtonian":
                return new Newtonian();
            case "power_law":
                return (Consistency(block), Index(block)) is ({ } k, { } n)
                    ? new PowerLaw { Consistency = k, FlowIndex = n }
                    : null;
            case "bingham":
                double? plastic = block.Needed("plastic_viscosity", Quantities.Viscosity, Allowed.Positive);
                return (Yield(block), plastic) is ({ } stress, { } viscosity)
                    ? new Bingham { YieldStress = stress, PlasticViscosity = viscosity }
                    : null;
            case "herschel_bulkley":
                return (Yield(block), Consistency(block), Index(block)) is ({ } yield, { } factor, { } index)
                    ? new HerschelBulkley { YieldStress = yield, Consistency = factor, FlowIndex = index }
                    : null;
            default: // refused already: its other keys are not judged
                _ = Keys.Count(block.Has);
                return null;
        }
    }

    private static double? Yield(BlockReader block) => block.Needed("yield_stress", Quantities.Stress, Allowed.NotNegative);

    private static double? Consistency(BlockReader block) => block.Needed("consistency", Quantities.Consistency, Allowed.Positive);

    private static double? Index(BlockReader block) => block.Needed("flow_index", Quantities.Ratio, FlowIndices);
}
