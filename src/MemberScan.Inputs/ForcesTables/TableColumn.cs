using System.Collections.Immutable;
using MemberScan.Foundation.Units;

namespace MemberScan.Inputs.ForcesTables;

/// <summary>A column that a table may have.</summary>
/// <param name="Name">Its name in the header.</param>
/// <param name="Quantity">What its numbers measure; null for text.</param>
/// <param name="IsRequired">Whether it must be there.</param>
internal sealed record TableColumn(string Name, Quantity? Quantity, bool IsRequired)
{
    public const int Member = 0;
    public const int Situation = 1;
    public const int Kind = 2;
    public const int Station = 3;
    public const int FirstForce = 4;

    /// <summary>All columns; the constants are places in this list, the six forces last.</summary>
    public static ImmutableArray<TableColumn> All { get; } =
    [
        new("member", null, true), new("situation", null, true), new("kind", null, false),
        new("station", Foundation.Units.Quantity.Length, true),
        new("N", Foundation.Units.Quantity.Force, true), new("Vy", Foundation.Units.Quantity.Force, true),
        new("Vz", Foundation.Units.Quantity.Force, true), new("T", Foundation.Units.Quantity.Moment, true),
        new("My", Foundation.Units.Quantity.Moment, true), new("Mz", Foundation.Units.Quantity.Moment, true),
    ];

    public static ImmutableArray<string> Names { get; } = [.. All.Select(column => column.Name)];
}
