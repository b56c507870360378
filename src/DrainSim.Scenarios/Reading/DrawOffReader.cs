using DrainSim.Draining;
using DrainSim.Lines;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the lines of a tank, each with what it discharges into: <c>line</c> and <c>receiver</c>, or <c>lines</c>.</summary>
internal static class DrawOffReader
{
    /// <summary>The lines; null when one is missing or refused.</summary>
    /// <param name="file">the whole scenario</param>
    /// <param name="folder">folder in which a strapping table is looked for</param>
    /// <param name="tank">the tank, for judging the geometry; null when it was refused</param>
    public static IReadOnlyList<DrawOff>? Read(BlockReader file, string folder, FilledTank? tank)
    {
        if (file.AtMostOne("Give one 'line', or a list of 'lines'", "line", "lines") == "lines")
            return Several(file, folder, tank);
        if (!file.Has("line") && !file.Has("lines"))
            file.Miss("is missing", "Give its bore, inlet and path", "line", "lines");
        double? front = null;
        Line? line = file.Block("line") is { } block ? LineReader.Read(block, tank, out front) : null;
        Receiver? receiver = null;
        bool isWhole = line is not null;
        if (file.Block("receiver") is { } below)
        {
            receiver = ReceiverReader.Read(below, folder);
            isWhole &= receiver is not null;
        }
        return isWhole ? [new DrawOff { Line = line!, Receiver = receiver, Front = front }] : null;
    }

    private static DrawOff[]? Several(BlockReader file, string folder, FilledTank? tank)
    {
        if (file.Has("receiver"))
            file.Refuse("receiver", "stands beside 'lines'", "Write each line's own 'receiver' into the line");
        if (file.List("lines") is not { } list)
            return null;
        if (list.Items.Count == 0)
            file.Refuse("lines", "lists no lines", "A line has a name, a bore, an inlet and a path");
        List<DrawOff?> drawOffs = [];
        HashSet<string> names = [];
        for (int i = 0; i < list.Items.Count; i++)
        {
            string path = ParameterPath.OfItem(file.PathOf("lines"), list.Items[i], i);
            if (list.Items[i] is BlockNode node)
            {
                drawOffs.Add(One(new BlockReader(node, path, node.At, file.Findings), names, folder, tank));
                continue;
            }
            file.Findings.Refuse(list.Items[i].At, path, "is no line", "A line has a name, a bore, an inlet and a path");
            drawOffs.Add(null);
        }
        return drawOffs.Count == 0 || drawOffs.Contains(null) ? null : [.. drawOffs.OfType<DrawOff>()];
    }

    private static DrawOff? One(BlockReader block, HashSet<string> names, string folder, FilledTank? tank)
    {
        if (!block.Has("name"))
            block.Miss("is missing", "Each of several lines has a name", "name");
        string? name = NameReader.Read(block, names);
        BlockReader? below = block.Block("receiver");
        Receiver? receiver = below is null ? null : ReceiverReader.Read(below, folder);
        Line? line = LineReader.Read(block, tank, out double? front);
        return line is null || (below is not null && receiver is null)
            ? null
            : new DrawOff { Line = line with { Name = name }, Receiver = receiver, Front = front };
    }
}
