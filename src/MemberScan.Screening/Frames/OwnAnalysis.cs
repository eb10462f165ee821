using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc;
using MemberScan.Ifc.Frames;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Frames;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Statics;

namespace MemberScan.Screening.Frames;

/// <summary>Section forces by our own frame analysis of the model's analysis models.</summary>
internal static class OwnAnalysis
{
    /// <summary>Places along each frame member at which its forces are given, beside those where they jump or have an extreme.</summary>
    private const int Stations = 21;

    /// <summary>Largest unbalanced share of the loads with which a solution is used.</summary>
    private const double LargestError = 1e-6;

    /// <summary>Forces by key of member, for members of analysis models that have loads.</summary>
    /// <param name="model">The model.</param>
    /// <param name="members">Its candidates.</param>
    /// <param name="evenWithResults">Whether analysis models that hold results of their own are solved too.</param>
    /// <param name="diagnostics">Takes what bars an analysis, and what makes its results doubtful.</param>
    public static ImmutableArray<MemberForces> Of(IfcModel model, ImmutableArray<Member> members, bool evenWithResults, DiagnosticList diagnostics)
    {
        if (!model.File.RecordsOf("IFCSTRUCTURALANALYSISMODEL").Any()) return [];

        var frames = model.ReadFrames(members).Where(f => f.HasLoads && (evenWithResults || !f.HasResults));
        return model.LayForces(members, frames.SelectMany(frame => Solve(frame, diagnostics)));
    }

    private static IEnumerable<LineForces> Solve(AnalysisFrame read, DiagnosticList diagnostics)
    {
        if (read.Frame is null) return Refused(read, [.. read.Refusals.Select(r => r.Message)], diagnostics);
        if (read.Cases.IsEmpty) return Refused(read, ["its loads belong to no load case"], diagnostics);

        var told = new DiagnosticList();
        var result = FrameSolver.Solve(read.Frame with { Stations = FrameStations.Equal(Stations) }, told);
        if (result is null) return Refused(read, [.. told.Items.Where(d => d.Severity == Severity.Error).Select(d => d.Message)], diagnostics);

        foreach (var item in told.Items) diagnostics.Add(item.Code, item.Severity, $"{read.Name}: {item.Message}");
        return [.. read.Cases.SelectMany((one, i) => OfCase(read, one, result.Situations[i], diagnostics))];
    }

    private static IEnumerable<LineForces> Refused(AnalysisFrame read, IReadOnlyList<string> why, DiagnosticList diagnostics)
    {
        foreach (var message in why) diagnostics.Add("SCR-0031", Severity.Warning, $"Our own frame analysis of {read.Name} was not possible: {message}");

        var situation = new Situation("own frame analysis", SituationKind.Unknown, "not stated", ActsInFull: false, read.Name);
        var more = why.Count > 1 ? string.Create(CultureInfo.InvariantCulture, $"; and {why.Count - 1} more") : "";
        var reason = new Reason(ReasonCode.NoForces, $"{read.Name} has loads and no results, and our own frame analysis of it was not possible: {why[0]}{more}");
        return read.Lines.Select(line => new LineForces { Line = line, Situation = situation, Source = Source(read, line), Unusable = reason });
    }

    private static IEnumerable<LineForces> OfCase(AnalysisFrame read, FrameCase one, Statics.SituationResult result, DiagnosticList diagnostics)
    {
        var notes = read.Notes.AddRange(one.Notes);
        var members = one.Unusable is null ? [.. Enumerable.Range(0, read.Pieces.Length).Select(result.Member)] : ImmutableArray<Statics.MemberResult>.Empty;
        ImmutableArray<MemberExtreme> axial = [.. members.Select(m => m.Extremes[(int)ForceComponent.N])];
        var bar = one.Unusable ?? Unbalanced(read, one, result) ?? WrongSense(read, one, axial);
        if (bar is null && SecondOrder(read, one, axial) is { } warning)
        {
            diagnostics.Add("SCR-0032", Severity.Warning, $"{read.Name}: {warning}");
            notes = notes.Add(warning);
        }

        foreach (var line in read.Lines)
        {
            var forces = new LineForces { Line = line, Situation = one.Situation, Source = Source(read, line), Notes = notes, Unusable = bar };
            var pieces = Enumerable.Range(0, read.Pieces.Length).Where(i => read.Pieces[i].Line == line).ToList();
            if (bar is not null || pieces.Count == 0) yield return forces;
            else if (!read.Pieces[pieces[0]].IsStraight)
                yield return forces with { Unusable = new Reason(ReasonCode.AxesUnknown, $"{read.Pieces[pieces[0]].Name} is curved or bent; its forces are not laid along a member") };
            else yield return forces with { Axes = read.Pieces[pieces[0]].Axes, Stations = [.. pieces.SelectMany(i => Along(members[i], read.Pieces[i].From))] };
        }
    }

    /// <summary>Stations of one frame member, from its place along the analytical member on.</summary>
    private static IEnumerable<ForceStation> Along(Statics.MemberResult member, double from)
    {
        foreach (var x in member.Stations.Select(s => s.X).Concat(member.Places).Append(0).Append(member.Length).Where(x => x >= 0 && x <= member.Length).Distinct().Order())
        {
            var (left, right) = (member.ForcesAt(x, afterJump: false), member.ForcesAt(x, afterJump: true));
            if (x > 0) yield return new ForceStation(from + x, left);
            if (x == 0 || (x < member.Length && left != right)) yield return new ForceStation(from + x, right);
        }
    }

    private static Reason? Unbalanced(AnalysisFrame read, FrameCase one, Statics.SituationResult result) =>
        result.EquilibriumError <= LargestError && result.Residual <= LargestError
            ? null
            : new Reason(ReasonCode.NoForces, string.Create(CultureInfo.InvariantCulture, $"our own frame analysis of {read.Name} leaves {Math.Max(result.EquilibriumError, result.Residual):0.0E+0} of the loads of '{one.Situation.Name}' unbalanced"));

    /// <summary>A cable that would be compressed, or the like: the linear solution is not that of the frame.</summary>
    private static Reason? WrongSense(AnalysisFrame read, FrameCase one, ImmutableArray<MemberExtreme> axial)
    {
        var largest = axial.Max(a => Math.Max(Math.Abs(a.Least), Math.Abs(a.Largest)));
        for (var i = 0; i < read.Pieces.Length; i++)
        {
            var (piece, own) = (read.Pieces[i], axial[i]);
            if (piece.Sense == AxialSense.TensionOnly && own.Least < -LargestError * largest)
                return new Reason(ReasonCode.NoForces, string.Create(CultureInfo.InvariantCulture, $"{piece.Name} carries tension only and would be compressed by {-own.Least / 1e3:0.###} kN in '{one.Situation.Name}', which a linear analysis does not cover"));
            if (piece.Sense == AxialSense.CompressionOnly && own.Largest > LargestError * largest)
                return new Reason(ReasonCode.NoForces, string.Create(CultureInfo.InvariantCulture, $"{piece.Name} carries compression only and would be pulled by {own.Largest / 1e3:0.###} kN in '{one.Situation.Name}', which a linear analysis does not cover"));
        }

        return null;
    }

    private static string? SecondOrder(AnalysisFrame read, FrameCase one, ImmutableArray<MemberExtreme> axial)
    {
        var (worst, share) = (-1, SecondOrderRule.Warned);
        for (var i = 0; i < read.Pieces.Length; i++)
            if (SecondOrderRule.Share(read.Frame!.Members[i], read.Pieces[i].LineLength, axial[i].Least) is var own && own > share) (worst, share) = (i, own);
        return worst < 0 ? null : string.Create(CultureInfo.InvariantCulture,
            $"second-order effects are not covered: {read.Pieces[worst].Name} is compressed to {100 * share:0.#} % of its Euler load (hinged over its own length) in '{one.Situation.Name}'");
    }

    private static string Shear(AnalysisFrame read, ulong line)
    {
        var number = read.Frame is null ? -1 : Array.FindIndex([.. read.Pieces], p => p.Line == line);
        return number >= 0 && read.Frame!.Members[number].ShearFlexible ? "member flexible in shear" : "member stiff in shear";
    }

    private static string Source(AnalysisFrame read, ulong line) =>
        string.Create(CultureInfo.InvariantCulture, $"own frame analysis of {read.Name}, linear, first order, {Shear(read, line)}; on #{line}");
}
