using System.Collections.Immutable;

namespace MemberScan.Model.Rules;

/// <summary>A material grade of a standard.</summary>
/// <param name="Name">Name, such as <c>S235</c>.</param>
/// <param name="Pattern">Regular expression over the material name, without regard to case; the whole name must fit.</param>
/// <param name="Standard">Standard and edition.</param>
/// <param name="Yields">Yield strengths by thickness, thinnest range first.</param>
/// <param name="Modulus">Modulus of elasticity [Pa].</param>
/// <param name="Poisson">Poisson's ratio [-].</param>
/// <param name="IsSteel">Whether it is a steel.</param>
/// <param name="FromMemory">Whether the values are from memory and not yet verified with the standard's text.</param>
public sealed record Grade(
    string Name, string Pattern, string Standard, ImmutableArray<YieldRange> Yields, double Modulus, double Poisson, bool IsSteel, bool FromMemory)
{
    /// <summary>Whether a material name, the whole of it, names this grade.</summary>
    public bool Fits(string materialName) => GradePattern.Fits(Pattern, materialName);
}
