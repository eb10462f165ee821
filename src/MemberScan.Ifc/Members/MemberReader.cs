using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Bodies;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Materials;
using MemberScan.Ifc.Schema;
using MemberScan.Ifc.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Members;

/// <summary>Finds the candidates of a model and reads each: section, length, axes, material, or the reason why not.</summary>
internal sealed class MemberReader(
    Instances instances, Relations relations, PlacementReader placements, BodyReader bodies, ProfileReader profiles, MaterialReader materials,
    AnalyticalMemberReader analytical, SchemaVersion schema, CandidateRules rules, bool recognisesMeshes, RoleGuess roles, DiagnosticList diagnostics)
{
    private const string NoBar = "no bar-like body of a covered section, and no forces";

    private readonly HashSet<string> _keys = new(StringComparer.Ordinal);
    private readonly Dictionary<(string Class, string Why), int> _passedOver = [];

    /// <summary>Reads all candidates in the order of the file.</summary>
    /// <param name="isNamed">Whether a table names the element, which makes it a candidate.</param>
    public MemberCatalog Read(Func<ElementIdentity, bool> isNamed)
    {
        var always = rules.Always.SelectMany(ClassNames.KeywordsOf).ToHashSet(StringComparer.Ordinal);
        var conditional = rules.WithBarBodyOrForces.SelectMany(ClassNames.KeywordsOf).ToHashSet(StringComparer.Ordinal);
        if (always.Contains("IFCSTRUCTURALCURVEMEMBER")) always.Add("IFCSTRUCTURALCURVEMEMBERVARYING");

        var members = ImmutableArray.CreateBuilder<Member>();
        foreach (var record in instances.File.InFileOrder(always.Concat(conditional), PartsOfRailings()))
        {
            var isAlways = always.Contains(record.Keyword) || IsPartOfRailing(record);
            if (record.IsDuplicate)
                PassOver(ClassNames.Spell(record.Keyword), "its instance number stands further up already; the first counts");
            else if (record.Keyword is "IFCSTRUCTURALCURVEMEMBER" or "IFCSTRUCTURALCURVEMEMBERVARYING")
                AddAnalytical(record, members, always);
            else
                AddPhysical(record, isAlways, isNamed, members);
        }

        var passed = _passedOver.OrderBy(p => p.Key.Class, StringComparer.Ordinal).ThenBy(p => p.Key.Why, StringComparer.Ordinal)
            .Select(p => new ClassCount(p.Key.Class, p.Value, p.Key.Why));
        return new MemberCatalog(members.ToImmutable(), [.. passed]);
    }

    // Whatever their class, they are candidates.
    private IEnumerable<Part21Record> PartsOfRailings()
    {
        foreach (var railing in instances.File.RecordsOf("IFCRAILING"))
            foreach (var id in relations.PartsOf(railing.Id))
                if (instances.File.TryFind(id, out var part))
                    yield return part;
    }

    private bool IsPartOfRailing(Part21Record record) =>
        relations.WholeOf(record.Id) is var whole and not 0 && instances.File.TryFind(whole, out var parent) && parent.Keyword == "IFCRAILING";

    private void AddPhysical(Part21Record record, bool isAlways, Func<ElementIdentity, bool> isNamed, ImmutableArray<Member>.Builder members)
    {
        var element = Identity(record);
        if (IsItsParts(record))
        {
            PassOver(element.Class, "its parts are the candidates");
            return;
        }

        // Most elements of a building are meshes of classes that count only with a bar: they are passed over without a look into the mesh.
        var isAsked = isAlways || relations.AnalyticalOf(record.Id).Count > 0 || relations.ActivitiesOn(record.Id).Count > 0 || isNamed(element);
        if (!isAsked && !recognisesMeshes && bodies.AreMeshes(record[6]))
        {
            PassOver(element.Class, NoBar);
            return;
        }

        var placed = placements.Placement(record[5]);
        var toProject = placed is Finding<Transform3>.Found found ? found.Value : Transform3.Identity;
        var read = record.IsDamaged ? [] : bodies.Read(record[6], toProject);
        var sweeps = read.OfType<Finding<BarBody>.Found>().ToList();

        // Beside a bar, short pieces such as base plates are no items.
        var bars = sweeps.FindAll(s => s.Value.IsBarLike) is { Count: > 0 } longer ? longer : sweeps;
        if (!isAsked && !bars.Exists(b => b.Value.IsBarLike) && !read.Any(IsUnreadSweep))
        {
            PassOver(element.Class, NoBar);
            return;
        }

        var key = KeyOf(element, record);
        if (bars.Count >= 2)
        {
            for (var i = 0; i < bars.Count; i++)
                members.Add(FromBar(record, element, $"{key}/{(i + 1).ToString(CultureInfo.InvariantCulture)}", i + 1, bars.Count, bars[i], read, placed));
        }
        else if (bars.Count == 1)
        {
            members.Add(WithProfileSet(record, FromBar(record, element, key, 0, 1, bars[0], read, placed)));
        }
        else
        {
            members.Add(WithTaper(record, WithoutBar(record, element, key, read)));
        }
    }

    /// <summary>Whether a body is a sweep of a covered section that could not be read to its end: it may be a bar, so it is not passed over.</summary>
    private static bool IsUnreadSweep(Finding<BarBody> body) => body is Finding<BarBody>.Missing
    {
        Why.Code: ReasonCode.LengthAmbiguous or ReasonCode.SectionInvalid or ReasonCode.WallOverRadius
            or ReasonCode.UnitMissing or ReasonCode.PlacementNotSupported or ReasonCode.DamagedRecord,
    };

    private Member FromBar(
        Part21Record record, ElementIdentity element, string key, int number, int count, Finding<BarBody>.Found bar,
        ImmutableArray<Finding<BarBody>> read, Finding<Transform3> placed)
    {
        var body = bar.Value;
        var section = body.Profile.Section;
        var notes = body.Notes;
        if (read.Length > count)
        {
            var whyOther = read.OfType<Finding<BarBody>.Missing>().FirstOrDefault()?.Why.Message ?? "short against their section";
            notes = notes.Add(string.Create(CultureInfo.InvariantCulture, $"the element has {read.Length - count} further bodies that are no bars and are not checked ({whyOther})"));
        }

        if (relations.HasOpenings(record.Id)) notes = notes.Add("openings are cut out of the element; the gross section is used");

        Finding<MemberAxes> axes = placed.TryGet(out var map, out var why)
            ? new Finding<MemberAxes>.Found(InProject(body.Axes, map.Value, ref notes), "body")
            : new Finding<MemberAxes>.Missing(why);
        return new Member
        {
            Key = key,
            Element = element,
            ItemNumber = number,
            ItemCount = count,
            Role = roles.Of(element, (axes as Finding<MemberAxes>.Found)?.Value, body.Length / body.Profile.LargestExtent),
            Section = new Finding<SectionFinding>.Found(section, body.Source),
            EndSection = body.EndSection,
            Length = new Finding<double>.Found(body.Length, body.LengthSource),
            Axes = axes,
            Material = materials.Read(record.Id, body.EndSection is { } end ? section with { Shapes = [.. section.Shapes, .. end.Shapes] } : section),
            BendRadii = body.BendRadii,
            IsStraight = body.IsStraight,
            Notes = notes,
        };
    }

    /// <summary>Maps axes to project coordinates; a placement that mirrors would make them left-handed, so y is turned round then.</summary>
    private static MemberAxes InProject(MemberAxes axes, Transform3 toProject, ref ImmutableArray<string> notes)
    {
        var (x, z) = (toProject.Direction(axes.X), toProject.Direction(axes.Z));
        if (toProject.Determinant < 0) notes = notes.Add("y is reversed: the placement mirrors");
        return new MemberAxes(toProject.Point(axes.Origin), x, z.Cross(x), z);
    }

    /// <summary>Adds the section of the material profile set where it differs from the body's: the less favourable decides.</summary>
    private Member WithProfileSet(Part21Record record, Member member)
    {
        var (sets, ends) = (materials.ProfilesOf(record.Id), materials.EndProfilesOf(record.Id));
        if (sets.IsEmpty || member.Section is not Finding<SectionFinding>.Found body) return member;
        if (sets.Length > 1 || ends.Length > 1) return member with { Notes = member.Notes.Add("the material profile set has several profiles; the body's section is used") };
        if (sets.AddRange(ends).OfType<Finding<ProfileShape>.Missing>().FirstOrDefault() is { } unread)
            return member with { Notes = member.Notes.Add($"the profile of the material profile set is not read ({unread.Why.Message}); the body's section is used") };

        if (member.EndSection is not null) return member with { Notes = member.Notes.Add("the body tapers; its sections are used, not those of the material profile set") };

        var own = body.Value.Shapes;
        var named = sets.AddRange(ends).Cast<Finding<ProfileShape>.Found>().ToList();
        var different = named.SelectMany(n => n.Value.Section.Shapes).Where(s => !own.Any(o => SectionAlike.Of(s, o))).ToImmutableArray();
        if (different.IsEmpty) return member with { Section = body with { Source = $"{body.Source}; material profile set agrees" } };

        var note = $"body and material profile set differ ({own[0].Designation} against {different[0].Designation}); the less favourable decides";
        var both = body.Value with { Shapes = own.AddRange(different), Notes = body.Value.Notes.Add(note) };
        return member with
        {
            Section = new Finding<SectionFinding>.Found(both, $"{body.Source}; material profile set, {string.Join(" to ", named.Select(n => n.Source))}"),
            Material = materials.Read(record.Id, both),
            Notes = member.Notes.Add(note),
        };
    }

    private Member WithoutBar(Part21Record record, ElementIdentity element, string key, ImmutableArray<Finding<BarBody>> read)
    {
        var notes = ImmutableArray<string>.Empty;
        var offset = (0.0, 0.0);
        var section = record.IsDamaged
            ? new Finding<SectionFinding>.Missing(new Reason(ReasonCode.DamagedRecord, $"the record of the element #{record.Id} is damaged"))
            : SectionOfSet(record, read, ref notes, out offset);
        var lines = relations.AnalyticalOf(record.Id).Select(analytical.Read).OfType<AnalyticalMember>().ToList();
        return new Member
        {
            Key = key,
            Element = element,
            ItemNumber = 0,
            ItemCount = 1,
            Role = roles.Of(element, lines.Count == 1 ? (lines[0].Axes as Finding<MemberAxes>.Found)?.Value : null, null),
            Section = section,
            Length = lines.Count == 1 ? lines[0].Length : NoLength("the member has no swept body that gives its length"),
            Axes = lines.Count == 1 ? lines[0].Axes : NoAxes("the member has no swept body that gives its axes"),
            Material = materials.Read(record.Id, (section as Finding<SectionFinding>.Found)?.Value),
            CentroidOffset = offset,
            Notes = notes,
        };
    }

    private Finding<SectionFinding> SectionOfSet(Part21Record record, ImmutableArray<Finding<BarBody>> read, ref ImmutableArray<string> notes, out (double Y, double Z) offset)
    {
        offset = default;
        var sets = materials.ProfilesOf(record.Id);
        if (sets.Length > 1) return NoSection(ReasonCode.SectionNotCovered, "the material profile set has several profiles");
        if (sets.Length == 1)
        {
            if (!sets[0].TryGet(out var set, out var whyNoSet)) return new Finding<SectionFinding>.Missing(whyNoSet);
            if (set.Value.IsMoved) return Moved(set);

            if (!read.IsEmpty) notes = notes.Add($"the body gives no section ({((Finding<BarBody>.Missing)read[0]).Why.Message}); the material profile set does");
            notes = notes.AddRange(set.Value.Section.Notes);
            if (!materials.RunsAlongCentroid(record.Id)) offset = OffsetOf(set.Value);
            return new Finding<SectionFinding>.Found(set.Value.Section, $"material profile set, {set.Source}");
        }

        return read.IsEmpty
            ? NoSection(ReasonCode.NoSection, $"{element(record)} has no body and no material profile set")
            : new Finding<SectionFinding>.Missing(((Finding<BarBody>.Missing)read[0]).Why);

        static string element(Part21Record record) => $"{ClassNames.Spell(record.Keyword)} #{record.Id}";
    }

    /// <summary>Adds the section at the end where the material profile set tapers and no body shows the member.</summary>
    private Member WithTaper(Part21Record record, Member member)
    {
        if (!materials.IsTapering(record.Id) || member.Section is not Finding<SectionFinding>.Found start) return member;
        if (materials.EndProfilesOf(record.Id) is not [var only]) return Refused("the material profile set tapers to none, or to several profiles");
        if (!only.TryGet(out var end, out var why)) return member with { Section = new Finding<SectionFinding>.Missing(why) };
        if (end.Value.IsMoved) return member with { Section = Moved(end) };
        if (SectionAlike.Of(start.Value.Shape, end.Value.Section.Shape)) return member;

        var words = $"the material profile set tapers from {start.Value.Shape.Designation} to {end.Value.Section.Shape.Designation} ({end.Source})";
        var offset = materials.RunsAlongCentroid(record.Id) ? default : OffsetOf(end.Value);
        if (!materials.KeepsItsLine(record.Id) || offset != member.CentroidOffset) return Refused($"{words}, shifted from the member's line otherwise than at its start");

        // Without a length, which ends in a reason of its own, the slope is not known.
        var length = (member.Length as Finding<double>.Found)?.Value ?? double.PositiveInfinity;
        if (TaperedEnds.WhyNot(start.Value.Shape, end.Value.Section.Shape, length) is { Length: > 0 } fault) return Refused($"{words}; {fault}");

        return member with
        {
            EndSection = end.Value.Section,
            Material = materials.Read(record.Id, start.Value with { Shapes = [.. start.Value.Shapes, .. end.Value.Section.Shapes] }),
            Notes = member.Notes.Add(words),
        };

        Member Refused(string message) => member with { Section = NoSection(ReasonCode.SectionNotCovered, message) };
    }

    /// <summary>A profile turned or shifted by its own position, which only a body can show in space.</summary>
    private static Finding<SectionFinding> Moved(Finding<ProfileShape>.Found profile) =>
        NoSection(ReasonCode.SectionNotCovered, $"{profile.Source} is turned or shifted by its position, and no body shows how it lies in the member");

    private void AddAnalytical(Part21Record record, ImmutableArray<Member>.Builder members, HashSet<string> always)
    {
        var isRepresented = relations.PhysicalOf(record.Id).Any(id =>
            instances.File.TryFind(id, out var physical) && (always.Contains(physical.Keyword) || IsConditional(physical.Keyword)) && !IsItsParts(physical));
        if (isRepresented)
        {
            PassOver(ClassNames.Spell(record.Keyword), "its physical element is the candidate");
            return;
        }

        if (record.Keyword == "IFCSTRUCTURALCURVEMEMBERVARYING" && relations.PartsOf(record.Id).Count > 0)
        {
            PassOver(ClassNames.Spell(record.Keyword), "its parts are the candidates");
            return;
        }

        var element = Identity(record);
        var line = analytical.Read(record.Id)!;
        var notes = ImmutableArray<string>.Empty;
        var offset = (0.0, 0.0);
        var section = record.IsDamaged
            ? NoSection(ReasonCode.DamagedRecord, $"the record of the analytical member #{record.Id} is damaged")
            : record.Keyword == "IFCSTRUCTURALCURVEMEMBERVARYING" ? NoSection(ReasonCode.SectionNotCovered, "the analytical member varies along its length")
            : AnalyticalSection(record, ref notes, out offset);
        members.Add(WithTaper(record, new Member
        {
            Key = KeyOf(element, record),
            Element = element,
            ItemNumber = 0,
            ItemCount = 1,
            Role = roles.Of(element, (line.Axes as Finding<MemberAxes>.Found)?.Value, null),
            Section = section,
            Length = line.Length,
            Axes = line.Axes,
            Material = materials.Read(record.Id, (section as Finding<SectionFinding>.Found)?.Value),
            CentroidOffset = offset,
            Notes = notes,
        }));
    }

    /// <summary>Whether an element is a railing without a body of its own, whose parts are the candidates.</summary>
    private bool IsItsParts(Part21Record record) => record.Keyword == "IFCRAILING" && record[6].IsEmpty && relations.PartsOf(record.Id).Count > 0;

    private bool IsConditional(string keyword) => rules.WithBarBodyOrForces.SelectMany(ClassNames.KeywordsOf).Contains(keyword, StringComparer.Ordinal);

    private Finding<SectionFinding> AnalyticalSection(Part21Record record, ref ImmutableArray<string> notes, out (double Y, double Z) offset)
    {
        offset = default;
        var related = relations.ProfilePropertiesOf(record.Id);
        if (related.Count > 1) return NoSection(ReasonCode.SectionNotCovered, "several profile properties are related to the analytical member, so its section varies along its length");

        foreach (var (properties, _) in related)
        {
            if (!instances.File.TryFind(properties, out var p) || !instances.TryFollow(p[1], out var profile)) continue;
            if (!profiles.Read(profile).TryGet(out var found, out var why)) return new Finding<SectionFinding>.Missing(why);
            if (found.Value.IsMoved) return Moved(found);

            notes = notes.AddRange(found.Value.Section.Notes);
            offset = OffsetOf(found.Value);
            return new Finding<SectionFinding>.Found(found.Value.Section, $"profile properties #{properties}, {found.Source}");
        }

        return SectionOfSet(record, [], ref notes, out offset);
    }

    /// <summary>Centroid of a profile from its origin, which lies on the member's line [m].</summary>
    private static (double Y, double Z) OffsetOf(ProfileShape profile)
    {
        var hair = 1e-6 * profile.LargestExtent;
        var at = profile.Position.Origin;
        return Math.Abs(at.X) <= hair && Math.Abs(at.Y) <= hair ? default : (at.X, at.Y);
    }

    private ElementIdentity Identity(Part21Record record)
    {
        var type = relations.TypeOf(record.Id) is var id and not 0 && instances.File.TryFind(id, out var found) ? found : default;
        var predefined = PredefinedTypeIndex(record.Keyword) is var index and > 0 ? Instances.Literal(record[index]) : "";
        if (predefined is "" or "NOTDEFINED" && type.Id != 0) predefined = Instances.Literal(type[9]);

        var place = new PlaceReader(instances, relations);
        var tag = record.Keyword.StartsWith("IFCSTRUCTURAL", StringComparison.Ordinal) ? "" : Instances.Text(record[7]);
        return new ElementIdentity(
            record.Id, Instances.Text(record[0]), ClassNames.Spell(record.Keyword), predefined is "NOTDEFINED" ? "" : predefined,
            Instances.Text(record[2]), tag, type.Id != 0 ? Instances.Text(type[2]) : "", place.Storey(record.Id))
        {
            StoreyPath = place.StoreyPath(record.Id),
            Assembly = place.Assembly(record.Id),
            Layer = place.Layer(record[6]),
        };
    }

    private int PredefinedTypeIndex(string keyword) => keyword switch
    {
        "IFCRAILING" => 8,
        "IFCREINFORCINGBAR" => 12,
        "IFCTENDON" => 9,
        "IFCMECHANICALFASTENER" => 10,
        "IFCBEAM" or "IFCBEAMSTANDARDCASE" or "IFCCOLUMN" or "IFCCOLUMNSTANDARDCASE" or "IFCMEMBER" or "IFCMEMBERSTANDARDCASE"
            or "IFCBUILDINGELEMENTPROXY" or "IFCDISCRETEACCESSORY" or "IFCPIPESEGMENT" or "IFCCABLESEGMENT" or "IFCPLATE" => schema == SchemaVersion.Ifc2x3 ? 0 : 8,
        _ => 0,
    };

    private string KeyOf(ElementIdentity element, Part21Record record)
    {
        var key = element.GlobalId.Length > 0 ? element.GlobalId : string.Create(CultureInfo.InvariantCulture, $"#{record.Id}");
        if (_keys.Add(key)) return key;

        diagnostics.Add("IFC-0010", Severity.Warning, "Two elements have the same GlobalId; the later one is keyed by GlobalId and STEP id.", record.Span);
        key = string.Create(CultureInfo.InvariantCulture, $"{key}#{record.Id}");
        _keys.Add(key);
        return key;
    }

    private void PassOver(string className, string why) =>
        _passedOver[(className, why)] = _passedOver.GetValueOrDefault((className, why)) + 1;

    private static Finding<SectionFinding> NoSection(ReasonCode code, string message) => new Finding<SectionFinding>.Missing(new Reason(code, message));

    private static Finding<double> NoLength(string message) => new Finding<double>.Missing(new Reason(ReasonCode.LengthAmbiguous, message));

    private static Finding<MemberAxes> NoAxes(string message) => new Finding<MemberAxes>.Missing(new Reason(ReasonCode.AxesUnknown, message));
}
