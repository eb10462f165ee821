using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Screening.Sheets;

/// <summary>The stress field of a section at many points, made once: stresses under unit forces, for drawings under any forces.</summary>
public sealed class SectionSamples
{
    private readonly StressField _field;

    private SectionSamples(StressField field) => _field = field;

    /// <summary>Kind and dimensions of the section.</summary>
    public string Designation => _field.Section.Designation;

    /// <summary>The shear model.</summary>
    public ShearModel Model => _field.Model;

    /// <summary>Poisson's ratio ν [-].</summary>
    public double Poisson => _field.Poisson;

    /// <summary>Properties of the section.</summary>
    public SectionProperties Properties => _field.Properties;

    /// <summary>
    /// Whether stresses of forces that act together are the sum of those of each alone. Not so in the elementary model of a round bar with
    /// Vy and Vz, whose shear follows the resultant.
    /// </summary>
    public bool AddsUp => !(_field.Section is Round && _field.Model == ShearModel.Elementary);

    /// <summary>Radius of a round bar whose shear follows the resultant [m]; 0 for all others.</summary>
    public double ResultantRadius => AddsUp ? 0 : ((Round)_field.Section).Radius;

    /// <summary>Edges about the centroid, arcs in chords, the outer one first [m].</summary>
    public required ImmutableArray<ImmutableArray<(double Y, double Z)>> Rings { get; init; }

    /// <summary>The lattice.</summary>
    public required SampleGrid Grid { get; init; }

    /// <summary>Its nodes in and beside the material.</summary>
    public required ImmutableArray<SamplePoint> Points { get; init; }

    /// <summary>Shear stresses of each node under unit forces; those of a round bar hold for one shear force at a time.</summary>
    public required ImmutableArray<UnitShear> Units { get; init; }

    /// <summary>Numbers of the nodes that arrows of the shear stress are drawn at.</summary>
    public required ImmutableArray<int> ArrowSites { get; init; }

    /// <summary>The samples of a field.</summary>
    internal static SectionSamples Of(StressField field)
    {
        var rings = OutlineRings.Of(field.Section);
        var (grid, points) = SampleLayout.Of(field, rings);
        return new SectionSamples(field)
        {
            Rings = rings,
            Grid = grid,
            Points = points,
            Units = [.. points.Select(p => UnitsAt(field, p))],
            ArrowSites = SampleLayout.Sites(points, Math.Max(field.Section.ExtentY, field.Section.ExtentZ)),
        };
    }

    /// <summary>The stresses at a sample.</summary>
    /// <param name="point">Number of the sample.</param>
    /// <param name="forces">Section forces, T about the shear centre.</param>
    public StressState At(int point, in SectionForces forces)
    {
        var (place, unit) = (Points[point], Units[point]);
        var sigma = Sigma(forces, place.Y, place.Z);
        if (!AddsUp)
        {
            var state = _field.At(forces with { N = 0, My = 0, Mz = 0 }, place.ShearY, place.ShearZ);
            return new StressState(sigma, state.TauXY, state.TauXZ);
        }

        return new StressState(
            sigma,
            forces.Vy * unit.VyXY + forces.Vz * unit.VzXY + forces.T * unit.TXY,
            forces.Vy * unit.VyXZ + forces.Vz * unit.VzXZ + forces.T * unit.TXZ);
    }

    /// <summary>The stresses at all samples.</summary>
    public ImmutableArray<StressState> Over(SectionForces forces) => [.. Enumerable.Range(0, Points.Length).Select(i => At(i, forces))];

    /// <summary>σ as a plane over the section: at the centroid [Pa], and what it gains along y and z [Pa/m].</summary>
    public (double N, double PerY, double PerZ) Plane(in SectionForces forces)
    {
        var p = Properties;
        var determinant = p.Iy * p.Iz - p.Iyz * p.Iyz;
        return (
            forces.N / p.Area,
            -(forces.Mz * p.Iy + forces.My * p.Iyz) / determinant,
            (forces.My * p.Iz + forces.Mz * p.Iyz) / determinant);
    }

    private double Sigma(in SectionForces forces, double y, double z)
    {
        var (n, perY, perZ) = Plane(forces);
        return n + perY * y + perZ * z;
    }

    private static UnitShear UnitsAt(StressField field, in SamplePoint at)
    {
        var vy = field.At(new SectionForces(0, 1, 0, 0, 0, 0), at.ShearY, at.ShearZ);
        var vz = field.At(new SectionForces(0, 0, 1, 0, 0, 0), at.ShearY, at.ShearZ);
        var t = field.CarriesTorsion ? field.At(new SectionForces(0, 0, 0, 1, 0, 0), at.ShearY, at.ShearZ) : default;
        return new UnitShear(vy.TauXY, vy.TauXZ, vz.TauXY, vz.TauXZ, t.TauXY, t.TauXZ);
    }
}
