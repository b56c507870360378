namespace DrainSim.Tests.Scenarios;

/// <summary>A scenario that is read without a word, to be changed line by line.</summary>
internal static class GoodScenario
{
    public const string Text = """
        title: Rinse tank over the rim into the yard sump
        liquid:
          name: water
          temperature: 18 degC
        site:
          altitude: 120 m
        tank:
          shape: vertical_cylinder
          diameter: 2.4 m
          height: 3.0 m
          level: 2.6 m
        line:
          bore: 38 mm
          material: smooth_hose
          inlet: {elevation: 50 mm, facing: down, edge: re_entrant}
          path:
            - {name: inner_leg, length: 3.2 m, to: 3.15 m}
            - {fitting: bend_90, count: 2}
            - {name: outer_leg, length: 6.0 m, to: -1.5 m}
            - {valve: ball, name: outlet_valve, opening: 100 %}
        run:
          until: 12 h
        """;

    /// <summary>The scenario with one piece of its text replaced.</summary>
    public static string With(string old, string changed)
    {
        Assert.Contains(old, Text, StringComparison.Ordinal);
        return Text.Replace(old, changed, StringComparison.Ordinal);
    }
}
