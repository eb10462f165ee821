namespace MemberScan.Reporting.Columns;

/// <summary>Type of the values of a column.</summary>
public enum ColumnKind
{
    /// <summary>Text.</summary>
    Text,

    /// <summary>A number in SI.</summary>
    Number,

    /// <summary>A whole number.</summary>
    Integer,
}
