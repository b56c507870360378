using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>How a text looks.</summary>
/// <param name="Size">height of the font, px</param>
/// <param name="Color">its colour</param>
/// <param name="IsBold">its weight</param>
internal readonly record struct TextLook(float Size, SKColor Color, bool IsBold = false)
{
    /// <summary>Distance of two lines, px.</summary>
    public float LineHeight => 1.28f * Size;

    /// <summary>The font; the caller disposes of it.</summary>
    public SKFont Font() => new(IsBold ? ShippedFont.Bold : ShippedFont.Regular, Size)
    {
        Edging = SKFontEdging.Antialias,
        Hinting = SKFontHinting.None,
        Subpixel = true,
    };
}
