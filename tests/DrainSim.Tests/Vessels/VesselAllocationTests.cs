using DrainSim.Vessels;

namespace DrainSim.Tests.Vessels;

public sealed class VesselAllocationTests
{
    public static TheoryData<Vessel> Vessels => new()
    {
        new Sphere { Diameter = 2 },
        new Box { Length = 1, Width = 2, WallHeight = 3 },
        new Cone { BottomDiameter = 0.1, TopDiameter = 2, ConeHeight = 3 },
        new Basin { BottomLength = 10, BottomWidth = 5, SideSlope = 2, Depth = 3 },
        new VerticalCylinder { Diameter = 2, ShellHeight = 3, Bottom = Torispherical.Kloepper(2), Top = new Ellipsoidal() },
        new HorizontalCylinder { Diameter = 2, Length = 3, FirstHead = Torispherical.Kloepper(2), SecondHead = ConeHead.OfDepth(1) },
        new HorizontalCylinder { Diameter = 2, Length = 3, FirstHead = new Torispherical { CrownRadius = 3, KnuckleRadius = 0 }, SecondHead = new Flat() },
        new StrappingTable { Rows = [(0, 0), (1, 1), (2, 3), (3, 7)] },
        new Stack
        {
            Sections =
            [
                new VerticalCylinder { Diameter = 2, ShellHeight = 3, Bottom = Torispherical.Korbbogen(2), Top = new Flat() },
                new StrappingTable { Rows = [(0, 0), (1, 1), (2, 3), (3, 7)] },
            ],
        },
    };

    [Theory]
    [MemberData(nameof(Vessels))]
    public void A_call_allocates_nothing(Vessel vessel)
    {
        _ = Sweep(vessel);
        long before = GC.GetAllocatedBytesForCurrentThread();
        double sum = Sweep(vessel);
        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
        Assert.True(sum > 0);
    }

    private static double Sweep(Vessel vessel)
    {
        double sum = 0;
        for (int i = -2; i <= 102; i++)
        {
            double level = vessel.Height * i / 100;
            sum += vessel.Volume(level) + vessel.Area(level) + vessel.Level(vessel.Capacity * i / 100);
        }
        return sum;
    }
}
