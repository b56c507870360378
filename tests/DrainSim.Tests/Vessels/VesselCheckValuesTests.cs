using System.Globalization;
using System.Reflection;
using CsvHelper;
using DrainSim.Vessels;

namespace DrainSim.Tests.Vessels;

/// <summary>Every row of tank-check-values.csv: numerical integrations, closed forms, and worked examples
/// from the sources named beside the rows, each within the tolerance of its row (the digits it was printed with).</summary>
public sealed class VesselCheckValuesTests
{
    private sealed record Row(string Case, string Orientation, double Diameter, double Length, Head First, Head Second,
        double Width, double Level, double Volume, double Tolerance);

    public static TheoryData<int, string> Cases()
    {
        TheoryData<int, string> cases = [];
        foreach ((int index, Row row) in Rows.Index())
            cases.Add(index, row.Case);
        return cases;
    }

    private static readonly List<Row> Rows = ReadRows();

    [Fact]
    public void All_112_rows_are_read() => Assert.Equal(112, Rows.Count);

    [Theory]
    [MemberData(nameof(Cases))]
    public void The_volume_agrees_with_the_row(int index, string name)
    {
        Row row = Rows[index];
        Assert.Equal(name, row.Case);
        Vessel vessel = VesselOf(row);
        Assert.Equal(row.Volume, vessel.Volume(row.Level), row.Tolerance * row.Volume);
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void The_level_agrees_with_the_row(int index, string name)
    {
        Row row = Rows[index];
        Assert.Equal(name, row.Case);
        Vessel vessel = VesselOf(row);
        double volume = vessel.Volume(row.Level);
        // Ill-conditioned where the roof closes to a point: half the digits are left.
        double tolerance = vessel.Area(row.Level) > 1e-3 ? 1e-13 : 1e-7;
        Assert.Equal(row.Level, vessel.Level(volume), tolerance * vessel.Height);
    }

    private static Vessel VesselOf(Row row) => row switch
    {
        { Orientation: "box" } => new Box { Length = row.Length, Width = row.Width, WallHeight = 2 },
        { Case: "sphere" } => new Sphere { Diameter = row.Diameter },
        { Case: ['f', 'r', 'u', 's', ..] } =>
            new Cone { BottomDiameter = 0.3, TopDiameter = row.Diameter, ConeHeight = row.Length },
        { Orientation: "horizontal" } => new HorizontalCylinder
        {
            Diameter = row.Diameter,
            Length = row.Length,
            FirstHead = row.First,
            SecondHead = row.Second,
        },
        // The rows of single heads have no shell; a metre of it lies above their level.
        _ => new VerticalCylinder
        {
            Diameter = row.Diameter,
            ShellHeight = row.Length > 0 ? row.Length : 1,
            Bottom = row.First,
            Top = row.Second,
        },
    };

    private static List<Row> ReadRows()
    {
        using Stream stream = Assembly.GetExecutingAssembly()
            .GetManifestResourceStream("DrainSim.Tests.Vessels.tank-check-values.csv")!;
        using StreamReader text = new(stream);
        using CsvReader csv = CsvReader.FromText(text.ReadToEnd());
        List<Row> rows = [];
        while (csv.Read())
        {
            double diameter = Number(csv, "diameter_m");
            rows.Add(new Row(csv.GetString("case"), csv.GetString("orientation"), diameter, Number(csv, "length_m"),
                HeadOf(csv, "head_a", diameter), HeadOf(csv, "head_b", diameter),
                Number(csv, "width_m"), Number(csv, "level_m"), Number(csv, "volume_m3"), Number(csv, "rel_tol")));
        }
        return rows;
    }

    private static Head HeadOf(CsvReader csv, string prefix, double diameter)
    {
        double depth = Number(csv, prefix + "_depth_m");
        double radius = diameter / 2;
        return csv.GetString(prefix) switch
        {
            "" or "flat" => new Flat(),
            "conical" => ConeHead.OfDepth(depth),
            "ellipsoidal" when depth == radius => new Hemisphere(),
            "ellipsoidal" => new Ellipsoidal { Depth = depth },
            "spherical" => new Torispherical
            {
                CrownRadius = (depth * depth + radius * radius) / (2 * depth),
                KnuckleRadius = 0,
            },
            "torispherical" => new Torispherical
            {
                CrownRadius = Number(csv, prefix + "_f") * diameter,
                KnuckleRadius = Number(csv, prefix + "_k") * diameter,
            },
            string other => throw new InvalidDataException(other),
        };
    }

    private static double Number(CsvReader csv, string column)
    {
        string cell = csv.GetString(column);
        return cell.Length == 0 ? 0 : double.Parse(cell, NumberStyles.Float, CultureInfo.InvariantCulture);
    }
}
