namespace MemberScan.Ifc.WriteBack;

/// <summary>What the property set of one element says. Values are SI; null is left out of the set.</summary>
public sealed record StressCheckSet
{
    /// <summary>Name of the set.</summary>
    public const string SetName = "MemberScan_StressCheck";

    /// <summary>STEP id of the element.</summary>
    public required ulong ElementId { get; init; }

    /// <summary>Key of the element; GlobalIds of set and relation derive from it.</summary>
    public required string ElementKey { get; init; }

    /// <summary>WITHIN LIMIT, OVERSTRESSED or NOT CHECKED.</summary>
    public required string Status { get; init; }

    /// <summary>Reason code and sentence.</summary>
    public string? Reason { get; init; }

    /// <summary>Utilization in root form [-].</summary>
    public double? Utilization { get; init; }

    /// <summary>Criterion in words.</summary>
    public string? Criterion { get; init; }

    /// <summary>Stress limit [Pa].</summary>
    public double? StressLimit { get; init; }

    /// <summary>Equivalent stress at the governing point [Pa].</summary>
    public double? EquivalentStress { get; init; }

    /// <summary>Normal stress there [Pa].</summary>
    public double? NormalStress { get; init; }

    /// <summary>Shear stress there [Pa].</summary>
    public double? ShearStress { get; init; }

    /// <summary>Equivalent stress with its unit, for people.</summary>
    public string? EquivalentStressText { get; init; }

    /// <summary>Governing situation.</summary>
    public string? Situation { get; init; }

    /// <summary>Distance from the member's start [m].</summary>
    public double? Station { get; init; }

    /// <summary>Governing point along y [m].</summary>
    public double? PointY { get; init; }

    /// <summary>Governing point along z [m].</summary>
    public double? PointZ { get; init; }

    /// <summary>Governing point in words.</summary>
    public string? PointName { get; init; }

    /// <summary>Where the forces come from.</summary>
    public string? ForcesSource { get; init; }

    /// <summary>Where the section comes from.</summary>
    public string? SectionSource { get; init; }

    /// <summary>Shear model that decides.</summary>
    public string? ShearModel { get; init; }

    /// <summary>Key of the worst item of an element that has several.</summary>
    public string? Item { get; init; }

    /// <summary>Number of items of an element that has several.</summary>
    public int? ItemCount { get; init; }

    /// <summary>RunId.</summary>
    public required string RunId { get; init; }

    /// <summary>Program and version.</summary>
    public required string Program { get; init; }

    /// <summary>What a person decided; null if nobody did.</summary>
    public string? ReviewDecision { get; init; }

    /// <summary>Note of the decision with who, when, and whether it is stale.</summary>
    public string? ReviewNote { get; init; }
}
