namespace MemberScan.Screening;

/// <summary>How far a screening has come.</summary>
/// <param name="Stage">What is being done, in words.</param>
/// <param name="Share">Share done of that stage, 0 to 1.</param>
public readonly record struct ScreeningProgress(string Stage, double Share);
