namespace DrainSim.Integration;

/// <summary>Steps with a Rosenbrock method: implicit, one Jacobian a step, no iteration.</summary>
/// <typeparam name="TSystem">the system stepped</typeparam>
/// <remarks>
/// The error is that of the step's end. A part of the solution that is quick and driven by time alone is far better there than
/// asked for, so that steps grow until its dense output is thousands of tolerances off; where it follows other parts they keep the steps short.
/// </remarks>
internal sealed class Rosenbrock<TSystem> : Stepper<TSystem> where TSystem : IOdeSystem
{
    private readonly int n;
    private readonly int stages;
    private readonly RosenbrockTableau tableau;
    private readonly LinearEquations equations;
    private readonly double[] u;
    private readonly double[] firstSlope;
    private readonly double[] lastSlope;
    private readonly double[] byState;
    private readonly double[] byTime;
    private readonly double[] matrix;
    private bool hasJacobian;

    public Rosenbrock(TSystem system, RosenbrockTableau tableau) : base(system, tableau.Order)
    {
        this.tableau = tableau;
        n = system.Dimension;
        stages = tableau.Nodes.Length;
        equations = new LinearEquations(n);
        u = new double[stages * n];
        (firstSlope, lastSlope, byTime) = (new double[n], new double[n], new double[n]);
        (byState, matrix) = (new double[n * n], new double[n * n]);
    }

    /// <inheritdoc/>
    protected override Span<double> FirstSlope => firstSlope;

    /// <inheritdoc/>
    protected override Span<double> LastSlope => lastSlope;

    /// <inheritdoc/>
    public override double Try(double length, double relativeTolerance)
    {
        if (!Factor(length))
            return double.NaN;
        for (int s = 0; s < stages; s++)
        {
            if (!Solve(s, length))
                return double.NaN;
        }
        Span<double> last = Stage(stages - 1);
        for (int i = 0; i < n; i++)
            Trial[i] += last[i];    // on the state of the last stage
        if (!TryDerivative(Time + length, Trial, lastSlope))
            return double.NaN;
        ScaleTrial(Time + length);
        double largest = 0;
        for (int i = 0; i < n; i++)
            largest = Math.Max(largest, OverTolerance(last[i], i, relativeTolerance));
        return largest;
    }

    /// <inheritdoc/>
    public override void WriteDense(Span<double> coefficients)
    {
        for (int i = 0; i < n; i++)
        {
            double first = Weighted(tableau.Dense[0], i);
            double second = Weighted(tableau.Dense[1], i);
            double third = Weighted(tableau.Dense[2], i);
            Span<double> c = coefficients.Slice(i * DenseStep.Terms, DenseStep.Terms);
            c[0] = State[i];
            c[1] = Trial[i] - State[i] + first;
            c[2] = second - first;
            c[3] = third - second;
            c[4] = -third;
        }
    }

    /// <inheritdoc/>
    private protected override void Moved() => hasJacobian = false;

    /// <summary>Factors I/(h·γ) − J, J made once for all lengths tried from a state.</summary>
    private bool Factor(double h)
    {
        if (!hasJacobian)
            Jacobian(byState, byTime);
        hasJacobian = true;
        for (int i = 0; i < matrix.Length; i++)
            matrix[i] = -byState[i];
        for (int i = 0; i < n; i++)
            matrix[i * n + i] += 1 / (h * tableau.Diagonal);
        return equations.Factor(matrix);
    }

    private bool Solve(int s, double h)
    {
        Span<double> stage = Stage(s);
        for (int i = 0; i < n; i++)
            Trial[i] = State[i] + Weighted(tableau.Stages[s], i);
        if (s == 0)
            firstSlope.CopyTo(stage);
        else if (!TryDerivative(Time + tableau.Nodes[s] * h, Trial, stage))
            return false;
        for (int i = 0; i < n; i++)
            stage[i] += Weighted(tableau.Coupling[s], i) / h + h * tableau.TimeWeights[s] * byTime[i];
        equations.Solve(stage);
        return true;
    }

    private double Weighted(double[] weights, int component)
    {
        double sum = 0;
        for (int s = 0; s < weights.Length; s++)
            sum += weights[s] * u[s * n + component];
        return sum;
    }

    private Span<double> Stage(int s) => u.AsSpan(s * n, n);
}
