namespace DrainSim.Integration;

/// <summary>The way in which an event function passes through zero as time goes on.</summary>
public enum EventDirection
{
    /// <summary>Upwards or downwards.</summary>
    Either,

    /// <summary>From below zero to above.</summary>
    Rising,

    /// <summary>From above zero to below.</summary>
    Falling,
}
