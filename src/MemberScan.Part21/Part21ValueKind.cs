namespace MemberScan.Part21;

/// <summary>What an argument is.</summary>
public enum Part21ValueKind
{
    /// <summary>Beyond the last argument, or nothing between two commas.</summary>
    Absent,

    /// <summary><c>$</c></summary>
    Unset,

    /// <summary><c>*</c></summary>
    Derived,

    /// <summary><c>#12</c></summary>
    Reference,

    /// <summary><c>12</c></summary>
    Integer,

    /// <summary><c>1.5</c></summary>
    Real,

    /// <summary><c>'text'</c></summary>
    Text,

    /// <summary><c>.LITERAL.</c></summary>
    Enumeration,

    /// <summary><c>"0F"</c></summary>
    Binary,

    /// <summary><c>(a,b)</c></summary>
    List,

    /// <summary><c>IFCLABEL('x')</c></summary>
    Typed,

    /// <summary>Something that is none of these.</summary>
    Malformed,
}
