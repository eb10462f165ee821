namespace MemberScan.Ifc.Members;

/// <summary>How many elements of a class are no candidates, and why.</summary>
/// <param name="Class">The class.</param>
/// <param name="Count">How many.</param>
/// <param name="Why">Why, in words.</param>
public sealed record ClassCount(string Class, int Count, string Why);
