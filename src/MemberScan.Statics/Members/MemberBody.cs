using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Frames;

namespace MemberScan.Statics.Members;

/// <summary>The flexible part of a member: where it lies and how it deforms.</summary>
internal sealed class MemberBody
{
    private readonly SectionFlexibility _flexibility;
    private readonly double[] _tapered;

    public MemberBody(FrameMember member, MemberAxes axes, double length)
    {
        (Member, Axes, Length) = (member, axes, length);
        _flexibility = new SectionFlexibility(member.Section, member.Material, member.ShearFlexible);
        _tapered = [.. member.Taper.Select(point => point.Share * length)];
    }

    /// <summary>The member.</summary>
    public FrameMember Member { get; }

    /// <summary>Local axes; their origin is the flexible start.</summary>
    public MemberAxes Axes { get; }

    /// <summary>Flexible length [m].</summary>
    public double Length { get; }

    /// <summary>Whether the section changes along the member.</summary>
    public bool IsTapered => _tapered.Length > 0;

    /// <summary>Places where a taper changes its slope, ends included; empty for one section.</summary>
    public IReadOnlyList<double> TaperPlaces => _tapered;

    /// <summary>Flexibility of the section at a place.</summary>
    public SectionFlexibility FlexibilityAt(double x) =>
        IsTapered ? new SectionFlexibility(SectionAt(x), Member.Material, Member.ShearFlexible) : _flexibility;

    /// <summary>Area at a place [m²].</summary>
    public double AreaAt(double x) => IsTapered ? SectionAt(x).Area : Member.Section.Area;

    /// <summary>
    /// Displacement of the flexible end when the start is clamped, for a force at the end: 6 × 6, row-major, symmetric, in the order of
    /// <see cref="SectionForces"/>.
    /// </summary>
    public double[] EndFlexibility()
    {
        var flexibility = new double[36];
        var places = IsTapered ? _tapered : [0, Length];
        var rule = IsTapered ? GaussRule.Eight : GaussRule.Two;                  // one section: quadratic at most
        for (var piece = 0; piece + 1 < places.Length; piece++)
        {
            var (from, step) = (places[piece], places[piece + 1] - places[piece]);
            foreach (var (share, weight) in rule) AddPlace(flexibility, from + share * step, weight * step);
        }

        for (var i = 0; i < 6; i++)
            for (var j = 0; j < i; j++) flexibility[j * 6 + i] = flexibility[i * 6 + j];
        return flexibility;
    }

    /// <summary>Displacement at a place when the start is held, by loads and the section forces at the start.</summary>
    /// <param name="start">Section forces about the centroid just right of the start.</param>
    /// <param name="loading">The loads.</param>
    /// <param name="from">A place where the displacement is known [m].</param>
    /// <param name="known">The displacement there.</param>
    /// <param name="to">The place asked for, with no break of the loads between [m].</param>
    public EndDisplacement Follow(in SectionForces start, MemberLoading loading, double from, in EndDisplacement known, double to)
    {
        var moved = known.Carried(to - from);
        foreach (var (share, weight) in IsTapered ? GaussRule.Eight : GaussRule.Four)
        {
            var x = from + share * (to - from);
            var strains = FlexibilityAt(x).Of(loading.At(start, x, afterJump: false)) + loading.Free;
            moved += EndDisplacement.Of(strains, weight * (to - from), to - x);
        }

        return moved;
    }

    private void AddPlace(double[] flexibility, double x, double weight)
    {
        var section = FlexibilityAt(x);
        var rest = Length - x;
        for (var column = 0; column < 6; column++)
        {
            var force = Unit(column);
            var at = MemberLoading.ToStart(force, rest);
            var moved = EndDisplacement.Of(section.Of(at), weight, rest);
            ReadOnlySpan<double> rows = [moved.X, moved.Y, moved.Z, moved.TurnX, moved.TurnY, moved.TurnZ];
            for (var row = column; row < 6; row++) flexibility[row * 6 + column] += rows[row];
        }
    }

    private static SectionForces Unit(int number) => new(
        number == 0 ? 1 : 0, number == 1 ? 1 : 0, number == 2 ? 1 : 0, number == 3 ? 1 : 0, number == 4 ? 1 : 0, number == 5 ? 1 : 0);

    private FrameSection SectionAt(double x)
    {
        var points = Member.Taper;
        var k = 1;
        while (k < points.Length - 1 && x > _tapered[k]) k++;
        var (a, b) = (points[k - 1].Section, points[k].Section);
        var t = Math.Clamp((x - _tapered[k - 1]) / (_tapered[k] - _tapered[k - 1]), 0, 1);
        return a with
        {
            Area = double.Lerp(a.Area, b.Area, t),
            Iy = double.Lerp(a.Iy, b.Iy, t),
            Iz = double.Lerp(a.Iz, b.Iz, t),
            Iyz = double.Lerp(a.Iyz, b.Iyz, t),
            J = double.Lerp(a.J, b.J, t),
            ShearAreaY = double.Lerp(a.ShearAreaY, b.ShearAreaY, t),
            ShearAreaZ = double.Lerp(a.ShearAreaZ, b.ShearAreaZ, t),
            ShearCentreY = double.Lerp(a.ShearCentreY, b.ShearCentreY, t),
            ShearCentreZ = double.Lerp(a.ShearCentreZ, b.ShearCentreZ, t),
        };
    }
}
