using System.IO.Enumeration;

namespace MemberScan.Model.Rules.Combinations;

/// <summary>Tells the action of load cases by their names.</summary>
/// <param name="Pattern">Name with <c>*</c> and <c>?</c> as wildcards, without regard to case.</param>
/// <param name="Tag">The action.</param>
public sealed record CaseTag(string Pattern, ActionTag Tag)
{
    /// <summary>Whether a case's name fits.</summary>
    public bool Fits(string name) => FileSystemName.MatchesSimpleExpression(Pattern, name, ignoreCase: true);
}
