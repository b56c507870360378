using System.Diagnostics.CodeAnalysis;
using DrainSim.Scenarios.Units;
using DrainSim.Studies.Sampling;

namespace DrainSim.Scenarios.Studies;

/// <summary>A spread as it is written: <c>normal(2.6 m, 10 mm)</c>, <c>normal(1 %)</c>, <c>uniform(36 mm, 40 mm)</c>, <c>usual</c>.</summary>
/// <remarks>
/// The shapes are <c>normal(mean, standard deviation)</c>, <c>lognormal(median, standard deviation of the logarithm)</c>,
/// <c>uniform(least, most)</c> and <c>triangular(least, likeliest, most)</c>. With one value in the brackets the
/// scenario's own value is the middle: <c>normal(10 mm)</c> and <c>lognormal(5 %)</c> give the standard deviation,
/// <c>uniform(10 mm)</c> and <c>triangular(10 mm)</c> how far the ends lie from the middle. A width in % is of the middle, save
/// for a ratio, where it is the ratio itself.
/// </remarks>
internal sealed class SpreadText
{
    /// <summary>How a spread reads, for messages.</summary>
    public const string Help = "A spread reads normal(2.6 m, 10 mm), lognormal(38 mm, 5 %), uniform(36 mm, 40 mm), triangular(1 m, 2 m, 4 m), "
        + "normal(1 %) about the value of the file, or usual";

    private readonly string shape;
    private readonly string[] values;

    private SpreadText(string shape, string[] values) => (this.shape, this.values) = (shape, values);

    /// <summary>Texts that are values of the parameter: the middle and the ends.</summary>
    public IReadOnlyList<string> Samples => values.Length == 1 ? [] : shape == "lognormal" || shape == "normal" ? values[..1] : values;

    /// <summary>Whether the trade's own spread is asked for.</summary>
    public bool IsUsual => shape == "usual";

    /// <summary>Takes a text apart; its values are read once it is known what they are.</summary>
    public static bool TryRead(string text, [NotNullWhen(true)] out SpreadText? spread)
    {
        spread = null;
        int open = text.IndexOf('(', StringComparison.Ordinal);
        if (text.Trim() == "usual")
            spread = new SpreadText("usual", []);
        if (open < 0 || !text.TrimEnd().EndsWith(')'))
            return spread is not null;
        string shape = text[..open].Trim();
        string[] values = [.. text[(open + 1)..text.LastIndexOf(')')].Split(',').Select(value => value.Trim())];
        int most = shape switch { "normal" or "lognormal" or "uniform" => 2, "triangular" => 3, _ => 0 };
        if (most > 0 && (values.Length == 1 || values.Length == most) && values.All(value => value.Length > 0))
            spread = new SpreadText(shape, values);
        return spread is not null;
    }

    /// <summary>The spread in SI, or what is wrong with it.</summary>
    /// <param name="parameter">what the values are</param>
    /// <param name="fault">what is wrong; empty when nothing is</param>
    /// <param name="source">where a usual spread comes from; null for one that is given</param>
    public Spread? Resolve(StudyParameter parameter, out string fault, out string? source)
    {
        (fault, source) = ("", null);
        if (parameter.Quantity is not { } quantity)
        {
            fault = "is a word; only numbers can be spread";
            return null;
        }

        if ((IsUsual || values.Length == 1) && parameter.Base is null)
        {
            fault = "has no value in the scenario to spread about";
            return null;
        }

        if (IsUsual)
            return Usual(parameter, out fault, out source);
        try
        {
            return values.Length == 1 ? About(parameter.Base!.Value, quantity) : Given(quantity);
        }
        catch (FormatException refused)
        {
            fault = refused.Message;
        }
        catch (ArgumentException refused)
        {
            fault = refused.Message;
        }

        return null;
    }

    private static Spread? Usual(StudyParameter parameter, out string fault, out string? source)
    {
        Spread? spread = UsualSpreads.Find(parameter.Path, parameter.Base!.Value, out string from);
        fault = spread is null ? $"has no usual spread; there is one for {string.Join(", ", UsualSpreads.Keys)} above 0" : "";
        source = spread is null ? null : from;
        return spread;
    }

    private Spread Given(Quantity quantity) => shape switch
    {
        "normal" => new NormalSpread { Mean = Value(0, quantity), Deviation = Width(1, quantity, Value(0, quantity)) },
        "lognormal" => new LogNormalSpread { Median = Value(0, quantity), LogDeviation = Ratio(1) },
        "uniform" => new UniformSpread(Value(0, quantity), Value(1, quantity)),
        _ => new TriangularSpread(Value(0, quantity), Value(1, quantity), Value(2, quantity)),
    };

    private Spread About(double middle, Quantity quantity) => shape switch
    {
        "normal" => new NormalSpread { Mean = middle, Deviation = Width(0, quantity, middle) },
        "lognormal" => new LogNormalSpread { Median = middle, LogDeviation = Ratio(0) },
        "uniform" => new UniformSpread(middle - Width(0, quantity, middle), middle + Width(0, quantity, middle)),
        _ => new TriangularSpread(middle - Width(0, quantity, middle), middle, middle + Width(0, quantity, middle)),
    };

    private double Value(int index, Quantity quantity) => Read(values[index], quantity);

    private double Ratio(int index) => Read(values[index], Quantities.Ratio);

    private double Width(int index, Quantity quantity, double middle)
    {
        string text = values[index];
        if (text.EndsWith('%') && quantity.SiUnit != "1")
            return Ratio(index) * Math.Abs(middle);
        if (ReferenceEquals(quantity, Quantities.Temperature) && !text.EndsWith('K'))
            throw new FormatException($"{Quote.Of(text)} is no difference of temperatures; one reads 2 K");
        return Read(text, quantity);
    }

    private static double Read(string text, Quantity quantity)
    {
        QuantityReading reading = QuantityText.Read(text, quantity);
        return reading.IsRefused ? throw new FormatException($"{reading.Fault}. {reading.Accepted}") : reading.Value;
    }
}
