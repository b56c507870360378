using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Studies;

/// <summary>A parameter that a study varies.</summary>
/// <param name="Path">its dotted path</param>
/// <param name="Quantity">what its values are; null for words, such as a material</param>
/// <param name="Unit">the unit that people wrote it in; null for words</param>
/// <param name="Base">its value in the scenario, SI; null for words and where the scenario does not give it</param>
public sealed record StudyParameter(string Path, Quantity? Quantity, Unit? Unit, double? Base)
{
    /// <summary>Name of its column in files: the path and the SI unit of the values.</summary>
    public string Column => Quantity is null || Quantity.SiUnit == "1" ? Path : $"{Path}_{Quantity.SiUnit.Replace('/', '_')}";

    /// <summary>A value of it.</summary>
    /// <param name="si">value in SI</param>
    /// <exception cref="InvalidOperationException">its values are words</exception>
    public ParameterValue Of(double si) => Quantity is { } quantity
        ? ParameterValue.Of(si, quantity.Units[0])
        : throw new InvalidOperationException($"the values of {Path} are words");
}
