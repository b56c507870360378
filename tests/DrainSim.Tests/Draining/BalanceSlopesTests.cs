using DrainSim.Draining;
using DrainSim.Gas;
using DrainSim.Lines;

namespace DrainSim.Tests.Draining;

/// <summary>The Jacobian of the balance, which implicit steps are made of, against differences of the balance itself.</summary>
public sealed class BalanceSlopesTests
{
    private static readonly VentedHeadspace Vented = new() { PolytropicExponent = 1.2, Openings = [new VentOrifice { Bore = 0.02 }] };

    public static TheoryData<string, double, double> Cases => new()
    {
        { "siphon", 0.5, 100_000 },
        { "held at the limit", 0.5, 60_000 },
        { "tail", 5.45, 101_300 },
        { "two lines into a tank, fed", 0.7, 101_000 },
        { "brimful, the gas at its least", 4e-6, 101_300 },
    };

    /// <remarks>2e-6 of the slope or, where that is 0, of the row's own: central differences lose half of the digits.</remarks>
    [Theory]
    [MemberData(nameof(Cases))]
    public void Every_slope_is_the_one_that_differences_show(string name, double delivered, double pressure)
    {
        const double time = 10;
        DrainModel model = ModelOf(name);
        int n = model.Dimension;
        double[] y = new double[n], dydt = new double[n], byState = new double[n * n], byTime = new double[n];
        y.AsSpan()[..^1].Fill(delivered);
        y[^1] = pressure;
        model.Derivative(time, y, dydt);
        model.Jacobian(time, y, dydt, byState, byTime);
        for (int j = 0; j <= n; j++)
        {
            double probe = j == n ? 1e-3 : j == n - 1 ? 0.01 : 1e-6;
            double[] more = At(j, probe), less = At(j, -probe);
            for (int i = 0; i < n; i++)
            {
                double expected = (more[i] - less[i]) / (2 * probe), size = Math.Max(Math.Abs(expected), Math.Abs(byState[i * n + i]));
                Assert.Equal(expected, j == n ? byTime[i] : byState[i * n + j], 2e-6 * size);
            }
        }

        double[] At(int j, double probe)
        {
            double[] state = [.. y], slope = new double[n];
            if (j < n)
                state[j] += probe;
            model.Derivative(j < n ? time : time + probe, state, slope);
            return slope;
        }
    }

    private static DrainModel ModelOf(string name)
    {
        Job siphon = Jobs.Siphon() with { Headspace = Vented };
        Line line = Jobs.SiphonLine();
        Job job = name switch
        {
            "siphon" => siphon,
            "held at the limit" => siphon with { DrawOffs = Jobs.Only(line with { AtVapour = AtVapour.Limit, LeastPressure = 45_000 }) },
            "tail" => siphon with { DrawOffs = Jobs.Only(SideOutlet) },
            "two lines into a tank, fed" => siphon with
            {
                DrawOffs =
                [
                    new DrawOff { Line = line },
                    new DrawOff { Line = SideOutlet, Receiver = new ReceivingTank { Vessel = Jobs.Prism(3, 4), Bottom = -1, Level = 1.5 } },
                ],
                Inflow = new Inflow { Points = [(0, 1e-3), (20, 3e-3)] },
            },
            _ => Jobs.OrificeDrain(level: 4) with { Headspace = Vented },
        };
        var plant = new Plant(job);
        return new DrainModel(plant, [.. plant.Lines.Select(l => new LineMode(l.HoldsAtVapour))]);
    }

    private static Line SideOutlet => new()
    {
        Bore = 0.08,
        Roughness = 1e-5,
        Inlet = new Inlet { Elevation = 0.05, Facing = InletFacing.Side, EdgeLoss = 0.5 },
        Path = [new StraightRun { Length = 1, Rise = -0.1 }],
    };
}
