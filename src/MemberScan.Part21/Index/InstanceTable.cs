using System.Collections.Immutable;

namespace MemberScan.Part21.Index;

/// <summary>All instances of a file: by place, by number, by keyword.</summary>
internal sealed class InstanceTable
{
    private readonly InstanceRow[] _rows;
    private readonly KeywordTable _keywords;
    private readonly IdIndex _ids;

    // Rows grouped by keyword, in file order within each group; group k is [_groups[k], _groups[k + 1]).
    private readonly int[] _grouped;
    private readonly int[] _groups;

    public InstanceTable(List<InstanceRow> rows, KeywordTable keywords)
    {
        _rows = [.. rows];
        _keywords = keywords;
        _ids = new IdIndex(_rows);
        _groups = new int[keywords.Count + 1];
        _grouped = new int[_rows.Length];
        Group();

        var counts = ImmutableSortedDictionary.CreateBuilder<string, int>(StringComparer.Ordinal);
        for (var k = 1; k < keywords.Count; k++)
        {
            var count = _groups[k + 1] - _groups[k];
            if (count > 0) counts.Add(keywords[k], count);
        }

        CountByKeyword = counts.ToImmutable();
    }

    public int Count => _rows.Length;

    public IReadOnlyDictionary<string, int> CountByKeyword { get; }

    public IdIndex Ids => _ids;

    public ref readonly InstanceRow this[int row] => ref _rows[row];

    public string KeywordOf(int row) => _keywords[_rows[row].Keyword];

    /// <summary>Rows of a keyword in file order.</summary>
    public ReadOnlyMemory<int> RowsOf(string keyword)
    {
        if (!_keywords.TryFind(keyword, out var number) || number == 0) return default;
        return _grouped.AsMemory(_groups[number], _groups[number + 1] - _groups[number]);
    }

    private void Group()
    {
        foreach (ref readonly var row in _rows.AsSpan()) _groups[row.Keyword + 1]++;
        for (var k = 1; k < _groups.Length; k++) _groups[k] += _groups[k - 1];

        var next = _groups.AsSpan().ToArray();
        for (var i = 0; i < _rows.Length; i++) _grouped[next[_rows[i].Keyword]++] = i;
    }
}
