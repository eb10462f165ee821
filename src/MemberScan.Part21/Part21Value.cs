namespace MemberScan.Part21;

/// <summary>One argument or list item, not decoded before it is asked for; free to copy.</summary>
public readonly struct Part21Value
{
    /// <summary>What it is.</summary>
    public Part21ValueKind Kind => throw new NotImplementedException();

    /// <summary>Whether it holds nothing: absent, <c>$</c> or <c>*</c>.</summary>
    public bool IsEmpty => throw new NotImplementedException();

    /// <summary>Its bytes, without blanks and comments around.</summary>
    public ReadOnlySpan<byte> Text => throw new NotImplementedException();

    /// <summary>Keyword of a typed value, upper case; empty for others.</summary>
    public string TypeName => throw new NotImplementedException();

    /// <summary>The value within a typed value; itself for others.</summary>
    public Part21Value Inner => throw new NotImplementedException();

    /// <summary>Number of items of a list; 0 for others.</summary>
    public int ItemCount => throw new NotImplementedException();

    /// <summary>Items of a list in order; none for others. Materialised once per call.</summary>
    public IReadOnlyList<Part21Value> Items => throw new NotImplementedException();

    /// <summary>Reads <c>#12</c>.</summary>
    public bool TryReference(out ulong id) => throw new NotImplementedException();

    /// <summary>Reads a real or an integer, typed or not; finite and correctly rounded, false otherwise.</summary>
    public bool TryReal(out double value) => throw new NotImplementedException();

    /// <summary>Reads an integer (or a real without fraction), typed or not.</summary>
    public bool TryInteger(out long value) => throw new NotImplementedException();

    /// <summary>Reads and decodes a string, typed or not; every directive of the standard.</summary>
    public bool TryText(out string value) => throw new NotImplementedException();

    /// <summary>Reads an enumeration literal without its dots, in upper case, typed or not.</summary>
    public bool TryEnumeration(out string literal) => throw new NotImplementedException();
}
