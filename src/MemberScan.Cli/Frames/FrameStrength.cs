using System.Globalization;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Forces;
using MemberScan.Model.Frames;
using MemberScan.Model.Limits;
using MemberScan.Screening;
using MemberScan.Statics;

namespace MemberScan.Cli.Frames;

/// <summary>Utilization of members that have a section text and a yield strength, by the limits that hold without settings.</summary>
internal sealed class FrameStrength(Frame frame)
{
    /// <summary>Places besides stations, jumps and extremes at which stresses are looked at: combined stress may peak between those of single forces.</summary>
    private const int Places = 64;

    private readonly Dictionary<CrossSection, StressField?> _fields = [];

    /// <summary>The limit in words.</summary>
    public static string Basis(SituationKind kind)
    {
        var limit = Limit(kind);
        return kind == SituationKind.Design
            ? string.Create(CultureInfo.InvariantCulture, $"EN 1993-1-1:2005 6.2.1(5), von Mises over fy/γM0, γM0 = {limit.Factor:0.00}")
            : string.Create(CultureInfo.InvariantCulture, $"von Mises over fy/{limit.Factor:0.00}{(kind == SituationKind.Unknown ? " (the situation says neither service nor design: held against the service limit)" : "")}");
    }

    /// <summary>Largest utilization along a member; null with a reason, or without one where nothing asks for it.</summary>
    public (double? Value, string? WhyNot) Utilization(int number, MemberResult member, SituationKind kind)
    {
        var (section, material) = (frame.Members[number].Section, frame.Members[number].Material);
        if (section.Shape is not { } shape) return (null, null);
        if (material.Yield is not { } yield) return (null, null);
        if (!frame.Members[number].Taper.IsEmpty) return Tapering(frame.Members[number], member, yield, kind);
        if (Field(shape, material) is not { } field) return (null, "the section has no elementary stress field");

        var states = States(member);
        if (!NumberRange.Holds(shape) || !states.TrueForAll(f => NumberRange.Holds(shape, field.Properties, f))) return (null, "the numbers are beyond any structure");
        if (!field.CarriesTorsion && states.Exists(f => f.T != 0)) return (null, "the section carries torsion, for which it has no stress field");

        var (largest, which) = (new GoverningPoint[6], new int[6]);
        field.GovernAll([.. states], largest, which);
        return (largest[(int)StressMeasure.VonMises].Value * Limit(kind).Factor / yield, null);
    }

    /// <summary>Of a tapering member: at each place the stress of the section there.</summary>
    private static (double? Value, string? WhyNot) Tapering(FrameMember own, MemberResult member, double yield, SituationKind kind)
    {
        if (own.Taper[^1].Section.Shape is not { } last || Taper.Of(own.Taper[0].Section.Shape!, last) is not { } taper) return (null, "the section between the ends of the taper is not known");
        if (taper.SlopeOver(member.Length) > Taper.LargestSlope) return (null, "the member tapers too steeply for the formulas of a straight bar");

        var poisson = Poisson(own.Material);
        var largest = 0.0;
        foreach (var x in PlacesOf(member))
        {
            var shape = taper.At(Math.Clamp(x / member.Length, 0, 1));
            if (!StressField.TryCreate(shape, ShearModel.Elementary, poisson, out var field, out _)) return (null, "the section has no elementary stress field");

            foreach (var forces in (SectionForces[])[Clean(member.ForcesAt(x, false)), Clean(member.ForcesAt(x, true))])
            {
                if (!NumberRange.Holds(shape, field.Properties, forces)) return (null, "the numbers are beyond any structure");

                largest = Math.Max(largest, field.Govern(forces, StressMeasure.VonMises).Value);
            }
        }

        return (largest * Limit(kind).Factor / yield, null);
    }

    private static StressLimit Limit(SituationKind kind) => kind == SituationKind.Design ? Model.Limits.Basis.Default.Design! : Model.Limits.Basis.Default.Service!;

    private StressField? Field(CrossSection shape, FrameMaterial material)
    {
        if (_fields.TryGetValue(shape, out var known)) return known;

        return _fields[shape] = StressField.TryCreate(shape, ShearModel.Elementary, Poisson(material), out var field, out _) ? field : null;
    }

    private static double Poisson(FrameMaterial material) => Math.Clamp(material.E / (2 * material.G) - 1, 0, 0.499);

    private static IEnumerable<double> PlacesOf(MemberResult member) =>
        member.Places.Concat(Enumerable.Range(0, Places + 1).Select(i => i == Places ? member.Length : member.Length * i / Places));

    private static List<SectionForces> States(MemberResult member)
    {
        var states = member.Stations.Select(s => s.Forces).ToList();
        foreach (var x in PlacesOf(member))
            states.AddRange([member.ForcesAt(x, false), member.ForcesAt(x, true)]);
        return [.. states.Select(Clean)];
    }

    // Rounding leaves forces so small that their squares are no numbers.
    private static SectionForces Clean(SectionForces f)
    {
        return new SectionForces(Some(f.N), Some(f.Vy), Some(f.Vz), Some(f.T), Some(f.My), Some(f.Mz));

        static double Some(double force) => Math.Abs(force) < NumberRange.LeastForce ? 0 : force;
    }
}
