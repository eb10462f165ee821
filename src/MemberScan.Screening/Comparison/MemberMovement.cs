using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Comparison;

/// <summary>One candidate in two runs.</summary>
/// <param name="Earlier">It in the earlier run; null when it is new.</param>
/// <param name="Later">It in the later run; null when it is gone.</param>
/// <param name="MatchedBy">By what it was found again; null when it stands in one run only.</param>
/// <param name="Movement">What became of it.</param>
/// <param name="Changes">Inputs that changed.</param>
public sealed record MemberMovement(MemberResult? Earlier, MemberResult? Later, MatchedBy? MatchedBy, Movement Movement, ImmutableArray<InputChange> Changes)
{
    /// <summary>Rise of a utilization above which an overstressed candidate counts as worse [-].</summary>
    public const double Rise = 1e-6;

    /// <summary>The later state, else the earlier one.</summary>
    public MemberResult Latest => Later ?? Earlier!;

    /// <summary>Whether the GlobalId is another and the candidate was found again all the same.</summary>
    public bool IsReidentified => MatchedBy is Comparison.MatchedBy.Tag or Comparison.MatchedBy.Axis;

    /// <summary>Change of the utilization [-]; null where either is not known.</summary>
    public double? Rising => Later?.Governing?.Utilization - Earlier?.Governing?.Utilization;

    /// <summary>Whether something became worse: newly overstressed, more overstressed, no verdict any more, or new without being within the limit.</summary>
    public bool IsWorse => Movement switch
    {
        Movement.BecameOverstressed or Movement.NoLongerChecked => true,
        Movement.StillOverstressed => Rising is not { } rising || rising > Rise,
        Movement.New => Later!.Verdict != Verdict.WithinLimit,
        _ => false,
    };

    /// <summary>What became of it in one line, such as <c>became overstressed, section changed</c>.</summary>
    public string Words
    {
        get
        {
            var parts = new List<string> { MovementText.Of(Movement) };
            if (Movement == Movement.StillOverstressed && Rising is { } rising)
                parts.Add(string.Create(CultureInfo.InvariantCulture, $"{Earlier!.Governing!.Utilization:0.000} → {Later!.Governing!.Utilization:0.000} ({rising:+0.000;-0.000;0.000})"));
            if (Movement is Movement.New or Movement.Gone) parts.Add(VerdictText.Of(Latest.Verdict));
            if (Movement == Movement.ChangedInput) parts[0] = $"changed input: {string.Join(", ", Changes.Select(c => c.What))}";
            else parts.AddRange(Changes.Select(c => c.What + " changed"));
            if (IsReidentified) parts.Add(MatchedBy == Comparison.MatchedBy.Tag ? "re-identified by its tag" : "re-identified by class, axis and section");
            return string.Join(", ", parts);
        }
    }
}
