namespace DrainSim.Lines;

/// <summary>A row of the file of fittings and valves.</summary>
internal sealed record FittingRow(
    string Id, string Table, string Description, LossLaw Loss, string? Curve, string Source)
{
    private static readonly Lazy<IReadOnlyList<FittingRow>> Rows = new(Read);

    /// <summary>Every row, in file order.</summary>
    public static IReadOnlyList<FittingRow> All => Rows.Value;

    private static List<FittingRow> Read()
    {
        List<(FittingRow Row, string? LaminarAs)> raw = EmbeddedTable.Rows("Lines.Tables.fittings.csv", row => (
            new FittingRow(
                row.GetString("id"), row.GetString("table"), row.GetString("description"),
                new LossLaw
                {
                    Method = MethodOf(row.GetString("method")),
                    Coefficient = row.Number("coefficient"),
                    SizeConstant = row.NumberOrNull("size_constant") ?? 0,
                    LaminarConstant = row.NumberOrNull("laminar_constant") ?? 0,
                },
                row.TextOrNull("curve"), row.GetString("source")),
            row.TextOrNull("laminar_as")));
        Dictionary<string, FittingRow> byId = raw.ToDictionary(pair => pair.Row.Id, pair => pair.Row);
        return raw.ConvertAll(pair => pair.LaminarAs is { } other ? pair.Row.WithLaminarOf(byId[other]) : pair.Row);
    }

    private FittingRow WithLaminarOf(FittingRow other) => this with
    {
        Loss = Loss with { LaminarConstant = other.Loss.LaminarConstant },
        Source = $"{Source}; laminar rise K1 of {other.Id}, a rule of ours",
    };

    private static LossMethod MethodOf(string text) => text switch
    {
        "constant" => LossMethod.Constant,
        "equivalent_length" => LossMethod.EquivalentLength,
        "two_k" => LossMethod.TwoK,
        "three_k" => LossMethod.ThreeK,
        _ => throw new InvalidDataException($"no loss method is called {text}"),
    };
}
