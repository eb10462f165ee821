using System.Collections.Immutable;

namespace MemberScan.Screening.Contacts;

/// <summary>The contacts between the members of a model.</summary>
/// <param name="Tolerance">Gap up to which members touch [m].</param>
/// <param name="All">All contacts, ordered by keys.</param>
public sealed record ContactList(double Tolerance, ImmutableArray<Contact> All)
{
    private readonly ILookup<string, Contact> _of = All.SelectMany(c => new[] { (Key: c.First, Contact: c), (Key: c.Second, Contact: c) }).ToLookup(p => p.Key, p => p.Contact, StringComparer.Ordinal);

    /// <summary>The contacts of a member, by their place along it.</summary>
    public IEnumerable<Contact> Of(string key) => _of[key].OrderBy(c => c.At(key)).ThenBy(c => c.Other(key), StringComparer.Ordinal);
}
