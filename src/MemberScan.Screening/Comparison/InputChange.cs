namespace MemberScan.Screening.Comparison;

/// <summary>An input that changed between two runs.</summary>
/// <param name="What">"section", "material", "forces", "limit" or "length".</param>
/// <param name="Earlier">The earlier value in words; empty where it has none that fits a line.</param>
/// <param name="Later">The later value in words; empty where it has none that fits a line.</param>
public sealed record InputChange(string What, string Earlier, string Later);
