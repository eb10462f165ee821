using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Schema;
using MemberScan.Ifc.Units;
using MemberScan.Model.Loads;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Analysis.Loads;

/// <summary>Actions on analytical members: point, linear and curve actions with their samples, in SI and without factors.</summary>
internal sealed class MemberLoadReader(
    Instances instances, Relations relations, ActivityPlaces places, LoadTree tree, ModelUnits units, SchemaVersion schema)
{
    /// <summary>Most samples of one action.</summary>
    public const int MaxSamples = 100_000;

    /// <summary>Share of the length by which a location may lie beyond an end.</summary>
    private const double Beyond = 1e-6;

    /// <summary>All loads on an analytical member, in the order of the model; loads that cannot be used are among them, with the reason.</summary>
    public ImmutableArray<MemberLoad> On(AnalyticalMember member)
    {
        var loads = ImmutableArray.CreateBuilder<MemberLoad>();
        foreach (var id in relations.ActivitiesOn(member.Id))
            if (instances.File.TryFind(id, out var action) && action.Keyword.StartsWith("IFCSTRUCTURAL", StringComparison.Ordinal) && action.Keyword.Contains("ACTION", StringComparison.Ordinal)
                && !action.Keyword.Contains("REACTION", StringComparison.Ordinal))
                loads.AddRange(Read(action, member));
        return loads.ToImmutable();
    }

    private IEnumerable<MemberLoad> Read(Part21Record action, AnalyticalMember member)
    {
        var load = Blank(action, member);
        if (tree.HasOwnFactor(action.Id)) return [Unusable(load, ReasonCode.ForcesIncomplete, "has a factor of its own in its group, which is not read")];
        if (!member.Length.TryGet(out var length, out var noLength)) return [load with { Unusable = noLength }];
        if (!instances.TryFollow(action[7], out var applied)) return [Unusable(load, ReasonCode.DamagedRecord, "has no values")];
        if (applied.Keyword == "IFCSTRUCTURALLOADTEMPERATURE") return [Temperature(load, applied, length.Value)];

        return action.Keyword switch
        {
            "IFCSTRUCTURALPOINTACTION" => [Point(load, action, applied, member)],
            "IFCSTRUCTURALLINEARACTION" => [Whole(load, action, applied, member, length.Value, LoadShape.Linear)],
            "IFCSTRUCTURALLINEARACTIONVARYING" => Varying(load, action, applied, member, length.Value),
            "IFCSTRUCTURALCURVEACTION" => Curve(load, action, applied, member, length.Value),
            _ => [Unusable(load, ReasonCode.ForcesIncomplete, "is of a class that is not read")],
        };
    }

    private MemberLoad Blank(Part21Record action, AnalyticalMember member)
    {
        var isLocal = Instances.Literal(action[8]) == "LOCAL_COORDS";
        var projected = action.Keyword switch
        {
            "IFCSTRUCTURALLINEARACTION" or "IFCSTRUCTURALLINEARACTIONVARYING" or "IFCSTRUCTURALCURVEACTION" => Instances.Literal(action[schema == SchemaVersion.Ifc2x3 ? 11 : 10]) == "PROJECTED_LENGTH",
            _ => false,
        };
        return new MemberLoad
        {
            Member = member.Id,
            Action = action.Id,
            Groups = [.. relations.GroupsOf(action.Id)],
            Shape = LoadShape.Point,
            From = 0,
            To = 0,
            Start = default,
            End = default,
            Axes = isLocal ? LoadAxes.Member : LoadAxes.Project,
            IsProjected = projected && !isLocal,
            Source = string.Create(CultureInfo.InvariantCulture, $"{action.Keyword} #{action.Id}"),
        };
    }

    private MemberLoad Point(MemberLoad load, Part21Record action, Part21Record applied, AnalyticalMember member)
    {
        if (places.OfVertex(action, member) is not { } place) return Unusable(load, ReasonCode.ForcesIncomplete, "does not say where on the member it acts");

        return Vector(load, applied, member, isPoint: true, out var vector) ?? load with { From = place, To = place, Start = vector, End = vector };
    }

    private MemberLoad Whole(MemberLoad load, Part21Record action, Part21Record applied, AnalyticalMember member, double length, LoadShape shape)
    {
        var (from, to) = places.OfEdge(action, member) ?? (0, length);
        if (!Within(from, length) || !Within(to, length) || to <= from) return Unusable(load, ReasonCode.ForcesIncomplete, "lies on no stretch of its member");

        return Vector(load, applied, member, isPoint: false, out var vector) ?? load with { Shape = shape, From = from, To = to, Start = vector, End = vector };
    }

    private IEnumerable<MemberLoad> Curve(MemberLoad load, Part21Record action, Part21Record applied, AnalyticalMember member, double length)
    {
        var type = Instances.Literal(action[11]);
        if (applied.Keyword != "IFCSTRUCTURALLOADCONFIGURATION")
        {
            return type switch
            {
                "CONST" => [Whole(load, action, applied, member, length, LoadShape.Linear)],
                "SINUS" => [Whole(load, action, applied, member, length, LoadShape.HalfSine)],
                "PARABOLA" => [Whole(load, action, applied, member, length, LoadShape.Parabola)],
                _ => [Unusable(load, ReasonCode.ForcesIncomplete, $"is of type {type} and has one value only")],
            };
        }

        if (applied[1].ItemCount > MaxSamples) return [Unusable(load, ReasonCode.ForcesIncomplete, $"has more than {MaxSamples} samples")];
        if (instances.FollowEach(applied[1]) is not { Count: > 0 } samples) return [Unusable(load, ReasonCode.DamagedRecord, "has lost a sample")];
        if (places.Locations(applied) is not { } locations) return [Unusable(load, ReasonCode.UnitMissing, "has locations, but the model names no length unit (LENGTHUNIT)")];
        if (locations.Length != samples.Count || !locations.All(x => Within(x, length)))
            return [Unusable(load, ReasonCode.ForcesIncomplete, $"has {samples.Count} samples at {locations.Length} locations, or a location beyond its member")];

        return type switch
        {
            "DISCRETE" => Samples(load, samples, locations, member),
            "LINEAR" or "POLYGONAL" => Pieces(load, samples, locations, member),
            _ => [Unusable(load, ReasonCode.ForcesIncomplete, $"is of type {type}, which says nothing of the load between its samples")],
        };
    }

    /// <summary>IFC2X3: the applied load and the subsequent ones, each at its point of the shape aspect, linear in between.</summary>
    private IEnumerable<MemberLoad> Varying(MemberLoad load, Part21Record action, Part21Record applied, AnalyticalMember member, double length)
    {
        if (action[13].ItemCount >= MaxSamples) return [Unusable(load, ReasonCode.ForcesIncomplete, $"has more than {MaxSamples} samples")];
        if (instances.FollowEach(action[13]) is not { Count: > 0 } subsequent) return [Unusable(load, ReasonCode.DamagedRecord, "has lost a sample")];
        if (places.OfAspect(action, action[12], member) is not { } locations) return [Unusable(load, ReasonCode.ForcesIncomplete, "has a location that is no point on a line")];
        if (locations.Length != subsequent.Count + 1 || !locations.All(x => Within(x, length)))
            return [Unusable(load, ReasonCode.ForcesIncomplete, $"has {subsequent.Count + 1} samples at {locations.Length} locations, or a location beyond its member")];

        return Pieces(load, [applied, .. subsequent], locations, member);
    }

    private IEnumerable<MemberLoad> Samples(MemberLoad load, List<Part21Record> samples, double[] locations, AnalyticalMember member)
    {
        for (var i = 0; i < samples.Count; i++)
            yield return Vector(load, samples[i], member, isPoint: true, out var vector) ?? load with { From = locations[i], To = locations[i], Start = vector, End = vector };
    }

    private IEnumerable<MemberLoad> Pieces(MemberLoad load, List<Part21Record> samples, double[] locations, AnalyticalMember member)
    {
        for (var i = 1; i < samples.Count; i++)
        {
            if (locations[i] < locations[i - 1])
            {
                yield return Unusable(load, ReasonCode.ForcesIncomplete, "has locations in no order");
                yield break;
            }

            if (locations[i].Equals(locations[i - 1])) continue;

            if ((Vector(load, samples[i - 1], member, isPoint: false, out var start) ?? Vector(load, samples[i], member, isPoint: false, out _)) is { } faulty)
            {
                yield return faulty;
                yield break;
            }

            _ = Vector(load, samples[i], member, isPoint: false, out var end);
            yield return load with { Shape = LoadShape.Linear, From = locations[i - 1], To = locations[i], Start = start, End = end };
        }
    }

    /// <summary>Force and couple in the axes that the load says; the load with its fault when there are none. A component that is left out is 0.</summary>
    private MemberLoad? Vector(MemberLoad load, Part21Record values, AnalyticalMember member, bool isPoint, out LoadVector vector)
    {
        vector = default;
        var isRight = isPoint
            ? values.Keyword is "IFCSTRUCTURALLOADSINGLEFORCE" or "IFCSTRUCTURALLOADSINGLEFORCEWARPING"
            : values.Keyword == "IFCSTRUCTURALLOADLINEARFORCE";
        if (!isRight) return Unusable(load, ReasonCode.ForcesIncomplete, $"holds {values.Keyword}, which is no {(isPoint ? "force" : "force per length")}");

        Span<double> six = stackalloc double[6];
        for (var i = 0; i < 6; i++)
        {
            if (values[i + 1].IsEmpty) continue;
            if (Instances.Real(values[i + 1]) is not { } real) return Unusable(load, ReasonCode.DamagedRecord, "holds something other than a number");
            if (real == 0) continue;

            var unit = (isPoint, i < 3) switch { (true, true) => "FORCEUNIT", (true, false) => "TORQUEUNIT", (false, true) => "LINEARFORCEUNIT", _ => "LINEARMOMENTUNIT" };
            if (units.FactorOf(unit) is not { } factor) return Unusable(load, ReasonCode.UnitMissing, $"has values whose unit the model does not name ({unit})");

            six[i] = real * factor;
        }

        var (force, couple) = (new Vector3(six[0], six[1], six[2]), new Vector3(six[3], six[4], six[5]));
        if (!double.IsFinite(force.Length) || !double.IsFinite(couple.Length)) return Unusable(load, ReasonCode.ForcesIncomplete, "holds numbers beyond any range");

        vector = load.Axes == LoadAxes.Member ? new(force, couple) : new(member.GlobalAxes.Direction(force), member.GlobalAxes.Direction(couple));
        return null;
    }

    private MemberLoad Temperature(MemberLoad load, Part21Record values, double length)
    {
        var unit = units.FactorOf("THERMODYNAMICTEMPERATUREUNIT") ?? 1;
        var change = new Vector3(Instances.Real(values[1]) ?? 0, Instances.Real(values[2]) ?? 0, Instances.Real(values[3]) ?? 0);
        var vector = new LoadVector(unit * change, Vector3.Zero);
        return load with { Shape = LoadShape.Temperature, From = 0, To = length, Start = vector, End = vector, Axes = LoadAxes.Member, IsProjected = false };
    }

    private static bool Within(double x, double length) => x >= -Beyond * length && x <= (1 + Beyond) * length;

    private static MemberLoad Unusable(MemberLoad load, ReasonCode code, string words) => load with { Unusable = new Reason(code, $"the load {load.Source} {words}") };
}
