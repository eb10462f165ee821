namespace MemberScan.Checks.Aisc360;

/// <summary>The two methods of AISC 360-22, B3; each is for situations of one kind.</summary>
public enum DesignMethod
{
    /// <summary>Allowable strength design: nominal strength over Ω, service situations.</summary>
    Asd,

    /// <summary>Load and resistance factor design: φ times nominal strength, design situations.</summary>
    Lrfd,
}
