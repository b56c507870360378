namespace DrainSim.Integration;

/// <summary>Functions g(t, y) of the solution whose change of sign is an event.</summary>
/// <remarks>The rules by which they fire are numbered at <see cref="Integrator{TSystem}"/>.</remarks>
public interface IEventSet
{
    /// <summary>Number of event functions; constant during a run.</summary>
    int EventCount { get; }

    /// <summary>Writes the values of all event functions; each is continuous in t and y.</summary>
    /// <param name="t">time</param>
    /// <param name="y">state</param>
    /// <param name="dydt">derivative at a step's ends, the slope of the dense output within a step, so that a
    /// function of the flow needs no new one</param>
    /// <param name="values">receives one value per function; NaN where the function has no value</param>
    void EventValues(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> values);

    /// <summary>What a change of sign of one function means; asked when one is found, so it may change at a restart.</summary>
    /// <param name="index">which function, from 0</param>
    EventRule Rule(int index);

    /// <summary>Answers an event whose action is <see cref="EventAction.Restart"/>.</summary>
    /// <param name="index">which function fired</param>
    /// <param name="t">time of the event</param>
    /// <param name="y">state there; may be changed, as may the system's own parameters</param>
    /// <returns>whether the run goes on</returns>
    /// <remarks>
    /// A derivative with a jump or a kink keeps its accuracy when it goes on along its present branch beyond
    /// the place, has an event function there, and changes its branch here: no step then sees both branches.
    /// </remarks>
    bool OnRestart(int index, double t, Span<double> y);
}
