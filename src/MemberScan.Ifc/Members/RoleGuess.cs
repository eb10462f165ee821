using MemberScan.Model.Members;

namespace MemberScan.Ifc.Members;

/// <summary>Guesses what a member is for, from predefined type, names and class; only ever shown as a guess.</summary>
internal static class RoleGuess
{
    private static readonly (string Word, string Role)[] s_words =
    [
        ("hanger", "hanger"), ("hänge", "hanger"), ("haenge", "hanger"), ("threaded rod", "hanger"), ("gewindestange", "hanger"),
        ("stay", "stay"), ("abspann", "stay"), ("strut", "strut"), ("strebe", "strut"), ("brace", "brace"), ("bracing", "brace"), ("verband", "brace"),
        ("post", "post"), ("pfosten", "post"), ("stijl", "post"), ("baluster", "post"), ("rail", "rail"), ("holm", "rail"), ("handlauf", "rail"),
        ("leuning", "rail"), ("regel", "rail"), ("mast", "mast"), ("rod", "rod"), ("stange", "rod"),
    ];

    /// <summary>One word: rail, post, hanger, rod, strut, brace, stay, mast, beam, column, member.</summary>
    public static string Of(ElementIdentity element)
    {
        var byType = element.PredefinedType switch
        {
            "POST" or "STUD" => "post",
            "STRUT" => "strut",
            "BRACE" => "brace",
            "HANDRAIL" or "GUARDRAIL" or "BALUSTRADE" => "rail",
            "STAY_CABLE" or "TIEBAR" => "stay",
            "SUSPENDER" => "hanger",
            _ => "",
        };
        if (byType.Length > 0 && element.Class != "IfcRailing") return byType;

        foreach (var text in new[] { element.Name, element.TypeName })
            foreach (var (word, role) in s_words)
                if (text.Contains(word, StringComparison.OrdinalIgnoreCase))
                    return role;

        if (byType.Length > 0) return byType;
        return element.Class.StartsWith("IfcBeam", StringComparison.Ordinal) ? "beam"
            : element.Class.StartsWith("IfcColumn", StringComparison.Ordinal) ? "column"
            : element.Class == "IfcRailing" ? "rail"
            : "member";
    }
}
