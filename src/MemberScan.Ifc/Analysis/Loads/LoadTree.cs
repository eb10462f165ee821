using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Rules;
using MemberScan.Model.Rules.Combinations;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Analysis.Loads;

/// <summary>Load groups, cases and combinations as they hold each other, with the factors of each schema.</summary>
/// <remarks>
/// Factor of an action = product of the coefficients of all groups above it and of the factors of the relations between them
/// (<c>IfcRelAssignsToGroupByFactor</c>; 1 for a plain assignment). Self-weight coefficients of a case are not multiplied by that case's own
/// coefficient. A coefficient that is left out is not known, unless the rules say that it is 1.
/// </remarks>
internal sealed class LoadTree
{
    /// <summary>Deepest nesting of groups.</summary>
    public const int MaxDepth = 32;

    /// <summary>Most shares of one combination.</summary>
    public const int MaxShares = 100_000;

    private readonly Instances _instances;
    private readonly ForceRules _rules;
    private readonly Dictionary<ulong, List<(ulong Child, double? Factor)>> _children = [];
    private readonly HashSet<ulong> _factoredActions = [];

    public LoadTree(Instances instances, ForceRules rules)
    {
        (_instances, _rules) = (instances, rules);
        foreach (var relation in instances.File.RecordsOf("IFCRELASSIGNSTOGROUP")) Add(relation, 1);
        foreach (var relation in instances.File.RecordsOf("IFCRELASSIGNSTOGROUPBYFACTOR")) Add(relation, Instances.Real(relation[7]));
    }

    /// <summary>The combinations of the model, in its order.</summary>
    public IEnumerable<Part21Record> Combinations =>
        _instances.File.RecordsOf("IFCSTRUCTURALLOADGROUP").Where(g => Instances.Literal(g[5]) == "LOAD_COMBINATION");

    /// <summary>Whether an action has a factor in a group of its own, which is not read.</summary>
    public bool HasOwnFactor(ulong action) => _factoredActions.Contains(action);

    /// <summary>The groups whose actions act in a case or combination, with their factors.</summary>
    public LoadFactors ActionsOf(ulong group)
    {
        var walk = new Walk();
        VisitActions(walk, group, 1, 0);
        return walk.Finish();
    }

    /// <summary>The cases of a combination whose results make up its own.</summary>
    /// <param name="combination">The combination.</param>
    /// <param name="hasResults">Whether a group has results; the walk stops there.</param>
    public LoadFactors CasesOf(ulong combination, Func<ulong, bool> hasResults)
    {
        var walk = new Walk();
        VisitCases(walk, combination, 1, 0, hasResults, isTop: true);
        return walk.Finish();
    }

    /// <summary>All groups below a combination, whatever their factors.</summary>
    public IReadOnlySet<ulong> Below(ulong combination)
    {
        var (below, open) = (new HashSet<ulong>(), new Stack<ulong>([combination]));
        while (open.TryPop(out var group))
            foreach (var (child, _) in _children.GetValueOrDefault(group) ?? [])
                if (below.Count < MaxShares && below.Add(child)) open.Push(child);
        return below;
    }

    private void VisitActions(Walk walk, ulong group, double factor, int depth)
    {
        if (!Enter(walk, group, depth, out var record)) return;

        if (SelfWeight(record) is { } weight) walk.SelfWeight += factor * weight;
        if (Coefficient(record) is not { } coefficient)
        {
            walk.Fail(Unknown(record));
            return;
        }

        walk.Add(group, factor * coefficient);
        foreach (var (child, share) in _children.GetValueOrDefault(group) ?? [])
            if (Share(walk, record, child, share) is { } known)
                VisitActions(walk, child, factor * coefficient * known, depth + 1);
    }

    private void VisitCases(Walk walk, ulong group, double factor, int depth, Func<ulong, bool> hasResults, bool isTop)
    {
        if (!Enter(walk, group, depth, out var record)) return;

        if (!isTop && hasResults(group))
        {
            if (OfResults(walk, record) is { } own) walk.Add(group, factor * own);
            return;
        }

        if (Coefficient(record) is not { } coefficient)
        {
            walk.Fail(Unknown(record));
            return;
        }

        var children = _children.GetValueOrDefault(group) ?? [];
        if (children.Count == 0 || SelfWeight(record) is { } weight && weight != Vector3.Zero)
            walk.Fail(new Reason(ReasonCode.NoCombination, $"{Words(record)} has no results"));
        foreach (var (child, share) in children)
            if (Share(walk, record, child, share) is { } known)
                VisitCases(walk, child, factor * coefficient * known, depth + 1, hasResults, isTop: false);
    }

    /// <summary>What results of a case are multiplied by for its own coefficient; null when that is not known.</summary>
    private double? OfResults(Walk walk, Part21Record record)
    {
        if (_rules.CaseCoefficients == CaseCoefficients.InResults) return 1;
        if (Coefficient(record) is not { } coefficient)
        {
            walk.Fail(Unknown(record));
            return null;
        }

        if (coefficient == 1) return 1;
        if (_rules.CaseCoefficients == CaseCoefficients.Refuse)
            walk.Fail(new Reason(ReasonCode.NoCombination, string.Create(CultureInfo.InvariantCulture,
                $"{Words(record)} has the coefficient {coefficient:0.######}, and nothing says whether its results carry it; the settings can (forces.caseCoefficients)")));
        else if (SelfWeight(record) is { } weight && weight != Vector3.Zero)
            walk.Fail(new Reason(ReasonCode.NoCombination, $"{Words(record)} has a coefficient that does not apply to its self-weight, and its results are not apart"));
        return coefficient;
    }

    private bool Enter(Walk walk, ulong group, int depth, out Part21Record record)
    {
        record = default;
        if (walk.Why is not null) return false;
        if (depth > MaxDepth || walk.Count >= MaxShares)
        {
            walk.Fail(new Reason(ReasonCode.DamagedRecord, $"the load groups below #{group} hold each other in a ring, or are nested deeper than {MaxDepth}"));
            return false;
        }

        if (_instances.File.TryFind(group, out record) && IsGroup(record)) return true;

        walk.Fail(new Reason(ReasonCode.DamagedRecord, $"the load group #{group} is missing"));
        return false;
    }

    private static double? Share(Walk walk, Part21Record group, ulong child, double? share)
    {
        if (share is null) walk.Fail(new Reason(ReasonCode.NoCombination, $"{Words(group)} holds #{child} with a factor that is no number, or twice"));
        return share;
    }

    private double? Coefficient(Part21Record group) =>
        group[8].IsEmpty ? _rules.MissingCoefficientsAreOne ? 1 : null : Instances.Real(group[8]);

    private static Vector3? SelfWeight(Part21Record group) =>
        group.Keyword == "IFCSTRUCTURALLOADCASE" && Instances.Reals(group[10]) is { Length: 3 } c ? new Vector3(c[0], c[1], c[2]) : null;

    private static Reason Unknown(Part21Record group) => new(
        ReasonCode.NoCombination, $"{Words(group)} leaves out its coefficient, so its factor is not known; the settings can say that it is 1 (forces.missingCoefficients)");

    private static string Words(Part21Record group) => string.Create(CultureInfo.InvariantCulture, $"the load group #{group.Id} '{Instances.Text(group[2]).Trim()}'");

    private static bool IsGroup(Part21Record record) => record.Keyword is "IFCSTRUCTURALLOADGROUP" or "IFCSTRUCTURALLOADCASE";

    private void Add(Part21Record relation, double? factor)
    {
        if (!relation[6].TryReference(out var group) || !_instances.File.TryFind(group, out var record) || !IsGroup(record)) return;

        if (!_children.TryGetValue(group, out var children)) _children[group] = children = [];
        foreach (var id in Instances.IdsOf(relation[4]))
        {
            if (!_instances.File.TryFind(id, out var child)) continue;

            if (!IsGroup(child))
            {
                if (factor != 1) _factoredActions.Add(id);
            }
            else if (children.FindIndex(c => c.Child == id) is var index and >= 0)
            {
                children[index] = (id, null);
            }
            else
            {
                children.Add((id, factor));
            }
        }
    }

    private sealed class Walk
    {
        private readonly ImmutableArray<LoadFactor>.Builder _factors = ImmutableArray.CreateBuilder<LoadFactor>();

        public Vector3 SelfWeight { get; set; } = Vector3.Zero;

        public Reason? Why { get; private set; }

        public int Count => _factors.Count;

        public void Add(ulong group, double factor) => _factors.Add(new LoadFactor(group, factor));

        public void Fail(Reason why) => Why ??= why;

        public LoadFactors Finish() => new(Why is null ? _factors.ToImmutable() : [], SelfWeight, Why);
    }
}
