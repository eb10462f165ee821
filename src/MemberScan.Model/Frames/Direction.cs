namespace MemberScan.Model.Frames;

/// <summary>The six directions in which a node or a member end may move: three shifts, three right-handed turns.</summary>
public enum Direction
{
    /// <summary>Shift along x.</summary>
    Ux,

    /// <summary>Shift along y.</summary>
    Uy,

    /// <summary>Shift along z.</summary>
    Uz,

    /// <summary>Turn about x.</summary>
    Rx,

    /// <summary>Turn about y.</summary>
    Ry,

    /// <summary>Turn about z.</summary>
    Rz,
}
