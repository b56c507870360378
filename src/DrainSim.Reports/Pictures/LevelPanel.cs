using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>The marks on the level curve: where the line begins and ends, the stop, the events, the tenths.</summary>
internal sealed class LevelPanel(
    Sheet sheet, Panel panel, RunReport report, TimeAxis axis, Unit unit, Notes notes)
{
    /// <summary>Longest text of an act in the panel, characters.</summary>
    private const int LongestAct = 44;

    /// <summary>Distance of the strokes of a hatched strip, px.</summary>
    private const float HatchStep = 12;

    private readonly DrainResult result = report.Result;

    /// <summary>The tenths before the end, which has its own label.</summary>
    private IEnumerable<DrainEvent> Tenths =>
        result.Events.Where(moment => moment.Code == EventCode.TenthGone && moment.Time < axis.End);

    /// <summary>The range of levels to show, m: the outlet is in it when it is near enough.</summary>
    public static (double Least, double Most) Range(DrainResult result, LineProfile profile)
    {
        double start = result.Job.Level;
        double[] shown = [.. Marks(result.Job, profile).Where(mark => mark > -0.3 * start && mark < 1.6 * start)];
        if (ReceiverSurface(result) is { } bottom)
            shown = [.. shown, bottom, bottom + (result.ReceiverLevel ?? 0)];
        double least = Math.Min(0, shown.DefaultIfEmpty(0).Min());
        double highest = result.Job.Inflow is null && result.Job.Timeline.Count == 0 ? start : Math.Max(start, result.FinalLevel);
        double most = Math.Max(highest, shown.DefaultIfEmpty(0).Max());
        most = most > least ? most : least + 1;
        return (least < 0 ? least - 0.06 * (most - least) : 0, most + 0.1 * (most - least));
    }

    /// <summary>
    /// Elevation of the bottom of the first receiving tank, m, where its surface can be shown beside the level: within some
    /// three times its range; null where not.
    /// </summary>
    public static double? ReceiverSurface(DrainResult result)
    {
        double start = Math.Max(result.Job.Level, 0.1);
        ReceivingTank? tank = result.Job.DrawOffs.Select(drawOff => drawOff.Receiver).OfType<ReceivingTank>().FirstOrDefault();
        return tank is not null && tank.Bottom > -2 * start && tank.Bottom + (result.ReceiverLevel ?? 0) < 1.6 * start ? tank.Bottom : null;
    }

    /// <summary>Writes all marks, the weightiest first, so that they get the best places.</summary>
    public void Annotate(LineProfile profile)
    {
        axis.MarkEnd(sheet, panel, notes);
        DrawAirBand();
        WriteReferences(profile);
        foreach (DrainEvent moment in Tenths)
        {
            sheet.Ring(At(moment), 5, Palette.Liquid);
        }
        WriteEnd();
        WriteEvents();
        NameTenths();
    }

    /// <summary>
    /// The levels between which the published forms say that air is drawn into the first line's inlet, as a hatched strip from
    /// the moment of the first to the end.
    /// </summary>
    private void DrawAirBand()
    {
        DrainEvent may = result.Events.FirstOrDefault(moment => moment is { Code: EventCode.AirMayBeDrawn, Line: 0 });
        DrainEvent likely = result.Events.FirstOrDefault(moment => moment is { Code: EventCode.AirDrawn, Line: 0 });
        if (may.Code != EventCode.AirMayBeDrawn || axis.End <= 0)
        {
            return;
        }
        double least = likely.Code == EventCode.AirDrawn ? likely.Level : result.FinalLevel;
        SKPoint top = panel.At(axis.At(may.Time), unit.From(may.Level));
        SKPoint bottom = panel.At(axis.At(axis.End), unit.From(least));
        for (float x = top.X; x < bottom.X + (bottom.Y - top.Y); x += HatchStep)
        {
            float from = Math.Max(x - (bottom.Y - top.Y), top.X), to = Math.Min(x, bottom.X);
            if (from < to)
            {
                sheet.Line(new SKPoint(to, top.Y + (x - to)), new SKPoint(from, top.Y + (x - from)), Palette.Liquid.WithAlpha(0x38), 1.5f);
            }
        }
    }

    private static IEnumerable<double> Marks(Job job, LineProfile profile)
    {
        yield return profile.Inlet;
        yield return profile.Outlet;
        if (job.ReceiverSurface is { } surface)
        {
            yield return surface;
        }
    }

    private string InletName =>
        result.Job.DrawOffs.Count > 1 ? $"inlet of {LimitWording.NameOf(result.Job.Line, 0)}" : "inlet";

    private void WriteReferences(LineProfile profile)
    {
        MeasureFormat format = report.Format;
        var marks = new List<(double Elevation, string Name)>
        {
            (profile.Inlet, $"{InletName} {format.Length(profile.Inlet)}"),
            (profile.Outlet, $"outlet {format.Length(profile.Outlet)}"),
        };
        foreach ((DrawOff other, int i) in result.Job.DrawOffs.Select((drawOff, i) => (drawOff, i)).Skip(1))
        {
            string line = LimitWording.NameOf(other.Line, i);
            marks.Add((other.Line.Inlet.Elevation, $"inlet of {line} {format.Length(other.Line.Inlet.Elevation)}"));
        }
        if (result.Job.ReceiverSurface is { } surface)
        {
            marks.Add((surface, $"receiving surface {format.Length(surface)}"));
        }
        TextLook look = PageText.Note(Palette.Muted);
        var outside = new List<string>();
        foreach ((double elevation, string name) in marks.OrderByDescending(mark => mark.Elevation))
        {
            if (!notes.Reference(unit.From(elevation), name, look, isAbove: elevation >= profile.Inlet))
            {
                outside.Add(elevation > result.Job.Level ? "↑ " + name : "↓ " + name);
            }
        }
        if (outside.Count > 0)
        {
            string text = string.Join("   ", outside);
            float x = panel.Frame.Right - Sheet.Measure(text, look);
            sheet.Text(text, x, panel.Frame.Top - 20, look);
        }
    }

    private void WriteEnd()
    {
        SKPoint at = panel.At(axis.At(axis.End), unit.From(result.FinalLevel));
        sheet.Dot(at, 9, Palette.Liquid);
        notes.KeepClearOf(at, 10);
        string level = report.Format.Length(result.FinalLevel);
        string second = axis.End <= 0 ? $"level {level}"
            : result.Outcome == Outcome.Emptied ? When(axis.End)
            : $"{When(axis.End)}, {level}";
        notes.AddNeeded(at, new TextLook(24, Palette.Liquid), 400, Verdict.Headline(result.Outcome), second);
    }

    private void WriteEvents()
    {
        SKPoint end = panel.At(axis.At(axis.End), unit.From(result.FinalLevel));
        double before = double.NegativeInfinity;
        string last = "";
        foreach (DrainEvent moment in result.Events.Where(moment => !IsPartOfAct(moment)))
        {
            string text = moment.Code == EventCode.Act ? ShortAct(moment) : Short(moment.Code);
            if (text.Length == 0 || text == last && moment.Time - before < 0.02 * axis.End)
            {
                continue;
            }
            (before, last) = (moment.Time, text);
            SKPoint at = At(moment);
            if (SKPoint.Distance(at, end) > 14 && notes.Add(at, PageText.Note(Palette.Ink), 400, false, text, When(moment.Time)))
            {
                sheet.Dot(at, 6, Palette.Ink);
                notes.KeepClearOf(at, 7);
            }
        }
    }

    private void NameTenths()
    {
        foreach (DrainEvent moment in Tenths)
        {
            string text = MeasureFormat.Percent(moment.Number / 10) + " out";
            notes.Add(At(moment), new TextLook(18, Palette.Muted), 12, false, text);
        }
    }

    private SKPoint At(DrainEvent moment) => panel.At(axis.At(moment.Time), unit.From(moment.Level));

    /// <summary>The event in a few words; empty for the tenths, and for the end, which has its own label.</summary>
    private static string Short(EventCode code) => code switch
    {
        EventCode.LeftTurbulent or EventCode.LeftLaminar => "transition begins",
        EventCode.BecameLaminar => "laminar from here",
        EventCode.BecameTurbulent => "turbulent from here",
        EventCode.VapourLimitBegins => "flow held at the limit",
        EventCode.VapourLimitEnds => "flow free again",
        EventCode.AirMayBeDrawn => "a vortex may draw air",
        EventCode.AirDrawn => "air is likely drawn",
        EventCode.BoreUncovered => "bore uncovered",
        EventCode.OutletCovered => "outlet covered",
        EventCode.OutletFreed => "outlet free",
        EventCode.VacuumRatingPassed => "vacuum rating passed",
        EventCode.PressureRatingPassed => "pressure rating passed",
        EventCode.HoseRatingPassed => "hose rating passed",
        EventCode.AirBreak => "vent on the line open",
        EventCode.InletUncovered => "inlet uncovered",
        EventCode.VapourBreak => "column parts",
        EventCode.ReceiverFull => "receiver full",
        _ => "",
    };

    /// <summary>The time since the start, by the clock too where the job has one.</summary>
    private string When(double time)
    {
        string elapsed = MeasureFormat.Duration(time);
        return report.Clock is { } clock
            ? $"{elapsed}, at {(axis.End < 86400 ? clock.OfDay(time, axis.End) : clock.DayAndTime(time))}"
            : elapsed;
    }

    /// <summary>Whether an event only says how the flow jumped when something was done.</summary>
    private bool IsPartOfAct(DrainEvent moment) =>
        moment.Code is EventCode.LeftTurbulent or EventCode.LeftLaminar or EventCode.BecameLaminar or EventCode.BecameTurbulent
        && result.Events.Any(act => act.Code == EventCode.Act && Math.Abs(act.Time - moment.Time) < 1e-3 * axis.End);

    private string ShortAct(DrainEvent moment)
    {
        string text = EventWording.Text(moment, result.Job);
        return text.Length <= LongestAct ? text : text[..(LongestAct - 1)].TrimEnd() + "…";
    }
}
