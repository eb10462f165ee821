using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Model;
using MemberScan.Model.Limits;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Checking;
using MemberScan.Screening.Checking.Rules;
using MemberScan.Screening.Contacts;
using MemberScan.Screening.Decisions;
using MemberScan.Screening.Record;
using MemberScan.Screening.Record.Given;
using MemberScan.Screening.Sheets;

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
        if (ModelContents.Read(request, diagnostics, progress, cancellation) is not { } contents) return null;

        cancellation.ThrowIfCancellationRequested();
        var library = new SectionLibrary();
        var results = DecisionCarrier.Carry(Check(request, contents, library, progress, cancellation), request.Decisions, request.DecidedOn, diagnostics);
        var record = Record(request, contents, results, library, diagnostics);
        return new ScreeningOutcome(record, contents.MayWriteModel ? contents.Model : null, contents.Text, RunIdentity.CreationDate(request.TimestampIsGiven ? request.Timestamp : "", contents.File.Header.TimeStamp))
        {
            WithSetTemplate = request.WithSetTemplate,
            Sheets = new SheetMaker(contents, library, request.Settings),
        };
    }

    private static ImmutableArray<MemberResult> Check(
        ScreeningRequest request, ModelContents contents, SectionLibrary library, IProgress<ScreeningProgress>? progress, CancellationToken cancellation)
    {
        var members = contents.Catalog.Members;
        var contacts = new Lazy<ContactList?>(() => contents.Contacts ?? ContactFinder.Find(members, request.Settings.Loads.ContactTolerance));
        var checker = new MemberChecker(library, request.Settings, contacts);
        var marker = new InputMarker(request.Settings);
        var results = new MemberResult[members.Length];
        var done = 0;
        Parallel.For(0, members.Length, new ParallelOptions { CancellationToken = cancellation }, i =>
        {
            var forces = contents.ForcesOf(members[i], out var notes);
            results[i] = checker.Check(members[i], forces, notes) with { Inputs = marker.Of(members[i], forces) };
            var count = Interlocked.Increment(ref done);
            if (count % 64 == 0) progress?.Report(new("checking", (double)count / members.Length));
        });
        progress?.Report(new("checking", 1));
        return [.. results];
    }

    private static ScreeningRecord Record(
        ScreeningRequest request, ModelContents contents, ImmutableArray<MemberResult> results, SectionLibrary library, DiagnosticList diagnostics)
    {
        var settings = request.Settings;
        var facts = contents.Facts(request);
        return new ScreeningRecord
        {
            Version = request.Version,
            RunId = RunIdentity.RunId(facts.Sha256, contents.Files.Select(f => f.Sha256), settings, request.Version),
            Timestamp = request.Timestamp,
            Model = facts,
            ForcesFiles = contents.Files,
            Basis = [BasisLine("service", settings.Basis.Service, Basis.Default.Service), BasisLine("design", settings.Basis.Design, Basis.Default.Design)],
            Settings = [.. settings.Effective.Select(s => new SettingLine(s.Key, s.Value, s.IsDefault))],
            Cautions = Cautions.Lines,
            PassedOver = [.. contents.Catalog.PassedOver.Select(p => new PassedOver(p.Class, p.Count, p.Why))],
            Sections = SectionsInUse(contents.Catalog.Members, results, library),
            Members = results,
            Contacts = contents.Contacts?.All ?? [],
            Findings = [.. diagnostics.Items.Select(d => new FindingLine(d.Code, d.Severity, d.Message, d.Span?.ToString() ?? "", diagnostics.CountOf(d)))],
            Counts = new VerdictCounts(
                results.Count(r => r.Verdict == Verdict.WithinLimit), results.Count(r => r.Verdict == Verdict.Overstressed), results.Count(r => r.Verdict == Verdict.NotChecked)),
            HasDamage = contents.File.HasDamage,
        };
    }

    private static BasisLine BasisLine(string kind, StressLimit? limit, StressLimit? standard) =>
        new(kind, LimitWords.Of(limit), LimitWords.Clause(limit), limit == standard);

    /// <summary>Sections that stresses were found in; those of members without forces or strength are not solved for the sake of a table.</summary>
    private static ImmutableArray<SectionFacts> SectionsInUse(ImmutableArray<Member> members, ImmutableArray<MemberResult> results, SectionLibrary library)
    {
        var uses = members
            .Where((m, i) => m.Section is Finding<SectionFinding>.Found && results[i].Governing is not null)
            .SelectMany(m => ((Finding<SectionFinding>.Found)m.Section).Value.Shapes.Select(shape => (Shape: shape, Poisson: ((Finding<double>.Found)m.Material.Poisson).Value)))
            .Where(use => NumberRange.Holds(use.Shape))
            .GroupBy(use => use.Shape)
            .OrderBy(group => group.Key.Designation, StringComparer.Ordinal);
        return [.. uses.Select(group => Facts(group.Key, group.Count(), group.First().Poisson, library))];
    }

    private static SectionFacts Facts(CrossSection shape, int members, double poisson, SectionLibrary library)
    {
        var p = library.Properties(shape, poisson);
        return new SectionFacts(
            shape.Designation, members, p.Area, p.Iy, p.Iz, p.WelY, p.WelZ, p.J, p.JSource, p.Wt,
            Closure(library.Field(shape, ShearModel.Elementary, poisson)), Closure(library.Field(shape, ShearModel.Elasticity, poisson)))
        {
            Iyz = p.Iyz,
            ShearCentreY = p.ShearCentreY,
            ShearCentreZ = p.ShearCentreZ,
            Rings = Rings(shape),
        };
    }

    /// <summary>The rings of sections that their designation does not tell, for drawings.</summary>
    private static ImmutableArray<ImmutableArray<RingPoint>> Rings(CrossSection shape) => shape is OutlineSection or OpenProfile
        ? [.. OutlineRings.Of(shape).Select(ring => ring.Select(p => new RingPoint(p.Y, p.Z)).ToImmutableArray())]
        : [];

    private static string Closure((StressField? Field, string WhyNot) entry)
    {
        if (entry.Field is not { } field) return entry.WhyNot;

        var c = field.Closure;
        return field.Model == ShearModel.Elasticity
            ? string.Create(CultureInfo.InvariantCulture, $"ν = {field.Poisson:0.###}: largest error {c.LargestError:0.0E+0}")
            : string.Create(CultureInfo.InvariantCulture, $"N {c.N:0.####}, Vy {c.Vy:0.####}, Vz {c.Vz:0.####}, T {(field.CarriesTorsion ? c.T.ToString("0.####", CultureInfo.InvariantCulture) : "none")}, My {c.My:0.####}, Mz {c.Mz:0.####}");
    }
}
