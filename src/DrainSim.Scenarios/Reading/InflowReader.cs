using DrainSim.Draining;
using DrainSim.Scenarios.Units;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads <c>tank.inflow</c>: a flow, or a list of flows over time.</summary>
internal static class InflowReader
{
    private const string Help = "A point has a time and a flow, such as {at: 30 min, flow: 2 L/s}";

    /// <summary>What runs in; null for nothing.</summary>
    /// <param name="tank">the block of the tank</param>
    public static Inflow? Read(BlockReader tank)
    {
        if (tank.ListIfAny("inflow") is { } list)
            return FromList(tank, list);
        return tank.Amount("inflow", Quantities.Flow, Allowed.NotNegative) is > 0 and { } flow ? Inflow.Constant(flow) : null;
    }

    private static Inflow? FromList(BlockReader tank, ListNode list)
    {
        List<(double Time, double Flow)> points = [];
        bool isWhole = list.Items.Count > 0;
        for (int i = 0; i < list.Items.Count; i++)
        {
            string path = ParameterPath.OfItem(tank.PathOf("inflow"), list.Items[i], i);
            if (list.Items[i] is not BlockNode node)
            {
                tank.Findings.Refuse(list.Items[i].At, path, "is no point of an inflow", Help);
                isWhole = false;
                continue;
            }
            BlockReader point = new(node, path, node.At, tank.Findings);
            double? time = point.Needed("at", Quantities.Time, Allowed.NotNegative);
            double? flow = point.Needed("flow", Quantities.Flow, Allowed.NotNegative);
            point.Finish();
            isWhole &= time is not null && flow is not null;
            if (time <= (points.Count > 0 ? points[^1].Time : -1))
            {
                point.Refuse("at", "is no later than the point before", "The points stand in the order of time");
                isWhole = false;
            }
            if (time is { } t && flow is { } q)
                points.Add((t, q));
        }
        if (list.Items.Count == 0)
            tank.Refuse("inflow", "lists no points", Help);
        return isWhole ? tank.BuildAt("inflow", () => new Inflow { Points = points }) : null;
    }
}
