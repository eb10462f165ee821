namespace MemberScan.Screening.Marks;

/// <summary>Marks of what a candidate's verdict depends on: each the first 16 hexadecimal digits of a SHA-256; equal marks, equal inputs.</summary>
/// <param name="Section">Section, all readings of it.</param>
/// <param name="Material">Material name and values.</param>
/// <param name="Forces">Situations and section forces, nine significant digits.</param>
/// <param name="Limit">Limits in force and the factor of the buckling length.</param>
public sealed record InputMarks(string Section, string Material, string Forces, string Limit)
{
    /// <summary>Names of the inputs that differ, in words; empty when all are alike.</summary>
    public IEnumerable<string> Differing(InputMarks other)
    {
        ArgumentNullException.ThrowIfNull(other);
        if (Section != other.Section) yield return "section";
        if (Material != other.Material) yield return "material";
        if (Forces != other.Forces) yield return "forces";
        if (Limit != other.Limit) yield return "limit";
    }
}
