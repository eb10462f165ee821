using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Statics;

/// <summary>Section forces and displacements along the flexible part of one member in one situation.</summary>
public abstract class MemberResult
{
    private protected MemberResult()
    {
    }

    /// <summary>Local axes; their origin is the flexible start.</summary>
    public abstract MemberAxes Axes { get; }

    /// <summary>Flexible length [m].</summary>
    public abstract double Length { get; }

    /// <summary>The stations asked for, in rising order; two rows where a section force jumps.</summary>
    public abstract ImmutableArray<MemberStation> Stations { get; }

    /// <summary>True extremes of the six section forces, in the order of <see cref="ForceComponent"/>.</summary>
    public abstract ImmutableArray<MemberExtreme> Extremes { get; }

    /// <summary>Places where a section force jumps or an extreme of one lies, in rising order, both ends included [m].</summary>
    public abstract ImmutableArray<double> Places { get; }

    /// <summary>Section forces at a place.</summary>
    /// <param name="x">Distance from the flexible start [m], from 0 to <see cref="Length"/>.</param>
    /// <param name="afterJump">Where forces jump: those right of the jump; false for those left of it.</param>
    public abstract SectionForces ForcesAt(double x, bool afterJump);

    /// <summary>Displacement of the axis at a place [m], local axes, that of the nodes included.</summary>
    /// <param name="x">Distance from the flexible start [m], from 0 to <see cref="Length"/>.</param>
    public abstract Vector3 DisplacementAt(double x);

    /// <summary>Displacement against the straight line between the displaced flexible ends [m], local axes.</summary>
    /// <param name="x">Distance from the flexible start [m], from 0 to <see cref="Length"/>.</param>
    public abstract Vector3 ChordDeflectionAt(double x);
}
