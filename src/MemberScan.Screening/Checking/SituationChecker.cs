using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Checks;
using MemberScan.Checks.Walls;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Checking.Further;
using MemberScan.Screening.Checking.Rules;

namespace MemberScan.Screening.Checking;

/// <summary>Checks one situation on one member: all stations, all readings of the section, both shear models.</summary>
internal sealed class SituationChecker(SectionLibrary library, FurtherChecks further)
{
    /// <summary>Forces below this share of the others are rounding of zero.</summary>
    private const double ZeroShare = 1e-9;

    /// <summary>Parts into which a stretch under uniform load is cut before its largest value is closed in upon.</summary>
    private const int Parts = 8;

    /// <summary>
    /// Steps of the golden section: they leave a thousandth of the stretch, and since the value is flat at its largest, a miss of about
    /// a millionth of the bulge.
    /// </summary>
    private const int Steps = 11;

    private const double SteelModulus = 210e9;

    /// <summary>Checks a situation.</summary>
    public SituationFindings Check(Subject subject, MemberForces forces, int index)
    {
        var findings = new SituationFindings(forces);
        foreach (var note in forces.Notes) findings.Note(note);
        if (forces.Unusable is { } unusable)
        {
            findings.Bar(unusable);
            return findings;
        }

        ChooseLimit(findings, forces.Situation, subject);
        if (forces.Stations.IsEmpty)
        {
            findings.Bar(ReasonCode.NoForces, "the source has no stations");
            return findings;
        }

        if (subject.Taper is { } taper) CheckTaper(findings, subject, forces, taper, index);
        else foreach (var shape in subject.Section.Shapes) CheckShape(findings, subject, forces, shape, index);
        return findings;
    }

    private void CheckShape(SituationFindings findings, Subject subject, MemberForces forces, CrossSection shape, int index)
    {
        var properties = library.Properties(shape, subject.Poisson);
        var line = Line(forces, TorsionMove.Of(forces, properties, findings, out var shearIsKnown), subject.Length);
        if (!line.ReachesBothEnds) findings.Bar(ReasonCode.StationsTooCoarse, $"the stations of '{forces.Situation.Name}' do not reach both ends of the member");
        if (shape is OpenProfile or OutlineSection && forces.Stations.Any(s => s.Forces is not { My: 0, Mz: 0 }))
            findings.Note("bending of an open or general section: lateral-torsional buckling is not covered");
        var compression = new Compression(findings, line, properties, subject, Math.Max(subject.Length, (forces.To ?? 0) - forces.From));
        if (!FurtherChecks.ChecksStability(findings.Limit, subject, shape)) compression.Bar();
        var isEnvelope = !forces.Envelope.IsEmpty;
        if (isEnvelope) findings.Note(EnvelopeSearch.Note);
        var states = isEnvelope ? forces.Envelope.SelectMany(e => e.Corners()) : line.Stations.Select(s => s.Forces);
        foreach (var state in states) CheckWalls(findings, shape, properties, Cleaned(state, shape), subject);
        if (findings.Limit is not { } limit || isEnvelope && !shearIsKnown) return;

        var search = new SearchIn(line, shape, subject, forces.From, subject.RuleOf(limit, shape), index, shearIsKnown);
        Found? Largest(ShearModel model) => isEnvelope ? SearchEnvelope(findings, search, model) : Search(findings, search, model);
        var (elementary, elasticity) = (Largest(ShearModel.Elementary), Largest(ShearModel.Elasticity));
        if (elementary is null && elasticity is null)
            findings.Bar(ReasonCode.CheckNotEvaluated, $"no stress field for {shape.Designation}: {library.Field(shape, ShearModel.Elasticity, subject.Poisson).WhyNot}");
        findings.Elementary = Found.Larger(findings.Elementary, elementary);
        findings.Elasticity = Found.Larger(findings.Elasticity, elasticity);
        if (subject.IsBrittle || (elementary ?? elasticity) is null) return;

        further.Make(findings, new CheckedLine(subject, limit, shape, properties, States(line, forces, shape, elementary, elasticity), compression));
    }

    /// <summary>The states that checks beside the stress criterion are made for: all stations, and where the stress is largest.</summary>
    private static List<(double X, SectionForces Forces)> States(ForceLine line, MemberForces forces, CrossSection shape, params ReadOnlySpan<Found?> found)
    {
        var states = new List<(double X, SectionForces Forces)>();
        if (forces.Envelope.IsEmpty)
            foreach (var station in line.Stations) Add(forces.From + station.X, Cleaned(station.Forces, shape));
        else
            foreach (var station in forces.Envelope)
                foreach (var corner in station.Corners()) Add(station.X, Cleaned(corner, shape));
        foreach (var place in found)
            if (place is not null) Add(place.X, place.Forces);
        return states;

        void Add(double x, SectionForces state)
        {
            if (!states.Exists(s => s.Forces == state)) states.Add((x, state));
        }
    }

    /// <summary>
    /// A tapering member: the section at every station and at many places between, the largest value closed in upon. Stresses are those
    /// of a straight bar with the section of the place.
    /// </summary>
    private void CheckTaper(SituationFindings findings, Subject subject, MemberForces forces, Taper taper, int index)
    {
        if (!forces.Envelope.IsEmpty)
        {
            findings.Bar(ReasonCode.SectionNotCovered, $"'{forces.Situation.Name}' is an envelope, which is not evaluated along a tapering member");
            return;
        }

        findings.Note("tapered: stresses of a straight bar with the section of each place; the shear that the taper itself causes is not counted");
        var line = Line(forces, forces.Stations, subject.Length);
        if (!line.ReachesBothEnds) findings.Bar(ReasonCode.StationsTooCoarse, $"the stations of '{forces.Situation.Name}' do not reach both ends of the member");
        var ends = new[] { taper.Start, taper.End };
        var weakest = ends.MinBy(shape => library.Properties(shape, subject.Poisson).IMin)!;
        new Compression(findings, line, library.Properties(weakest, subject.Poisson), subject, Math.Max(subject.Length, (forces.To ?? 0) - forces.From)).Bar();
        foreach (var station in line.Stations)
            foreach (var shape in ends) CheckWalls(findings, shape, library.Properties(shape, subject.Poisson), Cleaned(station.Forces, shape), subject);
        if (findings.Limit is not { } limit) return;
        if (limit.Criterion is Criterion.Aisc360Asd or Criterion.Aisc360Lrfd)
            findings.Bar(ReasonCode.CheckNotEvaluated, "the strength of a tapering member by AISC 360-22, chapters D to H, is not evaluated");

        foreach (var model in new[] { ShearModel.Elementary, ShearModel.Elasticity })
        {
            var found = new TaperSearch(taper, model, subject, forces.From, subject.RuleOf(limit, taper.Start), index).Of(findings, line);
            if (model == ShearModel.Elementary) findings.Elementary = Found.Larger(findings.Elementary, found);
            else findings.Elasticity = Found.Larger(findings.Elasticity, found);
        }
    }

    /// <summary>What a search for the largest stress works on.</summary>
    private sealed record SearchIn(ForceLine Line, CrossSection Shape, Subject Subject, double From, StressRule Rule, int Index, bool ShearIsKnown);

    private static void ChooseLimit(SituationFindings findings, Situation situation, Subject subject)
    {
        if (subject.IsBrittle)
        {
            ChooseBrittle(findings, situation, subject.Limits.Brittle!);
            return;
        }

        var basis = subject.Limits.Basis;
        switch (situation.Kind)
        {
            case SituationKind.Service or SituationKind.Design:
                findings.Limit = situation.Kind == SituationKind.Service ? basis.Service : basis.Design;
                if (findings.Limit is null)
                    findings.Bar(ReasonCode.KindWithoutLimit, $"'{situation.Name}' is of kind {situation.Kind.ToString().ToLowerInvariant()}, for which the basis has no limit");
                break;
            case SituationKind.Unknown when basis.Service is { } service:
                findings.Limit = service;
                findings.Note("kind unknown: held against the service limit");
                break;
            default:
                findings.Bar(ReasonCode.KindUnknown, $"'{situation.Name}' says neither service nor design, and the basis has no service limit");
                break;
        }
    }

    private static void ChooseBrittle(SituationFindings findings, Situation situation, BrittleLimits limits)
    {
        if (situation.Kind == limits.Kind || (situation.Kind == SituationKind.Unknown && limits.Kind == SituationKind.Service))
            findings.Limit = new StressLimit(Criterion.LargestNormalStress, 1);
        else
            findings.Bar(ReasonCode.KindWithoutLimit, $"'{situation.Name}' is of kind {situation.Kind.ToString().ToLowerInvariant()}; the limits of brittle materials are for {limits.Kind.ToString().ToLowerInvariant()} situations");
    }

    private static ForceLine Line(MemberForces forces, ImmutableArray<ForceStation> stations, double length)
    {
        var to = forces.To ?? length;
        return ForceLine.Build(stations.Select(s => s with { X = s.X - forces.From }), to - forces.From);
    }

    /// <summary>Slender walls by the limits of steel; of other materials with the strength scaled by the modulus, as ε asks.</summary>
    private static void CheckWalls(SituationFindings findings, CrossSection shape, SectionProperties properties, in SectionForces forces, Subject subject)
    {
        if (subject.IsBrittle) return;

        var yield = subject.Yield;
        if (!subject.Material.IsSteel && subject.Material.Modulus is Finding<double>.Found { Value: < SteelModulus } modulus)
            yield *= SteelModulus / modulus.Value;
        if (SlenderWall.Check(shape, properties, forces, yield) is CheckResult.NotEvaluated slender) findings.Bar(slender.Why);
    }

    private Found? SearchEnvelope(SituationFindings findings, SearchIn given, ShearModel model) =>
        library.Field(given.Shape, model, given.Subject.Poisson).Field is { } field
            ? EnvelopeSearch.Largest(findings, findings.Forces.Envelope, field, given.Rule, given.Index)
            : null;

    private Found? Search(SituationFindings findings, SearchIn given, ShearModel model)
    {
        var (line, shape, subject, from, rule, index, shearIsKnown) = given;
        if (library.Field(shape, model, subject.Poisson).Field is not { } field) return null;

        Found? best = null;

        double Try(double x, in SectionForces forces)
        {
            if (!NumberRange.Holds(shape, field.Properties, Cleaned(forces, shape)))
            {
                findings.Bar(ReasonCode.CheckNotEvaluated, "the forces are so large that stresses are beyond the range of numbers");
                return 0;
            }

            var usable = Usable(findings, field, shape, shearIsKnown ? forces : new SectionForces(forces.N, 0, 0, 0, forces.My, forces.Mz));
            var (utilization, point) = rule.Govern(field, usable);
            if (best is null || utilization > best.Utilization) best = new Found(utilization, from + x, usable, point, field, index, rule);
            return utilization;
        }

        // The round bar's shear parabola follows the resultant and is not convex in Vy and Vz; every other field is linear in the forces.
        bool CanExceed(ForceInterval interval)
        {
            if (best is null || shape is Round || !field.CarriesTorsion) return true;

            var (start, end) = interval.Enclosing;
            return Bound(start) > best.Utilization || Bound(end) > best.Utilization;
        }

        double Bound(in SectionForces forces)
        {
            var cleaned = Cleaned(forces, shape);
            return NumberRange.Holds(shape, field.Properties, cleaned) ? rule.Govern(field, cleaned).Utilization : double.PositiveInfinity;
        }

        foreach (var station in line.Stations) Try(station.X, station.Forces);
        foreach (var interval in line.Intervals)
        {
            switch (interval.Kind)
            {
                case IntervalKind.UniformLoadInferred:
                    if (!findings.Forces.LoadsAreKnown) findings.Note("uniform load inferred between stations");
                    if (CanExceed(interval)) SearchInside(interval, Try);
                    break;
                case IntervalKind.Unknown:
                    findings.Bar(ReasonCode.StationsTooCoarse, string.Create(CultureInfo.InvariantCulture, $"between the stations at {from + interval.Start.X:0.###} m and {from + interval.End.X:0.###} m a larger value is possible"));
                    break;
            }

            // Linear stretches need no search: each measure is convex in the forces, so its largest value lies at an end.
        }

        return best;
    }

    private delegate double Evaluate(double x, in SectionForces forces);

    /// <summary>Cuts a stretch into parts and closes in on the largest value by golden section around the best of them.</summary>
    private static void SearchInside(ForceInterval interval, Evaluate evaluate)
    {
        double At(double share) => evaluate(interval.Start.X + share * (interval.End.X - interval.Start.X), interval.At(share));

        var best = 0.5;
        var largest = double.NegativeInfinity;
        for (var i = 1; i < Parts; i++)
        {
            var value = At((double)i / Parts);
            if (value > largest) (best, largest) = ((double)i / Parts, value);
        }

        GoldenSection.CloseIn(At, best - 1.0 / Parts, best + 1.0 / Parts, Steps);
    }

    /// <summary>
    /// The forces that the field has an answer for. Where it carries no torsion and there is some, axial force and bending alone are
    /// checked: σ is a lower bound of the equivalent stress, enough to call the member overstressed and never to pass it.
    /// </summary>
    internal static SectionForces Usable(SituationFindings findings, StressField field, CrossSection shape, in SectionForces forces)
    {
        var cleaned = Cleaned(forces, shape);
        if (field.CarriesTorsion || cleaned.T == 0) return cleaned;

        findings.Bar(ReasonCode.CheckNotEvaluated, $"torsion in a {shape.Kind} needs a numerical field, which is not available; the value shown leaves torsion and shear out and is a lower bound");
        return new SectionForces(cleaned.N, 0, 0, 0, cleaned.My, cleaned.Mz);
    }

    internal static SectionForces Cleaned(in SectionForces forces, CrossSection shape)
    {
        var extent = Math.Max(shape.ExtentY, shape.ExtentZ);
        var force = Math.Max(Math.Abs(forces.N), Math.Max(Math.Abs(forces.Vy), Math.Abs(forces.Vz)));
        var moment = Math.Max(Math.Abs(forces.T), Math.Max(Math.Abs(forces.My), Math.Abs(forces.Mz)));
        var (leastForce, leastMoment) = (ZeroShare * Math.Max(force, moment / extent), ZeroShare * Math.Max(moment, force * extent));
        static double Clean(double value, double least) => Math.Abs(value) <= least || Math.Abs(value) < NumberRange.LeastForce ? 0 : value;
        return new SectionForces(
            Clean(forces.N, leastForce), Clean(forces.Vy, leastForce), Clean(forces.Vz, leastForce),
            Clean(forces.T, leastMoment), Clean(forces.My, leastMoment), Clean(forces.Mz, leastMoment));
    }
}
