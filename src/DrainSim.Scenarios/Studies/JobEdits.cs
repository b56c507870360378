using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Scenarios.Reading;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Studies;

/// <summary>Changes one number of a job.</summary>
/// <param name="job">the job</param>
/// <param name="value">the number in SI</param>
/// <returns>the changed job; null where only reading the scenario tells what the number means</returns>
internal delegate Job? JobEdit(Job job, double value);

/// <summary>The numbers that stand in a job as they are given in the scenario.</summary>
internal static class JobEdits
{
    /// <summary>A run is no shorter than its rise; nearer than this the reading decides, m.</summary>
    private const double Rounding = 1e-9;

    /// <summary>Changes the number of a path; null where it has to be read.</summary>
    /// <param name="document">the scenario</param>
    /// <param name="job">its job</param>
    /// <param name="path">dotted path</param>
    public static JobEdit? Find(ScenarioDocument document, Job job, string path)
    {
        // What is done during the job was compiled from the line as it stands, and a value beside its rival is refused.
        if (job.Timeline.Count > 0 || document.Find(path) is not TextNode)
            return null;
        return path switch
        {
            "tank.level" => (old, level) => Level(old, level),
            "tank.fill" => (old, fill) => fill is >= 0 and <= 1 ? Contents(old, fill * old.Vessel.Capacity) : null,
            "tank.contents" => Contents,
            _ when job.DrawOffs.Count > 1 => null,
            "line.roughness" => (old, roughness) => roughness >= 0 ? WithLine(old, old.Line with { Roughness = roughness }) : null,
            "line.inlet.loss" => (old, loss) => loss >= 0
                ? WithLine(old, old.Line with { Inlet = old.Line.Inlet with { EdgeLoss = loss } })
                : null,
            "line.bore" when document.Find("line.inlet.floor_clearance") is null =>
                (old, bore) => bore > 0 ? WithLine(old, old.Line with { Bore = bore }) : null,
            _ => OfItem(document, job, path),
        };
    }

    private static JobEdit? OfItem(ScenarioDocument document, Job job, string path)
    {
        int dot = path.LastIndexOf('.');
        if (dot < 0 || document.Find("line.path") is not ListNode list || list.Items.Count != job.Line.Path.Count)
            return null;
        string item = path[..dot];
        int index = Enumerable.Range(0, list.Items.Count)
            .FirstOrDefault(i => ParameterPath.OfItem("line.path", list.Items[i], i) == item, -1);
        return (path[(dot + 1)..], index < 0 ? null : job.Line.Path[index]) switch
        {
            ("length", StraightRun) => (old, length) => old.Line.Path[index] is StraightRun run && length > Math.Abs(run.Rise) + Rounding
                ? WithItem(old, index, run with { Length = length })
                : null,
            ("roughness", StraightRun) => (old, roughness) => old.Line.Path[index] is StraightRun run && roughness >= 0
                ? WithItem(old, index, run with { Roughness = roughness })
                : null,
            ("loss", PlainLoss) => (old, loss) => old.Line.Path[index] is PlainLoss plain && loss >= 0
                ? WithItem(old, index, plain with { Coefficient = loss })
                : null,
            ("opening", Valve) => (old, opening) => old.Line.Path[index] is Valve valve && opening is >= 0 and <= 1
                ? WithItem(old, index, valve with { Opening = opening })
                : null,
            _ => null,
        };
    }

    private static Job? Level(Job job, double level) =>
        level >= 0 && level <= job.Vessel.Height && !(level <= job.Run.StopAtLevel)
        && !(job.Run.StopAtVolume is { } stop && job.Vessel.Volume(level) <= stop)
            ? job with { Level = level }
            : null;

    private static Job? Contents(Job job, double volume) =>
        volume >= 0 && volume <= job.Vessel.Capacity ? Level(job, job.Vessel.Level(volume)) : null;

    private static Job WithItem(Job job, int index, PathItem item)
    {
        PathItem[] path = [.. job.Line.Path];
        path[index] = item;
        return WithLine(job, job.Line with { Path = path });
    }

    private static Job WithLine(Job job, Line line) =>
        job with { DrawOffs = [job.DrawOffs[0] with { Line = line }] };
}
