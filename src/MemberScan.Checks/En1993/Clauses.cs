namespace MemberScan.Checks.En1993;

/// <summary>Places in EN 1993, every one from memory.</summary>
internal static class Clauses
{
    public static Clause Of(string section, string equation = "") => new("EN 1993-1-1:2005", section, equation, FromMemory: true);

    public static Clause OfStainless(string section) => new("EN 1993-1-4:2006", section, "", FromMemory: true);
}
