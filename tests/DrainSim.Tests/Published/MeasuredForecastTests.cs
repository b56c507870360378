using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Studies;
using DrainSim.Studies.Forecasting;
using DrainSim.Tests.Draining;

namespace DrainSim.Tests.Published;

/// <summary>Measured drain-downs forecast from their first readings, by the study that a crew would use.</summary>
public sealed class MeasuredForecastTests
{
    private static readonly double[] CylinderLevels = [0.13, 0.12, 0.11, 0.10, 0.09, 0.08, 0.07, 0.06, 0.05, 0.04];
    private static readonly double[] CylinderTimes = [0, 7.05, 14.24, 21.95, 30, 38.32, 47.08, 56.46, 66.89, 78.72];

    /// <summary>
    /// G. Fabusola, C. M. Simon, Chem. Eng. Sci. 309 (2025) 121488, as in <see cref="FabusolaTaperedTankTests"/>: of the later 22 readings
    /// 20 come within 5 % of the time that the first third foretells, and the last within 1.2 %.
    /// </summary>
    /// <remarks>
    /// The two others, at 300 s and 350 s, are missed by 5.8 and 5.6 %; a reading's own noise, 2 mm, is 1.7 % of the time there. Weighted by
    /// the instrument the fit is in levels; the fit in times of <see cref="FabusolaTaperedTankTests"/> comes within 4.8 %.
    /// </remarks>
    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void The_first_third_of_a_drain_down_foretells_the_rest(bool withLevel)
    {
        double[] levels = FabusolaTaperedTankTests.Levels, times = FabusolaTaperedTankTests.Times;
        ForecastResult forecast = OfTaperedTank(levels.Length / 3, withLevel);
        Assert.Equal(Separation.Apart, forecast.Separation);
        double[] misses = [.. Enumerable.Range(levels.Length / 3, levels.Length - levels.Length / 3).Select(i =>
            Math.Abs(forecast.Run.Trace.TimeAtVolume(forecast.Run.Job.Vessel.Volume(levels[i] / 100))!.Value / times[i] - 1))];
        Assert.Equal(20, misses.Count(miss => miss <= 0.05));
        Assert.InRange(misses.Max(), 0, 0.06);
        Assert.InRange(misses[^1], 0, 0.012);
    }

    /// <summary>
    /// Laboratory exercise 5 of a Polish modelling course (author and year not shown): a tank of 218 mm, an outlet of 9 mm whose length
    /// is not given. Times to levels read to 10 mm; the level's uncertainty is not stated, 1 mm is taken. Within 1.5 % of the time.
    /// </summary>
    [Fact]
    public void The_first_five_points_of_a_cylinder_foretell_the_next_five_within_1_5_percent_of_the_time()
    {
        var study = new ForecastStudy
        {
            Readings = [.. CylinderTimes.Zip(CylinderLevels, (t, h) => new LevelReading(t, h, 0.001)).Take(5)],
            Parameters = [new FittedParameter("Cd", "", 0.6)],
            Make = values => CaseJob.Of(() => new Job
            {
                Liquid = Jobs.Inviscid,
                Vessel = Jobs.Cylinder(0.218, 0.2),
                Level = CylinderLevels[0],
                DrawOffs = Jobs.Only(Jobs.Orifice(0.009, values[0])),
            }),
        };
        ForecastResult forecast = study.Run(TestContext.Current.CancellationToken);
        Assert.Equal(0.535, forecast.Estimates[0].Value, 0.005); // the coefficient that the collection finds from the same five
        for (int i = 5; i < CylinderLevels.Length; i++)
        {
            double foretold = forecast.Run.Trace.TimeAtVolume(forecast.Run.Job.Vessel.Volume(CylinderLevels[i]))!.Value;
            Assert.Equal(CylinderTimes[i], foretold, 0.015 * CylinderTimes[i]);
        }
    }

    /// <summary>The sensor's noise is some 2 mm (1 standard deviation): as that of a resolution of 7 mm.</summary>
    private static ForecastResult OfTaperedTank(int count, bool withLevel)
    {
        double first = FabusolaTaperedTankTests.Levels[0] / 100;
        Line hole = Jobs.Orifice(0.001984, 0.6);
        var study = new ForecastStudy
        {
            Readings = [.. FabusolaTaperedTankTests.Times.Zip(FabusolaTaperedTankTests.Levels, (t, h) => new LevelReading(t, h / 100, 0.007)).Take(count)],
            Parameters = withLevel
                ? [new FittedParameter("Cd", "", 0.6), new FittedParameter("level", "m", first)]
                : [new FittedParameter("Cd", "", 0.6)],
            Make = values => CaseJob.Of(() => BookDrains.Of(FabusolaTaperedTankTests.Tank(), withLevel ? values[1] : first,
                hole with { Inlet = hole.Inlet with { Elevation = FabusolaTaperedTankTests.Hole, EdgeLoss = 1 / (values[0] * values[0]) - 1 } }, to: 0.02)),
            Draws = 64,
        };
        return study.Run(TestContext.Current.CancellationToken);
    }
}
