using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Analysis.Loads;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;

namespace MemberScan.Ifc.Frames;

/// <summary>Lays section forces of analytical members on the candidates that they stand for, in each candidate's own axes.</summary>
internal static class LaidForces
{
    /// <summary>The forces of the candidates, in candidate order and then in the order of the situations.</summary>
    /// <param name="members">The candidates.</param>
    /// <param name="forces">Forces of analytical members.</param>
    /// <param name="bodies">Which analytical members belong to which candidate.</param>
    public static ImmutableArray<MemberForces> Of(ImmutableArray<Member> members, IEnumerable<LineForces> forces, BodyLines bodies)
    {
        var byLine = forces.ToLookup(f => f.Line);
        var laid = ImmutableArray.CreateBuilder<MemberForces>();
        foreach (var group in members.GroupBy(m => m.Element.StepId))
        {
            var items = group.ToList();
            var lines = bodies.LinesOf(items[0]);
            if (!lines.Exists(line => byLine.Contains(line.Id))) continue;

            foreach (var (member, own) in bodies.Assign(items, lines))
                foreach (var situation in own.SelectMany(line => byLine[line.Id].Select(f => (Line: line, Forces: f))).GroupBy(p => p.Forces.Situation))
                    laid.Add(Join(member, situation.Key, [.. situation]));
        }

        return laid.ToImmutable();
    }

    private static MemberForces Join(Member member, Situation situation, List<(AnalyticalMember Line, LineForces Forces)> parts)
    {
        var joined = JoinedForces.Of(member, situation, parts.ConvertAll(p => Part(p.Line, p.Forces)));
        var notes = parts.SelectMany(p => p.Forces.Notes).Distinct(StringComparer.Ordinal);
        return joined with { Source = string.Join(", ", parts.Select(p => p.Forces.Source)), Notes = [.. notes], LoadsAreKnown = true, TorsionAxis = TorsionAxis.ShearCentre };
    }

    private static JoinedForces.Part Part(AnalyticalMember line, LineForces forces)
    {
        // The forces are in the axes of the section, which may not be those of the analytical member.
        var own = forces.Axes is { } axes ? line with { Axes = new Finding<MemberAxes>.Found(axes, "axes of the section") } : line;
        return new JoinedForces.Part(own, forces.Source, new ReactionReader.Samples(forces.Stations, "section's axes in the frame", forces.Unusable), LineLoads.Unknown(""));
    }
}
