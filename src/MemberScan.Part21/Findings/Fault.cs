namespace MemberScan.Part21.Findings;

/// <summary>Why the parameters of an instance cannot be told apart; offsets count from the start of the instance [byte].</summary>
/// <param name="Kind">What was found.</param>
/// <param name="At">Where it is told.</param>
/// <param name="ResumeFrom">Where the search for the next instance begins: behind a string that may have swallowed it, not behind what was read.</param>
/// <param name="Reached">How far was read.</param>
internal readonly record struct Fault(FindingKind Kind, int At, int ResumeFrom, int Reached);
