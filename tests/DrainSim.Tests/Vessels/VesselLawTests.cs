using CsCheck;
using DrainSim.Vessels;
using MathNet.Numerics.Integration;

namespace DrainSim.Tests.Vessels;

/// <summary>What holds for every vessel at every level.</summary>
public sealed class VesselLawTests
{
    private const int Cases = 2000;

    private static readonly Gen<(Vessel Vessel, double Share)> VesselAndShare = Gen.Select(VesselGen.Any, Gen.Double[0, 1]);

    [Fact]
    public void The_volume_at_the_level_of_a_volume_is_that_volume() =>
        VesselAndShare.Sample((vessel, share) =>
        {
            double least = vessel.Volume(0);
            double volume = least + share * (vessel.Capacity - least);
            return Near(volume, vessel.Volume(vessel.Level(volume)), 1e-13 * vessel.Capacity);
        }, iter: Cases);

    [Fact]
    public void The_level_at_the_volume_of_a_level_is_that_level() =>
        VesselAndShare.Sample((vessel, share) =>
        {
            double level = share * vessel.Height;
            // The second term is what two roundings of the volume do to the level under a closing roof.
            double tolerance = 1e-13 * vessel.Height + 1e-15 * vessel.Capacity / vessel.Area(level);
            return Near(level, vessel.Level(vessel.Volume(level)), tolerance);
        }, iter: Cases);

    [Fact]
    public void The_volume_grows_by_the_integral_of_the_area() =>
        Gen.Select(VesselGen.Any, Gen.Double[0.05, 0.9], Gen.Double[0.001, 0.02]).Sample((vessel, share, width) =>
        {
            double from = share * vessel.Height, to = (share + width) * vessel.Height;
            if (vessel is StrappingTable || vessel.SectionLevels.Any(level => level >= from && level <= to))
                return true;
            double grown = GaussLegendreRule.Integrate(vessel.Area, from, to, 20);
            return Near(grown, vessel.Volume(to) - vessel.Volume(from), 1e-13 * vessel.Capacity);
        }, iter: Cases);

    [Fact]
    public void Near_the_bottom_the_volume_is_the_integral_of_the_area_to_13_digits() =>
        Gen.Select(VesselGen.Any, Gen.Double[-12.0, -3.0]).Sample((vessel, exponent) =>
        {
            double h = Math.Min(vessel.Height, FirstSection(vessel)) * Math.Pow(10, exponent);
            // s² smooths the root of a lying cylinder's area at its lowest line.
            double integral = GaussLegendreRule.Integrate(s => 2 * h * s * vessel.Area(h * s * s), 0, 1, 20);
            double volume = vessel.Volume(h) - vessel.Volume(0);
            return vessel.Volume(0) > 0 || Near(1, volume / integral, 1e-13);
        }, iter: Cases);

    [Fact]
    public void Near_the_bottom_the_level_of_a_volume_is_good_to_13_digits() =>
        Gen.Select(VesselGen.Any, Gen.Double[-12.0, -3.0]).Sample((vessel, exponent) =>
        {
            double h = vessel.Height * Math.Pow(10, exponent);
            return vessel.Volume(0) > 0 || Near(1, vessel.Level(vessel.Volume(h)) / h, 1e-13);
        }, iter: Cases);

    [Fact]
    public void A_higher_level_never_holds_less() =>
        Gen.Select(VesselGen.Any, Gen.Double[0, 1], Gen.Double[-14.0, 0.0]).Sample((vessel, share, exponent) =>
        {
            double low = share * vessel.Height;
            double high = low + Math.Pow(10, exponent) * vessel.Height;
            // A tie in the last bits may fall either way.
            return vessel.Volume(high) >= vessel.Volume(low) * (1 - 4e-15) - 4e-16 * vessel.Capacity;
        }, iter: Cases);

    [Fact]
    public void More_volume_never_stands_lower() =>
        Gen.Select(VesselGen.Any, Gen.Double[0, 1], Gen.Double[0, 0.1]).Sample((vessel, share, more) =>
            vessel.Level((share + more) * vessel.Capacity) >= vessel.Level(share * vessel.Capacity) * (1 - 4e-15) - 4e-16 * vessel.Height,
            iter: Cases);

    [Fact]
    public void Nothing_is_negative_or_beyond_the_brim() =>
        Gen.Select(VesselGen.Any, Gen.Double[-0.5, 1.5]).Sample((vessel, share) =>
        {
            double level = share * vessel.Height, volume = share * vessel.Capacity;
            return vessel.Volume(level) >= 0 && vessel.Volume(level) <= vessel.Capacity
                && vessel.Level(volume) >= 0 && vessel.Level(volume) <= vessel.Height
                && vessel.Area(level) >= 0 && double.IsFinite(vessel.Area(level));
        }, iter: Cases);

    [Fact]
    public void Outside_the_height_a_level_counts_as_its_nearest_end() =>
        Gen.Select(VesselGen.Any, Gen.Double[0, 10]).Sample((vessel, beyond) =>
            vessel.Volume(-beyond) == vessel.Volume(0)
            && vessel.Volume(vessel.Height + beyond) == vessel.Capacity
            && vessel.Area(-beyond) == vessel.Area(0)
            && vessel.Area(vessel.Height + beyond) == vessel.Area(vessel.Height)
            && vessel.Level(vessel.Volume(0) - beyond) == 0
            && vessel.Level(vessel.Capacity + beyond) == vessel.Height, iter: 500);

    [Fact]
    public void The_section_levels_rise_and_lie_inside() =>
        VesselGen.Any.Sample(vessel =>
        {
            IReadOnlyList<double> levels = vessel.SectionLevels;
            return levels.All(level => level > 0 && level < vessel.Height)
                && levels.Zip(levels.Skip(1)).All(pair => pair.First < pair.Second);
        }, iter: 500);

    private static double FirstSection(Vessel vessel) =>
        vessel.SectionLevels is [double first, ..] ? first : vessel.Height;

    private static bool Near(double expected, double actual, double tolerance) => Math.Abs(actual - expected) <= tolerance;
}
