using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Curves;
using MemberScan.Ifc.Outlines;
using MemberScan.Ifc.Sections.General;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;
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

        var followed = ImmutableArray.Create(outer.Source);
        var voids = ImmutableArray.CreateBuilder<ClosedOutline>();
        foreach (var inner in profile.Keyword == "IFCARBITRARYPROFILEDEFWITHVOIDS" ? profile[3].Items : [])
        {
            if (voids.Count == MaxVoids) return Missing(ReasonCode.SectionNotCovered, string.Create(CultureInfo.InvariantCulture, $"{called} has more than {MaxVoids} voids"));
            if (!Curve(inner, string.Create(CultureInfo.InvariantCulture, $"void {voids.Count + 1} of {called}")).TryGet(out var found, out var whyNot))
                return new Finding<ProfileShape>.Missing(whyNot);

            voids.Add(found.Value);
            followed = followed.Add(found.Source);
        }

        followed = [.. followed.Where(words => words.Length > 0)];
        if (RecognisedSection.Of(outer.Value, voids.ToImmutable()) is { } section)
            return Recognised(profile, called, section.Shapes, section.Position, section.Deviation, [.. followed, .. section.Notes]);
        if (OutlineFault.Of(outer.Value, voids.ToImmutable()) is { Length: > 0 } fault) return Missing(ReasonCode.SectionInvalid, $"{called}: {fault}");
        if (voids.Count == 0 && LetterProfile.Of(outer.Value) is { } letter) return Recognised(profile, called, [letter.Profile], letter.Position, letter.Deviation, followed);

        return General(profile, called, outer.Value, voids.ToImmutable(), followed);
    }

    private static Finding<ProfileShape>.Found Recognised(
        Part21Record profile, string called, ImmutableArray<CrossSection> shapes, Transform3 position, double deviation, ImmutableArray<string> notes)
    {
        var note = string.Create(CultureInfo.InvariantCulture, $"recognised from its drawn outline; largest deviation {deviation * 1e3:0.####} mm");
        var finding = new SectionFinding(shapes, Instances.Text(profile[1]), [note, .. notes]);
        return new Finding<ProfileShape>.Found(new ProfileShape(finding, position) { SourceWord = SourceWord }, called);
    }

    /// <summary>An outline of no special kind; its y and z are the axes it is drawn in.</summary>
    private static Finding<ProfileShape> General(Part21Record profile, string called, ClosedOutline outer, ImmutableArray<ClosedOutline> voids, ImmutableArray<string> notes)
    {
        var edges = outer.Edges.Length + voids.Sum(v => v.Edges.Length);
        var label = string.Create(CultureInfo.InvariantCulture, $"of {edges} edges{(voids.Length == 0 ? "" : voids.Length == 1 ? " with a void" : $" with {voids.Length} voids")}");
        if (edges > OutlineSection.MostVertices)
            return Missing(ReasonCode.SectionNotCovered, string.Create(CultureInfo.InvariantCulture, $"{called} is a general outline {label}; more than {OutlineSection.MostVertices} are not evaluated"));
        if (OutlineShapes.Of(label, outer, voids, out var centroid, out var fault) is not { } shape) return Missing(ReasonCode.SectionInvalid, $"{called}: {fault}");

        var finding = new SectionFinding([shape], Instances.Text(profile[1]), notes);
        var position = new Transform3(centroid, Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ);
        return new Finding<ProfileShape>.Found(new ProfileShape(finding, position) { SourceWord = SourceWord }, called);
    }

    private Finding<ClosedOutline> Curve(Part21Value reference, string called)
    {
        if (!instances.TryFollow(reference, out var record)) return NoCurve(ReasonCode.DamagedRecord, $"{called} refers to nothing");
        if (curves.ClosedPieces(record, out var within) is not { Count: > 0 } pieces)
            return NoCurve(ReasonCode.SectionNotCovered, string.Create(CultureInfo.InvariantCulture, $"{called} is drawn by {record.Keyword} #{record.Id}, which is not read or is damaged"));
        if (pieces.Exists(p => Math.Abs(p.Start.Z) > 0 || Math.Abs(p.End.Z) > 0)) return NoCurve(ReasonCode.SectionInvalid, $"{called} does not lie in a plane");

        var source = within is { } w ? string.Create(CultureInfo.InvariantCulture, $"{called} is followed by arcs, nowhere found further from it than {w * 1e3:0.#####} mm") : "";
        return ClosedOutline.From(pieces, out var fault) is { } outline
            ? new Finding<ClosedOutline>.Found(outline, source)
            : NoCurve(ReasonCode.SectionInvalid, $"{called}: {fault}");
    }

    private static Finding<ClosedOutline> NoCurve(ReasonCode code, string message) => new Finding<ClosedOutline>.Missing(new Reason(code, message));

    private static Finding<ProfileShape> Missing(ReasonCode code, string message) => new Finding<ProfileShape>.Missing(new Reason(code, message));
}
