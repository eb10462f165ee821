using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Curves;

namespace MemberScan.Ifc.Outlines;

/// <summary>A straight or circular edge of a closed outline in a plane (z = 0).</summary>
/// <param name="Start">Start [m].</param>
/// <param name="End">End [m].</param>
/// <param name="Centre">Centre of an arc [m]; zero for a straight edge.</param>
/// <param name="Radius">Radius of an arc [m]; 0 for a straight edge.</param>
/// <param name="Turn">Angle of an arc [rad], positive counter-clockwise; 0 for a straight edge.</param>
internal readonly record struct OutlineEdge(Vector3 Start, Vector3 End, Vector3 Centre, double Radius, double Turn)
{
    /// <summary>Whether it is circular.</summary>
    public bool IsArc => Radius > 0;

    /// <summary>Length [m].</summary>
    public double Length => IsArc ? Radius * Math.Abs(Turn) : (End - Start).Length;

    /// <summary>Direction at the start, a unit vector.</summary>
    public Vector3 StartTangent => IsArc ? Math.Sign(Turn) / Radius * Left(Start - Centre) : 1 / Length * (End - Start);

    /// <summary>Direction at the end, a unit vector.</summary>
    public Vector3 EndTangent => IsArc ? Math.Sign(Turn) / Radius * Left(End - Centre) : 1 / Length * (End - Start);

    /// <summary>The same edge run through the other way.</summary>
    public OutlineEdge Reversed => new(End, Start, Centre, Radius, -Turn);

    /// <summary>A straight edge.</summary>
    public static OutlineEdge Straight(Vector3 start, Vector3 end) => new(start, end, Vector3.Zero, 0, 0);

    /// <summary>An edge from a piece of a curve that lies in the plane.</summary>
    public static OutlineEdge From(CurvePiece piece)
    {
        if (!piece.IsArc) return Straight(piece.Start, piece.End);

        // The chord of an arc of less than a full turn lies on the side to which the arc bends.
        var sense = Cross(piece.StartTangent, piece.End - piece.Start) >= 0 ? 1 : -1;
        return new(piece.Start, piece.End, piece.Start + sense * piece.BendRadius * Left(piece.StartTangent), piece.BendRadius, sense * piece.Sweep);
    }

    /// <summary>The point at a share of the edge, from 0 to 1.</summary>
    public Vector3 At(double share)
    {
        if (!IsArc) return Start + share * (End - Start);

        var (sin, cos) = Math.SinCos(share * Turn);
        var arm = Start - Centre;
        return Centre + cos * arm + sin * Left(arm);
    }

    /// <summary>The vector turned by a quarter to the left.</summary>
    public static Vector3 Left(Vector3 v) => new(-v.Y, v.X, 0);

    /// <summary>The z part of the vector product of two vectors in the plane.</summary>
    public static double Cross(Vector3 a, Vector3 b) => a.X * b.Y - a.Y * b.X;
}
