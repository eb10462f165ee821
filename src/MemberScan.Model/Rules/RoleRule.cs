using System.Collections.Immutable;

namespace MemberScan.Model.Rules;

/// <summary>Guesses the role of a member; every condition that is given must hold, and the first rule that fits wins.</summary>
/// <param name="Role">The role in one word, such as <c>post</c>.</param>
public sealed record RoleRule(string Role)
{
    /// <summary>Classes, without regard to case, StandardCase forms with them; empty for any.</summary>
    public ImmutableArray<string> Classes { get; init; } = [];

    /// <summary>Predefined types, without regard to case; empty for any.</summary>
    public ImmutableArray<string> PredefinedTypes { get; init; } = [];

    /// <summary>Regular expression that is searched in the name, without regard to case; where no rule's pattern fits the name, in those of its type, its assembly and its layer, in this order. Empty for any.</summary>
    public string NamePattern { get; init; } = "";

    /// <summary>Least slope of the member against the horizontal [degree], in [0, 90]; over 0 only members of known axes fit.</summary>
    public double MinSlopeDegrees { get; init; }

    /// <summary>Largest slope of the member against the horizontal [degree], in [0, 90]; under 90 only members of known axes fit.</summary>
    public double MaxSlopeDegrees { get; init; } = 90;

    /// <summary>Least length over largest extent of the section [-]; over 0 only members of known length and section fit.</summary>
    public double MinSlenderness { get; init; }

    /// <summary>The shipped rules: predefined types, then names in several languages, then classes.</summary>
    public static ImmutableArray<RoleRule> Default { get; } =
    [
        new("post") { PredefinedTypes = ["POST", "STUD"] },
        new("strut") { PredefinedTypes = ["STRUT"] },
        new("brace") { PredefinedTypes = ["BRACE"] },
        new("stay") { PredefinedTypes = ["STAY_CABLE", "TIEBAR"] },
        new("hanger") { PredefinedTypes = ["SUSPENDER"] },
        new("hanger") { NamePattern = "hanger|h(ä|ae)nge|threaded rod|gewindestange|draadstang|suspente|tige filet|varilla roscada|p[eé]ndola|pendino|barra filettata" },
        new("stay") { NamePattern = "stay|abspann|hauban|strallo" },
        new("strut") { NamePattern = "strut|strebe|bracon|puntal|puntone|schoor" },
        new("brace") { NamePattern = "brace|bracing|verband|contreventement|arriostra|controvent" },
        new("post") { NamePattern = "post|pfosten|stijl|staander|baluster|poteau|montant|piantone" },
        new("rail") { NamePattern = "rail|holm|handlauf|geländer|leuning|regel|garde-?corps|main courante|barandilla|pasamanos|corrimano|ringhiera|parapetto" },
        new("mast") { NamePattern = "mast|mât|mástil" },
        new("rod") { NamePattern = "rod|stange|staaf|varilla|tige" },
        new("rail") { Classes = ["IfcRailing"] },
        new("beam") { Classes = ["IfcBeam"] },
        new("column") { Classes = ["IfcColumn"] },
    ];
}
