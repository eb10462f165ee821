namespace MemberScan.Inputs.ForcesTables;

/// <summary>How much a table may ask for: a bound on time and memory whatever the file holds.</summary>
/// <param name="Rows">Most rows of values.</param>
/// <param name="RowLength">Longest row or remark [bytes].</param>
/// <param name="FieldLength">Longest field [bytes].</param>
/// <param name="Names">Most different names of members and situations.</param>
/// <param name="Errors">Errors after which reading stops.</param>
internal sealed record TableLimits(int Rows, int RowLength, int FieldLength, int Names, int Errors)
{
    public const int MostRows = 50_000_000;
    public const int LongestRow = 64 * 1024;
    public const int LongestField = 1024;
    public const int MostNames = 5_000_000;
    public const int MostErrors = 50;

    public static TableLimits Default { get; } = new(MostRows, LongestRow, LongestField, MostNames, MostErrors);
}
