using DrainSim.Reports.Measures;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>The time axis that the rows of a picture share.</summary>
internal sealed class TimeAxis
{
    private readonly double most;
    private readonly AxisTicks ticks;

    /// <summary>An axis from the start to a little after the end; without ticks for a run of no length.</summary>
    /// <param name="end">when the run stopped, s</param>
    /// <param name="clock">the clock of the job; null where it has none</param>
    public TimeAxis(double end, Clock? clock)
    {
        End = end;
        Unit = MeasureFormat.TimeUnit(end);
        most = end > 0 ? 1.04 * Unit.From(end) : 1;
        ticks = end <= 0 ? AxisTicks.None
            : clock is null ? AxisTicks.Time(Unit, most, 10)
            : AxisTicks.OfClock(clock, Unit, most, 8);
        Title = end <= 0 ? "at the start"
            : clock is null ? $"time since the start, {Unit.Sign}"
            : $"time of the day, {clock.Zone}; start {clock.Moment(0)}";
    }

    /// <summary>When the run stopped, s.</summary>
    public double End { get; }

    /// <summary>What the axis shows, in words.</summary>
    public string Title { get; }

    /// <summary>The axis's unit.</summary>
    public Unit Unit { get; }

    /// <summary>A time in the axis's unit.</summary>
    /// <param name="time">s</param>
    public double At(double time) => Unit.From(time);

    /// <summary>The times of a course in the axis's unit; a run of no length spans the axis.</summary>
    public double[] Times(Course course) => End > 0 ? course.Values(now => now.Time, Unit.Size) : [0, most];

    /// <summary>A panel over this axis.</summary>
    /// <param name="frame">where its data lie, px</param>
    /// <param name="vertical">its vertical range</param>
    /// <param name="steps">most steps of the vertical ticks; 0 for none</param>
    public Panel Panel(SKRect frame, (double Least, double Most) vertical, int steps)
    {
        var panel = new Panel(frame, (0, most), vertical);
        panel.SetTicks(ticks,
            steps > 0 ? AxisTicks.Decimal(vertical.Least, vertical.Most, steps) : AxisTicks.None);
        return panel;
    }

    /// <summary>Draws the moment of the stop down a panel.</summary>
    public void MarkEnd(Sheet sheet, Panel panel, Notes notes)
    {
        if (End > 0)
        {
            float x = panel.At(At(End), 0).X;
            sheet.Line(new SKPoint(x, panel.Frame.Top), new SKPoint(x, panel.Frame.Bottom), Palette.Muted, 1.5f, 3, 5);
            notes.KeepClearOf(x);
        }
    }
}
