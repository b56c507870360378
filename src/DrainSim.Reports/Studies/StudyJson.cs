using System.Text.Encodings.Web;
using System.Text.Json;

namespace DrainSim.Reports.Studies;

/// <summary>The JSON of a study: one object, indented, with a line feed at its end.</summary>
internal static class StudyJson
{
    private static readonly JsonWriterOptions Options = new()
    {
        Indented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    /// <summary>Writes an object.</summary>
    public static void Write(Stream stream, Action<Utf8JsonWriter> content)
    {
        using (var json = new Utf8JsonWriter(stream, Options))
        {
            json.WriteStartObject();
            content(json);
            json.WriteEndObject();
        }

        stream.WriteByte((byte)'\n');
    }

    /// <summary>Writes a number; one that is absent or not finite is null.</summary>
    public static void Number(this Utf8JsonWriter json, string name, double? value)
    {
        if (value is { } number && double.IsFinite(number))
            json.WriteNumber(name, number);
        else
            json.WriteNull(name);
    }

    /// <summary>Writes an array of objects.</summary>
    public static void List<T>(this Utf8JsonWriter json, string name, IEnumerable<T> items, Action<T> write)
    {
        json.WriteStartArray(name);
        foreach (T item in items)
        {
            json.WriteStartObject();
            write(item);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    /// <summary>Writes an array of numbers; one that is not finite is null.</summary>
    public static void Numbers(this Utf8JsonWriter json, string? name, IEnumerable<double> values)
    {
        if (name is null)
            json.WriteStartArray();
        else
            json.WriteStartArray(name);
        foreach (double value in values)
        {
            if (double.IsFinite(value))
                json.WriteNumberValue(value);
            else
                json.WriteNullValue();
        }

        json.WriteEndArray();
    }
}
