using DrainSim.Integration;

namespace DrainSim.Tests.Integration.Problems;

/// <summary>An initial value problem with a closed form, to which a test adds its events.</summary>
public abstract class Problem : IOdeSystem, IEventSet
{
    private readonly List<(EventFunction Value, EventRule Rule)> events = [];

    public abstract double[] InitialState { get; }

    public int Dimension => InitialState.Length;

    /// <summary>Whether it is stepped implicitly, as a test says.</summary>
    public bool IsStiff { get; set; }

    public int EventCount => events.Count;

    /// <summary>Answers a restart; goes on unchanged unless a test says otherwise.</summary>
    public RestartAnswer Answer { get; set; } = (_, _, _) => true;

    public abstract void Exact(double t, Span<double> y);

    public abstract void Derivative(double t, ReadOnlySpan<double> y, Span<double> dydt);

    /// <summary>By central differences; the cube root of the last bit balances both of their errors.</summary>
    public virtual void Jacobian(
        double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> byState, Span<double> byTime)
    {
        const double share = 6e-6;
        double[] at = y.ToArray(), more = new double[Dimension], less = new double[Dimension];
        for (int j = 0; j < Dimension; j++)
        {
            double probe = share * Math.Max(Math.Abs(y[j]), 1);
            at[j] = y[j] + probe;
            Derivative(t, at, more);
            at[j] = y[j] - probe;
            Derivative(t, at, less);
            at[j] = y[j];
            for (int i = 0; i < Dimension; i++)
                byState[i * Dimension + j] = (more[i] - less[i]) / (2 * probe);
        }

        Derivative(t + share, y, more);
        Derivative(t - share, y, less);
        for (int i = 0; i < Dimension; i++)
            byTime[i] = (more[i] - less[i]) / (2 * share);
    }

    public virtual void ErrorScale(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> scale) =>
        ErrorScales.Magnitude(y, 1e-3, scale);

    public virtual double LargestStep(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt) =>
        double.PositiveInfinity;

    public void EventValues(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> values)
    {
        for (int i = 0; i < events.Count; i++)
            values[i] = events[i].Value(t, y, dydt);
    }

    public EventRule Rule(int index) => events[index].Rule;

    public bool OnRestart(int index, double t, Span<double> y) => Answer(index, t, y);

    public void Add(EventFunction value, EventRule rule) => events.Add((value, rule));

    public double[] Exact(double t)
    {
        double[] y = new double[Dimension];
        Exact(t, y);
        return y;
    }
}
