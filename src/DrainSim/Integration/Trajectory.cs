using System.Globalization;

namespace DrainSim.Integration;

/// <summary>The whole of a computed solution: the dense output of every accepted step, in pieces that end where
/// an event restarted the integration.</summary>
/// <remarks>
/// Its arrays grow by doubling and are kept when it is used for another run, so that a trajectory that has once
/// been long enough allocates nothing. What a restart changes at the very end of a run is in
/// <see cref="IntegrationResult.EndState"/> alone: no step leaves from there.
/// </remarks>
public sealed class Trajectory
{
    private readonly int stride;
    private readonly double[] initialState;
    private double[] starts;
    private double[] ends;
    private double[] lengths;
    private double[] coefficients;
    private int[] pieces = new int[8];
    private int pieceCount;

    /// <summary>An empty trajectory.</summary>
    /// <param name="dimension">number of components of the state; at least 1</param>
    /// <param name="capacity">number of steps to make room for at once; at least 1</param>
    /// <exception cref="ArgumentOutOfRangeException">a number is below 1</exception>
    public Trajectory(int dimension, int capacity = 64)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(dimension, 1);
        ArgumentOutOfRangeException.ThrowIfLessThan(capacity, 1);
        Dimension = dimension;
        stride = dimension * DenseStep.Terms;
        initialState = new double[dimension];
        starts = new double[capacity];
        ends = new double[capacity];
        lengths = new double[capacity];
        coefficients = new double[capacity * stride];
    }

    /// <summary>Number of components of the state.</summary>
    public int Dimension { get; }

    /// <summary>Number of accepted steps.</summary>
    public int StepCount { get; private set; }

    /// <summary>Number of pieces with at least one step.</summary>
    public int PieceCount => pieceCount > 0 && pieces[pieceCount - 1] == StepCount ? pieceCount - 1 : pieceCount;

    /// <summary>Time at which the solution begins.</summary>
    public double Start { get; private set; }

    /// <summary>Time up to which the solution is known.</summary>
    public double End => StepCount > 0 ? ends[StepCount - 1] : Start;

    /// <summary>One accepted step.</summary>
    /// <param name="index">from 0, in time order</param>
    /// <exception cref="ArgumentOutOfRangeException">there is no such step</exception>
    public DenseStep Step(int index)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(index);
        ArgumentOutOfRangeException.ThrowIfGreaterThanOrEqual(index, StepCount);
        return new DenseStep(starts[index], ends[index], lengths[index], Slot(index));
    }

    /// <summary>Time at which a piece begins.</summary>
    /// <param name="index">from 0, in time order</param>
    /// <exception cref="ArgumentOutOfRangeException">there is no such piece</exception>
    public double PieceStart(int index)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(index);
        ArgumentOutOfRangeException.ThrowIfGreaterThanOrEqual(index, PieceCount);
        return starts[pieces[index]];
    }

    /// <summary>Writes y(t).</summary>
    /// <param name="t">time from <see cref="Start"/> to <see cref="End"/></param>
    /// <param name="y">receives the state, one value per component</param>
    /// <param name="side">which value is meant where t is the time of a jump</param>
    /// <exception cref="ArgumentOutOfRangeException">t is outside</exception>
    public void Evaluate(double t, Span<double> y, Side side = Side.Before)
    {
        CheckTime(t);
        if (StepCount == 0)
            initialState.CopyTo(y);
        else
            Step(IndexAt(t, side)).Evaluate(t, y[..Dimension]);
    }

    /// <summary>Writes dy/dt at t.</summary>
    /// <param name="t">time from <see cref="Start"/> to <see cref="End"/></param>
    /// <param name="dydt">receives the derivative, one value per component</param>
    /// <param name="side">which value is meant where t is the time of a jump</param>
    /// <exception cref="ArgumentOutOfRangeException">t is outside</exception>
    /// <exception cref="InvalidOperationException">there is no step</exception>
    public void EvaluateDerivative(double t, Span<double> dydt, Side side = Side.Before)
    {
        CheckTime(t);
        if (StepCount == 0)
            throw new InvalidOperationException("a solution without a step has no derivative");
        Step(IndexAt(t, side)).EvaluateDerivative(t, dydt[..Dimension]);
    }

    /// <summary>Throws the steps away and begins at a state.</summary>
    internal void Begin(double t, ReadOnlySpan<double> state)
    {
        (StepCount, pieceCount, Start) = (0, 0, t);
        state.CopyTo(initialState);
        BeginPiece();
    }

    /// <summary>Lets the next step begin a piece.</summary>
    internal void BeginPiece()
    {
        if (pieceCount > 0 && pieces[pieceCount - 1] == StepCount)
            return;     // a second restart at the same instant
        if (pieceCount == pieces.Length)
            Array.Resize(ref pieces, 2 * pieceCount);
        pieces[pieceCount++] = StepCount;
    }

    /// <summary>Room for the coefficients of the next step; kept by <see cref="Append"/>, else written over.</summary>
    internal Span<double> NextSlot()
    {
        if (StepCount == starts.Length)
        {
            int capacity = 2 * StepCount;
            Array.Resize(ref starts, capacity);
            Array.Resize(ref ends, capacity);
            Array.Resize(ref lengths, capacity);
            Array.Resize(ref coefficients, checked(capacity * stride));
        }
        return Slot(StepCount);
    }

    /// <summary>Keeps the step whose coefficients were written into <see cref="NextSlot"/>.</summary>
    internal void Append(double start, double end, double length)
    {
        starts[StepCount] = start;
        ends[StepCount] = end;
        lengths[StepCount] = length;
        StepCount++;
    }

    private Span<double> Slot(int index) => coefficients.AsSpan(index * stride, stride);

    private int IndexAt(double t, Side side)
    {
        int found = side == Side.Before
            ? Array.BinarySearch(ends, 0, StepCount, t)
            : Array.BinarySearch(starts, 0, StepCount, t);
        if (side == Side.Before)
            return found >= 0 ? found : ~found;
        return found >= 0 ? found : ~found - 1;
    }

    private void CheckTime(double t)
    {
        if (!(t >= Start && t <= End))
            throw new ArgumentOutOfRangeException(nameof(t), string.Create(CultureInfo.InvariantCulture,
                $"time must be from {Start} to {End}, got {t}"));
    }
}
