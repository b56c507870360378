namespace DrainSim.Lines;

/// <summary>Reads the file of valve curves.</summary>
internal static class ValveCurves
{
    /// <summary>Every curve by its name.</summary>
    public static Dictionary<string, ValveCharacteristic> ById() =>
        EmbeddedTable.Rows("Lines.Tables.valve-curves.csv", row => (
                Id: row.GetString("id"),
                Opening: row.Number("opening"),
                Capacity: row.Number("relative_capacity"),
                Source: row.GetString("source")))
            .GroupBy(point => point.Id)
            .ToDictionary(
                points => points.Key,
                points => new ValveCharacteristic(
                    points.Key,
                    points.First().Source,
                    points.Select(point => point.Opening).ToList(),
                    points.Select(point => point.Capacity).ToList()));
}
