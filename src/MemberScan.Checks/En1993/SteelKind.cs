namespace MemberScan.Checks.En1993;

/// <summary>The steels whose limits of slenderness and buckling differ.</summary>
public enum SteelKind
{
    /// <summary>Carbon steel: EN 1993-1-1.</summary>
    Carbon,

    /// <summary>Stainless steel with its 0.2 % proof strength: EN 1993-1-4.</summary>
    Stainless,
}
