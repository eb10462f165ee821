using System.Collections.Immutable;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Tests.Profiles;

/// <summary>Outlines and open profiles of the landing: gangway rails, stub brackets, mast feet.</summary>
internal static class ProfileSamples
{
    private static readonly double s_quarter = Math.Tan(Math.PI / 8);

    public static CrossSection[] All { get; } =
    [
        new OpenProfile(OpenShape.L, 0.100, 0.080, 0.008, 0.008),
        new OpenProfile(OpenShape.L, 0.060, 0.060, 0.006, 0.006, 0.008),
        new OpenProfile(OpenShape.I, 0.200, 0.100, 0.0056, 0.0085, 0.012),
        new OpenProfile(OpenShape.U, 0.100, 0.050, 0.006, 0.0085, 0.0085),
        new OpenProfile(OpenShape.T, 0.060, 0.060, 0.007, 0.007),
        new OutlineSection("plate with a hole", [Rounded(0.120, 0.060, 0), Circle(0.020, 0, 0.015)]),
        new OutlineSection("half disc", [[new(-0.02, 0), new(0.02, 0, 1)]]),
    ];

    /// <summary>A rectangle with rounded corners about the origin.</summary>
    public static ImmutableArray<OutlineVertex> Rounded(double b, double h, double r) => r == 0
        ? [new(-b / 2, -h / 2), new(b / 2, -h / 2), new(b / 2, h / 2), new(-b / 2, h / 2)]
        :
        [
            new(-b / 2 + r, -h / 2), new(b / 2 - r, -h / 2, s_quarter), new(b / 2, -h / 2 + r), new(b / 2, h / 2 - r, s_quarter),
            new(b / 2 - r, h / 2), new(-b / 2 + r, h / 2, s_quarter), new(-b / 2, h / 2 - r), new(-b / 2, -h / 2 + r, s_quarter),
        ];

    /// <summary>A circle of two halves.</summary>
    public static ImmutableArray<OutlineVertex> Circle(double y, double z, double radius) => [new(y - radius, z, 1), new(y + radius, z, 1)];
}
