using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.Analysis.Loads;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Analysis;

/// <summary>Section forces of the candidates from the result groups of a model, in each candidate's own axes.</summary>
internal sealed class ModelForcesReader(
    Instances instances, Relations relations, BodyLines bodies, ReactionReader reactions, SituationReader situations, SituationLoads loads,
    CombinedForces combinations, DiagnosticList diagnostics)
{
    private readonly HashSet<ulong> _used = [];

    /// <summary>Reads the forces of all candidates, in candidate order and then in the order of the result groups.</summary>
    public ImmutableArray<MemberForces> Read(ImmutableArray<Member> members)
    {
        var forces = ImmutableArray.CreateBuilder<MemberForces>();
        foreach (var group in members.GroupBy(m => m.Element.StepId))
        {
            var items = group.ToList();
            foreach (var (member, lines) in bodies.Assign(items, bodies.LinesOf(items[0]))) AddForces(member, lines, forces);
            ReportDirectActivities(items[0], forces);
        }

        ReportUnassigned();
        return forces.ToImmutable();
    }

    private void AddForces(Member member, List<AnalyticalMember> lines, ImmutableArray<MemberForces>.Builder forces)
    {
        var bySituation = new List<(Part21Record Group, List<JoinedForces.Part> Parts)>();
        foreach (var line in lines)
            foreach (var id in relations.ActivitiesOn(line.Id))
            {
                if (!instances.File.TryFind(id, out var reaction) || !IsReaction(reaction)) continue;

                _ = _used.Add(id);
                foreach (var group in relations.GroupsOf(id).Select(g => instances.File.TryFind(g, out var r) ? r : default).Where(r => r.Keyword == "IFCSTRUCTURALRESULTGROUP"))
                {
                    var index = bySituation.FindIndex(s => s.Group.Id == group.Id);
                    if (index < 0)
                    {
                        index = bySituation.Count;
                        bySituation.Add((group, []));
                    }

                    bySituation[index].Parts.Add(Part(member, line, reaction, group));
                }
            }

        var read = bySituation.OrderBy(s => s.Group.Span.Offset).Select(s => (s.Group, JoinedForces.Of(member, situations.Read(s.Group), s.Parts))).ToList();
        forces.AddRange(read.Select(r => r.Item2));
        forces.AddRange(combinations.Of(member, read));
    }

    private JoinedForces.Part Part(Member member, AnalyticalMember line, Part21Record reaction, Part21Record group)
    {
        var known = JoinedForces.LineAxes(line, member, out var axes, out _) ? loads.On(member, line, axes, group) : LineLoads.Unknown("");
        return new JoinedForces.Part(line, string.Create(CultureInfo.InvariantCulture, $"{reaction.Keyword} #{reaction.Id} on #{line.Id}"), reactions.Read(reaction, line, member.Element, member.Key, known.Loads), known);
    }

    private static bool IsReaction(Part21Record record) => record.Keyword is "IFCSTRUCTURALCURVEREACTION" or "IFCSTRUCTURALPOINTREACTION";

    /// <summary>Reactions hung on an element itself: no axes say how its components lie.</summary>
    private void ReportDirectActivities(Member member, ImmutableArray<MemberForces>.Builder forces)
    {
        if (member.Element.Class.StartsWith("IfcStructural", StringComparison.Ordinal)) return;

        foreach (var id in relations.ActivitiesOn(member.Element.StepId))
        {
            if (!instances.File.TryFind(id, out var reaction) || !IsReaction(reaction)) continue;

            _ = _used.Add(id);
            foreach (var group in relations.GroupsOf(id))
                if (instances.File.TryFind(group, out var record) && record.Keyword == "IFCSTRUCTURALRESULTGROUP")
                    forces.Add(new MemberForces
                    {
                        MemberKey = member.Key,
                        Situation = situations.Read(record),
                        Stations = [],
                        Source = string.Create(CultureInfo.InvariantCulture, $"{reaction.Keyword} #{reaction.Id}"),
                        Unusable = new Reason(ReasonCode.AxesUnknown, $"the reaction #{reaction.Id} hangs on the element itself; no analytical member says how its axes lie"),
                    });
        }
    }

    /// <summary>Results that no candidate has: without a situation, on nothing, or on something that is no candidate.</summary>
    private void ReportUnassigned()
    {
        foreach (var reaction in instances.File.RecordsOf("IFCSTRUCTURALCURVEREACTION"))
        {
            if (!relations.GroupsOf(reaction.Id).Any(g => instances.File.TryFind(g, out var r) && r.Keyword == "IFCSTRUCTURALRESULTGROUP"))
                diagnostics.Add("IFC-0023", Severity.Warning, "A curve reaction belongs to no result group, so its load situation is not known; it is not used.", reaction.Span);
            if (!relations.IsOnSomething(reaction.Id))
                diagnostics.Add("IFC-0024", Severity.Warning, "A curve reaction is connected to no member; it is not used.", reaction.Span);
            else if (!_used.Contains(reaction.Id))
                diagnostics.Add("IFC-0026", Severity.Warning, "A reaction lies on a member that is no candidate and stands for none; it is not used.", reaction.Span);
        }

        combinations.ReportUnused();
    }
}
