using System.Diagnostics.CodeAnalysis;

namespace DrainSim.Vessels;

/// <summary>Sections of tank one on another, open to each other over their whole joint.</summary>
/// <remarks>Two stacks are equal when their sections are equal one by one.</remarks>
[SuppressMessage("Naming", "CA1711", Justification = "The trade's word for sections one on another, and the scenario's.")]
public sealed record Stack : Vessel
{
    private const int MostSections = 1000;

    private double[] bottoms = [];
    private double[] volumesBelow = [];
    private double[] kinks = [];

    /// <summary>The sections from the bottom up; at least one, and open at every joint.</summary>
    /// <exception cref="ArgumentOutOfRangeException">
    /// no section, a section that closes to a point at a joint, or a strapping table with bottoms above another section
    /// </exception>
    public required IReadOnlyList<Vessel> Sections
    {
        get;
        init
        {
            Vessel[] sections = [.. value];
            Require.Within(sections.Length, 1, MostSections, "height of a stack", "sections");
            CheckJoints(sections);
            field = sections;
            bottoms = Sums(sections, section => section.Height);
            volumesBelow = Sums(sections, section => section.Capacity);
            kinks = [.. KinksOf(sections, bottoms)];
        }
    }

    /// <inheritdoc/>
    public override double Height => bottoms[^1];

    /// <inheritdoc/>
    public override double Capacity => volumesBelow[^1];

    /// <inheritdoc/>
    public override IReadOnlyList<double> SectionLevels => kinks;

    /// <inheritdoc/>
    public override double Volume(double level)
    {
        if (level >= Height)
            return Capacity;
        int i = IndexAt(bottoms, level);
        return volumesBelow[i] + Sections[i].Volume(level - bottoms[i]);
    }

    /// <inheritdoc/>
    public override double Area(double level)
    {
        if (level >= Height)
            return Sections[^1].Area(double.PositiveInfinity);
        int i = IndexAt(bottoms, level);
        return Sections[i].Area(level - bottoms[i]);
    }

    /// <inheritdoc/>
    public override double Level(double volume)
    {
        if (volume >= Capacity)
            return Height;
        int i = IndexAt(volumesBelow, volume);
        return bottoms[i] + Sections[i].Level(volume - volumesBelow[i]);
    }

    /// <summary>Whether the sections are equal one by one.</summary>
    public bool Equals(Stack? other) => other is not null && Sections.SequenceEqual(other.Sections);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Sections.Count, Sections[0]);

    // The section that holds a level or a volume: the upper one at a joint.
    private static int IndexAt(double[] starts, double value)
    {
        int i = starts.Length - 2;
        while (i > 0 && value < starts[i])
            i--;
        return i;
    }

    private static void CheckJoints(Vessel[] sections)
    {
        for (int i = 1; i < sections.Length; i++)
        {
            Vessel lower = sections[i - 1], upper = sections[i];
            Require.Positive(lower.Area(lower.Height), $"area at the top of section {i} of a stack", "m²");
            Require.Positive(upper.Area(0), $"area at the bottom of section {i + 1} of a stack", "m²");
            Require.Within(upper.Volume(0), 0, 0, $"volume below level 0 of section {i + 1} of a stack", "m³");
        }
    }

    private static double[] Sums(Vessel[] sections, Func<Vessel, double> part)
    {
        double[] sums = new double[sections.Length + 1];
        for (int i = 0; i < sections.Length; i++)
            sums[i + 1] = sums[i] + part(sections[i]);
        return sums;
    }

    private static IEnumerable<double> KinksOf(Vessel[] sections, double[] bottoms)
    {
        for (int i = 0; i < sections.Length; i++)
        {
            if (i > 0)
                yield return bottoms[i];
            foreach (double level in sections[i].SectionLevels)
                yield return bottoms[i] + level;
        }
    }
}
