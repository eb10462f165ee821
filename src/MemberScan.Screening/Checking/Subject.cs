using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Limits;
using MemberScan.Model.Members;
using MemberScan.Screening.Checking.Rules;

namespace MemberScan.Screening.Checking;

/// <summary>What is the same for all situations of a member.</summary>
/// <param name="Member">The candidate.</param>
/// <param name="Section">The section with its readings, of hollow sections with the wall of the basis.</param>
/// <param name="Length">Length [m].</param>
/// <param name="YieldFound">Yield strength with its source [Pa]; of brittle members of no meaning.</param>
/// <param name="Poisson">ν [-].</param>
/// <param name="Limits">The limits of the member.</param>
internal sealed record Subject(Member Member, SectionFinding Section, double Length, Finding<double>.Found YieldFound, double Poisson, LimitSet Limits)
{
    /// <summary>Yield strength [Pa].</summary>
    public double Yield => YieldFound.Value;

    /// <summary>The material.</summary>
    public Material Material => Member.Material;

    /// <summary>How the section changes along the member; null where it does not.</summary>
    public Taper? Taper { get; init; }

    /// <summary>Whether the largest normal stress against given limits is the criterion.</summary>
    public bool IsBrittle { get; init; }

    /// <summary>The wall of a section in words.</summary>
    public Func<CrossSection, string> WallWords { get; init; } = _ => "gross section";

    /// <summary>The criterion of a limit for a section.</summary>
    public StressRule RuleOf(StressLimit limit, CrossSection shape) => StressRule.Of(limit, Limits, shape, Yield, WallWords(shape));
}
