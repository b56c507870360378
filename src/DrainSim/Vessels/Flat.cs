namespace DrainSim.Vessels;

/// <summary>A flat end plate.</summary>
public sealed record Flat : Head
{
    /// <summary>0: a plate has no depth, m.</summary>
    /// <param name="diameter">inside diameter of the shell, m</param>
    public override double DepthOn(double diameter) => 0;

    internal override StandingHead Stand(double radius) => new Standing();

    internal override LyingHead Lie(double radius) => new Lying();

    private sealed class Standing() : StandingHead(depth: 0, capacity: 0)
    {
        public override double Volume(double h) => 0;

        public override double Area(double h) => 0;

        public override double Level(double volume) => 0;
    }

    private sealed class Lying : LyingHead
    {
        public override double Volume(double h, double phi) => 0;

        public override double Area(double h) => 0;
    }
}
