namespace MemberScan.Model.Loads;

/// <summary>How a load lies along a member.</summary>
public enum LoadShape
{
    /// <summary>At one place: forces [N] and couples [N·m].</summary>
    Point,

    /// <summary>Along a stretch, linear from its start to its end: forces [N/m] and couples [N·m/m].</summary>
    Linear,

    /// <summary>A half sine wave over a stretch, zero at its ends, the values being those in the middle [N/m], [N·m/m].</summary>
    HalfSine,

    /// <summary>A parabola over a stretch, zero at its ends, the values being those in the middle [N/m], [N·m/m].</summary>
    Parabola,

    /// <summary>A change of temperature of the whole member: X is that of the axis [K], Y and Z the differences across the section [K]. No force along the member.</summary>
    Temperature,
}
