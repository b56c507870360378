namespace DrainSim.Cli.Tests;

/// <summary>Scenarios that the tests run.</summary>
internal static class Jobs
{
    /// <summary>A siphon over the rim whose inlet stands 50 mm above the floor: air reaches the inlet.</summary>
    public const string Siphon = """
        title: Rinse tank over the rim
        liquid: {name: water, temperature: 18 degC}
        tank: {shape: vertical_cylinder, diameter: 1.2 m, height: 1.5 m, level: 1.2 m}
        line:
          bore: 38 mm
          roughness: 0.0015 mm
          inlet: {elevation: 50 mm, facing: down, loss: 0.8}
          path:
            - {name: inner_leg, length: 1.7 m, to: 1.65 m}
            - {name: outer_leg, length: 3.0 m, to: -1.0 m}

        """;

    /// <summary>A floor drain: nothing is left.</summary>
    public const string Drain = """
        title: Box through its floor
        liquid: {name: water, temperature: 12 degC}
        tank: {shape: box, length: 1 m, width: 1 m, height: 1 m, level: 0.8 m}
        line:
          bore: 40 mm
          roughness: 0.05 mm
          inlet: {elevation: 0 mm, facing: up, loss: 0.5}
          path:
            - {name: downcomer, length: 0.6 m, to: -0.6 m}

        """;

    /// <summary>A scenario with two problems: a bore without a unit and a key that is not known.</summary>
    public const string Faulty = """
        title: Nothing but trouble
        liquid: {name: water, temperature: 12 degC}
        tank: {shape: box, length: 1 m, width: 1 m, height: 1 m, level: 0.8 m}
        line:
          bore: 38
          roughness: 0.05 mm
          inlet: {elevation: 0 mm, facing: up, loss: 0.5}
          path:
            - {name: downcomer, lenght: 0.6 m, to: -0.6 m}

        """;
}
