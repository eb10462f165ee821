using System.Collections.Concurrent;
using System.Collections.Immutable;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.States;
using MemberScan.Mechanics.Stress;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Screening.Checking;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Sheets;

/// <summary>Makes what member sheets draw, when a sheet is drawn and not before; from the same stress fields as the verdicts.</summary>
public sealed class SheetMaker
{
    /// <summary>Most situations whose forces are drawn along the member, the worst first.</summary>
    public const int MostLines = 6;

    private readonly ModelContents _contents;
    private readonly SectionLibrary _library;
    private readonly Dictionary<string, Member> _members;
    private readonly ConcurrentDictionary<StressField, Lazy<SectionSamples>> _samples = new(ReferenceEqualityComparer.Instance);
    private readonly Settings _settings;

    internal SheetMaker(ModelContents contents, SectionLibrary library, Settings settings)
    {
        (_contents, _library) = (contents, library);
        _members = contents.Catalog.Members.DistinctBy(m => m.Key, StringComparer.Ordinal).ToDictionary(m => m.Key, StringComparer.Ordinal);
        _settings = settings;
    }

    /// <summary>The samples of the section that decides a candidate; null where no stress was found or the field is not at hand.</summary>
    public SectionSamples? SamplesOf(MemberResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        return FieldOf(result) is { } field ? Samples(field) : null;
    }

    /// <summary>What the sheet of a candidate draws; null where no stress was found.</summary>
    /// <param name="result">The candidate.</param>
    /// <param name="isWhole">Whether every situation is drawn, with the utilization along the member; otherwise the forces of the governing one alone.</param>
    public SheetData? Of(MemberResult result, bool isWhole = true)
    {
        ArgumentNullException.ThrowIfNull(result);
        if (result.Governing is not { } governing || FieldOf(result) is not { } field) return null;

        var samples = Samples(field);
        var forces = governing.StressForces ?? governing.Forces;
        return new SheetData
        {
            Samples = samples,
            Whole = Part(field, governing, null, forces),
            Alone = [.. Enum.GetValues<ForceComponent>().Select(c => Part(field, governing, c, Only(forces, c)))],
            Plane = samples.Plane(forces),
            State = PointState.Of(governing.Point.State),
            Lines = Lines(result, governing, field, isWhole),
        };
    }

    private SectionSamples Samples(StressField field) =>
        _samples.GetOrAdd(field, static f => new Lazy<SectionSamples>(() => SectionSamples.Of(f))).Value;

    private static FieldPart Part(StressField field, Governing governing, ForceComponent? component, SectionForces forces) => new(
        component, forces, component is null ? governing.Point.State : field.At(forces, governing.Point.Y, governing.Point.Z));

    private static SectionForces Only(in SectionForces f, ForceComponent component) => component switch
    {
        ForceComponent.N => new(f.N, 0, 0, 0, 0, 0),
        ForceComponent.Vy => new(0, f.Vy, 0, 0, 0, 0),
        ForceComponent.Vz => new(0, 0, f.Vz, 0, 0, 0),
        ForceComponent.T => new(0, 0, 0, f.T, 0, 0),
        ForceComponent.My => new(0, 0, 0, 0, f.My, 0),
        _ => new(0, 0, 0, 0, 0, f.Mz),
    };

    /// <summary>The field that decided: section and shear model as the record names them.</summary>
    private StressField? FieldOf(MemberResult result)
    {
        if (result.Governing is not { } governing || !_members.TryGetValue(result.Key, out var member)) return null;
        if (ShapeOf(member, result, governing) is not { } shape || member.Material.Poisson is not Finding<double>.Found poisson) return null;

        var model = governing.ShearModel == "elasticity" ? ShearModel.Elasticity : ShearModel.Elementary;
        return _library.Field(shape, model, poisson.Value).Field;
    }

    private static CrossSection? ShapeOf(Member member, MemberResult result, Governing governing)
    {
        if (member.Section is not Finding<SectionFinding>.Found section) return null;

        var taper = member.EndSection is { } end ? Taper.Of(section.Value.Shape, end.Shape) : null;
        return taper is null
            ? section.Value.Shapes.Concat(member.EndSection?.Shapes ?? []).FirstOrDefault(s => s.Designation == governing.Section)
            : taper.At(Math.Clamp((governing.StressStation ?? governing.Station) / result.Length!.Value, 0, 1));
    }

    private ImmutableArray<SituationLine> Lines(MemberResult result, Governing governing, StressField field, bool isWhole)
    {
        var member = _members[result.Key];
        var forces = _contents.ForcesOf(member, out _);
        var isPrismatic = member.EndSection is null;
        var lines = ImmutableArray.CreateBuilder<SituationLine>();
        var builder = new LineBuilder(_settings.LimitsOf(member).Basis);
        foreach (var situation in result.Situations.OrderByDescending(s => s.Situation == governing.Situation && s.Kind == governing.Kind))
        {
            if (lines.Count == (isWhole ? MostLines : 1)) break;
            if (forces.FirstOrDefault(f => f.Situation.Name == situation.Situation) is not { Unusable: null } found || found.Stations.IsEmpty) continue;
            if (builder.Of(found, situation, result, governing, isPrismatic ? field : null, isWhole) is { } line) lines.Add(line);
        }

        return lines.ToImmutable();
    }
}
