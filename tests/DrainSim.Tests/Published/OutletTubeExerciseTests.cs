using DrainSim.Draining;
using DrainSim.Tests.Draining;
using MathNet.Numerics;

namespace DrainSim.Tests.Published;

/// <summary>
/// Measured: laboratory exercise 5 of a Polish modelling course (scripts; author, year and institution not shown): a 218 mm tank
/// with a 9 mm outlet tube whose length is not given. All its losses are lumped into one coefficient, fitted to the first five readings.
/// </summary>
public sealed class OutletTubeExerciseTests
{
    private static readonly (double Level, double Time)[] Readings =
    [
        (0.13, 0), (0.12, 7.05), (0.11, 14.24), (0.10, 21.95), (0.09, 30), (0.08, 38.32), (0.07, 47.08), (0.06, 56.46),
        (0.05, 66.89), (0.04, 78.72), (0.03, 90.65), (0.02, 104.58), (0.015, 113.64), (0.01, 123.07), (0.005, 135.75),
    ];

    private static readonly Lazy<DrainResult> Prediction = new(() =>
    {
        (double[] falls, double[] times) = ([.. Readings[..5].Select(r => Math.Sqrt(0.13) - Math.Sqrt(r.Level))],
            [.. Readings[..5].Select(r => r.Time)]);
        double slope = Fit.LineThroughOrigin(times, falls);
        double cd = 2 * slope / (Math.Pow(0.009 / 0.218, 2) * Math.Sqrt(2 * RoughLines.Gravity));
        return Jobs.Run(BookDrains.Of(Jobs.Cylinder(0.218, 0.2), 0.13, Jobs.Orifice(0.009, cd)));
    });

    /// <remarks>1.5 %: the readings are by eye and stopwatch, some half second and half millimetre each.</remarks>
    [Fact]
    public void The_next_five_readings_come_within_1_5_percent_of_their_time()
    {
        foreach ((double level, double time) in Readings[5..10])
            Assert.Equal(time, TimeAt(level), 0.015 * time);
    }

    [Fact]
    public void The_readings_in_the_conical_foot_come_sooner_than_the_cylinder_would_have_them()
    {
        foreach ((double level, double time) in Readings[10..])
            Assert.True(TimeAt(level) > time, $"{level} m");
    }

    private static double TimeAt(double level) =>
        Prediction.Value.Trace.TimeAtVolume(Prediction.Value.Job.Vessel.Volume(level))!.Value;
}
