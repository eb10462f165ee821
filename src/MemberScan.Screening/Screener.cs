using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc;
using MemberScan.Ifc.Members;
using MemberScan.Ifc.WriteBack;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;
using MemberScan.Screening.Checking;
using MemberScan.Screening.Record;

namespace MemberScan.Screening;

/// <summary>The one place that joins reading and checks: model and forces in, verdicts out.</summary>
public static class Screener
{
    /// <summary>Screens a model.</summary>
    /// <param name="request">What to work from.</param>
    /// <param name="diagnostics">Takes all findings; errors with codes <c>SCR-…</c> mean that a table does not fit the model.</param>
    /// <param name="progress">Told how far the run is; may be null.</param>
    /// <param name="cancellation">Stops the run.</param>
    /// <returns>The outcome; null when a forces table does not fit the model.</returns>
    public static ScreeningOutcome? Run(
        ScreeningRequest request, DiagnosticList diagnostics, IProgress<ScreeningProgress>? progress = null, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(request);
        ArgumentNullException.ThrowIfNull(diagnostics);
        progress?.Report(new("reading", 0));
        var stripped = ResultBlock.Strip(request.ModelBytes);
        if (stripped is { HadBlock: true, IsIntact: false })
            diagnostics.Add("SCR-0006", Severity.Warning, "The model carries an earlier result block, but has changed since it was written; the block is replaced all the same.");

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
        if (diagnostics.Items.Any(d => d is { Severity: Severity.Error, Code: "SCR-0001" or "SCR-0002" or "SCR-0003" or "SCR-0004" or "SCR-0007" })) return null;

        cancellation.ThrowIfCancellationRequested();
        var library = new SectionLibrary();
        var results = Check(request, catalog.Members, fromTables, fromModel, library, progress, cancellation);
        var record = Record(request, model, file, stripped.Base.Span, catalog, results, files, library, diagnostics);
        return new ScreeningOutcome(record, model, RunIdentity.CreationDate(request.TimestampIsGiven ? request.Timestamp : "", file.Header.TimeStamp));
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
                Model.Rules.ForceConvention.EndForces => "end-forces, stated in the table",
                Model.Rules.ForceConvention.PositiveFace => "positive-face, stated in the table",
                _ => "positive-face, the default",
            };
            files.Add(new ForcesFile(table.FileName, table.Sha256, table.Rows.Length, unknown, convention));
        }

        return (byMember, files.ToImmutable());
    }

    private static ImmutableArray<MemberResult> Check(
        ScreeningRequest request, ImmutableArray<Member> members, Dictionary<string, List<MemberForces>> fromTables,
        ImmutableArray<MemberForces> fromModel, SectionLibrary library, IProgress<ScreeningProgress>? progress, CancellationToken cancellation)
    {
        var modelForces = fromModel.ToLookup(f => f.MemberKey, StringComparer.Ordinal);
        var checker = new MemberChecker(library, request.Settings.Basis, request.Settings.LengthFactor);
        var results = new MemberResult[members.Length];
        var done = 0;
        Parallel.For(0, members.Length, new ParallelOptions { CancellationToken = cancellation }, i =>
        {
            var key = members[i].Key;
            var inModel = modelForces[key].ToList();
            var hasTable = fromTables.TryGetValue(key, out var inTables);
            string[] notes = hasTable && inModel.Count > 0 ? ["results in the model are not used for this member: the forces table comes first"] : [];
            results[i] = checker.Check(members[i], hasTable ? inTables! : inModel, notes);
            var count = Interlocked.Increment(ref done);
            if (count % 64 == 0) progress?.Report(new("checking", (double)count / members.Length));
        });
        progress?.Report(new("checking", 1));
        return [.. results];
    }

    private static ScreeningRecord Record(
        ScreeningRequest request, IfcModel? model, Part21File file, ReadOnlySpan<byte> baseText, MemberCatalog catalog,
        ImmutableArray<MemberResult> results, ImmutableArray<ForcesFile> files, SectionLibrary library, DiagnosticList diagnostics)
    {
        var sha = ResultBlock.Sha256(baseText);
        var settings = request.Settings;
        var facts = new ModelFacts(
            request.ModelName, request.Container, sha, baseText.Length, string.Join(", ", file.Header.Schemas), model?.SchemaText ?? "not read",
            model?.ProjectName ?? "", file.Header.OriginatingSystem, file.Header.TimeStamp, file.ReadToEnd && model is not null,
            model is null ? [] : [.. model.Units.Reported.Select(u => new UnitLine(u.UnitType, u.Text, u.Factor ?? 0, u.Source))]);
        return new ScreeningRecord
        {
            Version = request.Version,
            RunId = RunIdentity.RunId(sha, files.Select(f => f.Sha256), settings, request.Version),
            Timestamp = request.Timestamp,
            Model = facts,
            ForcesFiles = files,
            Basis = [BasisLine("service", settings.Basis.Service, Basis.Default.Service), BasisLine("design", settings.Basis.Design, Basis.Default.Design)],
            Settings = [.. settings.Effective.Select(s => new SettingLine(s.Key, s.Value, s.IsDefault))],
            Cautions = Cautions.Lines,
            PassedOver = [.. catalog.PassedOver.Select(p => new PassedOver(p.Class, p.Count, p.Why))],
            Sections = SectionsInUse(catalog.Members, library),
            Members = results,
            Findings = [.. diagnostics.Items.Select(d => new FindingLine(d.Code, d.Severity, d.Message, d.Span?.ToString() ?? "", diagnostics.CountOf(d)))],
            Counts = new VerdictCounts(
                results.Count(r => r.Verdict == Verdict.WithinLimit), results.Count(r => r.Verdict == Verdict.Overstressed), results.Count(r => r.Verdict == Verdict.NotChecked)),
            HasDamage = file.HasDamage,
        };
    }

    private static BasisLine BasisLine(string kind, StressLimit? limit, StressLimit? standard) =>
        new(kind, LimitInForce.Words(limit), LimitInForce.Clause(limit), limit == standard);

    private static ImmutableArray<SectionFacts> SectionsInUse(ImmutableArray<Member> members, SectionLibrary library)
    {
        var uses = members
            .Where(m => m.Section is Finding<SectionFinding>.Found)
            .SelectMany(m => ((Finding<SectionFinding>.Found)m.Section).Value.Shapes.Select(shape => (Shape: shape, Poisson: ((Finding<double>.Found)m.Material.Poisson).Value)))
            .Where(use => NumberRange.Holds(use.Shape))
            .GroupBy(use => use.Shape)
            .OrderBy(group => group.Key.Designation, StringComparer.Ordinal);
        return [.. uses.Select(group => Facts(group.Key, group.Count(), group.First().Poisson, library))];
    }

    private static SectionFacts Facts(CrossSection shape, int members, double poisson, SectionLibrary library)
    {
        var p = library.Properties(shape);
        return new SectionFacts(
            shape.Designation, members, p.Area, p.Iy, p.Iz, p.WelY, p.WelZ, p.J, p.JSource, p.Wt,
            Closure(library.Field(shape, ShearModel.Elementary, poisson)), Closure(library.Field(shape, ShearModel.Elasticity, poisson)));
    }

    private static string Closure((StressField? Field, string WhyNot) entry)
    {
        if (entry.Field is not { } field) return entry.WhyNot;

        var c = field.Closure;
        return field.Model == ShearModel.Elasticity
            ? string.Create(CultureInfo.InvariantCulture, $"ν = {field.Poisson:0.###}: largest error {c.LargestError:0.0E+0}")
            : string.Create(CultureInfo.InvariantCulture, $"N {c.N:0.####}, Vy {c.Vy:0.####}, Vz {c.Vz:0.####}, T {(field.CarriesTorsion ? c.T.ToString("0.####", CultureInfo.InvariantCulture) : "none")}, My {c.My:0.####}, Mz {c.Mz:0.####}");
    }
}
