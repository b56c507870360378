using CsCheck;
using DrainSim.Gas;

namespace DrainSim.Tests.Gas;

public sealed class VentLineTests
{
    private const double Atmosphere = 101325;
    private static readonly Surroundings Outside = new(Atmosphere, 288.15);

    private static readonly Gen<VentLine> Lines =
        Gen.Select(Gen.Double[0.005, 0.2], Gen.Double[0.05, 50], Gen.Double[0, 1e-3], Gen.Double[0, 20])
            .Select((bore, length, roughness, losses) =>
                new VentLine { Bore = bore, Length = length, Roughness = roughness * bore, Losses = losses });

    private static readonly Gen<double> Differences =
        Gen.Select(Gen.Double[-3, 4], Gen.Bool).Select((exponent, sign) => Math.Pow(10, exponent) * (sign ? 1 : -1));

    // 40-digit evaluations of Churchill's equation (1977), twelve digits kept.
    [Theory]
    [InlineData(0.1, 0, 640)]
    [InlineData(100, 0.01, 0.64)]
    [InlineData(2000, 0, 0.0320433174287)]
    [InlineData(2300, 1e-5, 0.0308401836906)]
    [InlineData(3000, 1e-5, 0.0429821168724)]
    [InlineData(1e4, 0, 0.0310021306526)]
    [InlineData(1e5, 0.01, 0.0387335575222)]
    [InlineData(1e7, 1e-5, 0.00905889292796)]
    public void The_friction_factor_meets_its_published_form(double re, double e, double f) =>
        Assert.Equal(1, ChurchillFriction.Darcy(re, e, out _) / f, 1e-9);

    [Fact]
    public void The_exponent_of_the_friction_factor_is_its_slope_on_logarithms() =>
        Gen.Select(Gen.Double[0.1, 18], Gen.Double[0, 0.05]).Sample((log, e) =>
        {
            double re = Math.Exp(log);
            ChurchillFriction.Darcy(re, e, out double exponent);
            double up = ChurchillFriction.Darcy(re * Math.Exp(1e-5), e, out _);
            double down = ChurchillFriction.Darcy(re * Math.Exp(-1e-5), e, out _);
            return Math.Abs(Math.Log(up / down) / 2e-5 - exponent) < 1e-5;
        });

    [Fact]
    public void A_slow_flow_is_that_of_Hagen_and_Poiseuille()
    {
        VentLine line = new() { Bore = 0.01, Length = 20, Losses = 0 };
        // W = π·D⁴·ρ·Δp/(128·μ·L); μ at 288.15 K is 1.7894e-5 Pa·s in the table of ISO 2533.
        double expected = Math.PI * 1e-8 * 1.225 * 0.01 / (128 * 1.7894e-5 * 20);
        // The jet's head is 1e-6 of the whole; the printed viscosity has five digits.
        Assert.Equal(1, line.MassFlow(Atmosphere - 0.01, Outside, out _) / expected, 5e-5);
    }

    [Fact]
    public void A_line_of_fittings_alone_follows_the_square_root()
    {
        VentLine line = new() { Bore = 0.1, Length = 1e-6, Losses = 9 };
        double expected = Math.PI / 4 * 0.01 * Math.Sqrt(2 * 1.225 * 100 / 10);
        // Friction over a micrometre is 1e-7 of the losses; the mean density is 0.05 % below that outside.
        Assert.Equal(1, line.MassFlow(Atmosphere - 100, Outside, out _) / expected, 3e-4);
    }

    [Theory]
    [InlineData(0.01, 0.004)]
    [InlineData(0.10, 0.035)]
    [InlineData(0.20, 0.078)]
    public void Adiabatic_flow_with_friction_is_lower_by_no_more_than_the_doc_says(double drop, double bound) =>
        Gen.Select(Gen.Double[-1, 2], Gen.Double[0, 0.5]).Sample((log, losses) =>
        {
            VentLine line = new() { Bore = 0.05, Length = 0.05 * Math.Pow(10, log), Roughness = 1e-3, Losses = losses };
            double flow = line.MassFlow(Atmosphere * (1 - drop), Outside, out _);
            double re = flow * 0.05 / (line.Area * 1.7894e-5);
            double friction = ChurchillFriction.Darcy(re, 0.02, out _) * line.Length / 0.05;
            double exact = FannoLine.MassFlux(1 - drop, friction, losses) * line.Area * Atmosphere
                / Math.Sqrt(287.05287 * 288.15);
            return flow / exact - 1 is var excess && excess > -1e-4 && excess < bound;
        }, iter: 200);

    [Fact]
    public void The_flow_is_odd_in_the_difference_of_the_squares() =>
        Gen.Select(Lines, Differences).Sample((line, difference) =>
        {
            double inside = Atmosphere - difference;
            double swapped = line.MassFlow(Atmosphere, new Surroundings(inside, Outside.Temperature), out _);
            return line.MassFlow(inside, Outside, out _) == -swapped;
        });

    [Fact]
    public void The_slope_is_that_of_the_flow() =>
        Gen.Select(Lines, Differences).Sample((line, difference) =>
        {
            double inside = Atmosphere - difference;
            double step = Math.Max(1e-4 * Math.Abs(difference), 1e-6);
            line.MassFlow(inside, Outside, out double slope);
            double chord = (line.MassFlow(inside + step, Outside, out _) - line.MassFlow(inside - step, Outside, out _)) / (2 * step);
            return slope < 0 && Math.Abs(chord / slope - 1) < 1e-4;
        });

    [Fact]
    public void A_longer_line_never_passes_more() =>
        Gen.Select(Lines, Differences, Gen.Double[0, 10]).Sample((line, difference, more) =>
        {
            double own = Math.Abs(line.MassFlow(Atmosphere - difference, Outside, out _));
            VentLine longer = line with { Length = line.Length + more };
            return Math.Abs(longer.MassFlow(Atmosphere - difference, Outside, out _)) <= own * (1 + 1e-12);
        });

    [Fact]
    public void A_line_at_rest_has_no_flow_and_a_finite_slope()
    {
        VentLine line = new() { Bore = 0.05, Length = 3 };
        Assert.Equal(0, line.MassFlow(Atmosphere, Outside, out double slope));
        Assert.InRange(slope, -1, -1e-9);
    }
}
