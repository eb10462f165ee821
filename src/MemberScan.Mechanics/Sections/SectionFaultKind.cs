namespace MemberScan.Mechanics.Sections;

/// <summary>Rules that the dimensions of a cross-section must obey.</summary>
public enum SectionFaultKind
{
    /// <summary>A dimension is zero, negative or not a finite number.</summary>
    NotPositive,

    /// <summary>The wall is as thick as the radius or half the width, or thicker: there is no hole.</summary>
    WallOverRadius,

    /// <summary>A corner radius is larger than half the side, or outer and inner radius do not fit the wall.</summary>
    RadiusTooLarge,

    /// <summary>An outline crosses itself, has too many corners, or encloses nothing.</summary>
    NotSimple,
}
