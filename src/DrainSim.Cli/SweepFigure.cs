using DrainSim.Draining;
using DrainSim.Reports.Files;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Pictures;
using DrainSim.Reports.Studies;
using DrainSim.Scenarios.Studies;

namespace DrainSim.Cli;

/// <summary>Makes the picture of a sweep from its table.</summary>
/// <param name="cases">the cases</param>
/// <param name="units">units for people</param>
internal sealed class SweepFigure(SweepCases cases, UnitSystem units)
{
    /// <summary>Most cases of a map.</summary>
    private const long MostCells = 250_000;

    /// <summary>Most points of a curve; of more cases an even choice is drawn.</summary>
    private const long MostPoints = 2000;

    private readonly ParameterValue[] values = new ParameterValue[cases.Scenario.Parameters.Count];
    private readonly List<string>[] words = [.. cases.Scenario.Parameters.Select(_ => new List<string>())];

    /// <summary>Draws the picture.</summary>
    /// <param name="table">the table</param>
    /// <param name="path">where the picture goes</param>
    /// <param name="cancellation">ends the drawing; nothing is left half written</param>
    public void Write(string table, string path, CancellationToken cancellation)
    {
        long most = cases.IsGrid && values.Length == 2 ? MostCells : MostPoints;
        long stride = (cases.Count + most - 1) / most;
        var digest = new SweepDigest();
        List<SweepPoint> points = [];
        foreach (SweepRow row in SweepRows.Read(table, values.Length))
        {
            cancellation.ThrowIfCancellationRequested();
            digest.Add(row);
            if ((row.Case - 1) % stride == 0 || row.Case == cases.Count)
                points.Add(new SweepPoint(Places(row.Case - 1), row));
        }

        var format = new MeasureFormat(units);
        var report = new SweepReport
        {
            Title = cases.Scenario.Base.Title,
            Count = cases.Count,
            Axes = [.. cases.Scenario.Parameters.Select(Axis)],
            Points = points,
            Courses = Courses(points, cancellation),
            Units = units,
            Subtitle = string.Join(" ", digest.Lines(format).Prepend($"{digest.Outcomes}.")),
        };
        WholeFile.Write(path, stream => SweepPicture.Write(stream, report));
    }

    /// <summary>An axis in the unit that people wrote.</summary>
    public static SweepAxis AxisOf(StudyParameter parameter, bool isLogarithmic, IReadOnlyList<string> words) =>
        new(parameter.Path, parameter.Unit is null or { Spelling: "1" } ? "" : parameter.Unit.Spelling, isLogarithmic, words);

    private SweepAxis Axis(StudyParameter parameter, int index) => AxisOf(parameter, cases.IsLogarithmic(index), words[index]);

    private double[] Places(long number)
    {
        cases.Read(number, values);
        double[] places = new double[values.Length];
        for (int i = 0; i < places.Length; i++)
            places[i] = cases.Scenario.Parameters[i].Unit is { } unit && values[i].IsNumber ? Rounded(unit.FromSi(values[i].Si)) : WordIndex(i);
        return places;
    }

    /// <summary>Without the noise of the conversion, so that the same values of a grid stand at the same place.</summary>
    private static double Rounded(double value) =>
        double.Parse(value.ToString("G12", System.Globalization.CultureInfo.InvariantCulture), System.Globalization.CultureInfo.InvariantCulture);

    private int WordIndex(int parameter)
    {
        string text = values[parameter].Text;
        if (!words[parameter].Contains(text))
            words[parameter].Add(text);
        return words[parameter].IndexOf(text);
    }

    private List<(string, DrainResult)> Courses(List<SweepPoint> points, CancellationToken cancellation)
    {
        List<(string, DrainResult)> courses = [];
        if (cases.Count > SweepPicture.MostCourses || values.Length != 1)
            return courses;
        CaseReader reader = cases.Scenario.NewReader();
        foreach (SweepPoint point in points.Where(point => point.Row.Outcome != SweepTable.Impossible))
        {
            cases.Read(point.Row.Case - 1, values);
            if (reader.Read(values).Job is { } job && Simulation.Run(job, cancellation) is { StoppedAt: > 0 } result)
                courses.Add((values[0].Brief, result));
        }

        return courses;
    }
}
