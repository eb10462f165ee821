using MemberScan.Model.Forces;

namespace MemberScan.Model.Presets;

/// <summary>An assumed load with its source; a reviewer switches it on.</summary>
public sealed record LoadPreset
{
    /// <summary>Name by which settings switch it on.</summary>
    public required string Name { get; init; }

    /// <summary>What it loads.</summary>
    public required PresetKind Kind { get; init; }

    /// <summary>The code with its edition.</summary>
    public required string Standard { get; init; }

    /// <summary>Its clause.</summary>
    public required string Clause { get; init; }

    /// <summary>The occupancy or use that it is for, in words.</summary>
    public required string Occupancy { get; init; }

    /// <summary>Whether its values were written from memory and not read against the code's text.</summary>
    public required bool FromMemory { get; init; }

    /// <summary>Whether its situations count as service or as design.</summary>
    public required SituationKind SituationKind { get; init; }

    /// <summary>Concentrated load [N]; null for none.</summary>
    public double? Concentrated { get; init; }

    /// <summary>Load per length [N/m]; null for none. Never together with <see cref="Concentrated"/>.</summary>
    public double? Line { get; init; }

    /// <summary>Load on infill [N]; null for none.</summary>
    public double? Infill { get; init; }

    /// <summary>Side of the square on which <see cref="Infill"/> acts [m]; null for a point.</summary>
    public double? InfillSide { get; init; }

    /// <summary>Multiple of the weight of the filled pipe [-]; 1 where none is given.</summary>
    public double WeightFactor { get; init; } = 1;

    /// <summary>Load added at each hanger [N]; 0 where none is given.</summary>
    public double Added { get; init; }

    /// <summary>What a reader must know; empty for none.</summary>
    public string Note { get; init; } = "";

    /// <summary>Code, edition, clause, occupancy and the mark, in words.</summary>
    public string Source => $"{Standard}, {Clause}, {Occupancy}{(FromMemory ? " (from memory)" : "")}";
}
