using System.Globalization;

namespace DrainSim.Reports.Measures;

/// <summary>The clock on the wall of a job that says when it begins.</summary>
/// <param name="begins">the clock at the start, with its zone</param>
public sealed class Clock(DateTimeOffset begins)
{
    /// <summary>The clock at the start, with its zone.</summary>
    public DateTimeOffset Begins { get; } = begins;

    /// <summary>The zone, 'UTC+02:00'.</summary>
    public string Zone => "UTC" + Begins.ToString("zzz", CultureInfo.InvariantCulture);

    /// <summary>The clock at a time, to the second.</summary>
    /// <param name="time">s since the start</param>
    public DateTimeOffset At(double time) => Begins.AddSeconds(Math.Round(Math.Min(time, 1e10)));

    /// <summary>Date and time for people: 'Sun 4 May 2031 10:42'.</summary>
    /// <param name="time">s since the start</param>
    public string Moment(double time) =>
        ToMinute(time).ToString("ddd d MMM yyyy HH:mm", CultureInfo.InvariantCulture);

    /// <summary>Date and time without the year: '4 May 10:42'.</summary>
    /// <param name="time">s since the start</param>
    public string DayAndTime(double time) => ToMinute(time).ToString("d MMM HH:mm", CultureInfo.InvariantCulture);

    /// <summary>The time of the day, to the second where the job is short: '10:42'.</summary>
    /// <param name="time">s since the start</param>
    /// <param name="end">length of the job, s</param>
    public string OfDay(double time, double end) => end < 600
        ? At(time).ToString("HH:mm:ss", CultureInfo.InvariantCulture)
        : ToMinute(time).ToString("HH:mm", CultureInfo.InvariantCulture);

    /// <summary>Date, time and zone as ISO 8601 writes them.</summary>
    /// <param name="time">s since the start</param>
    public string Iso(double time) => At(time).ToString("yyyy-MM-dd'T'HH:mm:sszzz", CultureInfo.InvariantCulture);

    /// <summary>Time from the start to the first even step of the clock that is not before it, s.</summary>
    /// <param name="step">the step, s</param>
    public double FirstEven(double step)
    {
        double sinceMidnight = Begins.TimeOfDay.TotalSeconds;
        return Math.Ceiling(sinceMidnight / step - 1e-9) * step - sinceMidnight;
    }

    private DateTimeOffset ToMinute(double time)
    {
        DateTimeOffset later = At(time).AddSeconds(30);
        return later.AddSeconds(-later.Second);
    }
}
