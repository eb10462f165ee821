using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Part21;

/// <summary>One instance such as <c>#12=IFCBEAM(…)</c>: a small handle, free to copy; the default value is no instance.</summary>
public readonly record struct Part21Record
{
    /// <summary>The number after '#'; 0 for the default value.</summary>
    public ulong Id => throw new NotImplementedException();

    /// <summary>The keyword in upper case; empty for a complex instance.</summary>
    public string Keyword => throw new NotImplementedException();

    /// <summary>Whether the instance is of the external mapping <c>#1=(A(…)B(…))</c>; it then has no arguments here.</summary>
    public bool IsComplex => throw new NotImplementedException();

    /// <summary>Whether its arguments cannot be told apart; they then read as absent.</summary>
    public bool IsDamaged => throw new NotImplementedException();

    /// <summary>Number of arguments.</summary>
    public int ArgumentCount => throw new NotImplementedException();

    /// <summary>An argument by its index from 0; a value of kind <see cref="Part21ValueKind.Absent"/> beyond the last.</summary>
    public Part21Value this[int index] => throw new NotImplementedException();

    /// <summary>From '#' to ';', both included.</summary>
    public ReadOnlySpan<byte> Text => throw new NotImplementedException();

    /// <summary>Where it stands.</summary>
    public SourceSpan Span => throw new NotImplementedException();
}
