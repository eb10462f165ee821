namespace MemberScan.Mechanics.States;

/// <summary>The plane in which a stress element is drawn: x along the member and one axis of the section.</summary>
public enum ElementPlane
{
    /// <summary>x to the right, y up.</summary>
    XY,

    /// <summary>x to the right, z up.</summary>
    XZ,
}
