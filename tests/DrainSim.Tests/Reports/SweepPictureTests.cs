using System.Buffers.Binary;
using System.Globalization;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Pictures;
using DrainSim.Reports.Studies;

namespace DrainSim.Tests.Reports;

/// <summary>Pictures of sweeps of every form: they have their size and are the same twice.</summary>
public sealed class SweepPictureTests
{
    private static readonly SweepAxis Length = new("line.path.outer_leg.length", "m", false, []);
    private static readonly SweepAxis Bore = new("line.bore", "mm", true, []);
    private static readonly SweepAxis Material = new("line.material", "", false, ["smooth_hose", "cast_iron"]);

    private static readonly Dictionary<string, SweepReport> Reports = new()
    {
        ["one parameter"] = Report([Length], 40, i => [5 + i]),
        ["one case"] = Report([Length], 1, _ => [5]),
        ["one value"] = Report([Length], 3, _ => [5]),
        ["nothing done"] = Report([Length], 5, i => [i], _ => null),
        ["gaps"] = Report([Length], 30, i => [-i], i => i % 4 == 0 ? null : 1000 + i),
        ["logarithmic"] = Report([Bore], 20, i => [Math.Pow(10, i / 7.0)]),
        ["words"] = Report([Material], 2, i => [i]),
        ["map"] = Report([Length, Bore], 12, i => [i / 4, 10 * Math.Pow(2, i % 4)]),
        ["map of words, nothing done"] = Report([Material, Length], 6, i => [i / 3, i % 3], _ => null),
        ["fine map"] = Report([Length, Bore], 1200, i => [i / 30, 10 * Math.Pow(1.1, i % 30)], i => i % 30 < 4 ? null : 100 + i),
        ["three parameters"] = Report([Length, Bore, Material], 8, i => [i / 4, i / 2 % 2, i % 2]),
    };

    public static TheoryData<string> Cases => [.. Reports.Keys];

    [Theory]
    [MemberData(nameof(Cases))]
    public void A_picture_has_its_size_and_the_same_bytes_twice(string name)
    {
        byte[] first = Png(Reports[name]);
        Assert.Equal(SweepPicture.Width, BinaryPrimitives.ReadInt32BigEndian(first.AsSpan(16)));
        Assert.Equal(SweepPicture.Height, BinaryPrimitives.ReadInt32BigEndian(first.AsSpan(20)));
        Assert.Equal(first, Png(Reports[name]));
    }

    [Fact]
    public void Another_result_is_another_picture() =>
        Assert.NotEqual(Png(Reports["one parameter"]), Png(Report([Length], 40, i => [5 + i], i => 1001 + i * i)));

    [Fact]
    public void A_mark_found_stands_in_the_picture()
    {
        SweepReport report = Reports["one parameter"];
        Assert.NotEqual(Png(report), Png(report with { Marks = [(12, "12 m", true)] }));
        Assert.NotEqual(Png(report), Png(report with { TargetTime = 1200 }));
    }

    private static SweepReport Report(SweepAxis[] axes, int count, Func<int, double[]> values, Func<int, double?>? time = null) => new()
    {
        Title = "Invented sweep",
        Count = count,
        Axes = axes,
        Subtitle = "Everything here is invented.",
        Units = UnitSystem.Metric,
        Points = [.. Enumerable.Range(0, count).Select(i => new SweepPoint(values(i), Row(i, axes.Length, time is null ? 1000 + i * i : time(i))))],
    };

    private static SweepRow Row(int index, int parameters, double? time) => new()
    {
        Case = index + 1,
        Parameters = [.. Enumerable.Range(0, parameters).Select(i => i.ToString(CultureInfo.InvariantCulture))],
        Outcome = time is null ? SweepTable.Impossible : "inlet_uncovered",
        Reason = time is null ? "line.path: a run of 1 m cannot fall 2 m" : "",
        DrainTime = time,
        LeastMargin = time is null ? null : 40_000 - 3000 * index,
        LeftVolume = time is null ? null : 0.2,
    };

    private static byte[] Png(SweepReport report)
    {
        using var stream = new MemoryStream();
        SweepPicture.Write(stream, report);
        return stream.ToArray();
    }
}
