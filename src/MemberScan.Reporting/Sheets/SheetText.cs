using System.Globalization;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Page;
using MemberScan.Screening.Record;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Sheets;

/// <summary>The sheet of one candidate as plain lines, in the words of the page.</summary>
public static class SheetText
{
    /// <summary>The lines. Text from the model has its control characters made visible.</summary>
    /// <param name="member">The candidate.</param>
    /// <param name="sheets">Makes what only the stress field tells; null where only the record is at hand.</param>
    public static IEnumerable<string> Lines(MemberResult member, SheetMaker? sheets)
    {
        ArgumentNullException.ThrowIfNull(member);
        var data = sheets?.Of(member);
        IEnumerable<string>[] parts =
        [
            Head(member),
            member.Governing is { } governing ? [.. Where(governing), .. Forces(governing), .. Alone(data), .. State(data), .. Calculation(governing)] : [],
            Inputs(member), Situations(member), Along(data), Axes(member),
            member.Notes.IsEmpty ? [] : ["", "Notes", .. member.Notes.Select(n => "  " + ForeignText.Sentence(n))],
        ];
        return parts.SelectMany(p => p);
    }

    private static IEnumerable<string> Head(MemberResult member)
    {
        yield return $"{member.Verdict.Word()}{(member.Governing is { } g ? " " + Figures.Utilization(g.Utilization) : "")}  {ReportView.TitleOf(member)}";
        yield return $"  Key {ForeignText.Name(member.Key)}; Tag {Known(member.Tag)}; {ForeignText.Name(member.Class)}, {Known(member.Role)}; #{member.StepId.ToString(CultureInfo.InvariantCulture)}; Storey or container {Known(member.Storey)}";
        if (member.Reason is { } reason) yield return $"  {reason.Code.Text()}: {ForeignText.Sentence(reason.Message)}";
        if (member.Decision is { } decision) yield return $"  Decision of a person: {ForeignText.Sentence(decision.Shown)} {ForeignText.Sentence(decision.ShownNote)}";
    }

    private static IEnumerable<string> Where(Governing g) =>
    [
        "", "Where",
        $"  Station from the start  {Metres(g.Station)}",
        $"  Point from the centroid  y = {Both("m", g.Point.Y)}, z = {Both("m", g.Point.Z)}",
        $"  Place on the section  {Known(g.Point.Place)}",
        "", "Why",
        $"  Criterion  {Known(g.Criterion)}",
        $"  Clause  {Known(g.Clause)}",
        $"  Stress against limit  {Both("Pa", g.Stress)} against {Both("Pa", g.Limit)}",
        $"  Utilization  {Figures.Utilization(g.Utilization)}",
        $"  Situation  {Known(g.Situation)} ({ForeignText.Name(g.Kind)})",
        $"  Shear model  {Known(g.ShearModel)}; {(g.OtherModelUtilization is { } other ? $"by the other model {Figures.Utilization(other)}, at its own point" : "the other model has no value")}",
    ];

    private static IEnumerable<string> Forces(Governing g) =>
    [
        "", "Section forces at the station",
        .. Enum.GetValues<ForceComponent>().Select(c => $"  {SheetWords.Name(c),-28}{Both(SheetWords.Unit(c), SituationLine.Value(g.Forces, c))}"),
        "", "Stresses at the point",
        .. SheetWords.Stresses(g.Point.State).Select(s => $"  {s.Name,-28}{Both("Pa", s.Value)}"),
    ];

    private static IEnumerable<string> Alone(SheetData? data)
    {
        if (data is null) yield break;

        yield return "";
        yield return "What each force gives at the governing point [MPa]: σ, τxy, τxz";
        foreach (var part in data.Alone)
            yield return $"  {part.Component,-14}{Mpa(part.AtPoint.Sigma),12}{Mpa(part.AtPoint.TauXY),12}{Mpa(part.AtPoint.TauXZ),12}";
        yield return $"  {"all together",-14}{Mpa(data.Whole.AtPoint.Sigma),12}{Mpa(data.Whole.AtPoint.TauXY),12}{Mpa(data.Whole.AtPoint.TauXZ),12}";
        if (SheetWords.DoesNotAddUp(data) is { Length: > 0 } remark) yield return "  " + remark;
        yield return "  " + SheetWords.NeutralAxis(data).Replace("Dash-dotted: the neutral axis.", "The neutral axis crosses the section.", StringComparison.Ordinal);
    }

    private static IEnumerable<string> State(SheetData? data) => data is null ? [] :
    [
        "", "State at the governing point",
        .. data.State.Circles.Select(c => $"  Mohr's circle {c.Name}  centre {ShownUnit.Stress.WithUnit(c.Centre)}, radius {ShownUnit.Stress.WithUnit(c.Radius)}"),
        .. data.State.Elements.Select(e => $"  Stress element in the plane {e.Plane.ToString().ToLowerInvariant()}  σx {ShownUnit.Stress.WithUnit(e.Sigma)}, τ{e.Plane.ToString().ToLowerInvariant()} {ShownUnit.Stress.WithUnit(e.Tau)}"),
    ];

    private static IEnumerable<string> Calculation(Governing g) =>
    [
        "", "Calculation",
        .. g.Trace.Take(ReportView.LargestNumberOfTraceLines).Select(l =>
            $"  {ForeignText.Name(l.Symbol)} = {Both(l.Unit, l.Value)}   {(l.Formula.Length > 0 ? ForeignText.Sentence(l.Formula) : "input")}   [{ForeignText.Sentence(l.Source)}]"),
    ];

    private static IEnumerable<string> Inputs(MemberResult m) =>
    [
        "", "Where each input comes from",
        $"  Section  {Known(m.Section)}   [{Sentence(m.SectionSource)}]",
        .. m.Governing is { } g && g.Section != m.Section ? [$"  Section that decides  {Known(g.Section)}   [the less favourable reading]"] : Array.Empty<string>(),
        $"  Material  {Known(m.Material)}   [name in the model]",
        $"  Yield strength  {(m.Strength is { } fy ? Both("Pa", fy) : "not known")}   [{Sentence(m.StrengthSource)}]",
        $"  Length  {(m.Length is { } length ? Metres(length) : "not known")}   [{Sentence(m.LengthSource)}]",
        .. m.Governing is { } acting ? [$"  Forces  {Known(acting.Situation)}   [{Sentence(acting.ForcesSource)}]"] : Array.Empty<string>(),
    ];

    private static IEnumerable<string> Situations(MemberResult m) => m.Situations.IsEmpty ? [] :
    [
        "", "Situations, worst first",
        .. m.Situations.Take(ReportView.LargestNumberOfSituations).Select(s =>
            $"  {(s.Utilization is { } u ? Figures.Utilization(u) : "none"),-7} {ForeignText.Name(s.Situation)} ({ForeignText.Name(s.Kind)}), acts {(s.ActsInFull ? "in full" : "as a single load case")}{(s.Note.Length > 0 ? "; " + ForeignText.Sentence(s.Note) : "")}"),
    ];

    private static IEnumerable<string> Along(SheetData? data)
    {
        foreach (var line in data?.Lines ?? [])
        {
            yield return "";
            yield return $"Along the member: {ForeignText.Name(line.Situation)} ({ForeignText.Name(line.Kind)})";
            foreach (var component in Enum.GetValues<ForceComponent>())
            {
                var (least, largest) = line.Extremes(component);
                var (low, high, unit) = (SituationLine.Value(least.Forces, component), SituationLine.Value(largest.Forces, component), SheetWords.Unit(component));
                yield return low == high
                    ? $"  {component,-3} {(low == 0 ? "zero" : "all along " + Both(unit, low))}"
                    : $"  {component,-3} largest {Both(unit, high)} at {Metres(largest.X)}, least {Both(unit, low)} at {Metres(least.X)}";
            }
        }
    }

    private static IEnumerable<string> Axes(MemberResult m) => m.Axes is not { } axes ? ["", "Local axes: not known."] :
    [
        "", "Local axes in project coordinates",
        $"  Start of the member  {Figures.Fixed(axes.Origin.X, 3)}, {Figures.Fixed(axes.Origin.Y, 3)}, {Figures.Fixed(axes.Origin.Z, 3)} m",
        .. new[] { ("x, along the member", axes.X), ("y", axes.Y), ("z", axes.Z) }.Select(a => $"  {a.Item1}  {Figures.Fixed(a.Item2.X, 4)}, {Figures.Fixed(a.Item2.Y, 4)}, {Figures.Fixed(a.Item2.Z, 4)}"),
    ];

    private static string Both(string unit, double si)
    {
        var other = UsUnit.Of(unit, si);
        return ShownUnit.Of(ForeignText.Name(unit)).WithUnit(si) + (other.Length > 0 ? $" ({other})" : "");
    }

    private static string Mpa(double stress) => ShownUnit.Stress.Figure(stress);

    private static string Metres(double metres) => $"{Figures.Fixed(metres, 3)}\u00A0m ({UsUnit.Of("m", metres)})";

    private static string Known(string text) => text.Length > 0 ? ForeignText.Name(text) : "not given";

    private static string Sentence(string text) => text.Length > 0 ? ForeignText.Sentence(text) : "not given";
}
