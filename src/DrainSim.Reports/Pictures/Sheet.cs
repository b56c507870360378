using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>A page to draw on: text in the shipped font, lines, marks, and its PNG.</summary>
internal sealed class Sheet : IDisposable
{
    private readonly SKSurface surface;

    /// <summary>An empty page.</summary>
    /// <param name="width">px</param>
    /// <param name="height">px</param>
    public Sheet(int width, int height)
    {
        ShippedFont.Use();
        Width = width;
        Height = height;
        surface = SKSurface.Create(new SKImageInfo(width, height, SKColorType.Rgba8888, SKAlphaType.Opaque));
        Canvas.Clear(Palette.Paper);
    }

    public int Width { get; }

    public int Height { get; }

    public SKCanvas Canvas => surface.Canvas;

    public void Dispose() => surface.Dispose();

    /// <summary>Width of a line of text, px.</summary>
    public static float Measure(string text, TextLook look)
    {
        using SKFont font = look.Font();
        return font.MeasureText(text);
    }

    /// <summary>Draws a line of text.</summary>
    /// <param name="text">the line</param>
    /// <param name="x">its left end, px</param>
    /// <param name="baseline">where its letters stand, px</param>
    /// <param name="look">size, weight, colour</param>
    /// <param name="halo">whether a rim of paper keeps it clear of lines behind it</param>
    public void Text(string text, float x, float baseline, TextLook look, bool halo = false)
    {
        using SKFont font = look.Font();
        if (halo)
        {
            using var rim = new SKPaint
            {
                Color = Palette.Paper.WithAlpha(0xD8),
                IsAntialias = true,
                Style = SKPaintStyle.Stroke,
                StrokeWidth = 5,
                StrokeJoin = SKStrokeJoin.Round,
            };
            Canvas.DrawText(text, x, baseline, SKTextAlign.Left, font, rim);
        }
        using var paint = new SKPaint { Color = look.Color, IsAntialias = true };
        Canvas.DrawText(text, x, baseline, SKTextAlign.Left, font, paint);
    }

    /// <summary>Breaks a text into lines of a width; what does not fit into the lines allowed ends in an ellipsis.</summary>
    public static IReadOnlyList<string> Wrap(string text, TextLook look, float width, int mostLines)
    {
        using SKFont font = look.Font();
        var lines = new List<string>();
        string line = "";
        foreach (string word in text.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries))
        {
            string longer = line.Length == 0 ? word : line + " " + word;
            if (font.MeasureText(longer) <= width || line.Length == 0)
            {
                line = longer;
                continue;
            }
            lines.Add(line);
            line = word;
        }
        lines.Add(line);
        if (lines.Count > mostLines)
        {
            lines.RemoveRange(mostLines, lines.Count - mostLines);
            lines[^1] += " …";
        }
        return [.. lines.Select(one => Cut(one, font, width))];
    }

    public void Line(SKPoint from, SKPoint to, SKColor color, float width, params float[] dashes)
    {
        using SKPathEffect? effect = dashes.Length > 0 ? SKPathEffect.CreateDash(dashes, 0) : null;
        using var paint = new SKPaint { Color = color, IsAntialias = true, StrokeWidth = width, PathEffect = effect };
        Canvas.DrawLine(from, to, paint);
    }

    /// <summary>A filled rectangle.</summary>
    public void Fill(SKRect place, SKColor color)
    {
        using var paint = new SKPaint { Color = color, IsAntialias = false };
        Canvas.DrawRect(place, paint);
    }

    /// <summary>A dot with a rim of paper.</summary>
    public void Dot(SKPoint at, float radius, SKColor color)
    {
        using var paint = new SKPaint { Color = Palette.Paper, IsAntialias = true };
        Canvas.DrawCircle(at, radius + 2, paint);
        paint.Color = color;
        Canvas.DrawCircle(at, radius, paint);
    }

    /// <summary>A ring filled with paper.</summary>
    public void Ring(SKPoint at, float radius, SKColor color)
    {
        Dot(at, radius, color);
        using var paint = new SKPaint { Color = Palette.Paper, IsAntialias = true };
        Canvas.DrawCircle(at, radius - 2, paint);
    }

    /// <summary>Writes the page as PNG.</summary>
    public void Write(Stream stream)
    {
        using SKPixmap pixels = surface.PeekPixels();
        using SKData? data = pixels.Encode(new SKPngEncoderOptions(SKPngEncoderFilterFlags.None, 2));
        (data ?? throw new InvalidOperationException("the picture cannot be encoded")).SaveTo(stream);
    }

    private static string Cut(string line, SKFont font, float width)
    {
        if (font.MeasureText(line) <= width)
        {
            return line;
        }
        int length = line.Length;
        while (length > 1 && font.MeasureText(line.AsSpan(0, length).ToString() + "…") > width)
        {
            length--;
        }
        return line[..length] + "…";
    }
}
