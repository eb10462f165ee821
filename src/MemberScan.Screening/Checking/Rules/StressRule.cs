using MemberScan.Checks;
using MemberScan.Checks.Aisc360;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Limits;

namespace MemberScan.Screening.Checking.Rules;

/// <summary>The stress criterion of the basis as it holds for one section: what is sought over the section, and its limit.</summary>
internal abstract class StressRule(StressLimit limit)
{
    /// <summary>The limit of the basis that it comes from.</summary>
    public StressLimit Limit { get; } = limit;

    /// <summary>The criterion in words with its factor.</summary>
    public virtual string Words => LimitWords.Of(Limit);

    /// <summary>Standard, edition and clause.</summary>
    public virtual string Clause => LimitWords.Clause(Limit);

    /// <summary>The point of the section that governs under given forces, and its utilization [-]; convex in the forces but for round bars in shear.</summary>
    public abstract (double Utilization, GoverningPoint Point) Govern(StressField field, in SectionForces forces);

    /// <summary>Largest value of the point's measure that is allowed [Pa].</summary>
    public abstract double Allowed(in GoverningPoint point);

    /// <summary>Yield strength that the criterion needs at a point [Pa]; null where it holds no yield strength.</summary>
    public abstract double? RequiredYield(in GoverningPoint point);

    /// <summary>The check with its calculation.</summary>
    public abstract CheckResult.Evaluated Check(in GoverningPoint point);

    /// <summary>The rule of a limit for a section.</summary>
    /// <param name="limit">The limit of the basis.</param>
    /// <param name="limits">Everything that is set for the member.</param>
    /// <param name="shape">The section that stresses are taken of.</param>
    /// <param name="yield">Yield strength [Pa].</param>
    /// <param name="wallWords">Its wall in words.</param>
    public static StressRule Of(StressLimit limit, LimitSet limits, CrossSection shape, double yield, string wallWords) => limit.Criterion switch
    {
        Criterion.LargestNormalStress => new NormalStressRule(limit, limits.Brittle!),
        Criterion.Aisc360Asd => OfAisc(limit, shape, yield, DesignMethod.Asd, wallWords),
        Criterion.Aisc360Lrfd => OfAisc(limit, shape, yield, DesignMethod.Lrfd, wallWords),
        _ => new EquivalentStressRule(limit, yield),
    };

    private static StressRule OfAisc(StressLimit limit, CrossSection shape, double yield, DesignMethod method, string wallWords) => shape is Tube or Box
        ? new FirstYieldRule(limit, yield, method, wallWords)
        : new SplitStressRule(limit, yield, method);
}
