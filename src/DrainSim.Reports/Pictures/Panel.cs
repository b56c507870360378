using DrainSim.Reports.Measures;
using ScottPlot;
using SkiaSharp;

namespace DrainSim.Reports.Pictures;

/// <summary>One figure on a sheet: a frame, two axes with ticks, curves; and where a value lies on the sheet.</summary>
internal sealed class Panel
{
    private readonly SKRect frame;
    private readonly double left;
    private readonly double right;
    private readonly double bottom;
    private readonly double top;

    /// <summary>A figure without curves.</summary>
    /// <param name="frame">where its data lie on the sheet, px</param>
    /// <param name="horizontal">range of the horizontal axis</param>
    /// <param name="vertical">range of the vertical axis</param>
    public Panel(SKRect frame, (double Least, double Most) horizontal, (double Least, double Most) vertical)
    {
        ShippedFont.Use();
        this.frame = frame;
        (left, right) = horizontal;
        (bottom, top) = vertical;
        Plot = new Plot();
        Plot.FigureBackground.Color = Colors.Transparent;
        Plot.DataBackground.Color = Colors.Transparent;
        Plot.Grid.MajorLineColor = Palette.Of(Palette.Grid);
        Plot.Grid.MajorLineWidth = 1.5f;
        Plot.Axes.SetLimits(left, right, bottom, top);
        Plot.RenderManager.ClearCanvasBeforeEachRender = false;
        Plot.Axes.Top.IsVisible = false;
        Plot.Axes.Right.IsVisible = false;
    }

    /// <summary>The figure, for its curves.</summary>
    public Plot Plot { get; }

    /// <summary>Where its data lie on the sheet, px.</summary>
    public SKRect Frame => frame;

    /// <summary>Sets the ticks.</summary>
    public void SetTicks(AxisTicks horizontal, AxisTicks vertical)
    {
        Style(Plot.Axes.Bottom, horizontal);
        Style(Plot.Axes.Left, vertical);
    }

    /// <summary>Adds a curve.</summary>
    public void Curve(double[] xs, double[] ys, SKColor color, bool isDashed = false)
    {
        ScottPlot.Plottables.Scatter curve = Plot.Add.ScatterLine(xs, ys, Palette.Of(color));
        curve.LineWidth = 3.5f;
        curve.LinePattern = isDashed ? LinePattern.Dashed : LinePattern.Solid;
    }

    /// <summary>Tints the ground between a curve and 0.</summary>
    public void Tint(double[] xs, double[] ys, SKColor color) => Band(xs, new double[xs.Length], ys, color);

    /// <summary>Tints the ground between two curves.</summary>
    public void Band(double[] xs, double[] lower, double[] upper, SKColor color)
    {
        ScottPlot.Plottables.FillY fill = Plot.Add.FillY(xs, lower, upper);
        fill.FillColor = Palette.Of(color);
        fill.LineWidth = 0;
        fill.MarkerSize = 0;
    }

    /// <summary>Draws the figure on a sheet.</summary>
    public void Draw(Sheet sheet)
    {
        var page = new PixelRect(0, sheet.Width, sheet.Height, 0);
        Plot.Layout.Fixed(new PixelPadding(frame.Left, sheet.Width - frame.Right, sheet.Height - frame.Bottom, frame.Top));
        Plot.Render(sheet.Canvas, page);
    }

    /// <summary>Where a point lies on the sheet, px.</summary>
    public SKPoint At(double x, double y) => new(
        (float)(frame.Left + (x - left) / (right - left) * frame.Width),
        (float)(frame.Bottom - (y - bottom) / (top - bottom) * frame.Height));

    /// <summary>Whether a value lies in the vertical range.</summary>
    public bool Shows(double y) => y >= bottom && y <= top;

    private static void Style(IAxis axis, AxisTicks ticks)
    {
        axis.TickGenerator = new ScottPlot.TickGenerators.NumericManual(ticks.Positions, ticks.Labels);
        axis.TickLabelStyle.FontName = ShippedFont.Family;
        axis.TickLabelStyle.FontSize = 21;
        axis.TickLabelStyle.ForeColor = Palette.Of(Palette.Ink);
        axis.MajorTickStyle.Color = Palette.Of(Palette.Frame);
        axis.MajorTickStyle.Length = 6;
        axis.MajorTickStyle.Width = 1.5f;
        axis.FrameLineStyle.Color = Palette.Of(Palette.Frame);
        axis.FrameLineStyle.Width = 1.5f;
    }
}
