using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc;
using MemberScan.Ifc.Members;
using MemberScan.Ifc.WriteBack.Earlier;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;
using MemberScan.Screening.Contacts;
using MemberScan.Screening.Frames;
using MemberScan.Screening.Presets;
using MemberScan.Screening.Record.Given;
using MemberScan.Screening.Sources;

namespace MemberScan.Screening;

/// <summary>A model as read: its candidates and their forces from model and tables. What screening and readiness both begin with.</summary>
internal sealed class ModelContents
{
    private static readonly string[] s_faults =
        ["SCR-0001", "SCR-0002", "SCR-0003", "SCR-0004", "SCR-0007", "SCR-0009", "SCR-0010", "SCR-0011"];

    private readonly ImmutableArray<ForcesSource> _sources;

    private ModelContents(
        IfcModel? model, BaseText text, MemberCatalog catalog, ImmutableArray<ForcesSource> sources, ImmutableArray<ForcesFile> files, ContactList? contacts) =>
        (Model, Text, Catalog, Files, _sources, Contacts) = (model, text, catalog, files, sources, contacts);

    /// <summary>The model; null when its schema is not read.</summary>
    public IfcModel? Model { get; }

    /// <summary>Its text, without a block of ours.</summary>
    public BaseText Text { get; }

    /// <summary>The records of that text.</summary>
    public Part21File File => Text.File;

    /// <summary>Its candidates, and what was passed over.</summary>
    public MemberCatalog Catalog { get; }

    /// <summary>The forces tables as read.</summary>
    public ImmutableArray<ForcesFile> Files { get; }

    /// <summary>The contacts that spans and supports of load presets come from; null when no preset is switched on.</summary>
    public ContactList? Contacts { get; }

    /// <summary>Whether results of an earlier run can be taken out, so that new ones may be written.</summary>
    public bool MayWriteModel { get; private init; }

    /// <summary>Reads model and tables; null, with an error in <paramref name="diagnostics"/>, when a table does not fit the model.</summary>
    public static ModelContents? Read(ScreeningRequest request, DiagnosticList diagnostics, IProgress<ScreeningProgress>? progress, CancellationToken cancellation)
    {
        progress?.Report(new("reading", 0));
        var text = BaseText.Of(request.Model, IfcModel.KeywordsAsked(request.Settings.Reading), diagnostics);
        var (file, stripped) = (text.File, text.Earlier);
        TellEarlier(stripped, diagnostics);
        if (file.HighestId > file.HighestPossibleId)
            diagnostics.Add("SCR-0008", Severity.Error, "The model numbers its instances so high that there is no room for ours; no checked model is written. Export it with smaller numbers.");
        cancellation.ThrowIfCancellationRequested();
        var model = IfcModel.Open(file, request.Settings.Reading, diagnostics);
        var named = NamedInTables(request.Tables);
        var catalog = model?.ReadMembers(element => named.Contains(element.GlobalId) || named.Contains(element.Tag) || model.HasForcesInSets(element)) ?? new MemberCatalog([], []);

        progress?.Report(new("forces", 0));
        var (fromTables, files) = ReadTables(request, catalog, diagnostics);
        var rules = request.Settings.Reading.Forces;
        var sources = Sources(request, model, catalog, fromTables, diagnostics, out var contacts);
        CaseCombinations.RefuseUnknown(rules, sources.SelectMany(s => s.All), diagnostics);
        return diagnostics.Items.Any(d => d.Severity == Severity.Error && s_faults.Contains(d.Code))
            ? null
            : new ModelContents(model, text, catalog, sources, files, contacts) { MayWriteModel = stripped.References.IsEmpty };
    }

    /// <summary>Results of the model are not used where they are tied to a line beside the section's centroid: about which they are is not said.</summary>
    private static ImmutableArray<MemberForces> Usable(ImmutableArray<MemberForces> forces, ImmutableArray<Member> members)
    {
        var eccentric = members.Where(m => m.CentroidOffset != (0, 0)).ToDictionary(m => m.Key, m => m.CentroidOffset, StringComparer.Ordinal);
        if (eccentric.Count == 0) return forces;

        return [.. forces.Select(f => !eccentric.TryGetValue(f.MemberKey, out var at) || f.Unusable is not null ? f : f with
        {
            Stations = [],
            Unusable = new Reason(ReasonCode.ConventionUnknown, string.Create(CultureInfo.InvariantCulture, $"the section's centroid lies at y {at.Y * 1e3:0.##} mm, z {at.Z * 1e3:0.##} mm from the line of the analytical member; whether its forces are about the one or the other is not said")),
        })];
    }

    /// <summary>The sources of forces in the order of the settings; load presets serve the members that no earlier source does.</summary>
    private static ImmutableArray<ForcesSource> Sources(
        ScreeningRequest request, IfcModel? model, MemberCatalog catalog, ImmutableArray<MemberForces> fromTables, DiagnosticList diagnostics, out ContactList? contacts)
    {
        contacts = null;
        var rules = request.Settings.Reading.Forces;
        var sources = ImmutableArray.CreateBuilder<ForcesSource>();
        if (!request.Tables.IsEmpty && !rules.From.Contains(ForceSource.Table))
            diagnostics.Add("SCR-0033", Severity.Warning, "The settings leave forces tables out (forces.from); the tables given are not used.");
        foreach (var source in rules.From)
        {
            switch (source)
            {
                case ForceSource.Table: Add("forces table", fromTables); break;
                case ForceSource.Results: Add("results in the model", WithTorsion(Usable(model?.ReadForces(catalog.Members) ?? [], catalog.Members), rules)); break;
                case ForceSource.PropertySets: Add("property sets", WithTorsion(model?.ReadForcesInSets(catalog.Members) ?? [], rules)); break;
                case ForceSource.Statics: Add("own frame analysis", model is null ? [] : OwnAnalysis.Of(model, catalog.Members, !IsAfterResults(rules), diagnostics)); break;
                default:
                    var served = sources.SelectMany(s => s.All).Select(f => f.MemberKey).ToHashSet(StringComparer.Ordinal);
                    Add("load presets", [.. AssumedForces.Of(catalog.Members, request.Settings.Loads, key => !served.Contains(key), out contacts).Values.SelectMany(f => f)]);
                    break;
            }
        }

        return sources.ToImmutable();

        void Add(string name, ImmutableArray<MemberForces> forces) => sources.Add(ForcesSource.Of(name, forces, rules, diagnostics));
    }

    /// <summary>Whether results in the model come before our own analysis, which then leaves analysis models with results alone.</summary>
    private static bool IsAfterResults(ForceRules rules) =>
        rules.From.IndexOf(ForceSource.Results) is var results and >= 0 && results < rules.From.IndexOf(ForceSource.Statics);

    /// <summary>The forces that are used for a candidate: of the first source that has any, with the combinations of its load cases.</summary>
    /// <param name="member">The candidate.</param>
    /// <param name="notes">What a reader must know of the choice.</param>
    public IReadOnlyList<MemberForces> ForcesOf(Member member, out IReadOnlyList<string> notes)
    {
        notes = [];
        var first = _sources.FirstOrDefault(s => s.Of(member).Count > 0);
        if (first is null) return [];

        var used = first.Of(member);
        notes = [.. _sources.Where(s => s != first).SelectMany(s => SourceConflicts.Notes(member, (used, first.Name), (s.Of(member), s.Name)))];
        return first.Combinations.With(member, used);
    }

    /// <summary>What names the model and how it was read.</summary>
    public ModelFacts Facts(ScreeningRequest request) => new(
        request.Model.Name, request.Model.Note, Text.Sha256, Text.Text.Length, string.Join(", ", File.Header.Schemas), Model?.SchemaText ?? "not read",
        Model?.ProjectName ?? "", File.Header.OriginatingSystem, File.Header.TimeStamp, File.ReadToEnd && Model is not null,
        Model is null ? [] : [.. Model.Units.Reported.Select(u => new UnitLine(u.UnitType, u.Text, u.Factor ?? 0, u.Source))]);

    private static ImmutableArray<MemberForces> WithTorsion(ImmutableArray<MemberForces> forces, ForceRules rules) =>
        rules.Torsion == TorsionAxis.NotStated ? forces : [.. forces.Select(f => f with { TorsionAxis = rules.Torsion })];

    private static void TellEarlier(EarlierResults earlier, DiagnosticList diagnostics)
    {
        if (!earlier.References.IsEmpty)
            diagnostics.Add("SCR-0023", Severity.Error, $"Other instances refer to results of an earlier run ({EarlierWords.Of(earlier.References)}), so those cannot be replaced; no checked model is written. Take the references out, or start from the model without results.");
        else if (earlier.Kind == EarlierKind.Changed)
            diagnostics.Add("SCR-0006", Severity.Warning, "The model carries an earlier result block, but has changed since it was written; the block is replaced all the same.");
        else if (earlier.Kind == EarlierKind.LinesBehind)
            diagnostics.Add("SCR-0021", Severity.Note, "Another program has written lines behind an earlier result block; its lines stay, the block is replaced.");
        else if (earlier.Kind == EarlierKind.Rewritten)
            diagnostics.Add("SCR-0022", Severity.Warning, $"Another program has written the model anew with results of an earlier run in it; {EarlierWords.Count(earlier.Instances)} recognised by set name, Program and RunId are replaced.");
    }

    private static HashSet<string> NamedInTables(ImmutableArray<ForcesTable> tables)
    {
        var named = new HashSet<string>(StringComparer.Ordinal);
        var last = "";
        foreach (var table in tables)
            foreach (var row in table.Rows)
            {
                // Rows of one member mostly follow each other, and a table has one string for each name.
                if (ReferenceEquals(row.Member, last)) continue;

                last = row.Member;
                if (named.Add(last) && last.LastIndexOf('/') is var slash and > 0) named.Add(last[..slash]);
            }

        return named;
    }

    private static (ImmutableArray<MemberForces> Forces, ImmutableArray<ForcesFile> Files) ReadTables(
        ScreeningRequest request, MemberCatalog catalog, DiagnosticList diagnostics)
    {
        var all = ImmutableArray.CreateBuilder<MemberForces>();
        var earlier = new Dictionary<(string Member, string Situation), MemberForces>();
        var files = ImmutableArray.CreateBuilder<ForcesFile>();
        if (request.Tables.IsEmpty) return ([], []);

        var reader = new TableForces(catalog.Members, request.Settings.Reading.Forces, diagnostics);
        foreach (var table in request.Tables)
        {
            var (forces, unknown) = reader.Read(table);
            foreach (var entry in forces)
            {
                if (!earlier.TryAdd((entry.MemberKey, entry.Situation.Name), entry))
                    diagnostics.Add("SCR-0007", Severity.Error, $"Situation '{entry.Situation.Name}' of '{entry.MemberKey}' stands in two places: {earlier[(entry.MemberKey, entry.Situation.Name)].Source} and {entry.Source}; give it once.");
                all.Add(entry);
            }

            var convention = table.Convention switch
            {
                ForceConvention.EndForces => "end-forces, stated in the table",
                ForceConvention.PositiveFace => "positive-face, stated in the table",
                _ => "positive-face, the default",
            };
            files.Add(new ForcesFile(table.FileName, table.Sha256, table.Rows.Length, unknown, convention));
        }

        return (all.ToImmutable(), files.ToImmutable());
    }
}
