using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.Analysis.Loads;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Analysis;

/// <summary>Forces of the model's combinations that have no results of their own, superposed from the results of their cases.</summary>
internal sealed class CombinedForces
{
    private readonly SituationReader _situations;
    private readonly DiagnosticList _diagnostics;
    private readonly List<(Part21Record Combination, LoadFactors Cases, IReadOnlySet<ulong> Below)> _combinations = [];
    private readonly HashSet<ulong> _met = [];
    private readonly bool _hasResults;

    public CombinedForces(Instances instances, LoadTree tree, SituationReader situations, DiagnosticList diagnostics)
    {
        (_situations, _diagnostics) = (situations, diagnostics);
        var withResults = new HashSet<ulong>();
        foreach (var group in instances.File.RecordsOf("IFCSTRUCTURALRESULTGROUP"))
            if (group[6].TryReference(out var loads))
                _ = withResults.Add(loads);
        _hasResults = withResults.Count > 0;
        foreach (var combination in tree.Combinations) _combinations.Add((combination, tree.CasesOf(combination.Id, withResults.Contains), tree.Below(combination.Id)));
    }

    /// <summary>The combinations on one candidate.</summary>
    /// <param name="member">The candidate.</param>
    /// <param name="read">Its results, with the result group of each.</param>
    public IEnumerable<MemberForces> Of(Member member, List<(Part21Record Group, MemberForces Forces)> read)
    {
        if (read.Count == 0) yield break;

        var byLoads = new Dictionary<ulong, MemberForces>();
        foreach (var (group, forces) in read)
            if (group[6].TryReference(out var loads))
                _ = byLoads.TryAdd(loads, forces);

        foreach (var (combination, cases, below) in _combinations)
        {
            if (byLoads.ContainsKey(combination.Id))
            {
                _ = _met.Add(combination.Id);
                continue;
            }

            if (!below.Any(byLoads.ContainsKey)) continue;

            _ = _met.Add(combination.Id);
            yield return Of(member, combination, cases, byLoads, read[0].Forces);
        }
    }

    /// <summary>Tells of combinations that no candidate has forces of.</summary>
    public void ReportUnused()
    {
        // A model without any results is one for our own analysis, which has the combinations from the loads.
        if (!_hasResults) return;

        foreach (var (combination, cases, _) in _combinations)
            if (!_met.Contains(combination.Id))
                _diagnostics.Add("IFC-0027", Severity.Warning, $"A combination has no results, nor have its cases on any candidate{(cases.Why is { } why ? $" ({why.Message})" : "")}; it is not checked.", combination.Span);
    }

    private MemberForces Of(Member member, Part21Record combination, LoadFactors cases, Dictionary<ulong, MemberForces> byLoads, MemberForces any)
    {
        var situation = _situations.OfCombination(combination);
        MemberForces Unusable(Reason why) => new()
        {
            MemberKey = member.Key,
            Situation = situation,
            Stations = [],
            Source = string.Create(CultureInfo.InvariantCulture, $"{combination.Keyword} #{combination.Id}"),
            Unusable = why,
        };
        if (cases.Why is { } unknown) return Unusable(unknown);

        var parts = new List<FactoredForces>();
        foreach (var (group, factor) in cases.Groups)
        {
            if (factor == 0) continue;
            if (!byLoads.TryGetValue(group, out var forces))
                return Unusable(new Reason(ReasonCode.ForcesIncomplete, $"the combination '{situation.Name}' needs results of the load group #{group}, and this member has none"));

            parts.Add(new FactoredForces(factor, forces));
        }

        if (parts.Count == 0) return Unusable(new Reason(ReasonCode.NoForces, $"all factors of the combination '{situation.Name}' are 0"));
        if (any.To is null && !member.Length.TryGet(out _, out var noLength)) return Unusable(noLength);

        var length = member.Length is Finding<double>.Found found ? found.Value : any.To!.Value;
        return Superposition.Of(situation, parts, length, string.Create(CultureInfo.InvariantCulture, $"combination #{combination.Id} of the model"));
    }
}
