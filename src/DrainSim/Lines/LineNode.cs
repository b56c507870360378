namespace DrainSim.Lines;

/// <summary>A place on a line at which the pressure is known.</summary>
/// <param name="Name">name for people</param>
/// <param name="Item">index of the path item that it stands behind (or, at a bore change, before); null at the inlet</param>
/// <param name="Place">where it stands</param>
/// <param name="Elevation">elevation above the tank's lowest inside point, m</param>
/// <param name="Distance">developed length from the inlet, m</param>
/// <param name="Bore">bore on this side, m</param>
public sealed record LineNode(
    string Name, int? Item, NodePlace Place, double Elevation, double Distance, double Bore);
