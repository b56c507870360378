using DrainSim.Reports.Measures;
using DrainSim.Reports.Studies;
using DrainSim.Reports.Wording;
using DrainSim.Studies.Uncertainty;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>
/// The picture of an uncertainty study: the level in bands, the percentiles and the chances, and what explains the spread;
/// upright, in the proportions of an A4 page.
/// </summary>
public static class UncertaintyPicture
{
    private const float Left = 118;
    private const float Edge = 44;
    private const float Right = RunPicture.Width - 40;

    private static readonly TextLook Plain = new(21, Palette.Ink);
    private static readonly TextLook Quiet = new(18, Palette.Muted);

    /// <summary>Draws a study and writes it as PNG: the same bytes for the same study on every machine.</summary>
    /// <param name="stream">receives the PNG; left open</param>
    /// <param name="report">the study and how it is told</param>
    /// <exception cref="IOException">the stream refuses</exception>
    public static void Write(Stream stream, UncertaintyReport report)
    {
        ArgumentNullException.ThrowIfNull(report);
        using var sheet = new Sheet(RunPicture.Width, RunPicture.Height);
        float top = PageText.Head(sheet, report.Title, UncertaintyWording.Sentence(report.Result));
        PageText.Foot(sheet, report.Job, report.Format);
        float room = RunPicture.Height - 102 - top;
        var frame = new SKRect(Left, top + 44, Right, top + 0.44f * room);
        DrawFan(sheet, report, frame);
        float tables = frame.Bottom + 130;
        float left = DrawPercentiles(sheet, report, tables);
        float right = DrawChances(sheet, report, tables);
        DrawShares(sheet, report.Result, Math.Max(left, right) + 50);
        sheet.Write(stream);
    }

    private static void DrawFan(Sheet sheet, UncertaintyReport report, SKRect frame)
    {
        LevelFan fan = report.Result.Fan;
        var axis = new TimeAxis(fan.Times[^1], report.Clock);
        double most = fan.Levels[^1].Max();
        Unit unit = report.Format.LengthUnit(most);
        Panel panel = axis.Panel(frame, (0, 1.08 * unit.From(most)), 8);
        double[] xs = [.. fan.Times.Select(axis.At)];
        double[][] ys = [.. fan.Levels.Select(band => band.Select(unit.From).ToArray())];
        SKColor outer = Palette.Ramp(Palette.Liquid, 0.06), inner = Palette.Ramp(Palette.Liquid, 0.3);
        panel.Band(xs, ys[0], ys[^1], outer);
        panel.Band(xs, ys[1], ys[^2], inner);
        panel.Curve(xs, ys[2], Palette.Liquid);
        panel.Draw(sheet);
        PageText.RowTitle(sheet, frame, $"Level in the tank, {unit.Sign}");
        PageText.AxisTitle(sheet, frame, axis.Title);
        Legend(sheet, frame, (outer, "90 of 100 cases"), (inner, "80 of 100"), (Palette.Liquid, "the middle one"));
        var notes = new Notes(sheet, panel);
        foreach (double[] curve in (double[][])[ys[0], ys[2], ys[^1]])
            notes.KeepClearOf(xs, curve);
        (Percentile Percentile, string Name)[] marks = [(report.Result.DrainTime[2], "half are done"), (report.Result.DrainTime[^1], "95 of 100 are done")];
        marks = [.. marks.Where(mark => mark.Percentile.Value < fan.Times[^1])];
        foreach ((Percentile percentile, _) in marks)
        {
            float x = X(percentile);
            sheet.Line(new SKPoint(x, frame.Top), new SKPoint(x, frame.Bottom), Palette.Muted, 1.5f, 3, 5);
            notes.KeepClearOf(x);
        }
        foreach ((Percentile percentile, string name) in marks)
        {
            string when = report.Clock?.DayAndTime(percentile.Value) ?? MeasureFormat.Duration(percentile.Value);
            notes.Add(new SKPoint(X(percentile), frame.Top + 0.3f * frame.Height), PageText.Note(Palette.Ink), 500, true, name, when);
        }

        float X(Percentile percentile) => panel.At(axis.At(percentile.Value), 0).X;
    }

    /// <summary>Swatches with their names, above the frame at the right.</summary>
    internal static void Legend(Sheet sheet, SKRect frame, params (SKColor Color, string Name)[] items)
    {
        float x = frame.Right;
        foreach ((SKColor color, string name) in items.Reverse())
        {
            x -= Sheet.Measure(name, Quiet);
            sheet.Text(name, x, frame.Top - 20, Quiet);
            x -= 34;
            sheet.Fill(new SKRect(x, frame.Top - 34, x + 26, frame.Top - 20), color);
            x -= 24;
        }
    }

    private static float DrawPercentiles(Sheet sheet, UncertaintyReport report, float top)
    {
        Heading(sheet, "How long, and what is left", Edge, top);
        float y = top + 40;
        for (int k = 0; k < report.Result.DrainTime.Count; k++, y += 31)
        {
            Percentile time = report.Result.DrainTime[k];
            sheet.Text(UncertaintyWording.Name(time), Edge, y, Plain with { IsBold = k == 2 });
            sheet.Text(UncertaintyWording.Time(time), Edge + 62, y, Plain with { IsBold = k == 2 });
            sheet.Text(UncertaintyWording.Volume(report.Result.LeftVolume[k], report.Format), Edge + 352, y, Plain);
        }

        foreach (string line in Sheet.Wrap("P95: 95 of 100 cases stay below. ±: what another seed may change, 95 %.", Quiet, 600, 2))
        {
            sheet.Text(line, Edge, y, Quiet);
            y += Quiet.LineHeight;
        }
        return y;
    }

    private static float DrawChances(Sheet sheet, UncertaintyReport report, float top)
    {
        const float x = 690;
        UncertaintyResult result = report.Result;
        Heading(sheet, "How it ends", x, top);
        float y = top + 40;
        foreach (OutcomeChance one in result.Outcomes.Take(4))
            Row(Verdict.Headline(one.Outcome), one.Chance);
        if (result.Limits.Count > 0)
            sheet.Text("Limits kept", x, y, Plain with { IsBold = true });
        y += result.Limits.Count > 0 ? 31 : 0;
        foreach (LimitChance limit in result.Limits.Take(5))
            Row(LimitWording.Bound(limit.Kind, limit.Bound, report.Format), limit.Kept);
        if (result.Refused > 0)
        {
            sheet.Text($"{result.Refused} of {result.Count} samples make no job", x, y, Quiet);
            y += 31;
        }

        return y;

        void Row(string name, Chance chance)
        {
            string figure = UncertaintyWording.Chance(chance);
            float place = Right - Sheet.Measure(figure, Plain);
            if (x + Sheet.Measure(name, Plain) > place - 14)
            {
                sheet.Text(Sheet.Wrap(name, Plain, Right - x, 1)[0], x, y, Plain);
                y += 29;
                name = "";
            }
            sheet.Text(name, x, y, Plain);
            sheet.Text(figure, place, y, Plain);
            y += 31;
        }
    }

    private static void DrawShares(Sheet sheet, UncertaintyResult result, float top)
    {
        SpreadShares? shares = result.DrainTimeShares ?? result.LeftVolumeShares;
        Heading(sheet, shares is null ? "The result does not vary"
            : result.DrainTimeShares is null ? "What explains the spread of the volume left" : "What explains the spread of the drain time", Edge, top);
        if (shares is null)
            return;
        float y = top + 36, room = RunPicture.Height - 150 - y;
        float step = Math.Min(64, room / result.Study.Parameters.Count);
        foreach (int j in Enumerable.Range(0, result.Study.Parameters.Count).OrderByDescending(j => shares.Shares[j]))
        {
            UncertainParameter parameter = result.Study.Parameters[j];
            float width = Math.Max(2, (float)shares.Shares[j] * (Right - 690 - 90));
            sheet.Text(Sheet.Wrap(parameter.Path, Plain, 620, 1)[0], Edge, y + 21, Plain);
            if (step > 50)
                sheet.Text(Sheet.Wrap(parameter.Spread.Text(parameter.Unit), Quiet, 620, 1)[0], Edge, y + 44, Quiet);
            sheet.Fill(new SKRect(690, y + 2, 690 + width, y + Math.Min(36, step - 10)), Palette.Ramp(Palette.Liquid, 0.6));
            sheet.Text(UncertaintyWording.Share(shares.Shares[j]), 690 + width + 12, y + 24, Plain);
            y += step;
        }

        foreach (string line in Sheet.Wrap(UncertaintyWording.SharesNote(shares), Quiet, Right - Edge, 2))
        {
            sheet.Text(line, Edge, y + 20, Quiet);
            y += Quiet.LineHeight;
        }
    }

    private static void Heading(Sheet sheet, string text, float x, float y) =>
        sheet.Text(text, x, y, new TextLook(23, Palette.Ink, IsBold: true));
}
