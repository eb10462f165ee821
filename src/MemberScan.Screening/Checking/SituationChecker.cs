using System.Globalization;
using MemberScan.Checks;
using MemberScan.Checks.Stability;
using MemberScan.Checks.Walls;
using MemberScan.Mechanics.Forces;
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
    public sealed record Subject(SectionFinding Section, double Length, double Yield, double Poisson, Material Material);

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
        var line = Line(forces, subject.Length);
        if (line.Stations.IsEmpty)
        {
            findings.Bar(ReasonCode.NoForces, "the source has no stations");
            return findings;
        }

        var isEnvelope = !forces.Envelope.IsEmpty;
        if (isEnvelope) findings.Note(EnvelopeSearch.Note);
        if (!line.ReachesBothEnds) findings.Bar(ReasonCode.StationsTooCoarse, $"the stations of '{forces.Situation.Name}' do not reach both ends of the member");
        foreach (var shape in subject.Section.Shapes)
        {
            var properties = library.Properties(shape);
            CheckStability(findings, line, properties, subject, Math.Max(subject.Length, (forces.To ?? 0) - forces.From));
            var states = isEnvelope ? forces.Envelope.SelectMany(e => e.Corners()) : line.Stations.Select(s => s.Forces);
            foreach (var state in states) CheckWalls(findings, shape, properties, Cleaned(state, shape), subject);
            if (findings.Limit is not { } limit) continue;
            if (isEnvelope)
            {
                findings.Elementary = Found.Larger(findings.Elementary, SearchEnvelope(findings, shape, ShearModel.Elementary, subject, limit, index));
                findings.Elasticity = Found.Larger(findings.Elasticity, SearchEnvelope(findings, shape, ShearModel.Elasticity, subject, limit, index));
            }
            else
            {
                findings.Elementary = Found.Larger(findings.Elementary, Search(findings, line, shape, ShearModel.Elementary, subject, forces.From, limit, index));
                findings.Elasticity = Found.Larger(findings.Elasticity, Search(findings, line, shape, ShearModel.Elasticity, subject, forces.From, limit, index));
            }
        }

        return findings;
    }

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

    private static ForceLine Line(MemberForces forces, double length)
    {
        var to = forces.To ?? length;
        return ForceLine.Build(forces.Stations.Select(s => s with { X = s.X - forces.From }), to - forces.From);
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

    private Found? SearchEnvelope(SituationFindings findings, CrossSection shape, ShearModel model, Subject subject, StressLimit limit, int index) =>
        library.Field(shape, model, subject.Poisson).Field is { } field
            ? EnvelopeSearch.Largest(findings, findings.Forces.Envelope, field, LimitInForce.Measure(limit), LimitInForce.Stress(limit, subject.Yield), index)
            : null;

    private Found? Search(
        SituationFindings findings, ForceLine line, CrossSection shape, ShearModel model, Subject subject, double from, StressLimit limit, int index)
    {
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

            var usable = Usable(findings, field, shape, forces);
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

        const double Golden = 0.6180339887498949;
        var (a, b) = (best - 1.0 / Parts, best + 1.0 / Parts);
        var (c, d) = (b - Golden * (b - a), a + Golden * (b - a));
        var (fc, fd) = (At(c), At(d));
        for (var i = 0; i < Steps; i++)
        {
            if (fc >= fd)
            {
                (b, d, fd) = (d, c, fc);
                c = b - Golden * (b - a);
                fc = At(c);
            }
            else
            {
                (a, c, fc) = (c, d, fd);
                d = a + Golden * (b - a);
                fd = At(d);
            }
        }
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
