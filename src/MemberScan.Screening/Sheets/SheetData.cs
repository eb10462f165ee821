using System.Collections.Immutable;
using MemberScan.Mechanics.States;

namespace MemberScan.Screening.Sheets;

/// <summary>What the drawings of a member sheet need beside the record: the stress field of the governing situation and the forces along the member.</summary>
public sealed record SheetData
{
    /// <summary>The section that decides, sampled.</summary>
    public required SectionSamples Samples { get; init; }

    /// <summary>The governing forces all together.</summary>
    public required FieldPart Whole { get; init; }

    /// <summary>Each of the six governing forces alone, in the order N, Vy, Vz, T, My, Mz.</summary>
    public required ImmutableArray<FieldPart> Alone { get; init; }

    /// <summary>σ of the governing forces as a plane: at the centroid [Pa], and what it gains along y and z [Pa/m]; zero along the neutral axis.</summary>
    public required (double N, double PerY, double PerZ) Plane { get; init; }

    /// <summary>The state at the governing point worked out.</summary>
    public required PointState State { get; init; }

    /// <summary>Forces along the member, the governing situation first; at most <see cref="SheetMaker.MostLines"/>.</summary>
    public required ImmutableArray<SituationLine> Lines { get; init; }
}
