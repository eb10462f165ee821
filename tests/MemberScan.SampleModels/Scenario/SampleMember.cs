using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;

namespace MemberScan.SampleModels.Scenario;

/// <summary>One candidate of a sample as it is meant: what the model says of it, in SI.</summary>
public sealed record SampleMember
{
    /// <summary>GlobalId, for an item of a railing <c>GlobalId/2</c>; given when the member is written.</summary>
    public string Key { get; init; } = "";

    /// <summary>Name; for an item that of the railing.</summary>
    public required string Name { get; init; }

    /// <summary>Class keyword, such as <c>IFCMEMBER</c>.</summary>
    public string Keyword { get; init; } = "IFCMEMBER";

    /// <summary>Tag.</summary>
    public string? Tag { get; init; }

    /// <summary>Literal of PredefinedType.</summary>
    public string? PredefinedType { get; init; }

    /// <summary>The name parameter as it stands in the file, when it is not well formed.</summary>
    public string? NameSpelling { get; init; }

    /// <summary>Section.</summary>
    public required CrossSection Section { get; init; }

    /// <summary>Material.</summary>
    public required SampleMaterial Material { get; init; }

    /// <summary>Axes in project coordinates.</summary>
    public required MemberAxes Axes { get; init; }

    /// <summary>Length [m].</summary>
    public required double Length { get; init; }

    /// <summary>How the body is written.</summary>
    public SampleBody Body { get; init; } = SampleBody.Extrusion;

    /// <summary>Whether the analytical member's axes are turned by a quarter: its z is the member's y.</summary>
    public bool AnalysisIsTurned { get; init; }

    /// <summary>Section forces; empty when no source has any.</summary>
    public ImmutableArray<SampleSituation> Situations { get; init; } = [];
}
