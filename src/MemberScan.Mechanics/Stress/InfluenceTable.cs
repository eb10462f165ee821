using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Outlines;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Resultants;
using MemberScan.Mechanics.Shear;

namespace MemberScan.Mechanics.Stress;

/// <summary>Stresses at the nodes of a chart: per unit of Vy, Vz and T where the shear solution is linear, else evaluated anew.</summary>
internal sealed class InfluenceTable
{
    private readonly SectionProperties _properties;
    private readonly ShearSolution _shear;
    private readonly (ShearStress Vy, ShearStress Vz, ShearStress T)[]? _units;

    /// <summary>The table of a chart.</summary>
    public InfluenceTable(SectionProperties properties, ShearSolution shear, Chart chart)
    {
        (_properties, _shear) = (properties, shear);
        Chart = chart;
        Points = new (double, double)[chart.Nodes.Count];
        for (var i = 0; i < Points.Length; i++) Points[i] = chart.Map(chart.Nodes.P[i], chart.Nodes.Q[i]);
        if (shear.IsLinear)
            _units = [.. Points.Select(at => shear.UnitsAt(at.Y, at.Z))];
    }

    /// <summary>The chart whose nodes these are.</summary>
    public Chart Chart { get; }

    /// <summary>Places of the nodes [m].</summary>
    public (double Y, double Z)[] Points { get; }

    /// <summary>What is to be made largest, at every node.</summary>
    public void Evaluate(in SectionForces forces, StressMeasure measure, Span<double> values)
    {
        var (n, perY, perZ) = BendingStress.Plane(_properties, forces);
        var (vy, vz, t) = (forces.Vy, forces.Vz, forces.T);
        for (var i = 0; i < values.Length; i++)
        {
            var (y, z) = Points[i];
            ShearStress shear;
            if (_units is null)
            {
                shear = _shear.At(vy, vz, t, y, z);
            }
            else
            {
                ref readonly var unit = ref _units[i];
                shear = new ShearStress(
                    vy * unit.Vy.XY + vz * unit.Vz.XY + t * unit.T.XY,
                    vy * unit.Vy.XZ + vz * unit.Vz.XZ + t * unit.T.XZ);
            }

            values[i] = Target.Of(measure, n + perY * y + perZ * z, shear.XY * shear.XY + shear.XZ * shear.XZ);
        }
    }
}
