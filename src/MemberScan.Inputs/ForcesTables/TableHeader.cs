using MemberScan.Foundation.Units;
using MemberScan.Inputs.Values;

namespace MemberScan.Inputs.ForcesTables;

/// <summary>The header row: which column stands where, and in which unit.</summary>
internal sealed class TableHeader
{
    private readonly int[] _places = new int[TableColumn.All.Length];
    private readonly double[] _factors = new double[TableColumn.All.Length];

    private TableHeader(int width)
    {
        Width = width;
        Array.Fill(_places, -1);
    }

    /// <summary>Fields of every row.</summary>
    public int Width { get; }

    /// <summary>Whether stations are shares of the length.</summary>
    public bool StationIsShare { get; private set; }

    /// <summary>Place of a column among the fields of a row, from 0; −1 if the table does not have it.</summary>
    public int PlaceOf(int column) => _places[column];

    /// <summary>One unit of a column in SI.</summary>
    public double FactorOf(int column) => _factors[column];

    /// <summary>Reads the header; what is wrong is added to the findings.</summary>
    /// <param name="cells">Text of each cell and the byte at which it begins.</param>
    /// <param name="rowStart">First byte of the row.</param>
    /// <param name="fail">Takes the errors: code, byte, message.</param>
    public static TableHeader Read(IReadOnlyList<(string Text, int Start)> cells, int rowStart, Action<string, int, string> fail)
    {
        var header = new TableHeader(cells.Count);
        for (var place = 0; place < cells.Count; place++)
        {
            var (text, start) = cells[place];
            header.Take(text, place, (code, message) => fail(code, start, message));
        }

        var missing = TableColumn.All.Where((column, i) => column.IsRequired && header._places[i] < 0).ToArray();
        foreach (var column in missing)
        {
            fail(InputCodes.ColumnMissing, rowStart,
                $"the column '{column.Name}' is missing; add it as {Example(column)}");
        }

        return header;
    }

    private void Take(string cell, int place, Action<string, string> fail)
    {
        var (name, symbol) = Split(cell);
        var index = TableColumn.Names.IndexOf(name);
        if (index < 0)
        {
            fail(InputCodes.ColumnUnknown, name.Length == 0
                ? $"column {place + 1} has no name; name it or take it out"
                : $"{Excerpt.Of(name)} is not a column; {NearestName.Advice(name, TableColumn.Names)}");
            return;
        }

        if (_places[index] >= 0)
        {
            fail(InputCodes.ColumnDoubled, $"the column '{name}' stands twice; keep one of them");
            return;
        }

        _places[index] = place;
        var column = TableColumn.All[index];
        if (column.Quantity is not { } quantity)
        {
            if (symbol is not null) fail(InputCodes.ColumnUnit, $"the column '{name}' has no unit; write it without brackets");
            return;
        }

        if (index == TableColumn.Station && symbol == "%") (quantity, StationIsShare) = (Quantity.Ratio, true);
        if (UnitText.TryRead(symbol ?? "", quantity, out var unit, out var error)) _factors[index] = unit.Factor;
        else fail(InputCodes.ColumnUnit, $"column '{name}': {error}{(symbol is null ? $" in brackets, such as {Example(column)}" : "")}");
    }

    // "N [kN]" → ("N", "kN"); without brackets the symbol is null, with broken ones all of it is the name.
    private static (string Name, string? Symbol) Split(string cell)
    {
        var open = cell.IndexOf('[', StringComparison.Ordinal);
        return open > 0 && cell.EndsWith(']')
            ? (cell[..open].Trim(), cell[(open + 1)..^1].Trim())
            : (cell, null);
    }

    private static string Example(TableColumn column) => column.Quantity switch
    {
        Quantity.Length => $"{column.Name}[m]",
        Quantity.Force => $"{column.Name}[kN]",
        Quantity.Moment => $"{column.Name}[kNm]",
        _ => column.Name,
    };
}
