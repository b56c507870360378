using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Studies;
using DrainSim.Studies.Forecasting;
using DrainSim.Tests.Draining;
using MathNet.Numerics.Distributions;
using MathNet.Numerics.Random;

namespace DrainSim.Tests.Studies.Forecasting;

/// <summary>Readings made from known parameters and known noise: what the fit says of them can be counted.</summary>
public sealed class ForecastStudyTests
{
    private const double Coefficient = 0.6, Level = 3, Resolution = 0.01;

    private static readonly Job Tank = Jobs.OrificeDrain() with { Run = new RunSettings { StopAtLevel = 0.3, Until = 1e6 } };

    [Fact]
    public void Readings_without_noise_give_the_parameters_back()
    {
        ForecastResult forecast = Run(Study(Readings(seed: 1, noise: 0)));
        Assert.True(forecast.IsConverged);
        Assert.Equal(Coefficient, forecast.Estimates[0].Value, 1e-5);
        Assert.Equal(Level, forecast.Estimates[1].Value, 1e-5);
        Assert.Equal(TrueEnd(), forecast.Finish.Best, 1e-4 * TrueEnd());
        Assert.Equal(Separation.Apart, forecast.Separation);
        Assert.InRange(forecast.Scatter, 0, 0.01);
    }

    /// <summary>
    /// Estimates and finish lie within their own 95 % intervals as often as that says: with noise as the resolution says at least so
    /// often, with three times as much just so often, since the scatter then widens the intervals.
    /// </summary>
    [Theory]
    [InlineData(1.0)]
    [InlineData(3.0)]
    public void The_intervals_hold_the_truth_as_often_as_they_say(double noise)
    {
        const int seeds = 60;
        int coefficient = 0, level = 0, finish = 0;
        for (int seed = 0; seed < seeds; seed++)
        {
            ForecastResult forecast = Run(Study(Readings(seed, noise)));
            coefficient += Holds(forecast.Estimates[0].Low, Coefficient, forecast.Estimates[0].High);
            level += Holds(forecast.Estimates[1].Low, Level, forecast.Estimates[1].High);
            finish += Holds(forecast.Finish.Low!.Value, TrueEnd(), forecast.Finish.High!.Value);
        }

        foreach (int held in (int[])[coefficient, level, finish])
            Assert.InRange(held, 50, seeds); // Binomial(60, 0.95) is below 50 once in 4000 times
        static int Holds(double low, double value, double high) => low <= value && value <= high ? 1 : 0;
    }

    [Fact]
    public void The_same_readings_give_the_same_forecast_for_any_number_of_threads()
    {
        ForecastStudy study = Study(Readings(seed: 4, noise: 1));
        ForecastResult one = Run(study with { Runs = new OrderedRuns { Threads = 1 } });
        ForecastResult four = Run(study with { Runs = new OrderedRuns { Threads = 4 } });
        Assert.Equal(one.Finish, four.Finish);
        Assert.Equal(one.Estimates, four.Estimates);
        Assert.Equal(one.Band!.Levels.SelectMany(x => x), four.Band!.Levels.SelectMany(x => x));
    }

    /// <remarks>The flow depends on a²·Cd² alone: bore and coefficient cannot be told apart by any readings.</remarks>
    [Fact]
    public void Parameters_of_the_same_effect_are_not_told_apart()
    {
        ForecastStudy study = Study(Readings(seed: 1, noise: 1)) with
        {
            Parameters = [new FittedParameter("Cd", "", 0.55), new FittedParameter("bore", "m", 0.05)],
            Make = values => CaseJob.Of(() => Tank with { DrawOffs = Jobs.Only(Jobs.Orifice(values[1], values[0])) }),
        };
        ForecastResult forecast = Run(study);
        Assert.Equal(Separation.NotApart, forecast.Separation);
        Assert.InRange(forecast.ConditionIndex, 100, double.PositiveInfinity);
    }

    [Fact]
    public void A_parameter_without_effect_is_not_told_and_has_no_interval()
    {
        ForecastStudy study = Study(Readings(seed: 1, noise: 1)) with
        {
            Parameters = [new FittedParameter("Cd", "", 0.55), new FittedParameter("paint", "", 1)],
            Make = values => CaseJob.Of(() => JobOf(values[0], Level)),
        };
        ForecastResult forecast = Run(study);
        Assert.Equal(Separation.NotApart, forecast.Separation);
        Assert.Equal(double.PositiveInfinity, forecast.Estimates[1].StandardError);
        Assert.Null(forecast.Finish.Low);
        Assert.Null(forecast.Band);
        Assert.Equal(Coefficient, forecast.Estimates[0].Value, 0.01);
    }

    [Theory]
    [InlineData(AlternativeKind.Inflow)]
    [InlineData(AlternativeKind.Leak)]
    public void An_unknown_flow_is_found_where_there_is_one_and_nowhere_else(AlternativeKind kind)
    {
        const double flow = 1.5e-3;
        Job job = kind == AlternativeKind.Inflow
            ? Tank with { Inflow = Inflow.Constant(flow) }
            : Tank with { DrawOffs = [.. Tank.DrawOffs, .. Jobs.Only(Hole(flow))] };
        LevelReading[] readings = Readings(seed: 3, noise: 1, job);
        ForecastStudy study = Study(readings) with
        {
            Parameters = [new FittedParameter("inlet", "m", 0.1)],
            Make = values => CaseJob.Of(() => AtElevation(values[0])),
        };
        // The line's own coefficient is known here and its outlet is fitted, so that nothing else can play the unknown's part.
        ForecastResult forecast = Run(study);
        Alternative found = forecast.Alternatives.Single(one => one.Kind == kind);
        Assert.True(found.IsFound);
        Assert.InRange(Math.Abs(found.Flow - flow), 0, 4 * found.FlowError!.Value);
        Alternative other = forecast.Alternatives.Single(one => one.Kind != kind);
        Assert.False(other.IsFound && other.PValue < found.PValue);
    }

    /// <summary>Where nothing is amiss the F-test at 5 % raises about one alarm in twenty.</summary>
    [Fact]
    public void Alarms_without_a_cause_are_as_rare_as_the_test_says()
    {
        int alarms = Enumerable.Range(0, 20).Sum(seed => Run(Study(Readings(seed, noise: 1))).Alternatives.Count(one => one.IsFound));
        Assert.InRange(alarms, 0, 5); // of 40; both tests must agree and a flow below 0 is none: 1 expected
    }

    [Fact]
    public void Too_few_readings_or_an_impossible_start_are_refused()
    {
        LevelReading[] readings = Readings(seed: 1, noise: 1);
        Assert.Contains("2 readings cannot tell 2 parameters", Refused(Study(readings[..2])), StringComparison.Ordinal);
        Assert.Contains("make no job", Refused(Study(readings) with { Make = _ => CaseJob.Refused("no") }), StringComparison.Ordinal);
        Assert.Empty(Run(Study(readings[..3])).Alternatives);
        static string Refused(ForecastStudy study) => Assert.Throws<ArgumentOutOfRangeException>(() => Run(study)).Message;
    }

    [Fact]
    public void Readings_of_a_coarse_instrument_weigh_less()
    {
        LevelReading[] good = Readings(seed: 1, noise: 0);
        LevelReading[] spoiled = [.. good.Select((reading, i) => i % 4 == 0 ? new LevelReading(reading.Time, reading.Level + 0.1, 1) : reading)];
        Assert.Equal(Coefficient, Run(Study(spoiled)).Estimates[0].Value, 1e-3);
    }

    private static Job AtElevation(double outlet)
    {
        Line line = Jobs.Orifice(0.05, Coefficient);
        return Tank with { DrawOffs = Jobs.Only(line with { Inlet = line.Inlet with { Elevation = outlet } }) };
    }

    private static Line Hole(double flow) =>
        Jobs.Orifice(Math.Sqrt(4 / Math.PI * flow / (0.61 * Math.Sqrt(2 * Site.StandardGravity * Level))), 0.61);

    private static Job JobOf(double coefficient, double level) =>
        Tank with { Level = level, DrawOffs = Jobs.Only(Jobs.Orifice(0.05, coefficient)) };

    private static ForecastStudy Study(LevelReading[] readings) => new()
    {
        Readings = readings,
        Parameters = [new FittedParameter("Cd", "", 0.55), new FittedParameter("level", "m", 2.9)],
        Make = values => CaseJob.Of(() => JobOf(values[0], values[1])),
        Draws = 128,
    };

    private static ForecastResult Run(ForecastStudy study) => study.Run(TestContext.Current.CancellationToken);

    private static double TrueEnd() => Jobs.Run(JobOf(Coefficient, Level)).StoppedAt;

    /// <summary>Twelve readings over the first half, with normal noise of a multiple of what the resolution leaves.</summary>
    private static LevelReading[] Readings(int seed, double noise, Job? job = null)
    {
        DrainResult truth = Jobs.Run(job ?? JobOf(Coefficient, Level));
        var random = new Xoshiro256StarStar(seed + 1000, threadSafe: false);
        double deviation = noise * Resolution / Math.Sqrt(12);
        return [.. Enumerable.Range(0, 12).Select(i => i * truth.StoppedAt / 24).Select(t =>
            new LevelReading(t, truth.Trace.At(t).Level + (deviation > 0 ? Normal.Sample(random, 0, deviation) : 0), Resolution))];
    }
}
