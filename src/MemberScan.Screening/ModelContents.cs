using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc;
using MemberScan.Ifc.Members;
using MemberScan.Ifc.WriteBack;
using MemberScan.Ifc.WriteBack.Earlier;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;
using MemberScan.Part21;
using MemberScan.Screening.Record;

namespace MemberScan.Screening;

/// <summary>A model as read: its candidates and their forces from model and tables. What screening and readiness both begin with.</summary>
internal sealed class ModelContents
{
    private readonly Dictionary<string, List<MemberForces>> _fromTables;
    private readonly ILookup<string, MemberForces> _fromModel;
    private readonly ReadOnlyMemory<byte> _baseText;

    private ModelContents(
        IfcModel? model, Part21File file, ReadOnlyMemory<byte> baseText, MemberCatalog catalog, ImmutableArray<MemberForces> fromModel,
        Dictionary<string, List<MemberForces>> fromTables, ImmutableArray<ForcesFile> files)
    {
        (Model, File, _baseText, Catalog, Files, _fromTables) = (model, file, baseText, catalog, files, fromTables);
        _fromModel = fromModel.ToLookup(f => f.MemberKey, StringComparer.Ordinal);
    }

    /// <summary>The model; null when its schema is not read.</summary>
    public IfcModel? Model { get; }

    /// <summary>Its text, without a block of ours.</summary>
    public Part21File File { get; }

    /// <summary>Its candidates, and what was passed over.</summary>
    public MemberCatalog Catalog { get; }

    /// <summary>The forces tables as read.</summary>
    public ImmutableArray<ForcesFile> Files { get; }

    /// <summary>Whether results of an earlier run can be taken out, so that new ones may be written.</summary>
    public bool MayWriteModel { get; private init; }

    /// <summary>Reads model and tables; null, with an error in <paramref name="diagnostics"/>, when a table does not fit the model.</summary>
    public static ModelContents? Read(ScreeningRequest request, DiagnosticList diagnostics, IProgress<ScreeningProgress>? progress, CancellationToken cancellation)
    {
        progress?.Report(new("reading", 0));
        var stripped = EarlierResults.Find(request.ModelBytes, request.ModelName);
        TellEarlier(stripped, diagnostics);
        var file = Part21File.Read(stripped.Base, request.ModelName, diagnostics);
        if (file.HighestId > ScreeningOutcome.MaxInstanceId)
            diagnostics.Add("SCR-0008", Severity.Error, "The model numbers its instances so high that there is no room for ours; no checked model is written. Export it with smaller numbers.");
        cancellation.ThrowIfCancellationRequested();
        var model = IfcModel.Open(file, request.Settings.Reading, diagnostics);
        var named = NamedInTables(request.Tables);
        var catalog = model?.ReadMembers(element => named.Contains(element.GlobalId) || named.Contains(element.Tag)) ?? new MemberCatalog([], []);

        progress?.Report(new("forces", 0));
        var fromModel = model?.ReadForces(catalog.Members) ?? [];
        var (fromTables, files) = ReadTables(request, catalog, diagnostics);
        return diagnostics.Items.Any(d => d is { Severity: Severity.Error, Code: "SCR-0001" or "SCR-0002" or "SCR-0003" or "SCR-0004" or "SCR-0007" })
            ? null
            : new ModelContents(model, file, stripped.Base, catalog, fromModel, fromTables, files) { MayWriteModel = stripped.References.IsEmpty };
    }

    /// <summary>The forces that are used for a candidate: those of tables before those of the model.</summary>
    /// <param name="member">The candidate.</param>
    /// <param name="notes">What a reader must know of the choice.</param>
    public IReadOnlyList<MemberForces> ForcesOf(Member member, out IReadOnlyList<string> notes)
    {
        var inModel = _fromModel[member.Key].ToList();
        var hasTable = _fromTables.TryGetValue(member.Key, out var inTables);
        notes = hasTable && inModel.Count > 0 ? ["results in the model are not used for this member: the forces table comes first"] : [];
        return hasTable ? inTables! : inModel;
    }

    /// <summary>What names the model and how it was read.</summary>
    public ModelFacts Facts(ScreeningRequest request) => new(
        request.ModelName, request.Container, ResultBlock.Sha256(_baseText.Span), _baseText.Length, string.Join(", ", File.Header.Schemas), Model?.SchemaText ?? "not read",
        Model?.ProjectName ?? "", File.Header.OriginatingSystem, File.Header.TimeStamp, File.ReadToEnd && Model is not null,
        Model is null ? [] : [.. Model.Units.Reported.Select(u => new UnitLine(u.UnitType, u.Text, u.Factor ?? 0, u.Source))]);

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
        foreach (var table in tables)
            foreach (var row in table.Rows)
            {
                named.Add(row.Member);
                if (row.Member.LastIndexOf('/') is var slash and > 0) named.Add(row.Member[..slash]);
            }

        return named;
    }

    private static (Dictionary<string, List<MemberForces>> Forces, ImmutableArray<ForcesFile> Files) ReadTables(
        ScreeningRequest request, MemberCatalog catalog, DiagnosticList diagnostics)
    {
        var byMember = new Dictionary<string, List<MemberForces>>(StringComparer.Ordinal);
        var files = ImmutableArray.CreateBuilder<ForcesFile>();
        if (request.Tables.IsEmpty) return (byMember, []);

        var reader = new TableForces(catalog.Members, request.Settings.Reading.Forces, diagnostics);
        foreach (var table in request.Tables)
        {
            var (forces, unknown) = reader.Read(table);
            foreach (var entry in forces)
            {
                if (!byMember.TryGetValue(entry.MemberKey, out var list)) byMember[entry.MemberKey] = list = [];
                if (list.Find(f => f.Situation.Name == entry.Situation.Name) is { } earlier)
                    diagnostics.Add("SCR-0007", Severity.Error, $"Situation '{entry.Situation.Name}' of '{entry.MemberKey}' stands in two places: {earlier.Source} and {entry.Source}; give it once.");
                list.Add(entry);
            }

            var convention = table.Convention switch
            {
                ForceConvention.EndForces => "end-forces, stated in the table",
                ForceConvention.PositiveFace => "positive-face, stated in the table",
                _ => "positive-face, the default",
            };
            files.Add(new ForcesFile(table.FileName, table.Sha256, table.Rows.Length, unknown, convention));
        }

        return (byMember, files.ToImmutable());
    }
}
