namespace MemberScan.Part21.Findings;

/// <summary>One finding, not yet told.</summary>
/// <param name="Kind">What was found.</param>
/// <param name="Offset">Where [byte]; −1 for the file as a whole.</param>
/// <param name="Id">Number of the instance concerned; 0 if none.</param>
/// <param name="Count">How often; the place is the first one's.</param>
internal sealed record Finding(FindingKind Kind, long Offset, ulong Id, long Count = 1);
