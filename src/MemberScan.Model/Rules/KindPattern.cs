using System.IO.Enumeration;
using MemberScan.Model.Forces;

namespace MemberScan.Model.Rules;

/// <summary>Tells the kind of situations by their names.</summary>
/// <param name="Pattern">Name with <c>*</c> and <c>?</c> as wildcards, without regard to case.</param>
/// <param name="Kind">Service or design.</param>
public sealed record KindPattern(string Pattern, SituationKind Kind)
{
    /// <summary>Whether a situation's name fits.</summary>
    public bool Fits(string name) => FileSystemName.MatchesSimpleExpression(Pattern, name, ignoreCase: true);
}
