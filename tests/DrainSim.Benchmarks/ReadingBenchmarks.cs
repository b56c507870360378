using BenchmarkDotNet.Attributes;
using DrainSim.Scenarios;

namespace DrainSim.Benchmarks;

/// <summary>Reading of a scenario's text into the job.</summary>
[MemoryDiagnoser]
public class ReadingBenchmarks
{
    private readonly string text = """
        title: Rinse tank over the rim
        liquid: {name: water, temperature: 18 degC}
        tank: {shape: vertical_cylinder, diameter: 2.4 m, height: 3.0 m, level: 2.6 m}
        line:
          bore: 38 mm
          material: smooth_hose
          inlet: {elevation: 50 mm, facing: down, edge: re_entrant}
          path:
            - {name: inner_leg, length: 3.2 m, to: 3.15 m}
            - {fitting: bend_90, count: 2}
            - {name: outer_leg, length: 6.0 m, to: -1.5 m}
            - {valve: ball, name: outlet_valve, opening: 100 %}

        """;

    /// <summary>The whole text, tables looked up.</summary>
    [Benchmark]
    public ScenarioReading Scenario() => ScenarioReader.ReadText(text, "rinse.yaml", ".");
}
