using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Readiness;

/// <summary>How many candidates lack one thing, with the request to the modeler.</summary>
/// <param name="Code">What they lack.</param>
/// <param name="Count">How many candidates.</param>
public sealed record ReadinessTotal(ReasonCode Code, int Count)
{
    /// <summary>One line: how many members lack what, and what would help.</summary>
    public string Line => $"{Count.ToString(System.Globalization.CultureInfo.InvariantCulture)} {(Count == 1 ? "member has" : "members have")} {Lack(Code)}. {Code.Request()}";

    private static string Lack(ReasonCode code) => code switch
    {
        ReasonCode.NoSection => "no cross-section",
        ReasonCode.SectionNotParametric => "a mesh of no recognisable section",
        ReasonCode.SectionNotCovered => "a section of a kind that is not covered",
        ReasonCode.SectionInvalid => "section dimensions that make no section",
        ReasonCode.MeshNotAllowed => "a mesh that could be recognised",
        ReasonCode.WallOverRadius => "a wall that leaves no hole",
        ReasonCode.NoStrength => "no grade and no strength",
        ReasonCode.StrengthImplausible => "a strength that cannot be meant",
        ReasonCode.MaterialNotCovered => "a material that is not covered",
        ReasonCode.NoForces => "no section forces",
        ReasonCode.ForcesIncomplete => "incomplete section forces",
        ReasonCode.NoCombination => "single load cases only",
        ReasonCode.LengthAmbiguous => "no certain length",
        ReasonCode.AxesUnknown => "unknown local axes",
        ReasonCode.PlacementNotSupported => "a placement that is not supported",
        ReasonCode.UnitMissing => "values whose unit is missing",
        ReasonCode.ConventionUnknown => "forces of unknown convention",
        ReasonCode.DamagedRecord => "a damaged record",
        _ => $"the reason {code.Text()}",
    };
}
