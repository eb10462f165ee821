namespace MemberScan.Part21.Tokens;

/// <summary>What a parameter is; the same members in the same order as the public kinds.</summary>
internal enum TokenKind
{
    Absent,
    Unset,
    Derived,
    Reference,
    Integer,
    Real,
    Text,
    Enumeration,
    Binary,
    List,
    Typed,
    Malformed,
}
