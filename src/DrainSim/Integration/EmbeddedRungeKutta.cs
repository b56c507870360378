namespace DrainSim.Integration;

/// <summary>Steps with an explicit embedded pair.</summary>
/// <typeparam name="TSystem">the system stepped</typeparam>
internal sealed class EmbeddedRungeKutta<TSystem> : Stepper<TSystem> where TSystem : IOdeSystem
{
    private readonly int n;
    private readonly int stages;
    private readonly double[] nodes;
    private readonly double[][] stageWeights;
    private readonly double[] errorWeights;
    private readonly double[] denseWeights;
    private readonly double[] k;
    private double h;

    public EmbeddedRungeKutta(TSystem system, RungeKuttaTableau tableau) : base(system, tableau.Order)
    {
        n = system.Dimension;
        stages = tableau.Nodes.Length;
        nodes = RungeKuttaTableau.Values(tableau.Nodes);
        stageWeights = Array.ConvertAll(tableau.Stages, RungeKuttaTableau.Values);
        errorWeights = tableau.ErrorWeights();
        denseWeights = RungeKuttaTableau.Values(tableau.DenseWeights);
        k = new double[stages * n];
    }

    /// <inheritdoc/>
    protected override Span<double> FirstSlope => Stage(0);

    /// <inheritdoc/>
    protected override Span<double> LastSlope => Stage(stages - 1);

    /// <inheritdoc/>
    public override double Try(double length, double relativeTolerance)
    {
        h = length;
        for (int s = 1; s < stages; s++)
        {
            AddWeighted(stageWeights[s]);
            if (!TryDerivative(Time + nodes[s] * h, Trial, Stage(s)))
                return double.NaN;
        }
        ScaleTrial(Time + h);
        double largest = 0;
        for (int i = 0; i < n; i++)
            largest = Math.Max(largest, OverTolerance(h * Weighted(errorWeights, i), i, relativeTolerance));
        return largest;
    }

    /// <inheritdoc/>
    public override void WriteDense(Span<double> coefficients)
    {
        for (int i = 0; i < n; i++)
        {
            double rise = Trial[i] - State[i];
            double first = h * k[i];
            double last = h * k[(stages - 1) * n + i];
            double quartic = h * Weighted(denseWeights, i);
            Span<double> c = coefficients.Slice(i * DenseStep.Terms, DenseStep.Terms);
            c[0] = State[i];
            c[1] = first;
            c[2] = 3 * rise - 2 * first - last + quartic;
            c[3] = first + last - 2 * rise - 2 * quartic;
            c[4] = quartic;
        }
    }

    private void AddWeighted(double[] weights)
    {
        for (int i = 0; i < n; i++)
            Trial[i] = State[i] + h * Weighted(weights, i);
    }

    private double Weighted(double[] weights, int component)
    {
        double sum = 0;
        for (int s = 0; s < weights.Length; s++)
            sum += weights[s] * k[s * n + component];
        return sum;
    }

    private Span<double> Stage(int s) => k.AsSpan(s * n, n);
}
