using CsCheck;
using DrainSim.Reports.Pictures;
using SkiaSharp;

namespace DrainSim.Tests.Reports;

public sealed class LabelPlacerTests
{
    private static readonly SKRect Frame = new(100, 100, 900, 500);

    [Fact]
    public void No_label_leaves_the_frame_or_covers_another_or_the_curve() =>
        Gen.Select(Gen.Float[100, 900], Gen.Float[100, 500]).Array[1, 25].Sample(anchors =>
        {
            var placer = new LabelPlacer(Frame);
            SKPoint[] curve = [new(100, 120), new(400, 330), new(900, 480)];
            placer.KeepClearOf(curve);
            SKRect[] places =
                [.. anchors.Select(one => placer.Find(new SKPoint(one.Item1, one.Item2), new SKSize(120, 50), 400))
                    .OfType<SKRect>()];
            return places.All(place => Frame.Contains(place) && !curve.Any(place.Contains))
                && places.All(place => places.Count(other => other.IntersectsWith(place)) == 1);
        });

    [Fact]
    public void A_label_stands_above_to_the_right_where_there_is_room() =>
        Assert.Equal(SKRect.Create(410, 240, 120, 50),
            new LabelPlacer(Frame).Find(new SKPoint(400, 300), new SKSize(120, 50), 100));

    [Fact]
    public void A_label_larger_than_the_frame_finds_no_place() =>
        Assert.Null(new LabelPlacer(Frame).Find(new SKPoint(400, 300), new SKSize(1200, 50), 400));
}
