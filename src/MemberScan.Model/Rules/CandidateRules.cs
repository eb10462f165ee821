using System.Collections.Immutable;

namespace MemberScan.Model.Rules;

/// <summary>Which classes are candidates. Names are matched without regard to case; StandardCase forms follow their class.</summary>
/// <param name="Always">Classes that always are.</param>
/// <param name="WithBarBodyOrForces">Classes that are when they have a bar-like body or forces; others of them are counted.</param>
public sealed record CandidateRules(ImmutableArray<string> Always, ImmutableArray<string> WithBarBodyOrForces)
{
    /// <summary>Beams, columns, members, railings, analytical curve members; proxies, accessories, fasteners, bars, segments with a bar-like body.</summary>
    public static CandidateRules Default { get; } = new(
        ["IfcBeam", "IfcColumn", "IfcMember", "IfcRailing", "IfcStructuralCurveMember"],
        ["IfcBuildingElementProxy", "IfcDiscreteAccessory", "IfcMechanicalFastener", "IfcReinforcingBar", "IfcTendon",
            "IfcFlowSegment", "IfcPipeSegment", "IfcCableSegment"]);
}
