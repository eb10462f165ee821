using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Analysis.Loads;
using MemberScan.Ifc.Frames.Loading;
using MemberScan.Ifc.Frames.Topology;
using MemberScan.Model.Frames.Loads;
using MemberScan.Model.Loads;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames;

/// <summary>Load cases and combinations of an analysis model as situations of its frame.</summary>
/// <remarks>
/// A situation holds everything that acts in its case or combination, with the factors of the model. One in which anything acts that is not
/// read, or whose factors are not known, is told so and its results are not used.
/// </remarks>
internal sealed class FrameLoadReader
{
    /// <summary>Most situations of one analysis model.</summary>
    public const int MostSituations = 1000;

    private readonly Instances _instances;
    private readonly Relations _relations;
    private readonly AnalyticalMemberReader _analytical;
    private readonly LoadTree _tree;
    private readonly MemberLoadReader _memberLoads;
    private readonly NodeLoadReader _nodeLoads;
    private readonly SituationReader _situations;
    private readonly Dictionary<ulong, List<ulong>> _itemsOf = [];
    private readonly List<Part21Record> _actions = [];

    public FrameLoadReader(
        Instances instances, Relations relations, AnalyticalMemberReader analytical, LoadTree tree, MemberLoadReader memberLoads, NodeLoadReader nodeLoads, SituationReader situations)
    {
        (_instances, _relations, _analytical, _tree, _memberLoads, _nodeLoads, _situations) = (instances, relations, analytical, tree, memberLoads, nodeLoads, situations);
        foreach (var relation in instances.File.RecordsOf("IFCRELCONNECTSSTRUCTURALACTIVITY"))
            if (relation[4].TryReference(out var item) && relation[5].TryReference(out var activity))
            {
                if (!_itemsOf.TryGetValue(activity, out var items)) _itemsOf[activity] = items = [];
                items.Add(item);
            }

        foreach (var keyword in (string[])["POINTACTION", "CURVEACTION", "LINEARACTION", "LINEARACTIONVARYING", "SURFACEACTION", "PLANARACTION", "PLANARACTIONVARYING"])
            _actions.AddRange(instances.File.RecordsOf("IFCSTRUCTURAL" + keyword));
    }

    /// <summary>The loads of one analysis model.</summary>
    /// <param name="Members">On its members.</param>
    /// <param name="Nodes">On its connections.</param>
    /// <param name="Uncovered">Actions on it, or on nothing, that no frame holds.</param>
    private sealed record Acting(ImmutableArray<MemberLoad> Members, ImmutableArray<NodeAction> Nodes, ImmutableArray<Part21Record> Uncovered);

    /// <summary>Reads the situations of a model.</summary>
    /// <param name="model">The analysis model.</param>
    /// <param name="items">Its items.</param>
    /// <param name="assembly">Its nodes and members.</param>
    /// <param name="hasLoads">Whether anything acts on it at all.</param>
    public (ImmutableArray<FrameSituation> Situations, ImmutableArray<FrameCase> Cases) Read(Part21Record model, StructuralItems items, FrameAssembly assembly, out bool hasLoads)
    {
        var acting = Gather(items, assembly);
        var down = items.Members.Select(m => _analytical.Read(m.Id)!.GlobalAxes).FirstOrDefault() ?? Transform3.Identity;
        var groups = Groups(model, acting).ToList();
        var situations = ImmutableArray.CreateBuilder<FrameSituation>();
        var cases = ImmutableArray.CreateBuilder<FrameCase>();
        hasLoads = acting.Members.Length + acting.Nodes.Length + acting.Uncovered.Length > 0;
        if (groups.Count > MostSituations) assembly.Refuse(new Reason(ReasonCode.NoForces, $"the analysis model has more than {MostSituations} load cases and combinations"));
        foreach (var group in groups.Take(MostSituations))
        {
            var factors = _tree.ActionsOf(group.Id);
            hasLoads |= factors.SelfWeight != Vector3.Zero;
            var situation = _situations.OfLoads(group);
            var builder = new SituationBuilder(situation, down.Direction(factors.SelfWeight));
            if (factors.Why is { } why) builder.Fail(why);
            else Fill(builder, factors, acting, assembly);
            situations.Add(builder.Build());
            cases.Add(new FrameCase(situation, group.Id, builder.Unusable, [.. builder.Notes]));
        }

        return (situations.ToImmutable(), cases.ToImmutable());
    }

    private Acting Gather(StructuralItems items, FrameAssembly assembly)
    {
        var members = items.Members.SelectMany(m => _memberLoads.On(_analytical.Read(m.Id)!)).ToImmutableArray();
        var nodes = assembly.Connections.Values.SelectMany(c => _nodeLoads.On(c.Connection, c.Node, assembly.SupportOf(c.Node))).ToImmutableArray();
        var read = members.Select(l => l.Action).Concat(nodes.Select(n => n.Action)).ToHashSet();
        var own = items.Members.Concat(items.Connections).Concat(items.Others).Select(r => r.Id).ToHashSet();
        return new Acting(members, nodes, [.. _actions.Where(a => !read.Contains(a.Id) && IsHere(a.Id, own))]);
    }

    /// <summary>Whether an action acts on an item of the model, or on nothing that any analysis model holds.</summary>
    private bool IsHere(ulong action, HashSet<ulong> own)
    {
        var on = _itemsOf.GetValueOrDefault(action) ?? [];
        return on.Count == 0 || on.Exists(own.Contains) || on.TrueForAll(id => !_instances.File.TryFind(id, out var item) || !item.Keyword.StartsWith("IFCSTRUCTURAL", StringComparison.Ordinal));
    }

    /// <summary>The cases and combinations: those that the model lists and what is below them; all that hold its actions where it lists none.</summary>
    private IEnumerable<Part21Record> Groups(Part21Record model, Acting acting)
    {
        var ids = new HashSet<ulong>(Instances.IdsOf(model[7]));
        foreach (var top in ids.ToList()) ids.UnionWith(_tree.Below(top));
        if (ids.Count == 0)
            ids.UnionWith(acting.Members.SelectMany(l => l.Groups).Concat(acting.Nodes.SelectMany(n => n.Groups)).Concat(acting.Uncovered.SelectMany(a => _relations.GroupsOf(a.Id))));

        // A plain group below a case is part of it, and no situation.
        var below = ids.SelectMany(_tree.Below).ToHashSet();
        foreach (var id in ids.Order())
            if (_instances.File.TryFind(id, out var group) && group.Keyword is "IFCSTRUCTURALLOADGROUP" or "IFCSTRUCTURALLOADCASE"
                && (Instances.Literal(group[5]) is "LOAD_CASE" or "LOAD_COMBINATION" || !below.Contains(id)))
                yield return group;
    }

    private void Fill(SituationBuilder builder, LoadFactors factors, Acting acting, FrameAssembly assembly)
    {
        foreach (var action in acting.Uncovered)
            if (factors.Groups.Where(g => _relations.GroupsOf(action.Id).Contains(g.Group)).Sum(g => g.Factor) != 0)
                builder.Fail(new Reason(ReasonCode.ForcesIncomplete, string.Create(CultureInfo.InvariantCulture, $"the load {action.Keyword} #{action.Id} is not covered, so not all that acts is known")));
        foreach (var node in acting.Nodes)
            if (factors.Groups.Where(g => node.Groups.Contains(g.Group)).Sum(g => g.Factor) is var factor and not 0) builder.Add(node, factor);
        foreach (var load in acting.Members)
            if (factors.Of(load) is var factor and not 0)
                if (load.Unusable is { } why) builder.Fail(why);
                else builder.Add(load, factor, _analytical.Read(load.Member)!, assembly);
        if (factors.SelfWeight != Vector3.Zero) builder.Weigh(assembly);
    }
}
