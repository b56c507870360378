using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the block <c>site</c>.</summary>
internal static class SiteReader
{
    /// <summary>Lowest gravity on the earth's surface, m/s²; Huascarán, Peru (Hirt et al., Geophys. Res. Lett. 40 (2013) 4279).</summary>
    private const double LeastGravity = 9.76;

    /// <summary>Highest gravity on the earth's surface, m/s²; the Arctic Ocean, same source.</summary>
    private const double MostGravity = 9.84;

    /// <summary>The site: the standard atmosphere at sea level unless the block says otherwise.</summary>
    public static Site Read(BlockReader block)
    {
        string? given = block.AtMostOne("Give the altitude, or the pressure of the day", "altitude", "atmospheric_pressure");
        double? altitude = block.Amount("altitude", Quantities.Length, Allowed.Within(
            StandardAtmosphere.LeastAltitude, StandardAtmosphere.MostAltitude, "from -500 m to 11 000 m, where the standard atmosphere is known"));
        double? pressure = block.Amount("atmospheric_pressure", Quantities.Pressure, Allowed.Positive);
        double gravity = block.AmountOr("gravity", Quantities.Acceleration, Allowed.Positive, Site.StandardGravity, "9.80665 m/s2");
        if (given is null)
            NoteSeaLevel(block.Findings);
        if (gravity is < LeastGravity or > MostGravity)
            block.Warn("gravity", "this is not found anywhere on earth", "It lies from 9.76 m/s2 to 9.84 m/s2");
        if (pressure is < 30e3 or > 110e3)
            block.Warn("atmospheric_pressure", "this is not found at any place where people work", "It lies from 30 kPa to 110 kPa");
        block.Finish();
        return block.Build(() => new Site
        {
            AtmosphericPressure = pressure ?? (altitude is { } z ? StandardAtmosphere.Pressure(z) : StandardAtmosphere.Pressure(0)),
            Gravity = gravity,
        }) ?? new Site();
    }

    /// <summary>The site of a scenario that says nothing about it: sea level.</summary>
    public static Site Usual(Findings findings)
    {
        NoteSeaLevel(findings);
        findings.Note(new UnderstoodValue("site.gravity", Site.StandardGravity, "m/s2", "9.80665 m/s2", true));
        return new Site();
    }

    private static void NoteSeaLevel(Findings findings) =>
        findings.Note(new UnderstoodValue("site.altitude", 0, "m", "0 m", true));
}
