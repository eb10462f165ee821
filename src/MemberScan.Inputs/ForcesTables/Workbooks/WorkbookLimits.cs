namespace MemberScan.Inputs.ForcesTables.Workbooks;

/// <summary>How much a workbook may ask for, whatever it promises.</summary>
/// <param name="Unpacked">Most bytes of all its parts, unpacked.</param>
/// <param name="Parts">Most parts.</param>
/// <param name="Columns">Most columns of the sheet.</param>
/// <param name="SharedTexts">Most shared texts.</param>
internal sealed record WorkbookLimits(long Unpacked, int Parts, int Columns, int SharedTexts)
{
    public const long MostUnpacked = 1024L * 1024 * 1024;
    public const int MostParts = 10_000;
    public const int MostColumns = 256;
    public const int MostSharedTexts = 2_000_000;

    public static WorkbookLimits Default { get; } = new(MostUnpacked, MostParts, MostColumns, MostSharedTexts);
}
