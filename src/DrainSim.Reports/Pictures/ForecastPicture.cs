using DrainSim.Reports.Measures;
using DrainSim.Reports.Studies;
using DrainSim.Studies.Forecasting;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>
/// The picture of a forecast: readings, fitted curve, band and finish; the residuals; what the readings say of the
/// parameters; upright, in the proportions of an A4 page.
/// </summary>
public static class ForecastPicture
{
    private const float Left = 118;
    private const float Edge = 44;
    private const float Right = RunPicture.Width - 40;

    private static readonly TextLook Plain = new(21, Palette.Ink);
    private static readonly SKColor BandColor = Palette.Ramp(Palette.Liquid, 0.12);

    /// <summary>Draws a forecast and writes it as PNG: the same bytes for the same forecast on every machine.</summary>
    /// <param name="stream">receives the PNG; left open</param>
    /// <param name="report">the forecast and how it is told</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void Write(Stream stream, ForecastReport report)
    {
        ArgumentNullException.ThrowIfNull(report);
        using var sheet = new Sheet(RunPicture.Width, RunPicture.Height);
        float top = PageText.Head(sheet, report.Title, ForecastWording.Sentence(report));
        PageText.Foot(sheet, report.Result.Run.Job, report.Format);
        float room = RunPicture.Height - 102 - top;
        double end = Math.Max(report.Result.Band?.Times[^1] ?? 0, Math.Max(report.Result.Finish.Best, report.Result.Residuals[^1].Reading.Time));
        var axis = new TimeAxis(end, report.HasDate ? report.Clock : null);
        var levels = new SKRect(Left, top + 44, Right, top + 0.46f * room);
        var residuals = new SKRect(Left, levels.Bottom + 128, Right, levels.Bottom + 128 + 0.15f * room);
        DrawLevels(sheet, report, axis, levels);
        DrawResiduals(sheet, report, axis, residuals);
        WriteFindings(sheet, report, residuals.Bottom + 112);
        sheet.Write(stream);
    }

    private static void DrawLevels(Sheet sheet, ForecastReport report, TimeAxis axis, SKRect frame)
    {
        ForecastResult result = report.Result;
        var fitted = new Course(result.Run);
        double most = Math.Max(result.Run.Job.Level, result.Residuals.Max(one => one.Reading.Level));
        Unit unit = report.Format.LengthUnit(most);
        Panel panel = axis.Panel(frame, (0, 1.1 * unit.From(most)), 8);
        if (result.Band is { } band)
        {
            panel.Band([.. band.Times.Select(axis.At)], [.. band.Levels[0].Select(unit.From)], [.. band.Levels[^1].Select(unit.From)], BandColor);
        }
        var before = new Course(result.Before);
        double[] xsBefore = [.. before.Values(now => now.Time, axis.Unit.Size)];
        double[] ysBefore = before.Values(now => now.Level, unit.Size);
        panel.Curve(xsBefore, ysBefore, Palette.Frame, isDashed: true);
        double[] xs = fitted.Values(now => now.Time, axis.Unit.Size), ys = fitted.Values(now => now.Level, unit.Size);
        panel.Curve(xs, ys, Palette.Liquid);
        panel.Draw(sheet);
        PageText.RowTitle(sheet, frame, $"Level in the tank, {unit.Sign}");
        PageText.AxisTitle(sheet, frame, axis.Title);
        UncertaintyPicture.Legend(sheet, frame,
            (Palette.Flow, "readings"), (Palette.Liquid, "fitted"), (BandColor, "95 % band"), (Palette.Frame, "scenario as it stood"));
        foreach (ReadingResidual one in result.Residuals)
        {
            sheet.Dot(panel.At(axis.At(one.Reading.Time), unit.From(one.Reading.Level)), 6, Palette.Flow);
        }
        var notes = new Notes(sheet, panel);
        notes.KeepClearOf(xs, ys);
        notes.KeepClearOf(xsBefore, ysBefore);
        MarkFinish(sheet, panel, notes, report, axis, unit);
    }

    private static void MarkFinish(Sheet sheet, Panel panel, Notes notes, ForecastReport report, TimeAxis axis, Unit unit)
    {
        ForecastResult result = report.Result;
        SKPoint at = panel.At(axis.At(result.Finish.Best), unit.From(result.Run.FinalLevel));
        if (result.Finish is { Low: { } low, High: { } high })
        {
            SKPoint from = panel.At(axis.At(low), unit.From(result.Run.FinalLevel));
            SKPoint to = panel.At(axis.At(Math.Min(high, axis.End)), unit.From(result.Run.FinalLevel));
            foreach (SKPoint end in (ReadOnlySpan<SKPoint>)[from, to])
            {
                sheet.Line(new SKPoint(end.X, end.Y - 12), new SKPoint(end.X, end.Y + 12), Palette.Limit, 3);
            }
            sheet.Line(from, to, Palette.Limit, 3);
        }
        sheet.Dot(at, 9, Palette.Limit);
        notes.KeepClearOf(at, 12);
        string[] band = result.Finish is { Low: { } first, High: { } last } ? [$"{report.Moment(first, result.Finish.Best)} to {report.Moment(last, result.Finish.Best)}"] : [];
        notes.AddNeeded(at, new TextLook(23, Palette.Limit), 500, [$"finish {report.Moment(result.Finish.Best)}", .. band]);
    }

    private static void DrawResiduals(Sheet sheet, ForecastReport report, TimeAxis axis, SKRect frame)
    {
        ForecastResult result = report.Result;
        double reach = result.Residuals.Max(one => Math.Max(Math.Abs(one.Residual), 2 * one.Reading.Uncertainty));
        Unit unit = report.Format.LengthUnit(reach);
        double most = 1.35 * unit.From(reach);
        Panel panel = axis.Panel(frame, (-most, most), 6);
        double[] xs = [.. result.Residuals.Select(one => axis.At(one.Reading.Time))];
        double[] two = [.. result.Residuals.Select(one => unit.From(2 * one.Reading.Uncertainty))];
        panel.Band(xs, [.. two.Select(value => -value)], two, BandColor);
        panel.Draw(sheet);
        sheet.Line(panel.At(0, 0), new SKPoint(frame.Right, panel.At(0, 0).Y), Palette.Frame, 1.5f);
        PageText.RowTitle(sheet, frame, $"Reading less curve, {unit.Sign}");
        UncertaintyPicture.Legend(sheet, frame, (BandColor, "twice what the instrument's resolution leaves"));
        foreach (ReadingResidual one in result.Residuals)
        {
            sheet.Dot(panel.At(axis.At(one.Reading.Time), unit.From(one.Residual)), 6, Palette.Flow);
        }
    }

    private static void WriteFindings(Sheet sheet, ForecastReport report, float top)
    {
        ForecastResult result = report.Result;
        sheet.Text("What the readings say", Edge, top, new TextLook(23, Palette.Ink, IsBold: true));
        float y = top + 38;
        foreach (Estimate estimate in result.Estimates)
        {
            Write($"{estimate.Parameter.Path}: {ForecastWording.Text(estimate)}", Palette.Ink);
        }
        Write(ForecastWording.Text(result, result.Separation), result.Separation == Separation.Apart ? Palette.Ink : Palette.Limit);
        Write(ForecastWording.Scatter(result, report.Format), Palette.Ink);
        foreach (Alternative alternative in result.Alternatives)
        {
            Write(ForecastWording.Text(alternative, report), alternative.IsFound ? Palette.Limit : Palette.Ink);
        }

        void Write(string text, SKColor color)
        {
            TextLook look = Plain with { Color = color };
            foreach (string line in Sheet.Wrap(text, look, Right - Edge, 3))
            {
                if (y < RunPicture.Height - 90)
                {
                    sheet.Text(line, Edge, y, look);
                }
                y += look.LineHeight;
            }
            y += 6;
        }
    }
}
