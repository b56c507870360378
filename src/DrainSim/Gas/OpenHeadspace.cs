namespace DrainSim.Gas;

/// <summary>The open air: the surface stands under atmospheric pressure.</summary>
public sealed record OpenHeadspace : Headspace;
