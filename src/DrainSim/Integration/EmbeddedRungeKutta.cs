namespace DrainSim.Integration;

/// <summary>Steps a system with an explicit embedded pair: tries a step, measures its error, gives its dense
/// output. The driver decides on lengths and events.</summary>
/// <typeparam name="TSystem">the system stepped</typeparam>
internal sealed class EmbeddedRungeKutta<TSystem> where TSystem : IOdeSystem
{
    private readonly int n;
    private readonly int stages;
    private readonly double[] nodes;
    private readonly double[][] stageWeights;
    private readonly double[] errorWeights;
    private readonly double[] denseWeights;
    private readonly double[] y;
    private readonly double[] trial;
    private readonly double[] k;
    private double[] scale;
    private double[] trialScale;
    private TSystem system;
    private double h;

    public EmbeddedRungeKutta(TSystem system, RungeKuttaTableau tableau)
    {
        this.system = system;
        n = system.Dimension;
        stages = tableau.Nodes.Length;
        ErrorOrder = tableau.Order;
        nodes = RungeKuttaTableau.Values(tableau.Nodes);
        stageWeights = Array.ConvertAll(tableau.Stages, RungeKuttaTableau.Values);
        errorWeights = tableau.ErrorWeights();
        denseWeights = RungeKuttaTableau.Values(tableau.DenseWeights);
        k = new double[stages * n];
        (y, trial, scale, trialScale) = (new double[n], new double[n], new double[n], new double[n]);
    }

    /// <summary>Power of the step length that the error estimate goes with: that of the local error of the lower order.</summary>
    public int ErrorOrder { get; }

    /// <summary>Calls of the system's derivative since <see cref="ResetCount"/>.</summary>
    public int Evaluations { get; private set; }

    /// <summary>Time at the start of the step.</summary>
    public double Time { get; private set; }

    /// <summary>State at the start of the step.</summary>
    public ReadOnlySpan<double> State => y;

    /// <summary>Derivative at the start of the step.</summary>
    public ReadOnlySpan<double> Slope => Stage(0);

    /// <summary>State at the end of the step last tried.</summary>
    public ReadOnlySpan<double> TrialState => trial;

    /// <summary>Derivative at the end of the step last tried.</summary>
    public ReadOnlySpan<double> TrialSlope => Stage(stages - 1);

    public void ResetCount() => Evaluations = 0;

    /// <summary>Starts from a state; false when the derivative there is not finite.</summary>
    public bool Begin(double t, ReadOnlySpan<double> state)
    {
        Time = t;
        state.CopyTo(y);
        if (!TryDerivative(t, y, Stage(0)))
            return false;
        system.ErrorScale(t, y, Stage(0), scale);
        return true;
    }

    /// <summary>Tries a step; returns the largest error over its tolerance (1 at the limit), NaN when a stage
    /// left the domain.</summary>
    public double Try(double length, double relativeTolerance)
    {
        h = length;
        for (int s = 1; s < stages; s++)
        {
            AddWeighted(stageWeights[s]);
            if (!TryDerivative(Time + nodes[s] * h, trial, Stage(s)))
                return double.NaN;
        }
        system.ErrorScale(Time + h, trial, Stage(stages - 1), trialScale);
        double largest = 0;
        for (int i = 0; i < n; i++)
        {
            double error = Math.Abs(h * Weighted(errorWeights, i));
            if (error != 0)     // an exact step is within any tolerance, 0/0 would say otherwise
                largest = Math.Max(largest, error / (relativeTolerance * Math.Max(scale[i], trialScale[i])));
        }
        return largest;
    }

    /// <summary>Moves on to the end of the step last tried.</summary>
    public void Accept(double end)
    {
        Time = end;
        trial.CopyTo(y, 0);
        Stage(stages - 1).CopyTo(Stage(0));
        (scale, trialScale) = (trialScale, scale);
    }

    /// <summary>Writes the dense output of the step last tried as <see cref="DenseStep"/> reads it.</summary>
    public void WriteDense(Span<double> coefficients)
    {
        for (int i = 0; i < n; i++)
        {
            double rise = trial[i] - y[i];
            double first = h * k[i];
            double last = h * k[(stages - 1) * n + i];
            double quartic = h * Weighted(denseWeights, i);
            Span<double> c = coefficients.Slice(i * DenseStep.Terms, DenseStep.Terms);
            c[0] = y[i];
            c[1] = first;
            c[2] = 3 * rise - 2 * first - last + quartic;
            c[3] = first + last - 2 * rise - 2 * quartic;
            c[4] = quartic;
        }
    }

    /// <summary>A length for the first step; rather too short, the step after it may be ten times as long.</summary>
    /// <param name="limit">the longest to answer; a small share of it is answered where nothing moves</param>
    /// <param name="relativeTolerance">as in <see cref="Try"/></param>
    /// <remarks><code>
    /// h = 2·ε^(1/q) / max(|y'|/s, √(|y''|/s))
    ///
    /// ε  relative tolerance, s error scale, q order of the error estimate; y'' from one short Euler step
    /// 2  a half to a third of the length that later steps of the test problems come to
    /// </code>
    /// After Hairer, Nørsett, Wanner I, section II.4, "Starting step size", with the root over y'' that makes
    /// the answer independent of the unit of time.
    /// </remarks>
    public double FirstStep(double limit, double relativeTolerance)
    {
        const double probeShare = 0.01;
        const double shareWithoutMotion = 1e-3;
        const double boldness = 2;
        double size = Largest(y, 1);
        double rate = Largest(Slope, 1);
        double probe = shareWithoutMotion * limit;
        if (size > 0 && rate > 0)
            probe = Math.Min(probe, probeShare * size / rate);
        double curvature = Curvature(probe);
        if (double.IsNaN(curvature))
            return probe;
        rate = Math.Max(rate, Math.Sqrt(curvature));
        return rate > 0 ? Math.Min(boldness * Math.Pow(relativeTolerance, 1.0 / ErrorOrder) / rate, limit) : limit;
    }

    private double Curvature(double probe)
    {
        for (int i = 0; i < n; i++)
            trial[i] = y[i] + probe * k[i];
        if (!TryDerivative(Time + probe, trial, Stage(1)))
            return double.NaN;
        for (int i = 0; i < n; i++)
            trial[i] = k[n + i] - k[i];
        return Largest(trial, probe);
    }

    /// <summary>max |v_i| / (divisor·scale_i).</summary>
    private double Largest(ReadOnlySpan<double> v, double divisor)
    {
        double largest = 0;
        for (int i = 0; i < n; i++)
            largest = Math.Max(largest, Math.Abs(v[i]) / (divisor * scale[i]));
        return largest;
    }

    private bool TryDerivative(double t, ReadOnlySpan<double> state, Span<double> slope)
    {
        Evaluations++;
        system.Derivative(t, state, slope);
        foreach (double component in slope)
        {
            if (!double.IsFinite(component))
                return false;
        }
        return true;
    }

    private void AddWeighted(double[] weights)
    {
        for (int i = 0; i < n; i++)
            trial[i] = y[i] + h * Weighted(weights, i);
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
