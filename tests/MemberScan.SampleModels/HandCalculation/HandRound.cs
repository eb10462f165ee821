using System.Diagnostics.CodeAnalysis;
using MemberScan.Mechanics.Forces;

namespace MemberScan.SampleModels.HandCalculation;

/// <summary>Round bar (inner radius 0) and round tube.</summary>
/// <remarks>
/// Shear along the resultant V: bar (4/3)(V/A)(1 − s²/r²); tube V·Q/(I·2t) with Q = ⅔(ro³ − ri³)·sin ϑ, tangential. Torsion T·r/J.
/// </remarks>
internal sealed class HandRound : HandSection
{
    private const int Directions = 1440;

    private readonly double _outer;
    private readonly double _inner;

    [SetsRequiredMembers]
    public HandRound(double outer, double inner)
    {
        (_outer, _inner) = (outer, inner);
        Area = Math.PI * (outer * outer - inner * inner);
        Iy = Iz = Math.PI / 4 * (Math.Pow(outer, 4) - Math.Pow(inner, 4));
    }

    public override HandPoint Worst(in SectionForces f)
    {
        var worst = At(f, 0, _inner);
        double[] radii = _inner > 0 ? [_outer] : [.. Enumerable.Range(1, 10).Select(i => _outer * i / 10)];
        foreach (var radius in radii)
        {
            for (var i = 0; i < Directions; i++) worst = HandPoint.Worse(worst, At(f, 2 * Math.PI * i / Directions, radius));

            // The extreme fibre of the resultant moment lies on the line along (−Mz, My).
            var alongMoment = Math.Atan2(f.My, -f.Mz);
            worst = HandPoint.Worse(worst, At(f, alongMoment, radius));
            worst = HandPoint.Worse(worst, At(f, alongMoment + Math.PI, radius));
        }

        return worst;
    }

    private HandPoint At(in SectionForces f, double angle, double radius)
    {
        var (sin, cos) = Math.SinCos(angle);
        var (y, z) = (radius * cos, radius * sin);
        var v = Math.Sqrt(f.Vy * f.Vy + f.Vz * f.Vz);
        var torsion = f.T * radius / (2 * Iy);
        var (tauY, tauZ) = (-torsion * sin, torsion * cos);
        if (v > 0)
        {
            var (alongY, alongZ) = (f.Vy / v, f.Vz / v);
            if (_inner > 0)
            {
                // Flow runs from the far side of V to its near side: against the angle where V lies clockwise of the point.
                var sinFromV = alongY * sin - alongZ * cos;
                var q = 2.0 / 3 * (Math.Pow(_outer, 3) - Math.Pow(_inner, 3));
                var tangential = -v * q * sinFromV / (Iy * 2 * (_outer - _inner));
                (tauY, tauZ) = (tauY - tangential * sin, tauZ + tangential * cos);
            }
            else
            {
                var s = y * alongY + z * alongZ;
                var tau = 4.0 / 3 * v / Area * (1 - s * s / (_outer * _outer));
                (tauY, tauZ) = (tauY + tau * alongY, tauZ + tau * alongZ);
            }
        }

        return new HandPoint(y, z, Normal(f, y, z), Math.Sqrt(tauY * tauY + tauZ * tauZ));
    }
}
