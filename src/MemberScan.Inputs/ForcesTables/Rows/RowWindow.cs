using System.Security.Cryptography;

namespace MemberScan.Inputs.ForcesTables.Rows;

/// <summary>The part of a table that is being read: always a whole row and a little more, however long the table is.</summary>
internal sealed class RowWindow : IDisposable
{
    /// <summary>Size of the window [bytes], if rows may not be longer.</summary>
    public const int Size = 1024 * 1024;

    private readonly Stream _stream;
    private readonly IncrementalHash _hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
    private readonly byte[] _buffer;
    private readonly int _reach;
    private int _length;

    /// <summary>A window over a stream.</summary>
    /// <param name="stream">The bytes; read forward only.</param>
    /// <param name="reach">Bytes that must be seen from the start of a row, if the table has as many.</param>
    public RowWindow(Stream stream, int reach) => (_stream, _reach, _buffer) = (stream, reach, new byte[Math.Max(Size, 2 * reach)]);

    /// <summary>What is seen.</summary>
    public ReadOnlySpan<byte> Bytes => _buffer.AsSpan(0, _length);

    /// <summary>Place of the first byte seen in the table.</summary>
    public long Offset { get; private set; }

    /// <summary>Whether the table ends where the window does.</summary>
    public bool AtEnd { get; private set; }

    /// <summary>Sees to it that enough follows a place; gives the place anew, since what lay before it may be gone.</summary>
    public int From(int place)
    {
        if (AtEnd || _length - place >= _reach) return place;

        _buffer.AsSpan(place, _length - place).CopyTo(_buffer);
        _length -= place;
        Offset += place;
        while (!AtEnd && _length < _buffer.Length)
        {
            var read = _stream.Read(_buffer, _length, _buffer.Length - _length);
            if (read == 0) AtEnd = true;
            _hash.AppendData(_buffer, _length, read);
            _length += read;
        }

        return 0;
    }

    /// <summary>SHA-256 of the whole table, hexadecimal, lower case; what was not read yet is read.</summary>
    public string Sha256()
    {
        for (var place = _length; !AtEnd; place = _length) _ = From(place);
        return Convert.ToHexStringLower(_hash.GetCurrentHash());
    }

    /// <inheritdoc/>
    public void Dispose() => _hash.Dispose();
}
