using MemberScan.Foundation.Geometry;

namespace MemberScan.Statics.Members;

/// <summary>A load along a stretch of a member in its axes, changing linearly.</summary>
/// <param name="From">Where it begins [m].</param>
/// <param name="To">Where it ends [m].</param>
/// <param name="Force">Force per length at its beginning [N/m].</param>
/// <param name="ForceRise">Its rise per length [N/m²].</param>
/// <param name="Moment">Moment per length at its beginning [N].</param>
/// <param name="MomentRise">Its rise per length [N/m].</param>
internal readonly record struct LinePiece(double From, double To, Vector3 Force, Vector3 ForceRise, Vector3 Moment, Vector3 MomentRise)
{
    /// <summary>What the stretch up to a place adds to the section forces there when nothing else acts.</summary>
    public void AddAt(double x, ref Vector3 force, ref Vector3 moment)
    {
        var s = Math.Min(x, To) - From;
        if (s <= 0) return;

        var q = s * Force + 0.5 * s * s * ForceRise;
        var first = 0.5 * s * s * Force + s * s * s / 3 * ForceRise;             // ∫q·ξ dξ from the beginning
        var lever = (x - From) * q - first;                                      // ∫q·(x − ξ) dξ
        force -= q;
        moment -= s * Moment + 0.5 * s * s * MomentRise + new Vector3(0, lever.Z, -lever.Y);
    }
}
