using System.Globalization;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Studies;

/// <summary>One value of a parameter: as it would be written in the file, and in SI where it is a number.</summary>
public readonly record struct ParameterValue
{
    private readonly string? written;
    private readonly double number;
    private readonly Unit? unit;

    private ParameterValue(string? written, double number, Unit? unit) =>
        (this.written, this.number, this.unit) = (written, number, unit);

    /// <summary>Whether it is a number, and not a word such as a material.</summary>
    public bool IsNumber => unit is not null;

    /// <summary>The value in SI; NaN where it is no number.</summary>
    public double Si => unit is null ? double.NaN : unit.ToSi(number);

    /// <summary>As it would be written in the file, with its unit.</summary>
    public string Text => written ?? (unit is null ? "" : Number("R"));

    /// <summary>The value for people: as it is written, else to six figures.</summary>
    public string Shown => written ?? (unit is null ? "" : Number("G6"));

    /// <summary>The value for a picture: as it is written, else to four figures.</summary>
    public string Brief => written ?? (unit is null ? "" : Number("G4"));

    /// <summary>A word.</summary>
    public static ParameterValue Word(string text) => new(text, double.NaN, null);

    /// <summary>A number of a unit.</summary>
    public static ParameterValue Of(double number, Unit unit) => new(null, number, unit);

    /// <summary>A text as it is written; a word where it is no value of the quantity.</summary>
    /// <param name="text">the text</param>
    /// <param name="quantity">what the parameter is; null for words</param>
    public static ParameterValue Written(string text, Quantity? quantity)
    {
        if (quantity is null || QuantityText.Read(text, quantity) is not { IsRefused: false } reading)
            return Word(text);
        return new ParameterValue(text, reading.Value, quantity.Units[0]);
    }

    private string Number(string figures)
    {
        string text = number.ToString(figures, CultureInfo.InvariantCulture);
        return unit!.Spelling == "1" ? text : $"{text} {unit.Spelling}";
    }
}
