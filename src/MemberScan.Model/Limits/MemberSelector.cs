using System.IO.Enumeration;
using MemberScan.Model.Members;

namespace MemberScan.Model.Limits;

/// <summary>Which members something is for; every pattern that is given must fit, <c>*</c> and <c>?</c> being wildcards.</summary>
/// <param name="Role">Pattern on the role; null for any.</param>
/// <param name="Class">Pattern on the class; null for any.</param>
/// <param name="Name">Pattern on key, GlobalId, tag or name; null for any.</param>
/// <param name="Storey">Pattern on the storey or other container; null for any.</param>
public sealed record MemberSelector(string? Role, string? Class, string? Name, string? Storey)
{
    /// <summary>Whether a member is meant.</summary>
    public bool Fits(Member member)
    {
        ArgumentNullException.ThrowIfNull(member);
        var element = member.Element;
        return Fits(Role, member.Role) && Fits(Class, element.Class) && Fits(Storey, element.Storey) && (Name is null || Names(Name, member));
    }

    /// <summary>Whether a pattern fits key, GlobalId, tag or name of a member.</summary>
    /// <param name="pattern">The pattern.</param>
    /// <param name="member">The member.</param>
    public static bool Names(string pattern, Member member)
    {
        ArgumentNullException.ThrowIfNull(member);
        var element = member.Element;
        return Fits(pattern, member.Key) || Fits(pattern, element.GlobalId) || Fits(pattern, element.Tag) || Fits(pattern, element.Name);
    }

    private static bool Fits(string? pattern, string text) =>
        pattern is null || (text.Length > 0 && FileSystemName.MatchesSimpleExpression(pattern, text, ignoreCase: true));
}
