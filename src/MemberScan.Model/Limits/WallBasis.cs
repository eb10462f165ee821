namespace MemberScan.Model.Limits;

/// <summary>The wall of hollow sections that stresses are taken of.</summary>
public enum WallBasis
{
    /// <summary>The wall as modelled.</summary>
    Nominal,

    /// <summary>0.93 of it: the design wall of AISC 360-22 B4.2 (from memory).</summary>
    Design,

    /// <summary>The whole wall for the grades A1065 and A1085, else 0.93 of it.</summary>
    ByGrade,
}
