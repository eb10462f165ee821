namespace MemberScan.Model.Rules.PropertySets;

/// <summary>How properties say where along the member their values hold.</summary>
public enum StationSource
{
    /// <summary>Single values hold along the whole member.</summary>
    Constant,

    /// <summary>Lists of values, and a list of as many stations beside them.</summary>
    List,

    /// <summary>Tables: their defining values are stations, their defined values the forces.</summary>
    Table,

    /// <summary>The name of each property carries its station.</summary>
    Name,
}
