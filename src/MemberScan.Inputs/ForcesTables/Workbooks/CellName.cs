using System.Globalization;

namespace MemberScan.Inputs.ForcesTables.Workbooks;

/// <summary>Names of cells, such as <c>C7</c>.</summary>
internal static class CellName
{
    /// <summary>The name of a cell.</summary>
    /// <param name="column">Its column, from 0.</param>
    /// <param name="row">Its row, from 1.</param>
    public static string Of(int column, int row)
    {
        var letters = "";
        for (var rest = column + 1; rest > 0; rest = (rest - 1) / 26) letters = (char)('A' + (rest - 1) % 26) + letters;
        return letters + row.ToString(CultureInfo.InvariantCulture);
    }

    /// <summary>The column that a name says, from 0; −1 when it is no name of a cell.</summary>
    public static int ColumnOf(string name)
    {
        var column = 0;
        var at = 0;
        for (; at < name.Length && name[at] is >= 'A' and <= 'Z' && column < 100_000; at++) column = 26 * column + (name[at] - 'A' + 1);
        return at == 0 || at == name.Length ? -1 : column - 1;
    }
}
