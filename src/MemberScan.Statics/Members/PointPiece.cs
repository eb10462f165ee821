using MemberScan.Foundation.Geometry;

namespace MemberScan.Statics.Members;

/// <summary>A load at a point of a member in its axes.</summary>
/// <param name="At">Where [m].</param>
/// <param name="Force">Force [N].</param>
/// <param name="Moment">Moment [N·m].</param>
internal readonly record struct PointPiece(double At, Vector3 Force, Vector3 Moment)
{
    /// <summary>What the load adds to the section forces at a place beyond it when nothing else acts.</summary>
    public void AddAt(double x, ref Vector3 force, ref Vector3 moment)
    {
        var lever = (x - At) * Force;
        force -= Force;
        moment -= Moment + new Vector3(0, lever.Z, -lever.Y);
    }
}
