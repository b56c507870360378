using System.Collections.Frozen;

namespace DrainSim.Lines;

/// <summary>Rows found by their own name or by a trade word.</summary>
internal sealed class NamedRows<T>
    where T : class
{
    private readonly FrozenDictionary<string, T> byName;

    /// <summary>Takes the rows and the trade words of one table.</summary>
    /// <exception cref="ArgumentException">a trade word names no row, or a name stands twice</exception>
    public NamedRows(List<T> rows, Func<T, string> name, IReadOnlyList<Alias> aliases)
    {
        Dictionary<string, T> found = rows.ToDictionary(name, StringComparer.Ordinal);
        foreach (Alias alias in aliases)
        {
            if (!found.TryGetValue(alias.Target, out T? row))
                throw new ArgumentException($"the trade word {alias.Name} stands for {alias.Target}, which is no row");
            found.Add(alias.Name, row);
        }
        All = rows.AsReadOnly();
        Aliases = aliases;
        byName = found.ToFrozenDictionary(StringComparer.Ordinal);
    }

    /// <summary>Every row, in the order of the table.</summary>
    public IReadOnlyList<T> All { get; }

    /// <summary>The trade words that stand for a row.</summary>
    public IReadOnlyList<Alias> Aliases { get; }

    /// <summary>The row of that name or trade word; null when there is none.</summary>
    public T? Find(string id) => byName.GetValueOrDefault(id);
}
