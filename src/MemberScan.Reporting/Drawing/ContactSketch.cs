using System.Collections.Immutable;
using MemberScan.Screening.Contacts;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Drawing;

/// <summary>Where a member touches others, and what its assumed loads take for supports and ends.</summary>
/// <param name="Length">Length of the member [m].</param>
/// <param name="Model">Supports and ends as assumed, one sentence.</param>
/// <param name="Marks">The contacts along it, from its start.</param>
/// <param name="NotShown">Contacts beyond the largest number that is drawn.</param>
public sealed record ContactSketch(double Length, string Model, ImmutableArray<ContactMark> Marks, int NotShown)
{
    /// <summary>Most contacts that are drawn: one letter each.</summary>
    public const int MostMarks = 26;

    // How forces of a load preset begin where they are said (Screening).
    private const string Assumed = "assumed: ";

    /// <summary>The sketch of a member; null where its forces are not those of a load preset.</summary>
    /// <param name="member">The candidate.</param>
    /// <param name="contacts">All contacts of the run.</param>
    public static ContactSketch? Of(MemberResult member, ImmutableArray<Contact> contacts)
    {
        ArgumentNullException.ThrowIfNull(member);
        if (member.Length is not { } length || !(length > 0) || contacts.IsDefaultOrEmpty) return null;
        if (member.Situations.FirstOrDefault(s => s.ForcesSource.StartsWith(Assumed, StringComparison.Ordinal)) is not { } assumed) return null;

        var own = contacts.Where(c => c.Of(member.Key)).OrderBy(c => c.At(member.Key)).ThenBy(c => c.Other(member.Key), StringComparer.Ordinal).ToList();
        var marks = own.Take(MostMarks).Select((c, i) => new ContactMark((char)('A' + i), Math.Clamp(c.At(member.Key), 0, length), c.Other(member.Key), c.Gap, c.IsCertain));
        var model = assumed.Conversion.StartsWith(Assumed, StringComparison.Ordinal) ? assumed.Conversion[Assumed.Length..] : assumed.Conversion;
        return new ContactSketch(length, model, [.. marks], Math.Max(0, own.Count - MostMarks));
    }
}
