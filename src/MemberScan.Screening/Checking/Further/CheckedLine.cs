using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Limits;

namespace MemberScan.Screening.Checking.Further;

/// <summary>One member in one situation, ready for the checks beside the stress criterion.</summary>
/// <param name="Subject">The member.</param>
/// <param name="Limit">The limit of the basis.</param>
/// <param name="Shape">One reading of the section.</param>
/// <param name="Properties">Its properties.</param>
/// <param name="States">Places and section forces: all stations, and where the stress is largest.</param>
/// <param name="Compression">How the compression stands to the Euler load.</param>
internal sealed record CheckedLine(
    Subject Subject, StressLimit Limit, CrossSection Shape, SectionProperties Properties, IReadOnlyList<(double X, SectionForces Forces)> States, Compression Compression)
{
    /// <summary>Whether the clauses of section and member hold for the kind of section.</summary>
    public bool IsBarOrHollow => Shape is Round or Rectangle or RoundedRectangle or Tube or Box;
}
