using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Decisions;
using MemberScan.Screening.Marks;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Decisions;

/// <summary>Carries people's decisions onto the candidates of a run, and tells which have gone stale.</summary>
public static class DecisionCarrier
{
    /// <summary>The results with their decisions.</summary>
    /// <param name="results">The candidates, with their input marks.</param>
    /// <param name="decisions">The decisions given.</param>
    /// <param name="madeOn">The run that they were made on: its marks are held against those of this one; null when not known.</param>
    /// <param name="diagnostics">Takes a warning for each decision that fits no candidate or several.</param>
    public static ImmutableArray<MemberResult> Carry(
        ImmutableArray<MemberResult> results, ImmutableArray<ReviewDecision> decisions, ScreeningRecord? madeOn, DiagnosticList diagnostics)
    {
        ArgumentNullException.ThrowIfNull(diagnostics);
        if (decisions.IsEmpty) return results;

        var names = results.Select((m, i) => (m.Key, i)).Concat(results.Where(m => m.Tag.Length > 0 && m.Tag != m.Key).Select((m, i) => (Key: m.Tag, results.IndexOf(m))))
            .ToLookup(e => e.Key, e => e.Item2, StringComparer.Ordinal);
        var earlier = (madeOn?.Members ?? []).GroupBy(m => m.Key, StringComparer.Ordinal).ToDictionary(g => g.Key, g => g.First(), StringComparer.Ordinal);
        var carried = results.ToBuilder();
        var taken = new HashSet<int>();
        foreach (var decision in decisions)
        {
            var places = names[decision.Member].Distinct().ToList();
            if (places.Count != 1)
                diagnostics.Add("SCR-0024", Severity.Warning, $"The decision for '{decision.Member}' fits {(places.Count == 0 ? "no candidate" : "several candidates")}; it is not carried along. Name one candidate by its key.", decision.Place);
            else if (!taken.Add(places[0]))
                diagnostics.Add("SCR-0025", Severity.Warning, $"A second decision for '{decision.Member}' by another of its names; the first is carried along.", decision.Place);
            else carried[places[0]] = carried[places[0]] with { Decision = Of(decision, carried[places[0]], earlier) };
        }

        return carried.ToImmutable();
    }

    private static MemberDecision Of(ReviewDecision decision, MemberResult member, Dictionary<string, MemberResult> earlier)
    {
        var before = earlier.GetValueOrDefault(member.Key);

        // A decision that the earlier run carried already keeps the inputs it was first made on.
        var madeOn = before?.Decision is { } same && (same.Decision, same.By, same.Date) == (decision.Decision, decision.By, decision.Date) ? same.MadeOn : before?.Inputs;
        var changed = madeOn is not null && member.Inputs is { } now ? madeOn.Differing(now) : [];
        return new MemberDecision(decision.Decision, decision.By, decision.Date, decision.Note, madeOn, [.. changed]);
    }
}
