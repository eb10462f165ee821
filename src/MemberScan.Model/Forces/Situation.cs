namespace MemberScan.Model.Forces;

/// <summary>One load case, or one combination with its factors: forces that act together.</summary>
/// <param name="Name">Name, unique within its source.</param>
/// <param name="Kind">Service or design.</param>
/// <param name="KindSource">Where the kind comes from, in words.</param>
/// <param name="ActsInFull">False for a single load case, which supports no verdict within the limit.</param>
/// <param name="Origin">Where the situation comes from, in words, such as "result group #93 of combination 'CO1'".</param>
public sealed record Situation(string Name, SituationKind Kind, string KindSource, bool ActsInFull, string Origin)
{
    /// <summary>Whether the source says that its results may be superposed with factors; only of such cases are combinations made.</summary>
    public bool IsLinear { get; init; }
}
