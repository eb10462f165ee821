namespace MemberScan.Inputs;

/// <summary>Stable codes of the findings about what comes beside the model.</summary>
internal static class InputCodes
{
    public const string TableNotUtf8 = "INP-0001";
    public const string TableEmpty = "INP-0002";
    public const string TableWithoutRows = "INP-0003";
    public const string Separator = "INP-0004";
    public const string ColumnUnknown = "INP-0005";
    public const string ColumnDoubled = "INP-0006";
    public const string ColumnMissing = "INP-0007";
    public const string ColumnUnit = "INP-0008";
    public const string FieldCount = "INP-0009";
    public const string FieldEmpty = "INP-0010";
    public const string NotANumber = "INP-0011";
    public const string NotFinite = "INP-0012";
    public const string DecimalComma = "INP-0013";
    public const string StationOutOfRange = "INP-0014";
    public const string KindUnknown = "INP-0015";
    public const string KindContradicted = "INP-0016";
    public const string Quoting = "INP-0017";
    public const string LineEnd = "INP-0018";
    public const string DirectiveUnknown = "INP-0019";
    public const string DirectiveContradicted = "INP-0020";
    public const string DirectiveLate = "INP-0021";
    public const string TableLimit = "INP-0022";
    public const string TooManyErrors = "INP-0023";
    public const string ControlCharacter = "INP-0024";
    public const string Workbook = "INP-0025";
    public const string WorkbookRead = "INP-0026";
    public const string WorkbookCell = "INP-0027";

    public const string NotJson = "INP-0101";
    public const string KeyUnknown = "INP-0102";
    public const string KeyDoubled = "INP-0103";
    public const string WrongType = "INP-0104";
    public const string WordUnknown = "INP-0105";
    public const string OutOfRange = "INP-0106";
    public const string TextUnusable = "INP-0107";
    public const string ValueUnit = "INP-0108";
    public const string KeyMissing = "INP-0109";
    public const string PatternUnusable = "INP-0110";
    public const string SettingsLimit = "INP-0111";
    public const string EntryDoubled = "INP-0112";
    public const string ReferenceUnknown = "INP-0113";

    public const string DecisionHeader = "INP-0201";
    public const string DecisionText = "INP-0202";
    public const string DecisionDate = "INP-0203";
    public const string DecisionDoubled = "INP-0204";
}
