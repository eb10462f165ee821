using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Part21.Findings;

/// <summary>Every finding this project tells. Codes are never given to another meaning.</summary>
internal static class FindingKinds
{
    // The file as a whole
    public static readonly FindingKind NotPart21 = Fatal("P21-0001", "This is no ISO 10303-21 text: it does not begin with ISO-10303-21; nothing was read.");
    public static readonly FindingKind Utf16 = Fatal("P21-0002", "The text is in UTF-16, which ISO 10303-21 does not know; nothing was read. Save it as UTF-8 or ASCII.");
    public static readonly FindingKind Truncated = Fatal("P21-0003", "The text ends before END-ISO-10303-21: the file is cut off; what stood before was read.");
    public static readonly FindingKind SeveralStructures = Fatal("P21-0004", "The file holds several exchange structures one after the other; only the first was read.");
    public static readonly FindingKind NoData = Fatal("P21-0005", "There is no DATA section, so there is no instance to read.");
    public static readonly FindingKind EndOfSectionMissing = Fatal("P21-0006", "A section is not closed by ENDSEC; reading went on with what follows.");
    public static readonly FindingKind TextBefore = Damage("P21-0007", "There is text before ISO-10303-21; it was passed over.");
    public static readonly FindingKind TextAfter = Damage("P21-0008", "There is text after the end of the exchange structure; it was passed over.");
    public static readonly FindingKind TextBetween = Damage("P21-0009", "There is text between two statements that is no statement; it was passed over up to the next one.");
    public static readonly FindingKind SectionSkipped = Note("P21-0010", "An ANCHOR or REFERENCE section was skipped; what it names stands outside of this file or is not needed.");
    public static readonly FindingKind Signature = Note("P21-0011", "The file carries a signature; any copy with something written into it is no longer covered by it.");
    public static readonly FindingKind HeaderDamaged = Damage("P21-0012", "A header entry cannot be read; it was passed over.");
    public static readonly FindingKind HeaderIncomplete = new("P21-0013", Severity.Warning, "One of FILE_DESCRIPTION, FILE_NAME and FILE_SCHEMA is missing from the header; it counts as empty.", IsDamage: false);

    // One instance that cannot be used
    public static readonly FindingKind UnterminatedString = Damage("P21-0014", "A string has no closing apostrophe; the instance counts as damaged, reading went on at the next instance.");
    public static readonly FindingKind UnterminatedComment = Damage("P21-0015", "A comment is not closed; reading went on at the next instance after its beginning.");
    public static readonly FindingKind BracketMissing = Damage("P21-0016", "A closing bracket is missing; the instance counts as damaged, reading went on at the next instance.");
    public static readonly FindingKind UnexpectedText = Damage("P21-0017", "There is text where a comma, a bracket or a semicolon belongs; the instance counts as damaged, reading went on at the next instance.");
    public static readonly FindingKind NoInstance = Damage("P21-0018", "A statement is not of the form #number=KEYWORD(...); it was passed over, reading went on at the next instance.");
    public static readonly FindingKind Scope = Damage("P21-0019", "An instance has a scope (&SCOPE, long withdrawn from the standard); it counts as damaged, what is inside may be passed over.");
    public static readonly FindingKind Complex = new("P21-0020", Severity.Warning, "An instance consists of several partial types (external mapping), which no IFC schema uses; it was passed over.", IsDamage: false);

    // One value
    public static readonly FindingKind SemicolonMissing = Damage("P21-0021", "A statement is not closed by a semicolon; it was read all the same.");
    public static readonly FindingKind EmptyArgument = Damage("P21-0022", "There is nothing between two commas or brackets; the argument counts as absent.");
    public static readonly FindingKind BadNumber = Damage("P21-0023", "A number is not one of ISO 10303-21 (such as -1.#INF); the value counts as malformed.");
    public static readonly FindingKind NumberTooLarge = Damage("P21-0024", "A number is beyond what a double can hold; the value cannot be used.");
    public static readonly FindingKind BadValue = Damage("P21-0025", "A value is neither number, text, enumeration, binary, reference nor list; it counts as malformed.");
    public static readonly FindingKind TypedNotOne = Damage("P21-0026", "A typed value does not hold exactly one value; it counts as malformed.");

    // Numbers of instances
    public static readonly FindingKind DuplicateId = Damage("P21-0027", "The number of an instance stands further up already; references go to the first one.");
    public static readonly FindingKind Dangling = Damage("P21-0028", "A reference names an instance that the file does not hold.");

    // Limits
    public static readonly FindingKind TooDeep = Damage("P21-0029", "Brackets are nested deeper than the limit of 64; the instance counts as damaged.");
    public static readonly FindingKind InstanceTooLong = Damage("P21-0030", "An instance is longer than the limit of 64 MiB; it counts as damaged.");
    public static readonly FindingKind StringTooLong = Damage("P21-0031", "A string is longer than the limit of 16 MiB; the instance counts as damaged.");
    public static readonly FindingKind KeywordTooLong = Damage("P21-0032", "A keyword is longer than the limit of 255 characters; the instance counts as damaged.");
    public static readonly FindingKind TooManyKeywords = Damage("P21-0033", "There are more different keywords than the limit of 65,536; instances of further ones count as damaged.");
    public static readonly FindingKind TooManyInstances = Fatal("P21-0034", "There are more instances than the limit of 200,000,000; reading stopped there.");
    public static readonly FindingKind TooMuchDamage = Fatal("P21-0035", "So much of the text is damaged that finding the next instance took too long; reading stopped there.");
    public static readonly FindingKind NumberOfInstanceTooLarge = Damage("P21-0036", "The number of an instance is beyond 4,294,967,295, the highest that the index holds; the instance was passed over.");

    private static FindingKind Fatal(string code, string message) => new(code, Severity.Error, message, EndsReading: true);

    private static FindingKind Damage(string code, string message) => new(code, Severity.Warning, message);

    private static FindingKind Note(string code, string message) => new(code, Severity.Note, message, IsDamage: false);
}
