namespace MemberScan.Screening.Record;

/// <summary>Elements of a class that are no candidates.</summary>
/// <param name="Class">The class.</param>
/// <param name="Count">How many.</param>
/// <param name="Why">Why, in words.</param>
public sealed record PassedOver(string Class, int Count, string Why);
