namespace MemberScan.Model.Rules.Combinations;

/// <summary>A load case with its factor in a combination.</summary>
/// <param name="Case">Name of the case.</param>
/// <param name="Factor">Factor [-].</param>
public sealed record CaseFactor(string Case, double Factor);
