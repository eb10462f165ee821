using System.Collections.Frozen;
using System.Collections.Immutable;
using System.IO.Enumeration;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Members;
using MemberScan.Model.Presets;
using MemberScan.Screening.Contacts;

namespace MemberScan.Screening.Presets;

/// <summary>The members of a model with what presets ask of them: line, role, slope, contacts.</summary>
internal sealed class PresetMembers
{
    /// <summary>Share of the length by which an upright member rises at least: 60° against the horizontal.</summary>
    private const double Upright = 0.866;

    /// <summary>Share of the length by which a level member rises at most: 45° against the horizontal, so that stair rails count.</summary>
    private const double Level = 0.708;

    private readonly FrozenDictionary<string, (Member Member, BarLine? Line)> _byKey;
    private readonly Dictionary<CrossSection, SectionProperties> _properties = [];

    public PresetMembers(ImmutableArray<Member> members, ContactList contacts)
    {
        Contacts = contacts;
        _byKey = members.ToFrozenDictionary(m => m.Key, m => (m, BarLine.Of(m)), StringComparer.Ordinal);
    }

    /// <summary>The contacts.</summary>
    public ContactList Contacts { get; }

    /// <summary>Line of a member; null when it is bent or lacks section, length or axes.</summary>
    public BarLine? Line(string key) => _byKey[key].Line;

    /// <summary>A member by its key.</summary>
    public Member this[string key] => _byKey[key].Member;

    /// <summary>Properties of a member's section, made once for each section.</summary>
    public SectionProperties Properties(CrossSection shape)
    {
        if (!_properties.TryGetValue(shape, out var properties)) _properties[shape] = properties = SectionProperties.Of(shape);
        return properties;
    }

    /// <summary>Whether a use of a preset names the member: by pattern, and by role where the pattern names all.</summary>
    public static bool IsFor(PresetUse use, Member member, params ReadOnlySpan<string> roles)
    {
        if (use.Members == "*") return roles.Contains(member.Role);

        foreach (var name in (string[])[member.Key, member.Element.GlobalId, member.Element.Tag, member.Element.Name])
            if (name.Length > 0 && FileSystemName.MatchesSimpleExpression(use.Members, name, ignoreCase: true))
                return true;
        return false;
    }

    /// <summary>Whether a member stands.</summary>
    public bool IsUpright(string key) => Line(key) is { } line && Math.Abs(line.Axes.X.Z) >= Upright;

    /// <summary>Whether a member lies, or slopes as a stair does.</summary>
    public bool IsLevel(string key) => Line(key) is { } line && Math.Abs(line.Axes.X.Z) <= Level;

    /// <summary>The places of certain contacts with some members, in rising order; nearer ones than the thickness of the member are one.</summary>
    public List<double> Places(string key, Func<string, bool> isOne)
    {
        var places = new List<double>();
        var apart = Line(key)!.Reach;
        foreach (var contact in Contacts.Of(key))
            if (contact.IsCertain && contact.Kind != ContactKind.Alongside && isOne(contact.Other(key)) && (places.Count == 0 || contact.At(key) - places[^1] > apart))
                places.Add(contact.At(key));
        return places;
    }

    /// <summary>The first contact with some members that is in doubt; null when none is.</summary>
    public Contact? Doubt(string key, Func<string, bool> isOne) =>
        Contacts.Of(key).FirstOrDefault(c => (!c.IsCertain || c.Kind == ContactKind.Alongside) && isOne(c.Other(key)));
}
