namespace DrainSim.Vessels;

/// <summary>What a record works out once from its own parts; it takes no part in the record's equality.</summary>
/// <remarks>
/// A new record is worked out, and so checked as a whole, when its last part is set. A copy made by
/// <c>with</c> carries the mark of completeness, and is worked out by its first use: while its parts
/// change one by one the pairs in between may be impossible.
/// </remarks>
internal struct Derived<T> : IEquatable<Derived<T>>
    where T : class
{
    private T? value;
    private bool wasComplete;

    /// <summary>What was worked out; null when a part has changed since.</summary>
    public readonly T? Value => value;

    /// <summary>Notes that a part was set.</summary>
    /// <param name="work">works the value out, or gives null while a part is missing</param>
    public void PartSet(Func<T?> work)
    {
        value = wasComplete ? null : work();
        wasComplete |= value is not null;
    }

    /// <summary>Keeps what was worked out at first use.</summary>
    public T Keep(T worked) => value = worked;

    /// <summary>Always true: the parts alone decide.</summary>
    public readonly bool Equals(Derived<T> other) => true;

    public override readonly bool Equals(object? obj) => obj is Derived<T>;

    public override readonly int GetHashCode() => 0;
}
