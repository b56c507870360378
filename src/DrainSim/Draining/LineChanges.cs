using DrainSim.Lines;

namespace DrainSim.Draining;

/// <summary>Changes of a line that a crew can make: another outlet, another crest, a throttle.</summary>
internal static class LineChanges
{
    /// <summary>The line with its outlet lower: its last run falls further and is longer by as much.</summary>
    /// <param name="line">the line</param>
    /// <param name="drop">by how much, m</param>
    /// <returns>null where the line has no run</returns>
    public static Line? WithLowerOutlet(Line line, double drop)
    {
        int last = LastRun(line.Path);
        return last < 0 ? null : With(line, last, Fallen(line.Path[last], drop));
    }

    /// <summary>The line with its inlet lower: its first run is longer and climbs by as much more.</summary>
    /// <param name="line">the line</param>
    /// <param name="drop">by how much, m; at most the inlet's elevation</param>
    /// <returns>null where the line has no run</returns>
    public static Line? WithLowerInlet(Line line, double drop)
    {
        int first = FirstRun(line.Path);
        if (first < 0)
            return null;
        var run = (StraightRun)line.Path[first];
        return With(line, first, run with { Rise = run.Rise + drop, Length = run.Length + drop }) with
        {
            Inlet = line.Inlet with { Elevation = Math.Max(0, line.Inlet.Elevation - drop) },
        };
    }

    /// <summary>
    /// The line with its crest lower: the runs into and out of the crest climb and fall less, over the same lengths.
    /// </summary>
    /// <param name="line">the line</param>
    /// <param name="drop">by how much, m</param>
    /// <returns>null where no run climbs to a crest and falls from it</returns>
    public static Line? WithLowerCrest(Line line, double drop)
    {
        (int up, int down) = RunsAtCrest(line);
        if (up < 0 || down < 0)
            return null;
        Line lower = With(line, up, Risen(line.Path[up], -drop));
        return With(lower, down, Risen(lower.Path[down], drop));
    }

    /// <summary>The line with one more loss at its outlet.</summary>
    /// <param name="line">the line</param>
    /// <param name="loss">loss coefficient on the velocity head at the outlet, 1</param>
    public static Line WithThrottle(Line line, double loss) =>
        line with { Path = [.. line.Path, new PlainLoss { Coefficient = loss, Name = "throttle" }] };

    private static Line With(Line line, int index, PathItem item)
    {
        PathItem[] path = [.. line.Path];
        path[index] = item;
        return line with { Path = path };
    }

    private static StraightRun Fallen(PathItem item, double drop)
    {
        var run = (StraightRun)item;
        return run with { Rise = run.Rise - drop, Length = run.Length + drop };
    }

    private static StraightRun Risen(PathItem item, double rise)
    {
        var run = (StraightRun)item;
        double risen = run.Rise + rise;
        return run with { Rise = risen, Length = Math.Max(run.Length, Math.Abs(risen)) };
    }

    private static int FirstRun(IReadOnlyList<PathItem> path)
    {
        int i = 0;
        while (i < path.Count && path[i] is not StraightRun)
            i++;
        return i < path.Count ? i : -1;
    }

    private static int LastRun(IReadOnlyList<PathItem> path)
    {
        int i = path.Count - 1;
        while (i >= 0 && path[i] is not StraightRun)
            i--;
        return i;
    }

    private static (int Up, int Down) RunsAtCrest(Line line)
    {
        double elevation = line.Inlet.Elevation, crest = elevation;
        int up = -1, down = -1;
        for (int i = 0; i < line.Path.Count; i++)
        {
            if (line.Path[i] is not StraightRun run)
                continue;
            elevation += run.Rise;
            if (elevation > crest)
                (crest, up, down) = (elevation, i, -1);
            else if (elevation == crest && run.Rise >= 0)
                down = -1;
            else if (up >= 0 && down < 0)
                down = i;
        }

        return (up, down);
    }
}
