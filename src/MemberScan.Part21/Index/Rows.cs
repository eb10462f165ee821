namespace MemberScan.Part21.Index;

/// <summary>A list that grows by pieces: nothing is copied, and no piece is large enough to be collected late.</summary>
internal sealed class Rows<T>
    where T : struct
{
    private const int Shift = 11;
    private const int PieceLength = 1 << Shift;

    private readonly List<T[]> _pieces = [];
    private T[] _last = [];
    private int _used = PieceLength;

    /// <summary>Number of rows.</summary>
    public int Count => _pieces.Count == 0 ? 0 : (_pieces.Count - 1) * PieceLength + _used;

    public ref T this[int row] => ref _pieces[row >> Shift][row & (PieceLength - 1)];

    public void Add(in T row)
    {
        if (_used == PieceLength) Grow();
        _last[_used++] = row;
    }

    /// <summary>Adds all rows of another list.</summary>
    public void AddAll(Rows<T> rows)
    {
        for (var i = 0; i < rows.Count; i++) Add(rows[i]);
    }

    private void Grow()
    {
        _last = new T[PieceLength];
        _pieces.Add(_last);
        _used = 0;
    }
}
