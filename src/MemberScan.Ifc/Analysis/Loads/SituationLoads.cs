using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Loads;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Analysis.Loads;

/// <summary>The loads behind results: what acts on an analytical member in the case or combination of a result group.</summary>
internal sealed class SituationLoads(Instances instances, LoadTree tree, MemberLoadReader reader)
{
    private readonly MemberWeight _weights = new();
    private readonly Dictionary<ulong, LoadFactors> _factors = [];
    private readonly Dictionary<ulong, ImmutableArray<MemberLoad>> _loads = [];

    /// <summary>The loads on a member in the situation of a result group.</summary>
    /// <param name="member">The candidate that the analytical member stands for; its section has the weight.</param>
    /// <param name="line">The analytical member.</param>
    /// <param name="axes">Axes of its section forces.</param>
    /// <param name="resultGroup">The result group.</param>
    public LineLoads On(Member member, AnalyticalMember line, MemberAxes axes, Part21Record resultGroup)
    {
        if (!instances.TryFollow(resultGroup[6], out var group)) return LineLoads.Unknown("");
        if (!_factors.TryGetValue(group.Id, out var factors)) _factors[group.Id] = factors = tree.ActionsOf(group.Id);
        if (factors.Why is { } why) return LineLoads.Unknown(why.Message);
        if (!_loads.TryGetValue(line.Id, out var loads)) _loads[line.Id] = loads = reader.On(line);
        var acting = ImmutableArray.CreateBuilder<LineLoad>();
        var words = new List<string>();
        if (factors.SelfWeight != Vector3.Zero)
        {
            if (Weight(member, line, axes, factors.SelfWeight, words, out var unknown) is not { } weight) return LineLoads.Unknown(unknown!.Message);

            acting.Add(weight);
        }

        foreach (var load in loads)
        {
            var factor = factors.Of(load);
            if (factor == 0 || load.Shape == LoadShape.Temperature) continue;
            if (load.Unusable is { } bad) return LineLoads.Unknown(bad.Message);

            acting.Add(new LineLoad(load.Shape, load.From, load.To, factor * load.Along(load.Start, axes), factor * load.Along(load.End, axes)));
            words.Add(factor == 1 ? load.Source : string.Create(CultureInfo.InvariantCulture, $"{factor:0.######} × {load.Source}"));
        }

        return new LineLoads(acting.ToImmutable(), string.Join(", ", words.Distinct(StringComparer.Ordinal)), "");
    }

    /// <summary>Self-weight along the whole analytical member; its factors follow the global axes of the analysis model.</summary>
    private LineLoad? Weight(Member member, AnalyticalMember line, MemberAxes axes, Vector3 factors, List<string> words, out Reason? why)
    {
        if (!line.Length.TryGet(out var length, out why) || !_weights.PerLength(member).TryGet(out var weight, out why)) return null;

        var load = new LoadVector(weight.Value * axes.Components(line.GlobalAxes.Direction(factors)), Vector3.Zero);
        words.Add(weight.Source);
        return new LineLoad(LoadShape.Linear, 0, length.Value, load, load);
    }
}
