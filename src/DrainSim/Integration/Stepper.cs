namespace DrainSim.Integration;

/// <summary>Steps a system: tries a step, measures its error, gives its dense output. The driver decides on lengths,
/// events and which of the cases beside this file is used.</summary>
/// <typeparam name="TSystem">the system stepped</typeparam>
internal abstract class Stepper<TSystem> where TSystem : IOdeSystem
{
    private readonly double[] y;
    private double[] scale;
    private double[] trialScale;
    private TSystem system;

    private protected Stepper(TSystem system, int errorOrder)
    {
        this.system = system;
        ErrorOrder = errorOrder;
        int n = system.Dimension;
        (y, Trial, scale, trialScale) = (new double[n], new double[n], new double[n], new double[n]);
    }

    /// <summary>Power of the step length that the error estimate goes with: that of the local error of the lower order.</summary>
    public int ErrorOrder { get; }

    /// <summary>Calls of the system's derivative since <see cref="ResetCount"/>.</summary>
    public int Evaluations { get; private set; }

    /// <summary>Calls of the system's Jacobian since <see cref="ResetCount"/>.</summary>
    public int Jacobians { get; private set; }

    /// <summary>Time at the start of the step.</summary>
    public double Time { get; private set; }

    /// <summary>State at the start of the step.</summary>
    public ReadOnlySpan<double> State => y;

    /// <summary>Derivative at the start of the step.</summary>
    public ReadOnlySpan<double> Slope => FirstSlope;

    /// <summary>State at the end of the step last tried.</summary>
    public ReadOnlySpan<double> TrialState => Trial;

    /// <summary>Derivative at the end of the step last tried.</summary>
    public ReadOnlySpan<double> TrialSlope => LastSlope;

    /// <summary>Where a step puts the states that it tries, the last of them that of its end.</summary>
    protected double[] Trial { get; }

    /// <summary>Where the derivative at the start of the step is kept.</summary>
    protected abstract Span<double> FirstSlope { get; }

    /// <summary>Where the derivative at the end of the step is kept.</summary>
    protected abstract Span<double> LastSlope { get; }

    public void ResetCount() => (Evaluations, Jacobians) = (0, 0);

    /// <summary>Starts from a state; false when the derivative there is not finite.</summary>
    public bool Begin(double t, ReadOnlySpan<double> state)
    {
        Time = t;
        state.CopyTo(y);
        Moved();
        if (!TryDerivative(t, y, FirstSlope))
            return false;
        system.ErrorScale(t, y, FirstSlope, scale);
        return true;
    }

    /// <summary>Tries a step; returns the largest error over its tolerance (1 at the limit), NaN when a stage
    /// left the domain.</summary>
    public abstract double Try(double length, double relativeTolerance);

    /// <summary>Moves on to the end of the step last tried.</summary>
    public void Accept(double end)
    {
        Time = end;
        Trial.CopyTo(y, 0);
        LastSlope.CopyTo(FirstSlope);
        (scale, trialScale) = (trialScale, scale);
        Moved();
    }

    /// <summary>Writes the dense output of the step last tried as <see cref="DenseStep"/> reads it.</summary>
    public abstract void WriteDense(Span<double> coefficients);

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

    /// <summary>Forgets what belongs to the old state.</summary>
    private protected virtual void Moved()
    {
    }

    private protected bool TryDerivative(double t, ReadOnlySpan<double> state, Span<double> slope)
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

    private protected void Jacobian(Span<double> byState, Span<double> byTime)
    {
        Jacobians++;
        system.Jacobian(Time, y, FirstSlope, byState, byTime);
    }

    /// <summary>Takes the error scale at the end of the step tried, where state and derivative are known.</summary>
    private protected void ScaleTrial(double end) => system.ErrorScale(end, Trial, LastSlope, trialScale);

    /// <summary>An error of one component over what the larger scale of both ends allows, 1.</summary>
    private protected double OverTolerance(double error, int component, double relativeTolerance) => error == 0
        ? 0     // an exact step is within any tolerance, 0/0 would say otherwise
        : Math.Abs(error) / (relativeTolerance * Math.Max(scale[component], trialScale[component]));

    private double Curvature(double probe)
    {
        ReadOnlySpan<double> first = FirstSlope;
        for (int i = 0; i < y.Length; i++)
            Trial[i] = y[i] + probe * first[i];
        Span<double> probed = LastSlope;
        if (!TryDerivative(Time + probe, Trial, probed))
            return double.NaN;
        for (int i = 0; i < y.Length; i++)
            Trial[i] = probed[i] - first[i];
        return Largest(Trial, probe);
    }

    /// <summary>max |v_i| / (divisor·scale_i).</summary>
    private double Largest(ReadOnlySpan<double> v, double divisor)
    {
        double largest = 0;
        for (int i = 0; i < y.Length; i++)
            largest = Math.Max(largest, Math.Abs(v[i]) / (divisor * scale[i]));
        return largest;
    }
}
