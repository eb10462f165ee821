using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Statics.Members;

/// <summary>All loads of one member in one situation, in its axes.</summary>
internal sealed class MemberLoading
{
    /// <summary>No load.</summary>
    public static MemberLoading None { get; } = new();

    /// <summary>Loads at points.</summary>
    public List<PointPiece> Points { get; } = [];

    /// <summary>Loads along stretches.</summary>
    public List<LinePiece> Lines { get; } = [];

    /// <summary>Free strains of temperature.</summary>
    public Strains Free { get; set; }

    /// <summary>Whether nothing acts.</summary>
    public bool IsEmpty => Points.Count == 0 && Lines.Count == 0 && Free == default;

    /// <summary>Section forces about the centroid at a place, from those at the start and the loads in between.</summary>
    /// <param name="start">Section forces just right of the start.</param>
    /// <param name="x">The place [m].</param>
    /// <param name="afterJump">Whether point loads at the place itself count.</param>
    /// <remarks>Equilibrium: <c>dV/dx = −q</c>, <c>dMy/dx = Vz − my</c>, <c>dMz/dx = −Vy − mz</c>.</remarks>
    public SectionForces At(in SectionForces start, double x, bool afterJump)
    {
        var force = new Vector3(start.N, start.Vy, start.Vz);
        var moment = new Vector3(start.T, start.My + start.Vz * x, start.Mz - start.Vy * x);
        foreach (var point in Points)
            if (point.At < x || (afterJump && point.At == x)) point.AddAt(x, ref force, ref moment);
        foreach (var line in Lines) line.AddAt(x, ref force, ref moment);
        return new SectionForces(force.X, force.Y, force.Z, moment.X, moment.Y, moment.Z);
    }

    /// <summary>Section forces at the start of a cantilever that is free at its end.</summary>
    /// <param name="length">Its length [m].</param>
    public SectionForces CantileverStart(double length) => -1 * ToStart(At(default, length, afterJump: true), length);

    /// <summary>Section forces at the start that equal given ones at the end when nothing acts in between.</summary>
    public static SectionForces ToStart(in SectionForces end, double length) =>
        end with { My = end.My - end.Vz * length, Mz = end.Mz + end.Vy * length };

    /// <summary>Places at which the section forces are not smooth, both ends included, in rising order.</summary>
    public List<double> Breaks(double length, IEnumerable<double> others)
    {
        var all = new List<double> { 0, length };
        foreach (var point in Points) all.Add(point.At);
        foreach (var line in Lines) all.AddRange([line.From, line.To]);
        all.AddRange(others);
        all.Sort();
        return [.. all.Where(x => x >= 0 && x <= length).Distinct()];
    }
}
