using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Inputs.Frames;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Statics;

namespace MemberScan.Cli.Frames;

/// <summary>What the frame command shows, every number in the units of the file.</summary>
/// <param name="Units">The units.</param>
/// <param name="Quality">The arithmetic.</param>
/// <param name="Notes">Findings that bar nothing.</param>
/// <param name="Situations">The situations.</param>
internal sealed record FrameDocument(FrameUnits Units, SolveQuality Quality, ImmutableArray<string> Notes, ImmutableArray<FrameDocument.Answer> Situations)
{
    /// <summary>The answer to one situation.</summary>
    public sealed record Answer(
        string Name, string Kind, string? Basis, ImmutableArray<(string Node, double[] Six)> Displacements, ImmutableArray<(string Node, double[] Six)> Reactions,
        ImmutableArray<MemberAnswer> Members, SituationResult Checks);

    /// <summary>One member in one situation: rows of x, N, Vy, Vz, T, My, Mz, ux, uy, uz; extremes of least, place, largest, place.</summary>
    public sealed record MemberAnswer(
        string Name, double Length, ImmutableArray<double[]> Rows, ImmutableArray<(string Component, double[] Four)> Extremes, double? Utilization, string? WhyNoUtilization);

    /// <summary>Gathers everything.</summary>
    public static FrameDocument Of(FrameFile file, FrameResult result, FrameStrength strength, DiagnosticList diagnostics) => new(
        file.Units, result.Quality, [.. diagnostics.Items.Select(d => $"{d.Code} {d.Message}")], [.. result.Situations.Select(s => AnswerOf(file, s, strength))]);

    private static Answer AnswerOf(FrameFile file, SituationResult situation, FrameStrength strength)
    {
        var (units, frame) = (file.Units, file.Frame);
        var nodes = Enumerable.Range(0, frame.Nodes.Length);
        var members = Enumerable.Range(0, frame.Members.Length).Select(m => MemberOf(file, situation, m, strength)).ToImmutableArray();
        return new Answer(
            situation.Situation.Name,
            situation.Situation.Kind switch { SituationKind.Service => "service", SituationKind.Design => "design", _ => "not said" },
            members.Any(m => m.Utilization is not null) ? FrameStrength.Basis(situation.Situation.Kind) : null,
            [.. nodes.Select(n => (frame.Nodes[n].Name, Six(situation.Displacement(n).Shift, 1 / units.Length.Factor, situation.Displacement(n).Turn, 1)))],
            [.. frame.Supports.OrderBy(s => s.Node).Select(s => (frame.Nodes[s.Node].Name, Six(situation.Reaction(s.Node).Force, 1 / units.Force.Factor, situation.Reaction(s.Node).Moment, 1 / units.Moment)))],
            members, situation);
    }

    private static MemberAnswer MemberOf(FrameFile file, SituationResult situation, int number, FrameStrength strength)
    {
        var (units, member) = (file.Units, situation.Member(number));
        var (l, f, m) = (1 / units.Length.Factor, 1 / units.Force.Factor, 1 / units.Moment);
        var (utilization, whyNot) = strength.Utilization(number, member, situation.Situation.Kind);
        return new MemberAnswer(
            file.Frame.Members[number].Name, l * member.Length,
            [.. member.Stations.Select(s => (double[])
                [
                    l * s.X, f * s.Forces.N, f * s.Forces.Vy, f * s.Forces.Vz, m * s.Forces.T, m * s.Forces.My, m * s.Forces.Mz,
                    l * s.Displacement.X, l * s.Displacement.Y, l * s.Displacement.Z,
                ])],
            [.. member.Extremes.Select(e => (e.Component.ToString(), (double[])[Factor(e.Component) * e.Least, l * e.LeastAt, Factor(e.Component) * e.Largest, l * e.LargestAt]))],
            utilization, whyNot);

        double Factor(ForceComponent component) => component >= ForceComponent.T ? m : f;
    }

    private static double[] Six(Vector3 a, double first, Vector3 b, double second) => [first * a.X, first * a.Y, first * a.Z, second * b.X, second * b.Y, second * b.Z];
}
