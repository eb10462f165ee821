using System.Collections.Immutable;

namespace MemberScan.Checks.En1993.Sections;

/// <summary>Class of a cross-section under its forces.</summary>
/// <param name="Number">1 to 4.</param>
/// <param name="Part">The part that decides, in words.</param>
/// <param name="Lines">The calculation of the part that decides.</param>
public sealed record SectionClass(int Number, string Part, ImmutableArray<TraceLine> Lines);
