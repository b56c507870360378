using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Tests.Draining;
using DrainSim.Vessels;
using MathNet.Numerics;

namespace DrainSim.Tests.Published;

/// <summary>
/// Measured: G. Fabusola, C. M. Simon, Chemical Engineering Science 309 (2025) 121488, doi:10.1016/j.ces.2025.121488, open data of the
/// article, averaged over 8 s: a tank of 102.98 cm² at the floor and 128.95 cm² at 28.59 cm, a side hole of 5/64 in with its centre
/// 0.9 cm above the floor. The sensor's noise is about 2 mm, which is 3 s at first and 8 s at the end.
/// </summary>
public sealed class FabusolaTaperedTankTests
{
    internal const double Hole = 0.009;
    private const double Spacing = 25;

    /// <summary>Levels every 25 s, cm above the floor.</summary>
    internal static readonly double[] Levels =
    [
        24.87, 23.68, 22.98, 22.07, 21.95, 20.86, 20.04, 18.73, 18.12, 16.94, 16.62, 15.74, 14.57, 14.01, 13.09, 12.65, 11.94,
        11.38, 10.68, 10.12, 9.77, 9.01, 8.40, 7.86, 7.20, 6.94, 6.44, 5.95, 5.74, 5.14, 4.89, 4.49, 3.92,
    ];

    internal static readonly double[] Times = [.. Levels.Select((_, i) => i * Spacing)];

    /// <summary>Times to the levels through a hole of coefficient 1, s: for another one they go with its inverse.</summary>
    private static readonly Lazy<double[]> IdealTimes = new(() =>
    {
        Line hole = Jobs.Orifice(0.001984, 1);
        DrainResult run = Jobs.Run(BookDrains.Of(
            Tank(), Levels[0] / 100, hole with { Inlet = hole.Inlet with { Elevation = Hole } }, to: 0.02));
        return [.. Levels.Select(level => run.Trace.TimeAtVolume(run.Job.Vessel.Volume(level / 100))!.Value)];
    });

    [Fact]
    public void One_coefficient_fits_the_whole_series()
    {
        double inverse = Fit.LineThroughOrigin(IdealTimes.Value, Times);
        Assert.Equal(0.666, 1 / inverse, 0.666 * 0.01); // within what the noise of the first level leaves open
        double square = IdealTimes.Value.Zip(Times, (ideal, time) => Math.Pow(inverse * ideal - time, 2)).Average();
        Assert.InRange(Math.Sqrt(square), 0, 12); // 10 s found with the series
    }

    /// <remarks>
    /// 5 % of time, as the collection of cases asks. The first reading is as noisy as any other, so the moment at which the
    /// series begins is fitted with the coefficient.
    /// </remarks>
    [Fact]
    public void The_first_third_foretells_the_rest_within_5_percent_of_the_time()
    {
        int third = Levels.Length / 3;
        (double begins, double inverse) = Fit.Line(IdealTimes.Value[..third], Times[..third]);
        for (int i = third; i < Levels.Length; i++)
            Assert.Equal(Times[i], begins + inverse * IdealTimes.Value[i], 0.05 * Times[i]);
    }

    internal static StrappingTable Tank()
    {
        const double floor = 102.98e-4, top = 128.95e-4, height = 0.2859;
        return new StrappingTable
        {
            Rows = [.. Enumerable.Range(0, 31).Select(i => height * i / 30)
                .Select(h => (h, h * (floor + (top - floor) * h / (2 * height))))],
        };
    }
}
