namespace DrainSim.Tests.Integration.Problems;

/// <summary>Two prisms joined by a laminar line: h0' = −k·(h0 − h1), h1' = r·k·(h0 − h1), with r the ratio of their areas.
/// The difference decays as exp(−(1 + r)·k·t), the volume r·h0 + h1 stays.</summary>
public sealed class TwoTanks(double rate, double areaRatio) : Problem
{
    private const double FirstLevel = 3;
    private const double SecondLevel = 1;

    public override double[] InitialState => [FirstLevel, SecondLevel];

    public override void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt)
    {
        double flow = rate * (y[0] - y[1]);
        dydt[0] = -flow;
        dydt[1] = areaRatio * flow;
    }

    public override void Exact(double t, Span<double> y)
    {
        double final = (areaRatio * FirstLevel + SecondLevel) / (areaRatio + 1);
        double difference = (FirstLevel - SecondLevel) * Math.Exp(-(1 + areaRatio) * rate * t);
        y[0] = final + difference / (1 + areaRatio);
        y[1] = final - areaRatio * difference / (1 + areaRatio);
    }

    public double TimeAtDifference(double difference) =>
        Math.Log((FirstLevel - SecondLevel) / difference) / ((1 + areaRatio) * rate);
}
