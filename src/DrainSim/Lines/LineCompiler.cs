using System.Diagnostics;
using DrainSim.Liquids;

namespace DrainSim.Lines;

/// <summary>Walks along a line once and lays its nodes and losses out in arrays.</summary>
internal sealed class LineCompiler
{
    private readonly Line line;
    private readonly double gravity;
    private readonly double kinematicViscosity; // of a Newtonian liquid; what else it enters StressLosses takes out again
    private readonly List<LineNode> nodes = [];
    private readonly List<LossStep> steps = [];
    private readonly List<PipeWall> walls = [];
    private readonly List<double> totalPipe = [];
    private readonly List<double> volumes = [];
    private readonly Dictionary<(double Bore, double Roughness), int> wallOf = [];
    private readonly SortedSet<double> runBores = [];
    private double bore;
    private double elevation;
    private double distance;
    private double volume;

    /// <summary>Compiles a line for a liquid.</summary>
    public LineCompiler(Line line, Liquid liquid, double gravity)
    {
        this.line = line;
        this.gravity = gravity;
        kinematicViscosity = liquid.FlowCurve.Consistency / liquid.Density;
        bore = line.Bore;
        elevation = line.Inlet.Elevation;
        AddNode("inlet", null, NodePlace.Inlet, line.Inlet.EdgeLoss, 0);
        for (int i = 0; i < line.Path.Count; i++)
            AddItem(line.Path[i], i);
    }

    /// <summary>The nodes from the inlet to the outlet.</summary>
    public LineNode[] Nodes => [.. nodes];

    /// <summary>Volume of one line from the inlet to each node, m³.</summary>
    public double[] Volumes => [.. volumes];

    /// <summary>Σ L/(g·A) of one line, s²/m².</summary>
    public double Inertance { get; private set; }

    /// <summary>Whether a valve is shut.</summary>
    public bool IsShut { get; private set; }

    /// <summary>The bores of straight runs and of the outlet, m.</summary>
    public IEnumerable<double> RegimeBores => [.. runBores, bore];

    /// <summary>What lies between the node before and each node.</summary>
    public IReadOnlyList<LossStep> Steps => steps;

    /// <summary>Bore and roughness of each wall, m, in the order of their indices.</summary>
    public IEnumerable<(double Bore, double Roughness)> WallRoughness => wallOf.OrderBy(wall => wall.Value).Select(wall => wall.Key);

    /// <summary>The losses as arrays.</summary>
    public LineLosses Losses() => new()
    {
        Walls = [.. walls],
        Steps = [.. steps],
        TotalPipe = [.. totalPipe],
        Kinks = RegimeFlows(nodes.Select(node => node.Bore)),
    };

    /// <summary>Flows of one line at which a bore passes a regime limit, rising, m³/s.</summary>
    public double[] RegimeFlows(IEnumerable<double> bores)
    {
        var flows = new List<double>(4); // a line has a bore or two: a list is cheaper than a set
        foreach (double d in bores)
        {
            double laminar = FrictionFactor.LaminarLimit / PerFlow(d);
            if (flows.Contains(laminar))
                continue;
            flows.Add(laminar);
            flows.Add(FrictionFactor.TurbulentLimit / PerFlow(d));
        }

        flows.Sort();
        for (int i = flows.Count - 1; i > 0; i--)
        {
            if (flows[i] == flows[i - 1])
                flows.RemoveAt(i);
        }

        return [.. flows];
    }

    private double PerFlow(double d) => 4 / (Math.PI * d * kinematicViscosity);

    private static double Area(double d) => Math.PI / 4 * d * d;

    private double Jet(double d) => 1 / (2 * gravity * Area(d) * Area(d));

    private void AddItem(PathItem item, int index)
    {
        double before = bore;
        bore = item.Bore ?? bore;
        double onSmaller = Jet(Math.Min(before, bore)) / Jet(bore);
        if (item is Reducer reducer)
        {
            AddNode(NameOf(item), index, NodePlace.BehindItem,
                BoreChange.Cone(before, bore, reducer.Angle) * onSmaller, 0);
            return;
        }
        if (bore != before) // both come from the scenario untouched: unequal means changed
        {
            AddNode(FormattableString.Invariant($"bore {before * 1000:0.##} mm to {bore * 1000:0.##} mm"), index,
                NodePlace.BehindBoreChange, BoreChange.Sudden(before, bore) * onSmaller, 0);
        }
        switch (item)
        {
            case StraightRun run:
                AddRun(run, index);
                break;
            case PlainLoss loss:
                AddNode(NameOf(item), index, NodePlace.BehindItem, loss.Coefficient, 0);
                break;
            case Fitting fitting:
                LossLaw law = fitting.Kind.Loss;
                AddNode(NameOf(item), index, NodePlace.BehindItem,
                    fitting.Count * law.Turbulent(bore), fitting.Count * law.LaminarConstant);
                break;
            case Valve valve:
                AddValve(valve, index);
                break;
            default:
                throw new UnreachableException(item.GetType().Name);
        }
    }

    private void AddValve(Valve valve, int index)
    {
        double throttling = valve.Throttling;
        bool shut = !double.IsFinite(throttling);
        IsShut |= shut;
        if (shut)
            throttling = 0;
        AddNode(NameOf(valve), index, NodePlace.BehindItem,
            throttling * valve.OpenLoss(bore), throttling * valve.Kind.Loss.LaminarConstant);
    }

    private void AddRun(StraightRun run, int index)
    {
        double roughness = run.Roughness ?? line.Roughness;
        if (roughness >= bore)
        {
            throw new ArgumentOutOfRangeException(null, FormattableString.Invariant(
                $"roughness must be less than the bore of {bore} m, got {roughness} m"));
        }
        if (!wallOf.TryGetValue((bore, roughness), out int wall))
        {
            wall = walls.Count;
            wallOf.Add((bore, roughness), wall);
            walls.Add(new PipeWall(roughness / bore, PerFlow(bore)));
            totalPipe.Add(0);
        }
        double pipe = run.Length / bore * Jet(bore);
        totalPipe[wall] += pipe;
        runBores.Add(bore);
        elevation += run.Rise;
        distance += run.Length;
        volume += run.Length * Area(bore);
        Inertance += run.Length / (gravity * Area(bore));
        AddNode(NameOf(run), index, NodePlace.BehindItem, 0, 0, wall, pipe);
    }

    private void AddNode(
        string name, int? item, NodePlace place, double turbulent, double laminar, int wall = -1, double pipe = 0)
    {
        LossStep before = steps.Count > 0 ? steps[^1] : default;
        double jet = Jet(bore);
        double square = turbulent * jet;
        double linear = laminar * jet / PerFlow(bore);
        PipeWall friction = wall >= 0 ? walls[wall] : default;
        double laminarPipe = wall >= 0 ? FrictionFactor.LaminarProduct / friction.ReynoldsPerFlow * pipe : 0;
        steps.Add(new LossStep
        {
            Wall = wall,
            Pipe = pipe,
            Square = square,
            Linear = linear,
            Jet = jet,
            ReynoldsPerFlow = PerFlow(bore),
            SquareToHere = before.SquareToHere + square,
            LinearToHere = before.LinearToHere + linear,
            LaminarToHere = before.LaminarToHere + laminarPipe,
            LeastToHere = before.LeastToHere + friction.Least * pipe,
            LargestToHere = before.LargestToHere + friction.LargestTurbulent * pipe,
        });
        nodes.Add(new LineNode(name, item, place, elevation, distance, bore));
        volumes.Add(volume);
    }

    private static string NameOf(PathItem item) => item.Name ?? item switch
    {
        StraightRun => "straight run",
        Fitting fitting => fitting.Count == 1
            ? fitting.Kind.Id
            : FormattableString.Invariant($"{fitting.Count} x {fitting.Kind.Id}"),
        Valve valve => valve.Kind.Id,
        Reducer => "reducer",
        _ => "loss",
    };
}
