using System.Globalization;
using DrainSim.Lines;
using DrainSim.Scenarios.Units;

namespace DrainSim.Scenarios.Reading;

/// <summary>Reads the block <c>line.inlet</c>.</summary>
internal static class InletReader
{
    /// <summary>The inlet; null when it is refused.</summary>
    /// <param name="line">the block of the line</param>
    /// <param name="tank">the tank; null when it was refused</param>
    public static Inlet? Read(BlockReader line, FilledTank? tank)
    {
        if (!line.Has("inlet"))
            line.Miss("is missing", "Give the elevation of its lowest edge, such as {elevation: 50 mm, facing: down}", "inlet");
        if (line.Block("inlet") is not { } block)
            return null;
        double? elevation = block.Needed("elevation", Quantities.Length, Allowed.NotNegative);
        InletFacing facing = block.Choice("facing", InletFacing.Down,
            ("down", InletFacing.Down), ("side", InletFacing.Side), ("up", InletFacing.Up));
        double? loss = Loss(block, facing);
        double? clearance = block.Amount("floor_clearance", Quantities.Length, Allowed.Positive);
        AirDraw airDraw = block.Choice("air_draw", AirDraw.Warn, ("warn", AirDraw.Warn), ("break", AirDraw.Break));
        if (clearance is not null && facing != InletFacing.Down)
            block.Refuse("floor_clearance", "belongs to an inlet that faces down", "It is the gap between the end of a dip leg and the floor");
        if (tank is not null && elevation >= tank.Vessel.Height)
        {
            block.Refuse("elevation", string.Create(CultureInfo.InvariantCulture,
                $"the inlet is above the brim of the tank, which is {tank.Vessel.Height:0.####} m high inside"),
                "Elevations count from the tank's lowest inside point");
            elevation = null;
        }
        block.Finish();
        return elevation is { } z && loss is { } k
            ? block.Build(() => new Inlet
            {
                Elevation = z,
                Facing = facing,
                EdgeLoss = k,
                FloorClearance = clearance,
                AirDraw = airDraw,
            })
            : null;
    }

    private static double? Loss(BlockReader block, InletFacing facing)
    {
        string? given = block.AtMostOne("Give the edge, or its loss coefficient", "edge", "loss");
        InletEdge? edge = block.Row("edge", "inlet edge", EdgeTable.Find,
            () => EdgeTable.All.Select(row => row.Id).Concat(EdgeTable.Aliases.Select(alias => alias.Name)), "drainsim fittings");
        double? loss = block.Amount("loss", Quantities.Ratio, Allowed.NotNegative);
        if (given is not null || block.Has("edge") || block.Has("loss"))
            return loss ?? edge?.Loss;
        // A hose hung over the rim stands into the liquid; a nozzle or a floor drain ends flush with the wall.
        string usual = facing == InletFacing.Down ? "re_entrant" : "flush";
        block.Note("edge", null, null, usual, isDefault: true);
        return EdgeTable.Find(usual)!.Loss;
    }
}
