using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Bodies;
using MemberScan.Ifc.Outlines;

namespace MemberScan.Ifc.Meshes.Runs;

/// <summary>A straight piece of a joined mesh with a recognised section: a run, or a short piece of a bend or joint.</summary>
/// <param name="Side">Its outer side.</param>
/// <param name="Patches">Patches of its side and of its bore.</param>
/// <param name="Frame">x and y of its section's plane and z along the run, at the origin.</param>
/// <param name="Section">Its section; the position counts from the frame.</param>
/// <param name="Residual">Largest distance of the mesh's points from it [m].</param>
internal sealed record RunPiece(Ring Side, ImmutableHashSet<int> Patches, Transform3 Frame, RecognisedSection Section, double Residual)
{
    /// <summary>Largest extent of the section [m].</summary>
    public double Extent => Math.Max(Section.Shapes[0].ExtentY, Section.Shapes[0].ExtentZ);

    /// <summary>Least extent of the section [m].</summary>
    public double LeastExtent => Math.Min(Section.Shapes[0].ExtentY, Section.Shapes[0].ExtentZ);

    /// <summary>Whether it is long against its section, and so a run.</summary>
    public bool IsRun => Side.Length >= BarBody.BarLikeRatio * Extent;

    /// <summary>Points of the mesh at one of its ends.</summary>
    public IEnumerable<int> EndPoints(bool end) => Side.Lines.Select(l => end ? l.Last : l.First);

    /// <summary>Middle of one of its ends [m].</summary>
    public Vector3 Middle(bool end) => Side.Middle(end ? Side.AtEnd : Side.AtStart);

    /// <summary>Direction out of one of its ends.</summary>
    public Vector3 Outwards(bool end) => end ? Side.Axis : -Side.Axis;

    /// <summary>How far from one of its ends the axis of another piece is met, outwards [m]; 0 where it is not met, or within.</summary>
    public double ToAxisOf(RunPiece other, bool end)
    {
        var (along, against) = (Outwards(end), other.Side.Axis);
        var between = Middle(end) - other.Middle(false);
        var cosine = along.Dot(against);
        if (1 - cosine * cosine < 1e-3) return 0;

        var way = (between.Dot(against) * cosine - between.Dot(along)) / (1 - cosine * cosine);
        var foot = between + way * along;
        var apart = (foot - foot.Dot(against) * against).Length;
        return way > 1e-6 * Extent && way <= other.Extent && apart <= other.Extent ? way : 0;
    }
}
