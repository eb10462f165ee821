namespace MemberScan.Inputs.Outlines;

/// <summary>A ring of an outline file: either corners or a circle.</summary>
/// <param name="Points">Corners <c>[y, z]</c>, or <c>[y, z, bulge]</c> where an arc leads to the next one.</param>
/// <param name="Circle"><c>[y, z, radius]</c>.</param>
internal sealed record OutlineFileRing(double[][]? Points, double[]? Circle);
