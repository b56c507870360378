namespace DrainSim.Scenarios.Reading;

/// <summary>Keys of the vocabulary that this version does not read. Ignoring them would change the result unseen.</summary>
internal static class LaterWork
{
    private static readonly Dictionary<string, string> Keys = new()
    {
        ["liquid.rheology"] = "Give the viscosity of a Newtonian liquid",
        ["tank.headspace"] = "The tank is open to the air",
        ["tank.inflow"] = "Nothing flows in",
        ["tank.vacuum_rating"] = "The tank is open to the air",
        ["tank.pressure_rating"] = "The tank is open to the air",
        ["line.inlet.floor_clearance"] = "Give the loss of the inlet as 'loss'",
        ["line.inlet.air_draw"] = "The inlet counts as covered until the level falls to its edge",
        ["line.start"] = "The line counts as primed",
        ["line.air_break"] = "The line has no vent",
        ["line.vacuum_rating"] = "Give the pressure that the hose needs inside as 'least_pressure'",
        ["lines"] = "Give one 'line'; identical ones side by side by 'parallel'",
        ["receiver.shape"] = "Give the 'surface' that the outlet ends in, or leave the receiver out",
        ["receiver.bottom"] = "Give the 'surface' that the outlet ends in, or leave the receiver out",
        ["receiver.level"] = "Give the 'surface' that the outlet ends in, or leave the receiver out",
        ["receiver.brim"] = "Give the 'surface' that the outlet ends in, or leave the receiver out",
        ["timeline"] = "Run the parts of the job one by one",
        ["limits"] = "Compare the results yourself",
        ["run.begins"] = "Times count from the start",
    };

    /// <summary>What to do instead; null for a key that is not of the vocabulary at all.</summary>
    /// <param name="path">dotted path of the key</param>
    public static string? Find(string path) => Keys.GetValueOrDefault(path);
}
