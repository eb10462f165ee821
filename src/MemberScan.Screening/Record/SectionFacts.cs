using System.Collections.Immutable;

namespace MemberScan.Screening.Record;

/// <summary>A section that stresses were found in: its properties (SI) and how well its stress fields give back the six section forces.</summary>
/// <param name="Designation">Kind and dimensions.</param>
/// <param name="Members">Number of candidates that have it and whose stresses are known.</param>
/// <param name="Area">Area [m²].</param>
/// <param name="Iy">Second moment about y [m⁴].</param>
/// <param name="Iz">Second moment about z [m⁴].</param>
/// <param name="WelY">Elastic modulus about y [m³].</param>
/// <param name="WelZ">Elastic modulus about z [m³].</param>
/// <param name="J">Torsion constant [m⁴]; null if no model gives it.</param>
/// <param name="JSource">Where J comes from.</param>
/// <param name="Wt">Torsion modulus [m³]; null where J is.</param>
/// <param name="ElementaryClosure">Closure of the elementary model in words with numbers.</param>
/// <param name="ElasticityClosure">Closure of the elasticity model in words with numbers, or why there is none.</param>
public sealed record SectionFacts(
    string Designation, int Members, double Area, double Iy, double Iz, double WelY, double WelZ, double? J, string JSource, double? Wt,
    string ElementaryClosure, string ElasticityClosure)
{
    /// <summary>Product of inertia [m⁴].</summary>
    public double Iyz { get; init; }

    /// <summary>Shear centre from the centroid along y [m].</summary>
    public double ShearCentreY { get; init; }

    /// <summary>Shear centre from the centroid along z [m].</summary>
    public double ShearCentreZ { get; init; }

    /// <summary>Outer line and holes about the centroid, arcs in chords; empty where the designation tells the form.</summary>
    public ImmutableArray<ImmutableArray<RingPoint>> Rings { get; init; } = [];
}
