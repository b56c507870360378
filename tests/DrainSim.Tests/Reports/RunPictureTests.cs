using System.Buffers.Binary;
using System.Globalization;
using DrainSim.Draining;
using DrainSim.Reports;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Pictures;
using SkiaSharp;

namespace DrainSim.Tests.Reports;

public sealed class RunPictureTests
{
    public static TheoryData<string> Cases => [.. Runs.Keys];

    private static readonly Dictionary<string, InventedRun> Runs = new()
    {
        ["hours"] = new InventedRun(),
        ["days"] = new InventedRun { Title = string.Join(' ', Enumerable.Repeat("a long title", 20)), End = 12 * 86400.0 },
        ["seconds"] = new InventedRun { End = 42, EndLevel = 0, Outcome = Outcome.Emptied },
        ["a moment"] = new InventedRun { End = 1e-3, EndLevel = 2.599 },
        ["held"] = new InventedRun { VapourPressure = 20e3, LowestPressure = -20e3, Outcome = Outcome.VapourBreak },
        ["never"] = new InventedRun { Outcome = Outcome.NeverStarted, NoStart = NoStart.NoDrivingHead, OutletElevation = 9 },
        ["dry"] = new InventedRun
        {
            Outcome = Outcome.NeverStarted,
            NoStart = NoStart.InletAboveLevel,
            StartLevel = 0,
            EndLevel = 0,
        },
        ["no pressure"] = new InventedRun { LowestPressure = double.NaN },
    };

    [Theory]
    [MemberData(nameof(Cases))]
    public void A_picture_has_its_size_and_the_same_bytes_twice(string name)
    {
        byte[] first = Run(Runs[name], UnitSystem.Us);
        Assert.Equal((RunPicture.Width, RunPicture.Height), Size(first));
        Assert.Equal(first, Run(Runs[name], UnitSystem.Us));
        byte[] line = Line(Runs[name]);
        Assert.Equal((LinePicture.Width, LinePicture.Height), Size(line));
        Assert.Equal(line, Line(Runs[name]));
    }

    [Fact]
    public void The_culture_changes_no_byte()
    {
        byte[] run = Run(new InventedRun(), UnitSystem.Metric);
        byte[] line = Line(new InventedRun());
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo("")
            {
                NumberFormat = { NumberDecimalSeparator = ",", NumberGroupSeparator = ".", NegativeSign = "~" },
            };
            Assert.Equal(run, Run(new InventedRun(), UnitSystem.Metric));
            Assert.Equal(line, Line(new InventedRun()));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void The_units_change_the_picture() => Assert.NotEqual(
        Run(new InventedRun(), UnitSystem.Metric), Run(new InventedRun(), UnitSystem.Us));

    [Fact]
    public void Text_is_set_in_the_shipped_font_and_no_other()
    {
        ShippedFont.Use();
        SKTypeface? plain = ScottPlot.Fonts.GetTypeface(ScottPlot.Fonts.Default, bold: false, italic: false);
        SKTypeface? bold = ScottPlot.Fonts.GetTypeface(ScottPlot.Fonts.Default, bold: true, italic: false);
        Assert.Equal("DejaVu Sans", plain?.FamilyName);
        Assert.Equal("DejaVu Sans", bold?.FamilyName);
        Assert.True(bold?.IsBold);
        Assert.Same(ShippedFont.Regular, plain);
        Assert.Same(ShippedFont.Bold, bold);
    }

    [Theory]
    [InlineData("Tank Ω, 20 °C · Δp ≥ 3 kPa → ½ m³ ‑ “Öl” Ğıł № 5 ₂ ⁻¹ … ↓ −")]
    public void The_shipped_font_has_the_signs_of_the_trade(string text)
    {
        using SKFont font = new TextLook(20, Palette.Ink).Font();
        using SKFont bold = new TextLook(20, Palette.Ink, IsBold: true).Font();
        Assert.True(font.ContainsGlyphs(text));
        Assert.True(bold.ContainsGlyphs(text));
    }

    [Fact]
    public void The_terms_of_the_font_travel_with_it()
    {
        using Stream? terms = typeof(RunPicture).Assembly.GetManifestResourceStream("LICENSE-DejaVu.txt");
        Assert.NotNull(terms);
    }

    private static byte[] Run(InventedRun run, UnitSystem units)
    {
        using var stream = new MemoryStream();
        RunPicture.Write(stream, new RunReport { Name = "run", Result = run.Result(), Units = units });
        return stream.ToArray();
    }

    private static byte[] Line(InventedRun run)
    {
        using var stream = new MemoryStream();
        LinePicture.Write(stream, new RunReport { Name = "run", Result = run.Result() });
        return stream.ToArray();
    }

    private static (int Width, int Height) Size(byte[] png) =>
        (BinaryPrimitives.ReadInt32BigEndian(png.AsSpan(16)), BinaryPrimitives.ReadInt32BigEndian(png.AsSpan(20)));
}
