using ScottPlot;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>The font that DrainSim brings along, so that a picture is the same on every machine.</summary>
/// <remarks>DejaVu Sans 2.37, cut down; its terms stand beside the files. Nothing of the system's fonts is used.</remarks>
internal static class ShippedFont
{
    /// <summary>The family name under which ScottPlot finds it.</summary>
    public const string Family = "DrainSim Sans";

    private static readonly Lazy<(SKTypeface Regular, SKTypeface Bold)> Faces = new(Load);

    /// <summary>The regular face.</summary>
    public static SKTypeface Regular => Faces.Value.Regular;

    /// <summary>The bold face.</summary>
    public static SKTypeface Bold => Faces.Value.Bold;

    /// <summary>Makes it the font of every figure; to be called before the first one is made.</summary>
    /// <exception cref="InvalidOperationException">a face is missing, so that text would be missing too</exception>
    public static void Use() => _ = Faces.Value;

    private static (SKTypeface Regular, SKTypeface Bold) Load()
    {
        (SKTypeface Regular, SKTypeface Bold) faces = (Read("DejaVuSans.ttf"), Read("DejaVuSans-Bold.ttf"));
        Fonts.FontResolvers.Insert(0, new Resolver(faces.Regular, faces.Bold));
        Fonts.Default = Family;
        foreach (bool bold in (ReadOnlySpan<bool>)[false, true])
        {
            if (Fonts.GetTypeface(Family, bold, italic: false)?.FamilyName != faces.Regular.FamilyName)
            {
                throw new InvalidOperationException("the shipped font is not in use; a picture would have no text");
            }
        }
        return faces;
    }

    private static SKTypeface Read(string file)
    {
        using Stream stream = typeof(ShippedFont).Assembly.GetManifestResourceStream(file)
            ?? throw new InvalidOperationException($"the shipped font file {file} is missing");
        using SKData data = SKData.Create(stream);
        return SKTypeface.FromData(data)
            ?? throw new InvalidOperationException($"the shipped font file {file} cannot be read");
    }

    private sealed class Resolver(SKTypeface regular, SKTypeface bold) : IFontResolver
    {
        public SKTypeface? CreateTypeface(string fontName, bool isBold, bool italic) =>
            fontName != Family ? null : isBold ? bold : regular;

        public SKTypeface? CreateTypeface(
            string fontName, FontWeight weight, FontSlant slant, FontSpacing spacing) =>
            CreateTypeface(fontName, weight >= FontWeight.SemiBold, slant != FontSlant.Upright);
    }
}
