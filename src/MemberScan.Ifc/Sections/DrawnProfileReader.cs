using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Curves;
using MemberScan.Ifc.Outlines;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Sections;

/// <summary>Sections from outlines that are drawn as closed curves, with or without voids.</summary>
internal sealed class DrawnProfileReader(Instances instances, CurveReader curves)
{
    /// <summary>Source of a section that is read so, in words.</summary>
    public const string SourceWord = "drawn outline";

    /// <summary>Most voids of one outline.</summary>
    public const int MaxVoids = 64;

    /// <summary>Reads IfcArbitraryClosedProfileDef or IfcArbitraryProfileDefWithVoids.</summary>
    public Finding<ProfileShape> Read(Part21Record profile)
    {
        var called = ProfileReader.Called(profile);
        if (!Curve(profile[2], $"the outline of {called}").TryGet(out var outer, out var why)) return new Finding<ProfileShape>.Missing(why);

        var voids = ImmutableArray.CreateBuilder<ClosedOutline>();
        foreach (var inner in profile.Keyword == "IFCARBITRARYPROFILEDEFWITHVOIDS" ? profile[3].Items : [])
        {
            if (voids.Count == MaxVoids) return Missing(ReasonCode.SectionNotCovered, string.Create(CultureInfo.InvariantCulture, $"{called} has more than {MaxVoids} voids"));
            if (!Curve(inner, string.Create(CultureInfo.InvariantCulture, $"void {voids.Count + 1} of {called}")).TryGet(out var found, out var whyNot))
                return new Finding<ProfileShape>.Missing(whyNot);

            voids.Add(found.Value);
        }

        if (RecognisedSection.Of(outer.Value, voids.ToImmutable()) is not { } section) return General(profile, called, outer.Value, voids.ToImmutable());

        var note = string.Create(CultureInfo.InvariantCulture, $"recognised from its drawn outline; largest deviation {section.Deviation * 1e3:0.####} mm");
        var finding = new SectionFinding(section.Shapes, Instances.Text(profile[1]), [note, .. section.Notes]);
        return new Finding<ProfileShape>.Found(new ProfileShape(finding, section.Position) { SourceWord = SourceWord }, called);
    }

    /// <summary>An outline of no special kind. The one place where such a section would be made.</summary>
    private static Finding<ProfileShape> General(Part21Record profile, string called, ClosedOutline outer, ImmutableArray<ClosedOutline> voids)
    {
        if (OutlineFault.Of(outer, voids) is { Length: > 0 } fault) return Missing(ReasonCode.SectionInvalid, $"{called}: {fault}");

        var (leastX, mostX, leastY, mostY) = outer.Extents(Vector3.UnitX);
        var area = outer.Area - voids.Sum(v => v.Area);
        return Missing(ReasonCode.SectionNotCovered, string.Create(
            CultureInfo.InvariantCulture,
            $"{called} is a general outline of {outer.Edges.Length} edges{(voids.Length > 0 ? $" with {voids.Length} void{(voids.Length > 1 ? "s" : "")}" : "")}, {(mostX - leastX) * 1e3:0.###} mm wide and {(mostY - leastY) * 1e3:0.###} mm deep, area {area * 1e6:0.#} mm², which is none of the section kinds that are evaluated"));
    }

    private Finding<ClosedOutline> Curve(Part21Value reference, string called)
    {
        if (!instances.TryFollow(reference, out var record)) return NoCurve(ReasonCode.DamagedRecord, $"{called} refers to nothing");
        if (curves.ClosedPieces(record) is not { Count: > 0 } pieces)
            return NoCurve(ReasonCode.SectionNotCovered, string.Create(CultureInfo.InvariantCulture, $"{called} is drawn by {record.Keyword} #{record.Id}, which is not read or is damaged"));
        if (pieces.Exists(p => Math.Abs(p.Start.Z) > 0 || Math.Abs(p.End.Z) > 0)) return NoCurve(ReasonCode.SectionInvalid, $"{called} does not lie in a plane");

        return ClosedOutline.From(pieces, out var fault) is { } outline
            ? new Finding<ClosedOutline>.Found(outline, called)
            : NoCurve(ReasonCode.SectionInvalid, $"{called}: {fault}");
    }

    private static Finding<ClosedOutline> NoCurve(ReasonCode code, string message) => new Finding<ClosedOutline>.Missing(new Reason(code, message));

    private static Finding<ProfileShape> Missing(ReasonCode code, string message) => new Finding<ProfileShape>.Missing(new Reason(code, message));
}
