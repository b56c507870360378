namespace DrainSim.Vessels;

/// <summary>An upright cylindrical tank with a head at each end.</summary>
public sealed record VerticalCylinder : Vessel
{
    private Derived<Parts> derived;

    /// <summary>Inside diameter of the shell, m; greater than 0.</summary>
    public required double Diameter
    {
        get;
        init
        {
            field = Require.Positive(value, "tank diameter", "m");
            derived.PartSet(WorkOut);
        }
    }

    /// <summary>Height of the straight shell between the tangent lines, m; greater than 0.</summary>
    public required double ShellHeight
    {
        get;
        init
        {
            field = Require.Positive(value, "shell height", "m");
            derived.PartSet(WorkOut);
        }
    }

    /// <summary>The closure below, apex down.</summary>
    public required Head Bottom
    {
        get;
        init
        {
            field = value;
            derived.PartSet(WorkOut);
        }
    }

    /// <summary>The closure above, apex up; flat for an open tank.</summary>
    public required Head Top
    {
        get;
        init
        {
            field = value;
            derived.PartSet(WorkOut);
        }
    }

    /// <inheritdoc/>
    public override double Height => Worked.Height;

    /// <inheritdoc/>
    public override double Capacity => Worked.Capacity;

    /// <inheritdoc/>
    public override IReadOnlyList<double> SectionLevels => Worked.Kinks;

    private Parts Worked => derived.Value ?? derived.Keep(WorkOut()!);

    /// <inheritdoc/>
    public override double Volume(double level)
    {
        Parts parts = Worked;
        double h = Math.Clamp(level, 0, parts.Height);
        if (h < parts.ShellStart)
            return parts.Bottom.Volume(h);
        return h < parts.ShellEnd
            ? parts.Bottom.Capacity + parts.ShellArea * Math.Min(h - parts.ShellStart, ShellHeight)
            : parts.Capacity - parts.Top.Volume(parts.Height - h);
    }

    /// <inheritdoc/>
    public override double Area(double level)
    {
        Parts parts = Worked;
        double h = Math.Clamp(level, 0, parts.Height);
        if (h < parts.ShellStart)
            return parts.Bottom.Area(h);
        return h <= parts.ShellEnd ? parts.ShellArea : parts.Top.Area(parts.Height - h);
    }

    /// <inheritdoc/>
    public override double Level(double volume)
    {
        Parts parts = Worked;
        double v = Math.Clamp(volume, 0, parts.Capacity);
        if (v < parts.Bottom.Capacity)
            return parts.Bottom.Level(v);
        return v < parts.Bottom.Capacity + parts.ShellVolume
            ? Math.Min(parts.ShellStart + (v - parts.Bottom.Capacity) / parts.ShellArea, parts.ShellEnd)
            : parts.Height - parts.Top.Level(parts.Capacity - v);
    }

    private Parts? WorkOut() =>
        Diameter > 0 && ShellHeight > 0 && Bottom is not null && Top is not null
            ? new Parts(Diameter / 2, ShellHeight, Bottom.Stand(Diameter / 2), Top.Stand(Diameter / 2))
            : null;

    private sealed class Parts(double radius, double shellHeight, StandingHead bottom, StandingHead top)
    {
        public StandingHead Bottom { get; } = bottom;

        public StandingHead Top { get; } = top;

        public double ShellStart { get; } = bottom.Depth;

        public double ShellEnd { get; } = bottom.Depth + shellHeight;

        public double Height { get; } = bottom.Depth + shellHeight + top.Depth;

        public double ShellArea { get; } = Math.PI * radius * radius;

        public double ShellVolume { get; } = Math.PI * radius * radius * shellHeight;

        public double Capacity { get; } = bottom.Capacity + Math.PI * radius * radius * shellHeight + top.Capacity;

        public IReadOnlyList<double> Kinks { get; } = KinksOf(shellHeight, bottom, top);

        private static double[] KinksOf(double shellHeight, StandingHead bottom, StandingHead top)
        {
            double height = bottom.Depth + shellHeight + top.Depth;
            double?[] all =
            [
                bottom.Kink,
                bottom.Depth > 0 ? bottom.Depth : null,
                top.Depth > 0 ? bottom.Depth + shellHeight : null,
                height - top.Kink,
            ];
            return [.. all.OfType<double>()];
        }
    }
}
