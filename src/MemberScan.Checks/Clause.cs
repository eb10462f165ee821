namespace MemberScan.Checks;

/// <summary>A place in a standard.</summary>
/// <param name="Standard">Standard and edition; empty for plain mechanics.</param>
/// <param name="Section">Section, such as <c>6.2.1(5)</c>.</param>
/// <param name="Equation">Equation number; empty if none.</param>
/// <param name="FromMemory">Whether it was not yet verified with a licensed text.</param>
public sealed record Clause(string Standard, string Section, string Equation, bool FromMemory)
{
    /// <summary>The place as printed, with the mark of what is from memory.</summary>
    public override string ToString()
    {
        var text = string.Join(" ", new[] { Standard, Section, Equation }.Where(part => part.Length > 0));
        return FromMemory ? text + " (from memory)" : text;
    }
}
