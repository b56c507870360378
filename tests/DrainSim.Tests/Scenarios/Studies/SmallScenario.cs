using DrainSim.Scenarios;
using DrainSim.Tests.House;

namespace DrainSim.Tests.Scenarios.Studies;

/// <summary>A small scenario with room for the blocks of studies.</summary>
internal static class SmallScenario
{
    public const string Text = """
        liquid: {name: water, temperature: 15 degC}
        tank: {shape: vertical_cylinder, diameter: 1.2 m, height: 1.5 m, level: 1.2 m}
        line:
          bore: 32 mm
          material: smooth_hose
          inlet: {elevation: 50 mm, facing: down, edge: re_entrant}
          path:
            - {name: inner_leg, length: 1.8 m, to: 1.6 m}
            - {name: strainer, loss: 1.5}
            - {name: outer_leg, length: 4 m, to: -1 m}
        run: {stop_at_level: 0.2 m}

        """;

    /// <summary>The scenario with more text below it, in a folder.</summary>
    public static ScenarioDocument With(string more = "", string? folder = null) =>
        ScenarioDocument.FromText(Text + more, "small.yaml", folder ?? Repository.Root);
}
