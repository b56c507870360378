using DrainSim.Draining;
using DrainSim.Scenarios.Units;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the list <c>timeline</c>: acts at times or at levels, each setting parameters by their paths.</summary>
/// <remarks>
/// The plant after an act is that of the scenario in which the act's values, and those of the acts listed before it,
/// stand in place of its own: it is read by the same readers, so that an act is judged as strictly as the file.
/// </remarks>
internal static class TimelineReader
{
    /// <summary>Most acts of a job.</summary>
    private const int MostActs = 200;

    private const string Help = "An act has a time or a level and what it sets, such as {at: 10 min, set: {line.path.outlet_valve.opening: 50 %}}";

    /// <summary>The acts in the order of the file; those that are refused are left out.</summary>
    /// <param name="file">the whole scenario</param>
    /// <param name="root">its tree</param>
    /// <param name="start">the job without its acts; null when it was refused</param>
    /// <param name="read">reads the job of a changed tree, with its problems</param>
    public static List<Act> Read(BlockReader file, BlockNode root, Job? start, Func<BlockNode, Findings, Job?> read)
    {
        List<Act> acts = [];
        if (file.List("timeline") is not { } list)
            return acts;
        if (list.Items.Count > MostActs)
            file.Refuse("timeline", $"has more than {MostActs} acts", "Run the parts of the job one by one");
        Job? before = start;
        foreach ((Node item, int index) in list.Items.Take(MostActs).Select((item, index) => (item, index)))
        {
            string path = ParameterPath.OfItem(file.PathOf("timeline"), item, index);
            if (item is not BlockNode node)
            {
                file.Findings.Refuse(item.At, path, "is no act", Help);
                continue;
            }
            BlockReader block = new(node, path, node.At, file.Findings);
            if (ReadAct(block, ref root, before, read) is not { } act)
                continue;
            JudgeLevel(block, act, start);
            acts.Add(act);
            before = act.After;
        }
        return acts;
    }

    private static Act? ReadAct(BlockReader block, ref BlockNode root, Job? before, Func<BlockNode, Findings, Job?> read)
    {
        (double? time, double? level) = When(block);
        string? text = block.Word("text");
        if (!block.Has("set"))
            block.Miss("is missing", Help, "set");
        BlockNode? set = block.SettingsOf("set");
        block.Finish();
        if (set is null || before is null)
            return null;
        bool isWhole = true;
        BlockNode changed = root;
        foreach (Entry entry in set.Entries)
            isWhole &= Set(block, entry, ref changed);
        Findings found = block.Findings.Fresh();
        Job? after = isWhole ? read(changed, found) : null;
        if (after is null || (time is null && level is null))
        {
            if (found.Problems.Count > 0)
                block.Refuse("set", $"{Quote.Plain(found.Problems[0].Key)}: {found.Problems[0].Fault}", found.Problems[0].Accepted);
            return null;
        }
        if (Foreign(before, after) is { } what)
        {
            block.Refuse("set", $"{what} cannot be changed during the job",
                "Acts change the lines, their valves and receiving surfaces, the headspace and the inflow");
            return null;
        }
        root = changed;
        return new Act { Time = time, Level = level, Before = before, After = after, Text = text ?? Told(set) };
    }

    private static (double? Time, double? Level) When(BlockReader block)
    {
        if (!block.Has("at"))
            block.Miss("is missing", "Give a time such as 10 min, or a level such as 1.2 m", "at");
        return block.IsAmount("at", Quantities.Length)
            ? (null, block.Amount("at", Quantities.Length, Allowed.NotNegative))
            : (block.Amount("at", Quantities.Time, Allowed.NotNegative), null);
    }

    private static bool Set(BlockReader block, Entry entry, ref BlockNode root)
    {
        if (entry.Value is not TextNode { Text.Length: > 0 } value)
        {
            block.Findings.Refuse(entry.KeyAt, block.PathOf("set"), $"{Quote.Of(entry.Key)} has no single value", "Write one value behind the colon");
            return false;
        }
        if (ParameterPath.Set(root, entry.Key, value.Text) is { } changed)
        {
            root = changed;
            return true;
        }
        string help = Nearest.Find(entry.Key, ParameterPath.All(root)) is { } near ? $"did you mean {Quote.Of(near)}?" : "'drainsim check --inputs' lists them";
        block.Findings.Refuse(entry.KeyAt, block.PathOf("set"), $"{Quote.Of(entry.Key)} is no parameter of this scenario", help);
        return false;
    }

    private static void JudgeLevel(BlockReader block, Act act, Job? start)
    {
        if (act.Level >= start?.Level)
            block.Refuse("at", "the tank stands at this level or lower from the start", "Give a level below that at the start, or the time 0 s");
    }

    /// <summary>What an act changes that it must not; null where there is nothing.</summary>
    private static string? Foreign(Job before, Job after)
    {
        if (after.Liquid != before.Liquid)
            return "the liquid";
        if (after.Site != before.Site)
            return "the site";
        if (after.Vessel != before.Vessel || after.Level != before.Level)
            return "the tank";
        if (after.VacuumRating != before.VacuumRating || after.PressureRating != before.PressureRating)
            return "a rating";
        if (after.Limits != before.Limits || after.Run != before.Run)
            return "the run or its limits";
        return after.DrawOffs.Count != before.DrawOffs.Count || after.DrawOffs.Zip(before.DrawOffs).Any(pair => IsOtherTank(pair.First, pair.Second))
            ? "a receiving tank"
            : null;
    }

    private static bool IsOtherTank(DrawOff after, DrawOff before) =>
        (after.Receiver is ReceivingTank || before.Receiver is ReceivingTank) && after.Receiver != before.Receiver;

    private static string Told(BlockNode set) =>
        string.Join("; ", set.Entries.Select(entry => $"{entry.Key} set to {((TextNode)entry.Value).Text}"));
}
