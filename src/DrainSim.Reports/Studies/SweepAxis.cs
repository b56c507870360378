namespace DrainSim.Reports.Studies;

/// <summary>A varied parameter as an axis of a picture.</summary>
/// <param name="Name">its dotted path</param>
/// <param name="Unit">sign of the unit in which its values are given; empty for words and pure numbers</param>
/// <param name="IsLogarithmic">whether its values stand at even ratios</param>
/// <param name="Words">the words that it takes, of which a value is the index; empty for numbers</param>
public sealed record SweepAxis(string Name, string Unit, bool IsLogarithmic, IReadOnlyList<string> Words)
{
    /// <summary>Name and unit.</summary>
    public string Title => Unit.Length == 0 ? Name : $"{Name}, {Unit}";

    /// <summary>Where a value stands on the axis.</summary>
    internal double At(double value) => IsLogarithmic ? Math.Log10(value) : value;
}
