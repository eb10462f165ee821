namespace MemberScan.Screening.Record;

/// <summary>A corner of a section's outline.</summary>
/// <param name="Y">From the centroid along y [m].</param>
/// <param name="Z">From the centroid along z [m].</param>
public readonly record struct RingPoint(double Y, double Z);
