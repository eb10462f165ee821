namespace MemberScan.Part21.Index;

/// <summary>Instance number → row. A plain table where numbers lie close, a sorted list elsewhere: no number can make it slow or large.</summary>
internal sealed class IdIndex
{
    // Row + 1 by number; 0 where there is none.
    private readonly int[] _dense = [];
    private ulong[] _ids = [];
    private int[] _rows = [];

    /// <summary>Builds it and marks the rows whose number stands further up already; of those the first is found.</summary>
    public IdIndex(Span<InstanceRow> rows)
    {
        var highest = 0UL;
        foreach (ref readonly var row in rows) highest = Math.Max(highest, row.Id);

        if (highest < 1024 + 8UL * (ulong)rows.Length && highest < (ulong)Array.MaxLength)
        {
            _dense = new int[(int)highest + 1];
            FillDense(rows);
            return;
        }

        _ids = new ulong[rows.Length];
        _rows = new int[rows.Length];
        FillSorted(rows);
    }

    public bool TryFind(ulong id, out int row)
    {
        if (_dense.Length > 0)
        {
            row = id < (ulong)_dense.Length ? _dense[id] - 1 : -1;
            return row >= 0;
        }

        var at = Array.BinarySearch(_ids, id);
        row = at < 0 ? -1 : _rows[at];
        return at >= 0;
    }

    private void FillDense(Span<InstanceRow> rows)
    {
        for (var i = 0; i < rows.Length; i++)
        {
            ref var place = ref _dense[rows[i].Id];
            if (place == 0) place = i + 1;
            else rows[i] = rows[i].With(InstanceFlags.Duplicate);
        }
    }

    private void FillSorted(Span<InstanceRow> rows)
    {
        var ascending = true;
        for (var i = 0; i < rows.Length; i++)
        {
            _ids[i] = rows[i].Id;
            _rows[i] = i;
            ascending &= i == 0 || _ids[i] > _ids[i - 1];
        }

        if (ascending) return;

        Array.Sort(_ids, _rows);
        var kept = 0;
        for (var start = 0; start < _ids.Length;)
        {
            var end = start + 1;
            while (end < _ids.Length && _ids[end] == _ids[start]) end++;
            if (end - start > 1)
            {
                Array.Sort(_rows, start, end - start);
                for (var i = start + 1; i < end; i++) rows[_rows[i]] = rows[_rows[i]].With(InstanceFlags.Duplicate);
            }

            _ids[kept] = _ids[start];
            _rows[kept++] = _rows[start];
            start = end;
        }

        Array.Resize(ref _ids, kept);
        Array.Resize(ref _rows, kept);
    }
}
