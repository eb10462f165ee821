namespace MemberScan.Model.Frames;

/// <summary>How all six directions are held.</summary>
/// <param name="Ux">Shift along x.</param>
/// <param name="Uy">Shift along y.</param>
/// <param name="Uz">Shift along z.</param>
/// <param name="Rx">Turn about x.</param>
/// <param name="Ry">Turn about y.</param>
/// <param name="Rz">Turn about z.</param>
public sealed record Restraints(Restraint Ux, Restraint Uy, Restraint Uz, Restraint Rx, Restraint Ry, Restraint Rz)
{
    /// <summary>Nothing is held.</summary>
    public static Restraints AllFree { get; } = new(default, default, default, default, default, default);

    /// <summary>Everything is held rigidly.</summary>
    public static Restraints AllFixed { get; } = new(Restraint.Fixed, Restraint.Fixed, Restraint.Fixed, Restraint.Fixed, Restraint.Fixed, Restraint.Fixed);

    /// <summary>The three shifts are held rigidly, the turns are free.</summary>
    public static Restraints Pinned { get; } = new(Restraint.Fixed, Restraint.Fixed, Restraint.Fixed, default, default, default);

    /// <summary>One of the six.</summary>
    public Restraint this[Direction direction] => direction switch
    {
        Direction.Ux => Ux,
        Direction.Uy => Uy,
        Direction.Uz => Uz,
        Direction.Rx => Rx,
        Direction.Ry => Ry,
        Direction.Rz => Rz,
        _ => throw new ArgumentOutOfRangeException(nameof(direction)),
    };

    /// <summary>The same with one of the six replaced.</summary>
    public Restraints With(Direction direction, Restraint restraint) => direction switch
    {
        Direction.Ux => this with { Ux = restraint },
        Direction.Uy => this with { Uy = restraint },
        Direction.Uz => this with { Uz = restraint },
        Direction.Rx => this with { Rx = restraint },
        Direction.Ry => this with { Ry = restraint },
        Direction.Rz => this with { Rz = restraint },
        _ => throw new ArgumentOutOfRangeException(nameof(direction)),
    };
}
