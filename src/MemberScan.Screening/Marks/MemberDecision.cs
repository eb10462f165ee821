using System.Collections.Immutable;

namespace MemberScan.Screening.Marks;

/// <summary>What a person decided about a candidate, carried along; the program itself never makes one.</summary>
/// <param name="Decision">The decision in that person's words.</param>
/// <param name="By">Who decided.</param>
/// <param name="Date">When, as <c>yyyy-MM-dd</c>.</param>
/// <param name="Note">Note; empty if none.</param>
/// <param name="MadeOn">Inputs that the decision was made on; null when not known.</param>
/// <param name="Changed">Inputs that have changed since, in words; a decision with any is stale.</param>
public sealed record MemberDecision(string Decision, string By, string Date, string Note, InputMarks? MadeOn, ImmutableArray<string> Changed)
{
    /// <summary>The decision as outputs show it; a stale one, and one of unknown inputs, says so first.</summary>
    public string Shown => (!Changed.IsEmpty ? "STALE: " : MadeOn is null ? "INPUTS NOT KNOWN: " : "") + Decision;

    /// <summary>Who, when, and what has changed since, behind the note.</summary>
    public string ShownNote
    {
        get
        {
            var state = !Changed.IsEmpty ? $"; changed since: {string.Join(", ", Changed)}"
                : MadeOn is null ? "; on which section, material, forces and limit it was made is not known" : "";
            return $"{(Note.Length > 0 ? Note + " " : "")}({By}, {Date}{state})";
        }
    }
}
