namespace MemberScan.Mechanics.Sections;

/// <summary>The smallest size that passes a test with one dimension free.</summary>
/// <param name="Dimension">The free dimension in words.</param>
/// <param name="Value">Its value, rounded up to a hundredth of a millimetre [m]; null where no size passes.</param>
/// <param name="Section">The section of that size; null where none passes.</param>
public sealed record FreeSize(string Dimension, double? Value, CrossSection? Section);
