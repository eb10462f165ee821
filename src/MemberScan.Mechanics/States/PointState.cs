using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.States;

/// <summary>The stress state of a point worked out: principal stresses and directions, largest shear, Mohr's circles, stress elements.</summary>
/// <remarks>
/// All happens in the plane of x and the direction e of the resultant shear stress of the section; square to it acts nothing, so
/// σ2 = 0 is always the middle one. <c>tan 2θ = 2τ/σ</c>. Source: any text on mechanics of materials (common practice).
/// </remarks>
public sealed record PointState
{
    private PointState(StressState stress) => Stress = stress;

    /// <summary>The stresses that it is made of.</summary>
    public StressState Stress { get; }

    /// <summary>Largest principal stress [Pa], ≥ 0.</summary>
    public double Sigma1 => Stress.Sigma1;

    /// <summary>Middle principal stress [Pa]: always 0.</summary>
    public double Sigma2 { get; }

    /// <summary>Smallest principal stress [Pa], ≤ 0.</summary>
    public double Sigma3 => Stress.Sigma3;

    /// <summary>Direction of the section's resultant shear stress: a unit vector square to x; +z where there is none.</summary>
    public required Vector3 ShearDirection { get; init; }

    /// <summary>Angle of the direction of σ1 from x towards <see cref="ShearDirection"/> [rad], in [0, π/2]; that of σ3 is a right angle less.</summary>
    public required double Angle { get; init; }

    /// <summary>Direction of σ1: a unit vector in the member's axes, either sense.</summary>
    public required Vector3 Direction1 { get; init; }

    /// <summary>Direction of σ2; the three are right-handed.</summary>
    public required Vector3 Direction2 { get; init; }

    /// <summary>Direction of σ3.</summary>
    public required Vector3 Direction3 { get; init; }

    /// <summary>The largest shear stress and the face that it acts on.</summary>
    public required ShearPlane LargestShear { get; init; }

    /// <summary>Mohr's three circles: through σ1 and σ3, σ1 and σ2, σ2 and σ3.</summary>
    public required ImmutableArray<MohrCircle> Circles { get; init; }

    /// <summary>The stress elements in the planes of x and y and of x and z.</summary>
    public required ImmutableArray<StressElement> Elements { get; init; }

    /// <summary>Whether every direction in a plane is principal, since two principal stresses are the same; then the directions are one choice of many.</summary>
    public bool HasFreeDirections => Stress.Tau == 0;

    /// <summary>Works out a state; its stresses must be finite.</summary>
    /// <exception cref="ArgumentException">A stress is not finite.</exception>
    public static PointState Of(in StressState stress)
    {
        if (!double.IsFinite(stress.Sigma) || !double.IsFinite(stress.TauXY) || !double.IsFinite(stress.TauXZ))
            throw new ArgumentException("stresses must be finite numbers", nameof(stress));

        var along = new Vector3(0, stress.TauXY, stress.TauXZ).TryNormalize(out var unit) ? unit : Vector3.UnitZ;
        var (angle, radius) = (0.5 * Math.Atan2(2 * stress.Tau, stress.Sigma), 0.5 * stress.Tresca);
        var (first, second) = (Towards(angle), Vector3.UnitX.Cross(along));
        return new PointState(stress)
        {
            ShearDirection = along,
            Angle = angle,
            Direction1 = first,
            Direction2 = second,
            Direction3 = first.Cross(second),
            LargestShear = new ShearPlane(radius, 0.5 * stress.Sigma, angle - Math.PI / 4, Towards(angle - Math.PI / 4)),
            Circles =
            [
                new MohrCircle("σ1–σ3", 0.5 * stress.Sigma, radius),
                new MohrCircle("σ1–σ2", 0.5 * stress.Sigma1, 0.5 * stress.Sigma1),
                new MohrCircle("σ2–σ3", 0.5 * stress.Sigma3, -0.5 * stress.Sigma3),
            ],
            Elements = [new StressElement(ElementPlane.XY, stress.Sigma, stress.TauXY), new StressElement(ElementPlane.XZ, stress.Sigma, stress.TauXZ)],
        };

        Vector3 Towards(double turn)
        {
            var (sin, cos) = Math.SinCos(turn);
            return cos * Vector3.UnitX + sin * along;
        }
    }
}
