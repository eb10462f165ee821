using System.Collections.Immutable;
using MemberScan.Screening.Contacts;
using MemberScan.Screening.Record;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Page;

/// <summary>A candidate with its place in the page.</summary>
/// <param name="Member">The candidate.</param>
/// <param name="Anchor">Name of its place, such as <c>member-2O2Fr$t4X7Zf8NOew3FLOH</c>.</param>
public sealed record PlacedMember(MemberResult Member, string Anchor)
{
    /// <summary>Largest utilization known [-]; null when nothing could be evaluated.</summary>
    public double? Utilization => Member.Governing?.Utilization;

    /// <summary>Whether the page holds its full sheet.</summary>
    public bool HasSheet { get; init; }

    /// <summary>Outline of the section that decides; empty where its designation tells the form.</summary>
    public ImmutableArray<ImmutableArray<RingPoint>> Rings { get; init; } = [];

    /// <summary>The contacts of the run, which spans and supports of load presets come from.</summary>
    public ImmutableArray<Contact> Contacts { get; init; } = [];

    /// <summary>Makes what the sheet draws; null where only the record is at hand.</summary>
    public SheetMaker? Sheets { get; init; }
}
