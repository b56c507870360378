using DrainSim.Reports.Measures;
using DrainSim.Studies.Forecasting;

namespace DrainSim.Reports.Studies;

/// <summary>A forecast and how it is told: all that its files need.</summary>
public sealed record ForecastReport
{
    /// <summary>Name of the files, without folder and ending.</summary>
    public required string Name { get; init; }

    /// <summary>Title for people.</summary>
    public required string Title { get; init; }

    /// <summary>What the readings say.</summary>
    public required ForecastResult Result { get; init; }

    /// <summary>Units for people.</summary>
    public UnitSystem Units { get; init; } = UnitSystem.Metric;

    /// <summary>The clock at the start; null where it is not known.</summary>
    public Clock? Clock { get; init; }

    /// <summary>Whether the date of <see cref="Clock"/> is known, and not the time of the day alone.</summary>
    public bool HasDate { get; init; } = true;

    internal MeasureFormat Format => new(Units);

    /// <summary>A moment for people: the clock where it is known, else the time since the start.</summary>
    /// <param name="time">s since the start</param>
    public string Moment(double time) => Clock is null ? MeasureFormat.Duration(time) + " after the start"
        : HasDate ? Clock.DayAndTime(time)
        : Clock.OfDay(time, double.PositiveInfinity) + (Clock.At(time).Date - Clock.Begins.Date).Days switch
        {
            0 => "",
            1 => " the next day",
            var days => $" {days} days later",
        };

    /// <summary>A moment beside another one: the time of the day alone where both are of one day.</summary>
    /// <param name="time">s since the start</param>
    /// <param name="beside">the other moment, s since the start</param>
    public string Moment(double time, double beside) => Clock is not null && Clock.At(time).Date == Clock.At(beside).Date
        ? Clock.OfDay(time, double.PositiveInfinity)
        : Clock is null ? MeasureFormat.Duration(time) : Moment(time);
}
