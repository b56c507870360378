using CsCheck;
using DrainSim.Vessels;
using MathNet.Numerics.Integration;

namespace DrainSim.Tests.Vessels;

public sealed class StrappingTableTests
{
    [Fact]
    public void Every_row_is_met() =>
        VesselGen.StrappingTable.Sample(table => table.Rows.All(row =>
            Math.Abs(table.Volume(row.Level) - row.Volume) <= 1e-15 * table.Capacity
            && Math.Abs(table.Level(row.Volume) - row.Level) <= 1e-15 * table.Height), iter: 500);

    [Fact]
    public void The_area_does_not_step_at_a_row() =>
        VesselGen.StrappingTable.Sample(table => table.Rows.Skip(1).SkipLast(1).All(row =>
        {
            double hair = 1e-12 * table.Height;
            double below = table.Area(row.Level - hair), above = table.Area(row.Level + hair);
            return Math.Abs(above / below - 1) < 1e-8;
        }), iter: 500);

    [Fact]
    public void Between_two_rows_the_volume_grows_by_the_integral_of_the_area() =>
        Gen.Select(VesselGen.StrappingTable, Gen.Double[0, 1]).Sample((table, share) =>
            table.Rows.Zip(table.Rows.Skip(1)).All(rows =>
            {
                double from = rows.First.Level, to = from + share * (rows.Second.Level - from);
                double grown = GaussLegendreRule.Integrate(table.Area, from, to, 4);
                return Math.Abs(table.Volume(to) - rows.First.Volume - grown) <= 1e-14 * table.Capacity;
            }), iter: 500);

    [Fact]
    public void The_area_is_greater_than_0_everywhere() =>
        Gen.Select(VesselGen.StrappingTable, Gen.Double[0, 1])
            .Sample((table, share) => table.Area(share * table.Height) > 0, iter: 5000);

    [Fact]
    public void The_area_stays_between_the_least_and_the_greatest_that_the_rows_allow() =>
        Gen.Select(VesselGen.StrappingTable, Gen.Double[0, 1]).Sample((table, share) =>
        {
            double[] means = [.. table.Rows.Zip(table.Rows.Skip(1), (a, b) => (b.Volume - a.Volume) / (b.Level - a.Level))];
            double area = table.Area(share * table.Height);
            // With slopes of at most 2.5 means a cubic's slope is at least a quarter and at most 2.5 of them; a tenth at an end.
            return area >= 0.0999 * means.Min() && area <= 2.501 * means.Max();
        }, iter: 5000);

    [Fact]
    public void Two_rows_are_a_straight_line()
    {
        StrappingTable table = new() { Rows = [(0, 1), (2, 5)] };
        Assert.Equal(2, table.Volume(0.5));
        Assert.Equal(2, table.Area(1.3));
        Assert.Equal(0.5, table.Level(2), 1e-15);
    }

    [Fact]
    public void The_bottoms_count_as_volume_but_not_as_level()
    {
        StrappingTable table = new() { Rows = [(0, 1), (1, 3), (2, 5)] };
        Assert.Equal(1, table.Volume(0));
        Assert.Equal(1, table.Volume(-1));
        Assert.Equal(0, table.Level(1));
        Assert.Equal(0, table.Level(0.4));
        Assert.Equal(5, table.Capacity);
    }

    [Fact]
    public void Halving_the_distance_of_the_rows_cuts_the_error_of_a_sphere_at_least_sixfold()
    {
        // Away from the poles; the Fritsch–Butland slope is of second order, so the volume is of third.
        double ratio = LargestError(rows: 50) / LargestError(rows: 100);
        Assert.InRange(ratio, 6, 20);
    }

    [Fact]
    public void Rows_along_a_smooth_wall_are_no_section_levels_and_a_ledge_is_one()
    {
        StrappingTable smooth = TableOf(new Sphere { Diameter = 2 }, rows: 100);
        Assert.DoesNotContain(smooth.SectionLevels, level => level is > 0.2 and < 1.8);
        StrappingTable ledge = new() { Rows = [(0, 0), (1, 1), (2, 2), (3, 3), (4, 7), (5, 11), (6, 15)] };
        Assert.Contains(3.0, ledge.SectionLevels);
        Assert.DoesNotContain(1.0, ledge.SectionLevels);
    }

    private static double LargestError(int rows)
    {
        Sphere sphere = new() { Diameter = 2 };
        StrappingTable table = TableOf(sphere, rows);
        return Enumerable.Range(0, 1000).Select(i => 0.5 + 0.001 * i)
            .Max(level => Math.Abs(table.Volume(level) - sphere.Volume(level)));
    }

    private static StrappingTable TableOf(Sphere sphere, int rows) => new()
    {
        Rows = [.. Enumerable.Range(0, rows + 1).Select(i => (Level: sphere.Height * i / rows, Volume: sphere.Volume(sphere.Height * i / rows)))],
    };
}
