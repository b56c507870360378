using DrainSim.Draining;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>The marks on the level curve: where the line begins and ends, the stop, the events, the tenths.</summary>
internal sealed class LevelPanel(
    Sheet sheet, Panel panel, RunReport report, TimeAxis axis, Unit unit, Notes notes)
{
    private readonly DrainResult result = report.Result;

    /// <summary>The tenths before the end, which has its own label.</summary>
    private IEnumerable<DrainEvent> Tenths =>
        result.Events.Where(moment => moment.Code == EventCode.TenthGone && moment.Time < axis.End);

    /// <summary>The range of levels to show, m: the outlet is in it when it is near enough.</summary>
    public static (double Least, double Most) Range(DrainResult result, LineProfile profile)
    {
        double start = result.Job.Level;
        double[] shown = [.. Marks(result.Job, profile).Where(mark => mark > -0.3 * start && mark < 1.6 * start)];
        double least = Math.Min(0, shown.DefaultIfEmpty(0).Min());
        double most = Math.Max(start, shown.DefaultIfEmpty(0).Max());
        most = most > least ? most : least + 1;
        return (least < 0 ? least - 0.06 * (most - least) : 0, most + 0.1 * (most - least));
    }

    /// <summary>Writes all marks, the weightiest first, so that they get the best places.</summary>
    public void Annotate(LineProfile profile)
    {
        axis.MarkEnd(sheet, panel, notes);
        WriteReferences(profile);
        foreach (DrainEvent moment in Tenths)
        {
            sheet.Ring(At(moment), 5, Palette.Liquid);
        }
        WriteEnd();
        WriteEvents();
        NameTenths();
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

    private void WriteReferences(LineProfile profile)
    {
        MeasureFormat format = report.Format;
        var marks = new List<(double Elevation, string Name)>
        {
            (profile.Inlet, $"inlet {format.Length(profile.Inlet)}"),
            (profile.Outlet, $"outlet {format.Length(profile.Outlet)}"),
        };
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
            : result.Outcome == Outcome.Emptied ? MeasureFormat.Duration(axis.End)
            : $"{MeasureFormat.Duration(axis.End)}, {level}";
        notes.AddNeeded(at, new TextLook(24, Palette.Liquid), 400, Verdict.Headline(result.Outcome), second);
    }

    private void WriteEvents()
    {
        SKPoint end = panel.At(axis.At(axis.End), unit.From(result.FinalLevel));
        double before = double.NegativeInfinity;
        string last = "";
        foreach (DrainEvent moment in result.Events)
        {
            string text = Short(moment.Code);
            if (text.Length == 0 || text == last && moment.Time - before < 0.02 * axis.End)
            {
                continue;
            }
            (before, last) = (moment.Time, text);
            SKPoint at = At(moment);
            if (SKPoint.Distance(at, end) > 14 && notes.Add(at, PageText.Note(Palette.Ink), 400, false, text, MeasureFormat.Duration(moment.Time)))
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
        EventCode.BoreUncovered => "bore uncovered",
        EventCode.OutletCovered => "outlet covered",
        EventCode.OutletFreed => "outlet free",
        EventCode.VacuumRatingPassed => "vacuum rating passed",
        EventCode.PressureRatingPassed => "pressure rating passed",
        EventCode.HoseRatingPassed => "hose rating passed",
        EventCode.Act => "act",
        _ => "",
    };
}
