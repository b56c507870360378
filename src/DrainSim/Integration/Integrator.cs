using System.Globalization;

namespace DrainSim.Integration;

/// <summary>Integrates a system forward in time with error control, dense output and events.</summary>
/// <typeparam name="TSystem">the system and its events</typeparam>
/// <remarks>
/// One integrator does one run at a time and may do many; between two steps it allocates nothing.
/// <para>The rules of events:</para>
/// <list type="number">
/// <item>A function fires when it passes from one side of zero to the other in the direction of its rule.</item>
/// <item>It is looked at at both ends of every accepted step and at the ends of its
/// <see cref="IntegrationOptions.EventSamplesPerStep"/> equal parts: of two crossings both are found when such
/// a point lies between them, neither when none does.</item>
/// <item>A value of zero, or NaN, at a point within a step has no side; the function keeps the one that it had.
/// So one that touches zero and turns back does not fire.</item>
/// <item>A value of exactly zero at the end of a step, the end of the run included, has arrived: it
/// fires, and must leave zero before it fires again.</item>
/// <item>A function that is zero at the first instant does not fire there. Its first value other than zero
/// gives it its side.</item>
/// <item>An event is placed at the later of the two neighbouring doubles between which the dense output changes
/// the sign (2^−64 of a step apart near time zero): the state there is on the far side, or at zero.</item>
/// <item>Events come in the order of their times, however many lie in one step.</item>
/// <item>Crossings within 1e-12 of a step, or four units in the last place of the time, are one instant, the latest
/// of them. There, Record comes before Restart and Restart before Stop, each by index; all are
/// listed.</item>
/// <item>A recorded event changes no bit of the solution.</item>
/// <item>At a Restart the step ends at the event; the system is asked, may change the state and itself,
/// and integration starts from there with a new derivative and the last step length as first guess. The rest of
/// the old step is forgotten, with any event in it. A system that declines ends the run as stopped by that event.</item>
/// <item>A function that fired at the instant of a restart has no side after it, as in rule 5: one
/// root is not found twice.</item>
/// <item>A function that did not fire there and that the restart carried across zero fires at the same instant, at most
/// once, after the events that were the cause.</item>
/// <item>At a Stop the run ends. Restarts at the same instant are listed and not asked; of several stops, the one with
/// the lowest index counts.</item>
/// <item>Where an event that cuts a step has a kink, the step is repeated once to end a ten-thousandth beyond the event, and events are
/// looked for anew, in a solution that has hardly seen the far side. Where none is found now, the run goes on from there. What lies in
/// the first thousandth of a step is left as it is.</item>
/// <item>An event at the end of the run counts: a Stop makes it stopped, a Restart is still asked.</item>
/// </list>
/// </remarks>
public sealed class Integrator<TSystem> where TSystem : IOdeSystem, IEventSet
{
    /// <summary>Least step, in units in the last place of the time: below, stages share their times.</summary>
    private const double LeastStepUnits = 16;

    /// <summary>A last step may be this much longer than asked for, rather than leave a sliver.</summary>
    private const double LastStepStretch = 1.01;

    /// <summary>A kink in this first share of a step is not worth repeating it for.</summary>
    private const double NearKink = 1e-3;

    /// <summary>Share of its length by which a step goes beyond the kink that it is repeated for.</summary>
    private const double BeyondKink = 1e-4;

    private readonly EmbeddedRungeKutta<TSystem> explicitStepper;
    private readonly EventScan<TSystem> events;
    private readonly double[] endState;
    private Rosenbrock<TSystem>? implicitStepper;   // made at the first stiff stretch
    private Stepper<TSystem> stepper;
    private TSystem system;
    private StepControl control;
    private IntegrationOptions options = new();
    private Trajectory trajectory;
    private double time;
    private double end;
    private double length;
    private int steps;
    private int rejected;
    private int restarts;
    private int? stoppedBy;

    /// <summary>An integrator with the pair of Dormand and Prince and, where the system is stiff, Rodas5P.</summary>
    /// <param name="system">the system; its dimension and number of events are read here, once</param>
    /// <exception cref="ArgumentOutOfRangeException">the dimension is below 1 or the number of events below 0</exception>
    public Integrator(TSystem system)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(system.Dimension, 1);
        ArgumentOutOfRangeException.ThrowIfNegative(system.EventCount);
        this.system = system;
        stepper = explicitStepper = new EmbeddedRungeKutta<TSystem>(system, DormandPrince54.Tableau);
        events = new EventScan<TSystem>(system);
        endState = new double[system.Dimension];
        trajectory = new Trajectory(system.Dimension, capacity: 1);
    }

    /// <summary>Integrates from a state until the end, an event that stops, or an obstacle; never throws for what
    /// happens on the way.</summary>
    /// <param name="start">time at the start; finite</param>
    /// <param name="startState">state there; all finite</param>
    /// <param name="end">time to integrate to; finite, at least the start</param>
    /// <param name="options">how accurately and for how long</param>
    /// <param name="trajectory">receives the solution; what it held before is thrown away</param>
    /// <param name="cancellation">looked at once per step</param>
    /// <exception cref="ArgumentOutOfRangeException">a time or a state is not finite, or the end is before the start</exception>
    /// <exception cref="ArgumentException">the state or the trajectory has another dimension than the system</exception>
    public IntegrationResult Run(double start, ReadOnlySpan<double> startState, double end,
        IntegrationOptions options, Trajectory trajectory, CancellationToken cancellation = default)
    {
        Check(start, startState, end, trajectory);
        (time, this.end, this.options, this.trajectory) = (start, end, options, trajectory);
        (steps, rejected, restarts, stoppedBy) = (0, 0, 0, null);
        startState.CopyTo(endState);
        trajectory.Begin(start, startState);
        explicitStepper.ResetCount();
        implicitStepper?.ResetCount();
        events.Reset();
        EndingReason? reason = start == end ? EndingReason.ReachedEnd : Begin();
        while (reason is null)
            reason = Advance(cancellation);
        return Result(reason.Value);
    }

    private EndingReason? Begin()
    {
        if (!BeginStepper())
            return EndingReason.OutsideDomain;
        events.Begin(time, stepper.State, stepper.Slope);
        length = options.FirstStep ?? stepper.FirstStep(end - time, options.RelativeTolerance);
        return null;
    }

    /// <summary>Starts the stepper that the system asks for from the state at hand, without memory.</summary>
    private bool BeginStepper()
    {
        stepper = system.IsStiff
            ? implicitStepper ??= new Rosenbrock<TSystem>(system, Rodas5P.Tableau)
            : explicitStepper;
        control = new StepControl(stepper.ErrorOrder);
        return stepper.Begin(time, endState);
    }

    private EndingReason? Advance(CancellationToken cancellation)
    {
        if (cancellation.IsCancellationRequested)
            return EndingReason.Cancelled;
        if (steps + rejected >= options.MaximumSteps)
            return EndingReason.TooManySteps;
        double h = Fitted();
        bool isLast = h == end - time;
        double least = LeastStepUnits * (Math.BitIncrement(Math.Abs(time)) - Math.Abs(time));
        if (!(h >= least || isLast && h > 0))
            return EndingReason.StepTooSmall;
        double error = stepper.Try(h, options.RelativeTolerance);
        if (!(error <= 1))
            return Reject(h, error);
        steps++;
        length = control.AfterAcceptance(h, error);
        return Take(h, isLast ? end : time + h);
    }

    private EndingReason? Reject(double h, double error)
    {
        rejected++;
        length = control.AfterRejection(h, error);
        return null;
    }

    /// <summary>The wished length within what the system allows, fitted to the end of the run without a sliver.</summary>
    private double Fitted()
    {
        double limit = system.LargestStep(time, stepper.State, stepper.Slope);
        double h = Math.Min(length, limit);
        double left = end - time;
        if (h * LastStepStretch >= left && limit >= left)
            return left;
        return 2 * h > left ? left / 2 : h;
    }

    private EndingReason? Take(double h, double stepEnd)
    {
        bool isCut = IsCut(h, stepEnd);
        double shorter = (events.Instant - time) * (1 + BeyondKink);
        if (isCut && events.IsKink && shorter > h * NearKink && shorter < h * (1 - BeyondKink))
        {
            events.Rewind();
            rejected++;
            double error = stepper.Try(shorter, options.RelativeTolerance);
            if (!(error <= 1))
            {
                steps--;
                return Reject(shorter, error);
            }
            stepEnd = time + shorter;
            h = shorter;
            isCut = IsCut(h, stepEnd);
        }
        double reached = isCut ? events.Instant : stepEnd;
        trajectory.Append(time, reached, h);
        time = reached;
        if (isCut)
            return Restart();
        stepper.Accept(stepEnd);
        stepper.State.CopyTo(endState);
        return time == end ? EndingReason.ReachedEnd : null;
    }

    /// <summary>Writes the dense output of the step last tried and looks for events in it.</summary>
    private bool IsCut(double h, double stepEnd)
    {
        Span<double> coefficients = trajectory.NextSlot();
        stepper.WriteDense(coefficients);
        DenseStep step = new(time, stepEnd, h, coefficients);
        return events.IsCut(step, stepper.TrialState, stepper.TrialSlope, options.EventSamplesPerStep);
    }

    private EndingReason? Restart()
    {
        do
        {
            events.InstantState.CopyTo(endState);
            if (IsStopped())
                return EndingReason.Stopped;
            restarts++;
            trajectory.BeginPiece();
            if (!BeginStepper())
                return EndingReason.OutsideDomain;
        }
        while (events.IsCutAgain(time, stepper.State, stepper.Slope));
        return time == end ? EndingReason.ReachedEnd : null;
    }

    /// <summary>Acts on the events of the instant; true when one of them ends the run.</summary>
    private bool IsStopped()
    {
        foreach (ref readonly EventScan<TSystem>.Crossing crossing in events.InstantEvents)
        {
            if (crossing.Action == EventAction.Stop)
                stoppedBy ??= crossing.Index;
        }
        foreach (ref readonly EventScan<TSystem>.Crossing crossing in events.InstantEvents)
        {
            bool isAsked = stoppedBy is null && crossing.Action == EventAction.Restart;
            if (isAsked && !system.OnRestart(crossing.Index, time, endState))
                stoppedBy = crossing.Index;
        }
        return stoppedBy is not null;
    }

    private IntegrationResult Result(EndingReason reason) => new()
    {
        Reason = reason,
        StoppedBy = stoppedBy,
        EndTime = time,
        EndState = [.. endState],
        Events = events.Events(),
        Counters = new(steps, rejected, restarts,
            explicitStepper.Evaluations + (implicitStepper?.Evaluations ?? 0), implicitStepper?.Jacobians ?? 0, events.Evaluations),
    };

    private void Check(double start, ReadOnlySpan<double> startState, double end, Trajectory trajectory)
    {
        Require.Finite(start, "start of the integration", "");
        Require.Finite(end, "end of the integration", "");
        if (end < start)
            throw new ArgumentOutOfRangeException(nameof(end), string.Create(CultureInfo.InvariantCulture,
                $"the integration must end at or after {start}, got {end}"));
        if (startState.Length != endState.Length || trajectory.Dimension != endState.Length)
            throw new ArgumentException($"the state and the trajectory must have {endState.Length} components, "
                + $"got {startState.Length} and {trajectory.Dimension}");
        foreach (double component in startState)
            Require.Finite(component, "component of the state at the start", "");
    }
}
