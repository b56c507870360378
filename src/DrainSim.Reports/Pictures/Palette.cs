using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>The colours of the pictures: told apart by their lightness too, so that they print in grey.</summary>
internal static class Palette
{
    public static readonly SKColor Paper = new(0xFF, 0xFF, 0xFF);
    public static readonly SKColor Ink = new(0x1E, 0x2B, 0x33);
    public static readonly SKColor Muted = new(0x5C, 0x6B, 0x75);
    public static readonly SKColor Grid = new(0xE2, 0xE6, 0xE8);
    public static readonly SKColor Frame = new(0x9A, 0xA6, 0xAD);
    public static readonly SKColor Liquid = new(0x17, 0x52, 0x73);
    public static readonly SKColor LiquidTint = new(0xE6, 0xEF, 0xF4);
    public static readonly SKColor Receiver = new(0x2F, 0x6B, 0x5A);
    public static readonly SKColor Flow = new(0x9C, 0x6A, 0x14);
    public static readonly SKColor Pressure = new(0x5B, 0x3F, 0x73);
    public static readonly SKColor Limit = new(0xB2, 0x3A, 0x2A);

    public static readonly SKColor Undone = new(0xF7, 0xE9, 0xE6);

    /// <summary>One of several colours, told apart by their lightness: from ochre over green to the liquid's blue.</summary>
    /// <param name="index">which, from 0</param>
    /// <param name="count">of how many</param>
    public static SKColor Step(int index, int count)
    {
        double share = count > 1 ? index / (count - 1.0) : 1;
        SKColor middle = new(0x4F, 0x9A, 0x8B);
        return share < 0.5 ? Between(new SKColor(0xC8, 0x8A, 0x1E), middle, 2 * share) : Between(middle, Liquid, 2 * share - 1);
    }

    /// <summary>A colour between paper and a dark one.</summary>
    /// <param name="dark">the dark end</param>
    /// <param name="share">how dark, from 0 to 1</param>
    public static SKColor Ramp(SKColor dark, double share) => Between(Between(Paper, dark, 0.12), dark, share);

    /// <summary>The colours of several lines, in their order, over and over.</summary>
    public static readonly SKColor[] Lines =
    [
        new(0xC4, 0x8A, 0x2C), new(0x4F, 0x6B, 0x2E), new(0x8A, 0x3B, 0x5E), new(0x2E, 0x7A, 0x86), new(0x7A, 0x56, 0x3A),
    ];

    /// <summary>The same colour for a figure.</summary>
    public static ScottPlot.Color Of(SKColor color) => new(color.Red, color.Green, color.Blue);

    private static SKColor Between(SKColor from, SKColor to, double share)
    {
        return new SKColor(Mix(from.Red, to.Red), Mix(from.Green, to.Green), Mix(from.Blue, to.Blue));

        byte Mix(byte a, byte b) => (byte)Math.Round(a + share * (b - a));
    }
}
