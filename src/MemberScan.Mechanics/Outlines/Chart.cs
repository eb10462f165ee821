namespace MemberScan.Mechanics.Outlines;

/// <summary>A way to walk over a part of a section without meeting its ends.</summary>
/// <param name="Nodes">Nodes of the coarse search.</param>
/// <param name="Map">From chart coordinates (p, q) to a point (y, z) of the section [m].</param>
/// <remarks>
/// Where the part ends the chart folds: a step beyond comes back inside, and a stress that is largest at the end is a plain smooth
/// maximum in (p, q). So one search without bounds serves everywhere.
/// </remarks>
internal sealed record Chart(Lattice Nodes, Func<double, double, (double Y, double Z)> Map);
