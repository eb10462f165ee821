using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis.Loads;
using MemberScan.Ifc.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Analysis;

/// <summary>Samples of curve and point reactions in the analytical member's axes, positive face, SI.</summary>
internal sealed class ReactionReader(Instances instances, ActivityPlaces activityPlaces, ModelUnits units, ForceRules rules, DiagnosticList diagnostics)
{
    /// <summary>Share of the largest force and moment within which a pair of samples at the two ends balances.</summary>
    private const double Balanced = 1e-3;

    /// <summary>Share of the length within which a sample is at an end.</summary>
    private const double AtEnd = 1e-6;

    private static readonly string[] s_components = ["ForceX", "ForceY", "ForceZ", "MomentX", "MomentY", "MomentZ"];

    /// <summary>Most samples of one reaction.</summary>
    public const int MaxSamples = 1_000_000;

    /// <summary>Samples along the analytical member, or why they cannot be used.</summary>
    /// <param name="Stations">Distance from its start and section forces in its own axes.</param>
    /// <param name="Conversion">How the stored values were turned, in words.</param>
    /// <param name="Unusable">Why they cannot be used; null when they can.</param>
    public sealed record Samples(ImmutableArray<ForceStation> Stations, string Conversion, Reason? Unusable);

    /// <summary>Reads the samples of a reaction on an analytical member.</summary>
    /// <param name="reaction">The reaction.</param>
    /// <param name="member">The analytical member.</param>
    /// <param name="element">The candidate's element: a turn in the settings may name it instead of the analytical member.</param>
    /// <param name="key">The candidate's key.</param>
    /// <param name="loads">The loads on the analytical member in the same situation, as far as they are known, in its own axes.</param>
    public Samples Read(Part21Record reaction, AnalyticalMember member, ElementIdentity element, string key, IReadOnlyList<LineLoad> loads)
    {
        var turn = Turn(member, element, key);
        if (!member.Length.TryGet(out var length, out var why)) return Unusable(why);
        if (!instances.TryFollow(reaction[7], out var load)) return Unusable(ReasonCode.DamagedRecord, $"the reaction #{reaction.Id} has no values");

        if (load[1].ItemCount > MaxSamples) return Unusable(ReasonCode.ForcesIncomplete, $"the reaction #{reaction.Id} has more than {MaxSamples} samples");
        if ((load.Keyword == "IFCSTRUCTURALLOADCONFIGURATION" ? instances.FollowEach(load[1]) : [load]) is not { } samples)
            return Unusable(ReasonCode.DamagedRecord, $"the reaction #{reaction.Id} has lost a sample");
        if (samples.Exists(l => l.Keyword is not ("IFCSTRUCTURALLOADSINGLEFORCE" or "IFCSTRUCTURALLOADSINGLEFORCEWARPING")))
            return Unusable(ReasonCode.ForcesIncomplete, $"the reaction #{reaction.Id} holds something other than section forces");

        if (Places(reaction, load, samples.Count, length.Value, member, out var whyNoPlaces) is not { } places) return Unusable(whyNoPlaces!);

        var stations = ImmutableArray.CreateBuilder<ForceStation>(places.Length);
        var leftOut = new SortedSet<int>();
        for (var i = 0; i < places.Length; i++)
        {
            var values = Values(samples[Math.Min(i, samples.Count - 1)], leftOut, out var whyNoValues);
            if (values is not { } stored) return Unusable(whyNoValues!);
            if (!InMemberAxes(reaction, member, turn, stored, out var own, out var whyNoAxes)) return Unusable(whyNoAxes!);

            stations.Add(new ForceStation(places[i], own));
        }

        var words = Words(reaction, turn);
        if (samples.Exists(l => l.Keyword == "IFCSTRUCTURALLOADSINGLEFORCEWARPING" && Instances.Real(l[7]) is not (null or 0)))
            words += "; the warping moment is left out";
        if (leftOut.Count > 0) words += $"; components left out count as zero: {string.Join(", ", leftOut.Select(i => s_components[i]))}";
        return rules.Convention switch
        {
            ForceConvention.EndForces => FromEndForces(reaction, samples.Count, stations, length.Value, words),
            ForceConvention.Detect => Detected(reaction, samples.Count, stations, loads, length.Value, words),
            _ => OnPositiveFace(reaction, samples.Count, stations, loads, length.Value, words),
        };
    }

    /// <summary>Samples as they are, unless they balance as forces on the two ends and in no other way.</summary>
    private Samples OnPositiveFace(Part21Record reaction, int samples, ImmutableArray<ForceStation>.Builder stations, IReadOnlyList<LineLoad> loads, double length, string words)
    {
        if (!IsPair(stations, samples, length) || Balance(stations, loads) != (false, true)) return new Samples(stations.ToImmutable(), words, null);

        diagnostics.Add("IFC-0025", Severity.Warning, "The two samples of a reaction balance as forces on the ends of the member, not as forces on the positive face; they are not used. Set forces.convention to \"end-forces\" or \"detect\".", reaction.Span);
        return Unusable(ReasonCode.ConventionUnknown, $"the samples of the reaction #{reaction.Id} balance as forces on the two ends, not as forces on the positive face; the setting forces.convention can say so");
    }

    private static Samples Detected(Part21Record reaction, int samples, ImmutableArray<ForceStation>.Builder stations, IReadOnlyList<LineLoad> loads, double length, string words)
    {
        if (!IsPair(stations, samples, length)) return new Samples(stations.ToImmutable(), words + "; positive face, since there are samples between the ends or none at them", null);

        return Balance(stations, loads) switch
        {
            (true, _) => new Samples(stations.ToImmutable(), words + "; positive face, detected by equilibrium", null),
            (false, true) => FromEndForces(reaction, samples, stations, length, words + "; end forces, detected by equilibrium"),
            _ => Unusable(ReasonCode.ConventionUnknown, $"the samples of the reaction #{reaction.Id} balance neither on the positive face nor as forces on the two ends, with the loads that are known"),
        };
    }

    private static bool IsPair(ImmutableArray<ForceStation>.Builder stations, int samples, double length) =>
        samples == 2 && stations.Count == 2 && Math.Abs(stations[0].X) <= AtEnd * length && Math.Abs(stations[1].X - length) <= AtEnd * length;

    private static (bool OnFace, bool OnEnds) Balance(ImmutableArray<ForceStation>.Builder stations, IReadOnlyList<LineLoad> loads)
    {
        var reversed = stations[0] with { Forces = -1 * stations[0].Forces };
        return (Equilibrium.Miss(stations[0], stations[1], loads) <= Balanced, Equilibrium.Miss(reversed, stations[1], loads) <= Balanced);
    }

    private double[]? Places(Part21Record reaction, Part21Record load, int count, double length, AnalyticalMember member, out Reason? why)
    {
        why = null;
        if (reaction.Keyword == "IFCSTRUCTURALPOINTREACTION")
        {
            if (activityPlaces.OfVertex(reaction, member) is { } place) return [place];

            why = new Reason(ReasonCode.StationsTooCoarse, $"the point reaction #{reaction.Id} does not say where on the member it acts");
            return null;
        }

        var type = Instances.Literal(reaction[9]);
        if (load.Keyword != "IFCSTRUCTURALLOADCONFIGURATION")
        {
            if (type == "CONST") return [0, length];

            why = new Reason(ReasonCode.StationsTooCoarse, $"the reaction #{reaction.Id} of type {type} has one sample only");
            return null;
        }

        if (type == "EQUIDISTANT" && load[2].IsEmpty)
        {
            if (count >= 2) return [.. Enumerable.Range(0, count).Select(i => length * i / (count - 1))];

            why = new Reason(ReasonCode.StationsTooCoarse, $"the reaction #{reaction.Id} has one sample only");
            return null;
        }

        if (units.Length is not { } metre)
        {
            why = new Reason(ReasonCode.UnitMissing, "the model names no length unit (LENGTHUNIT)");
            return null;
        }

        var places = activityPlaces.Locations(load)!;
        if (places.Length != count || Array.Exists(places, double.IsNaN) || count == 0)
        {
            why = new Reason(ReasonCode.ForcesIncomplete, $"the reaction #{reaction.Id} has {count} samples at {places.Length} locations");
            return null;
        }

        if (Array.Exists(places, p => p > length * (1 + 1e-6) || p < -1e-6 * length))
        {
            why = new Reason(ReasonCode.ForcesIncomplete, string.Create(CultureInfo.InvariantCulture, $"the reaction #{reaction.Id} has a sample at {places.Max():0.####} m on an analytical member of {length:0.####} m"));
            return null;
        }

        if (places.Max() <= metre * 1.0000001 && Math.Abs(places.Max() / metre - 1) < 1e-9 && Math.Abs(length / metre - 1) > 1e-6)
            diagnostics.Add("IFC-0021", Severity.Warning, "Locations of a reaction run from 0 to 1 as if they were shares; they are read as lengths, as the schema says.", reaction.Span);
        return places;
    }

    private SectionForces? Values(Part21Record load, SortedSet<int> leftOut, out Reason? why)
    {
        why = null;
        Span<double> six = stackalloc double[6];
        for (var i = 0; i < 6; i++)
        {
            var value = load[i + 1];
            if (value.IsEmpty)
            {
                _ = leftOut.Add(i);
                if (rules.MissingComponentsAreZero) continue;

                why = new Reason(ReasonCode.ForcesIncomplete, $"#{load.Id} leaves out force components, and the settings do not say that these are zero");
                return null;
            }

            if (Instances.Real(value) is not { } real)
            {
                why = new Reason(ReasonCode.DamagedRecord, $"#{load.Id} holds something other than a number");
                return null;
            }

            var (factor, unitType) = i < 3 ? (units.Force, "FORCEUNIT") : (units.Torque, "TORQUEUNIT");
            if (real != 0 && factor is null)
            {
                why = new Reason(ReasonCode.UnitMissing, $"the model names no unit for {(i < 3 ? "forces" : "moments")} ({unitType}); the settings can");
                return null;
            }

            six[i] = real == 0 ? 0 : real * factor!.Value;
        }

        var forces = new SectionForces(six[0], six[1], six[2], six[3], six[4], six[5]);
        if (forces.IsFinite) return forces;

        why = new Reason(ReasonCode.ForcesIncomplete, $"#{load.Id} holds numbers beyond any range");
        return null;
    }

    private bool InMemberAxes(Part21Record reaction, AnalyticalMember member, double turn, SectionForces stored, out SectionForces own, out Reason? why)
    {
        own = stored;
        why = null;
        if (!IsGlobal(reaction))
        {
            own = turn != 0 ? stored.Turned(-turn * Math.PI / 180) : stored;
            return true;
        }

        if (!member.Axes.TryGet(out var axes, out why)) return false;

        var force = axes.Value.Components(member.GlobalAxes.Direction(new Vector3(stored.N, stored.Vy, stored.Vz)));
        var moment = axes.Value.Components(member.GlobalAxes.Direction(new Vector3(stored.T, stored.My, stored.Mz)));
        own = new SectionForces(force.X, force.Y, force.Z, moment.X, moment.Y, moment.Z);
        return true;
    }

    private bool IsGlobal(Part21Record reaction) => rules.Components switch
    {
        ForceComponents.MemberAxes => false,
        ForceComponents.GlobalAxes => true,
        _ => Instances.Literal(reaction[8]) != "LOCAL_COORDS",
    };

    /// <summary>The turn for a member, by the ids and names of its analytical side first, then by those of the candidate.</summary>
    private double Turn(AnalyticalMember member, ElementIdentity element, string key)
    {
        foreach (var name in new[] { member.GlobalId, member.Name, key, element.GlobalId, element.Name })
            if (rules.TurnDegreesByMember.TryGetValue(name, out var degrees))
                return degrees;
        return rules.TurnDegrees;
    }

    /// <summary>Forces on the two ends of the member: at its start they are the opposite of those on the +x face.</summary>
    private static Samples FromEndForces(Part21Record reaction, int samples, ImmutableArray<ForceStation>.Builder stations, double length, string words)
    {
        if (samples < stations.Count)
            return Unusable(ReasonCode.ConventionUnknown, $"the reaction #{reaction.Id} has one sample for the whole member, which end forces cannot have");

        for (var i = 0; i < stations.Count; i++)
        {
            var station = stations[i];
            var isStart = Math.Abs(station.X) <= AtEnd * length;
            if (!isStart && Math.Abs(station.X - length) > AtEnd * length)
                return Unusable(ReasonCode.ConventionUnknown, $"the reaction #{reaction.Id} has samples between the ends, which end forces cannot have");

            if (isStart) stations[i] = station with { Forces = -1 * station.Forces };
        }

        return new Samples(stations.ToImmutable(), words + "; end forces: values at the start reversed", null);
    }

    private string Words(Part21Record reaction, double degrees)
    {
        var flag = Instances.Literal(reaction[8]);
        var axes = IsGlobal(reaction) ? "global axes" : "the analytical member's axes";
        var overruled = rules.Components == ForceComponents.AsFlagged ? "" : $" by the settings (flag {flag})";
        var turn = !IsGlobal(reaction) && degrees != 0 ? string.Create(CultureInfo.InvariantCulture, $", which are turned by {degrees:R}° about x from its own") : "";
        return $"components in {axes}{overruled}{turn}";
    }

    private static Samples Unusable(ReasonCode code, string message) => Unusable(new Reason(code, message));

    private static Samples Unusable(Reason why) => new([], "", why);
}
