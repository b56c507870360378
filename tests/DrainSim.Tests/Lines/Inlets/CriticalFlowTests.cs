using CsCheck;
using DrainSim.Lines.Inlets;

namespace DrainSim.Tests.Lines.Inlets;

public sealed class CriticalFlowTests
{
    private const double G = 9.80665;

    private static readonly Gen<double> Heads = Gen.Double[-6, 2].Select(log => Math.Pow(10, log));

    [Fact]
    public void A_half_full_bore_runs_under_0_696_bores_of_head()
    {
        // y = D/2: A = π·D²/8, T = D, so H = D/2 + π·D/16 and Q = √(g·A³/T), closed forms.
        double area = Math.PI / 8;
        Assert.Equal(Math.Sqrt(G * area * area * area), Flow(0.5 + Math.PI / 16, 1, 0), 1e-13);
    }

    [Fact]
    public void A_trickle_sees_a_parabola()
    {
        // Near the invert T = 2·√(y·D), A = (2/3)·y·T, so y = (3/4)·H and Q = A·√(2·g·H/4).
        const double Head = 1e-7;
        double depth = 0.75 * Head;
        double area = 4.0 / 3 * depth * Math.Sqrt(depth * 0.1);
        // The next term of the parabola is of the order of y/D, 1e-6.
        Assert.Equal(1, Flow(Head, 0.1, 0) / (area * Math.Sqrt(G * Head / 2)), 2e-6);
    }

    [Fact]
    public void A_high_head_sees_an_opening_that_is_full_to_its_crown()
    {
        double full = Math.PI / 4 * 0.01 * Math.Sqrt(2 * G * (50 - 0.1) / 1.5);
        // The section is full but for a share of the order of (D/H)³.
        Assert.Equal(1, Flow(50, 0.1, 0.5) / full, 1e-6);
    }

    [Fact]
    public void The_Froude_number_is_one_and_the_energy_is_the_head() =>
        Gen.Select(Heads, Gen.Double[0, 2]).Where((h, _) => h < 20).Sample((h, k) =>
        {
            double flow = Flow(h, 1, k);
            double y = CriticalFlow.Depth(flow, 1, G);
            double half = Math.Acos(1 - 2 * y);
            double area = (half - Math.Sin(half) * Math.Cos(half)) / 4;
            double energy = y + (1 + k) * flow * flow / (2 * G * area * area);
            // Acos and the difference lose about eps/y of the area.
            return Math.Abs(energy / h - 1) < 1e-9 + 1e-13 / h;
        });

    // A/D² and T/D of a part full circle, printed with six digits (Chow 1959, as tabulated on a web page of section
    // properties), give the critical flow √(g·A³/T); its depth must come back to the digits printed.
    [Theory]
    [InlineData(0.55, 0.442616, 0.994987)]
    [InlineData(0.60, 0.492028, 0.979796)]
    [InlineData(0.70, 0.587230, 0.916515)]
    [InlineData(0.80, 0.673574, 0.800000)]
    public void The_critical_depth_agrees_with_tabulated_sections(double depth, double area, double width)
    {
        double flow = Math.Sqrt(G * area * area * area / width);
        Assert.Equal(depth, CriticalFlow.Depth(flow, 1, G), 5e-6);
    }

    [Theory]
    [InlineData(0.05)]
    [InlineData(0.2)]
    [InlineData(0.4)]
    [InlineData(0.6)]
    public void Straubs_approximation_of_the_critical_depth_is_near(double flow) =>
        // y = 1.01·D^−0.26·(Q²/g)^0.25, W. O. Straub, Civil Engineering (ASCE) 1978, for 0.02 < y/D < 0.85; from memory. A fit, off by up to 4 %.
        Assert.Equal(1, CriticalFlow.Depth(flow, 1, G) / (1.01 * Math.Pow(flow * flow / G, 0.25)), 0.05);

    [Fact]
    public void The_slope_is_that_of_the_flow() =>
        Gen.Select(Heads, Gen.Double[0.01, 1], Gen.Double[0, 2]).Sample((share, bore, k) =>
        {
            double h = share * bore;
            CriticalFlow.UnderHead(h, bore, k, G, out double slope);
            double chord = (Flow(h * 1.0001, bore, k) - Flow(h * 0.9999, bore, k)) / (2e-4 * h);
            return Math.Abs(chord / slope - 1) < 1e-6;
        });

    [Fact]
    public void A_smooth_entry_has_the_slope_of_the_largest_flow_for_its_energy()
    {
        // Without loss critical flow is the largest for its energy, so dQ/dE = A·g/v = √(g·A·T); half full: √(g·π/8).
        CriticalFlow.UnderHead(0.5 + Math.PI / 16, 1, 0, G, out double slope);
        Assert.Equal(Math.Sqrt(G * Math.PI / 8), slope, 1e-12);
    }

    [Fact]
    public void The_flow_rises_with_the_head_and_falls_with_the_loss() =>
        Gen.Select(Heads, Gen.Double[1e-6, 1], Gen.Double[0, 2], Gen.Double[0.01, 1]).Sample((h, more, k, loss) =>
            Flow(h * (1 + more), 1, k) > Flow(h, 1, k) && Flow(h, 1, k + loss) < Flow(h, 1, k));

    [Fact]
    public void Bores_scale_with_the_power_five_halves() =>
        Gen.Select(Heads, Gen.Double[0.01, 3]).Sample((h, bore) =>
            Math.Abs(Flow(h * bore, bore, 0.5) / (Math.Pow(bore, 2.5) * Flow(h, 1, 0.5)) - 1) < 1e-12);

    [Fact]
    public void The_critical_depth_stays_below_the_bore_for_any_flow() =>
        Gen.Double[-12, 3].Sample(log => CriticalFlow.Depth(Math.Pow(10, log), 1, G) is > 0 and <= 1);

    // Heads at which the search once halved away from a root that it had already met.
    [Theory]
    [InlineData(1e-12)]
    [InlineData(8.673e-48)]
    [InlineData(2.052e-86)]
    public void A_film_of_any_thinness_follows_the_parabola(double head) =>
        Assert.Equal(1, Flow(head, 1, 0) / (Math.Sqrt(3 / 8.0 * G) * head * head), 1e-9);

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    public void No_head_lets_nothing_in(double head)
    {
        Assert.Equal(0, CriticalFlow.UnderHead(head, 0.1, 0.5, G, out double slope));
        Assert.Equal(0, slope);
    }

    private static double Flow(double head, double bore, double k) => CriticalFlow.UnderHead(head, bore, k, G, out _);
}
