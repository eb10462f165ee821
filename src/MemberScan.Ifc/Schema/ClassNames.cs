using System.Collections.Frozen;

namespace MemberScan.Ifc.Schema;

/// <summary>Class names in their schema's spelling, by the keyword of the file.</summary>
internal static class ClassNames
{
    private static readonly FrozenDictionary<string, string> s_names = new[]
    {
        "IfcBeam", "IfcBeamStandardCase", "IfcColumn", "IfcColumnStandardCase", "IfcMember", "IfcMemberStandardCase", "IfcRailing",
        "IfcPlate", "IfcPlateStandardCase", "IfcBuildingElementProxy", "IfcBuildingElementPart", "IfcDiscreteAccessory", "IfcFastener",
        "IfcMechanicalFastener", "IfcReinforcingBar", "IfcTendon", "IfcTendonAnchor", "IfcPile", "IfcRail", "IfcFlowSegment",
        "IfcPipeSegment", "IfcCableSegment", "IfcElementAssembly", "IfcProxy", "IfcStructuralCurveMember",
        "IfcStructuralCurveMemberVarying", "IfcBuiltElement",
    }.ToFrozenDictionary(name => name.ToUpperInvariant(), StringComparer.Ordinal);

    /// <summary>The class as its schema spells it; the keyword itself when it is none of those in use.</summary>
    public static string Spell(string keyword) => s_names.GetValueOrDefault(keyword, keyword);

    /// <summary>Keywords of a class and its StandardCase and Varying forms.</summary>
    public static IEnumerable<string> KeywordsOf(string className)
    {
        var keyword = className.ToUpperInvariant();
        yield return keyword;
        yield return keyword + "STANDARDCASE";
    }
}
