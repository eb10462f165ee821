using System.Text;

namespace MemberScan.Model.Verdicts;

/// <summary>Spelling of the reason codes and what to ask the modeler for.</summary>
public static class ReasonCodes
{
    /// <summary>The code as printed and written, such as <c>no-strength</c>.</summary>
    public static string Text(this ReasonCode code)
    {
        var text = new StringBuilder();
        foreach (var letter in code.ToString())
        {
            if (char.IsUpper(letter) && text.Length > 0) text.Append('-');
            text.Append(char.ToLowerInvariant(letter));
        }

        return text.ToString();
    }

    /// <summary>The request line to the modeler: what would make such a member checkable.</summary>
    public static string Request(this ReasonCode code) => code switch
    {
        ReasonCode.NoSection => "Give the member a body or a material profile set with its cross-section.",
        ReasonCode.SectionNotParametric => "Export the member as an extrusion or swept disk with a parametric profile instead of a mesh.",
        ReasonCode.SectionNotCovered => "The section kind is outside the present scope; check the member by other means.",
        ReasonCode.SectionInvalid => "Correct the section dimensions in the model.",
        ReasonCode.MeshNotAllowed => "Export a parametric section, or allow mesh recognition in the settings.",
        ReasonCode.WallOverRadius => "Correct the wall thickness: it leaves no hole in the section.",
        ReasonCode.NoStrength => "Name a known grade or give the yield strength in the material's properties.",
        ReasonCode.StrengthImplausible => "Correct the yield strength or its unit in the material's properties.",
        ReasonCode.MaterialNotCovered => "The material is outside the present scope; check the member by other means.",
        ReasonCode.NoForces => "Give section forces for the member: a row in the forces table or results in the model.",
        ReasonCode.ForcesIncomplete => "Give all six force components, or state in the settings that omitted ones are zero.",
        ReasonCode.NoCombination => "Give results of load combinations; single load cases alone support no verdict.",
        ReasonCode.StationsTooCoarse => "Give section forces at more stations, both ends included.",
        ReasonCode.KindUnknown => "Say for each situation whether it is service or design.",
        ReasonCode.KindWithoutLimit => "Give situations of a kind for which the settings have a limit.",
        ReasonCode.LengthAmbiguous => "Make the member's length unambiguous in the model.",
        ReasonCode.AxesUnknown => "Give the analytical member an Axis that is not along the member.",
        ReasonCode.PlacementNotSupported => "Place the member with local placements.",
        ReasonCode.UnitMissing => "Name the missing unit in the model's unit assignment or in the settings.",
        ReasonCode.ConventionUnknown => "State the sign convention of the forces.",
        ReasonCode.ThreadUnknown => "Give the thread of the rod in its name or properties.",
        ReasonCode.StabilityNotChecked => "Check the member's stability by other means; it is compressed beyond 4 % of its Euler load, or its modulus is unknown.",
        ReasonCode.SlenderWall => "Check local buckling of the wall by other means.",
        ReasonCode.CheckNotEvaluated => "See the member's note: a check lacked data.",
        ReasonCode.DamagedRecord => "Export the model again: the record of the member is damaged.",
        _ => throw new ArgumentOutOfRangeException(nameof(code)),
    };
}
