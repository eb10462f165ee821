using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Checks;
using MemberScan.Checks.Stability;
using MemberScan.Checks.Walls;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Checking;

/// <summary>Checks one situation on one member: all stations, all readings of the section, both shear models.</summary>
internal sealed class SituationChecker(SectionLibrary library, Basis basis, double lengthFactor)
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

    /// <summary>What is the same for all situations of a member.</summary>
    /// <param name="Section">The section with its readings.</param>
    /// <param name="Length">Length [m].</param>
    /// <param name="Yield">Yield strength [Pa].</param>
    /// <param name="Poisson">ν [-].</param>
    /// <param name="Material">The material.</param>
    public sealed record Subject(SectionFinding Section, double Length, double Yield, double Poisson, Material Material)
    {
        /// <summary>How the section changes along the member; null where it does not.</summary>
        public Taper? Taper { get; init; }
    }

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

        ChooseLimit(findings, forces.Situation);
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
        CheckStability(findings, line, properties, subject, Math.Max(subject.Length, (forces.To ?? 0) - forces.From));
        var isEnvelope = !forces.Envelope.IsEmpty;
        if (isEnvelope) findings.Note(EnvelopeSearch.Note);
        var states = isEnvelope ? forces.Envelope.SelectMany(e => e.Corners()) : line.Stations.Select(s => s.Forces);
        foreach (var state in states) CheckWalls(findings, shape, properties, Cleaned(state, shape), subject);
        if (findings.Limit is not { } limit || isEnvelope && !shearIsKnown) return;

        var search = new SearchIn(line, shape, subject, forces.From, limit, index, shearIsKnown);
        Found? Largest(ShearModel model) => isEnvelope ? SearchEnvelope(findings, search, model) : Search(findings, search, model);
        var (elementary, elasticity) = (Largest(ShearModel.Elementary), Largest(ShearModel.Elasticity));
        if (elementary is null && elasticity is null)
            findings.Bar(ReasonCode.CheckNotEvaluated, $"no stress field for {shape.Designation}: {library.Field(shape, ShearModel.Elasticity, subject.Poisson).WhyNot}");
        findings.Elementary = Found.Larger(findings.Elementary, elementary);
        findings.Elasticity = Found.Larger(findings.Elasticity, elasticity);
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
        CheckStability(findings, line, library.Properties(weakest, subject.Poisson), subject, Math.Max(subject.Length, (forces.To ?? 0) - forces.From));
        foreach (var station in line.Stations)
            foreach (var shape in ends) CheckWalls(findings, shape, library.Properties(shape, subject.Poisson), Cleaned(station.Forces, shape), subject);
        if (findings.Limit is not { } limit) return;

        foreach (var model in new[] { ShearModel.Elementary, ShearModel.Elasticity })
        {
            var found = new TaperSearch(taper, model, subject, forces.From, limit, index).Of(findings, line);
            if (model == ShearModel.Elementary) findings.Elementary = Found.Larger(findings.Elementary, found);
            else findings.Elasticity = Found.Larger(findings.Elasticity, found);
        }
    }

    /// <summary>What a search for the largest stress works on.</summary>
    private sealed record SearchIn(ForceLine Line, CrossSection Shape, Subject Subject, double From, StressLimit Limit, int Index, bool ShearIsKnown);

    private void ChooseLimit(SituationFindings findings, Situation situation)
    {
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

    private static ForceLine Line(MemberForces forces, ImmutableArray<ForceStation> stations, double length)
    {
        var to = forces.To ?? length;
        return ForceLine.Build(stations.Select(s => s with { X = s.X - forces.From }), to - forces.From);
    }

    private void CheckStability(SituationFindings findings, ForceLine line, SectionProperties properties, Subject subject, double length)
    {
        var least = line.Stations.Min(s => Cleaned(s.Forces, subject.Section.Shape).N);
        var (modulus, why) = subject.Material.Modulus.TryGet(out var found, out var reason) ? (found.Value, "") : ((double?)null, reason.Message);
        switch (CompressionRule.Check(least, modulus, why, properties.IMin, length, lengthFactor))
        {
            case CheckResult.NotEvaluated barred:
                findings.Bar(barred.Why);
                break;
            case CheckResult.Evaluated within:
                findings.Note(string.Create(CultureInfo.InvariantCulture, $"compression is {4 * within.Utilization:0.00} % of the Euler load for a buckling length of {lengthFactor:0.##} × the member length; up to 4 % no stability check is needed ({within.Clause})"));
                break;
        }
    }

    /// <summary>Slender walls by the limits of steel; of other materials with the strength scaled by the modulus, as ε asks.</summary>
    private static void CheckWalls(SituationFindings findings, CrossSection shape, SectionProperties properties, in SectionForces forces, Subject subject)
    {
        var yield = subject.Yield;
        if (!subject.Material.IsSteel && subject.Material.Modulus is Finding<double>.Found { Value: < SteelModulus } modulus)
            yield *= SteelModulus / modulus.Value;
        if (SlenderWall.Check(shape, properties, forces, yield) is CheckResult.NotEvaluated slender) findings.Bar(slender.Why);
    }

    private Found? SearchEnvelope(SituationFindings findings, SearchIn given, ShearModel model) =>
        library.Field(given.Shape, model, given.Subject.Poisson).Field is { } field
            ? EnvelopeSearch.Largest(findings, findings.Forces.Envelope, field, LimitInForce.Measure(given.Limit), LimitInForce.Stress(given.Limit, given.Subject.Yield), given.Index)
            : null;

    private Found? Search(SituationFindings findings, SearchIn given, ShearModel model)
    {
        var (line, shape, subject, from, limit, index, shearIsKnown) = given;
        if (library.Field(shape, model, subject.Poisson).Field is not { } field) return null;

        var measure = LimitInForce.Measure(limit);
        var allowed = LimitInForce.Stress(limit, subject.Yield);
        Found? best = null;

        double Try(double x, in SectionForces forces)
        {
            if (!NumberRange.Holds(shape, field.Properties, Cleaned(forces, shape)))
            {
                findings.Bar(ReasonCode.CheckNotEvaluated, "the forces are so large that stresses are beyond the range of numbers");
                return 0;
            }

            var usable = Usable(findings, field, shape, shearIsKnown ? forces : new SectionForces(forces.N, 0, 0, 0, forces.My, forces.Mz));
            var point = field.Govern(usable, measure);
            if (best is null || point.Value / allowed > best.Utilization) best = new Found(point.Value / allowed, from + x, usable, point, field, index);
            return point.Value;
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
            return NumberRange.Holds(shape, field.Properties, cleaned) ? field.Govern(cleaned, measure).Value / allowed : double.PositiveInfinity;
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
