using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Resultants;

namespace MemberScan.Mechanics.Tests.Properties;

/// <summary>Outlines that are an I, L, U or T in any of the eight ways in which it can lie along two axes.</summary>
public sealed class LetterFitTests
{
    public static TheoryData<int, bool, int> Ways
    {
        get
        {
            var data = new TheoryData<int, bool, int>();
            for (var profile = 0; profile < s_profiles.Length; profile++)
                foreach (var isMirrored in new[] { false, true })
                    for (var turns = 0; turns < 4; turns++)
                        data.Add(profile, isMirrored, turns);
            return data;
        }
    }

    private static readonly OpenProfile[] s_profiles =
    [
        new(OpenShape.I, 0.2, 0.1, 0.0056, 0.0085, 0.012), new(OpenShape.L, 0.08, 0.06, 0.008, 0.008, 0.007), new(OpenShape.L, 0.05, 0.05, 0.005, 0.005),
        new(OpenShape.U, 0.12, 0.055, 0.007, 0.009, 0.009), new(OpenShape.T, 0.06, 0.08, 0.007, 0.006),
    ];

    [Theory]
    [MemberData(nameof(Ways))]
    public void A_profile_is_found_however_it_lies_and_sees_the_normal_stresses_of_the_outline(int index, bool isMirrored, int turns)
    {
        var profile = s_profiles[index];
        var outline = Lying(profile, isMirrored, turns);

        var fit = LetterFit.Of(outline)!;

        Assert.Equal(profile.Shape, fit.Profile.Shape);
        Assert.Equal((profile.Web, profile.Flange, profile.Root), (fit.Profile.Web, fit.Profile.Flange, fit.Profile.Root));
        if (!isMirrored && turns == 0) Assert.True(fit.IsUpright);

        // The bending formula with the turned properties and forces, at the turned point, is that of the outline at its own.
        var whole = Plain(OutlineIntegrals.Of(outline.Edges));
        var forces = new SectionForces(3e3, 0, 0, 0, 120, -45);
        var (seen, turned) = (fit.Turned(whole), fit.Turned(forces));
        foreach (var vertex in fit.Profile.Vertices)
        {
            var (y, z) = Moved(vertex.Y, vertex.Z, fit.IsMirrored, fit.QuarterTurns);
            var determinant = seen.Iy * seen.Iz - seen.Iyz * seen.Iyz;
            var sigma = turned.N / seen.Area
                + ((turned.My * seen.Iz + turned.Mz * seen.Iyz) * vertex.Z - (turned.Mz * seen.Iy + turned.My * seen.Iyz) * vertex.Y) / determinant;
            Assert.Equal(BendingStress.At(whole, forces, y, z), sigma, 1e-6 * Math.Abs(sigma) + 1);
        }
    }

    [Fact]
    public void Outlines_that_are_no_letter_are_none()
    {
        static OutlineVertex[] Ring(params (double Y, double Z)[] points) => [.. points.Select(p => new OutlineVertex(p.Y, p.Z))];

        // A Z, a T whose web is off the middle, a U of two flange thicknesses, an L with a sloped leg, a plain rectangle.
        OutlineVertex[][] rings =
        [
            Ring((0, 0), (0.06, 0), (0.06, 0.005), (0.005, 0.005), (0.005, 0.1), (-0.055, 0.1), (-0.055, 0.095), (0, 0.095)),
            Ring((0.02, 0), (0.027, 0), (0.027, 0.07), (0.067, 0.07), (0.067, 0.08), (0, 0.08), (0, 0.07), (0.02, 0.07)),
            Ring((0, 0), (0.05, 0), (0.05, 0.008), (0.006, 0.008), (0.006, 0.11), (0.05, 0.11), (0.05, 0.12), (0, 0.12)),
            Ring((0, 0), (0.06, 0), (0.06, 0.006), (0.008, 0.008), (0.008, 0.08), (0, 0.08)),
            Ring((0, 0), (0.06, 0), (0.06, 0.02), (0, 0.02)),
        ];

        Assert.All(rings, ring => Assert.Null(LetterFit.Of(new OutlineSection("plate", [[.. ring]]))));
    }

    private static SectionProperties Plain(OutlineIntegrals i) => new()
    {
        Area = i.Area,
        Iy = i.Iy,
        Iz = i.Iz,
        Iyz = i.Iyz,
        J = null,
        JSource = "",
        WelY = 0,
        WelZ = 0,
        Extremes = default,
        QY = 0,
        QZ = 0,
        WplY = 0,
        WplZ = 0,
        Wt = null,
        JThinWall = null,
        ShearCentreY = 0,
        ShearCentreZ = 0,
    };

    private static OutlineSection Lying(OpenProfile profile, bool isMirrored, int turns) => new("lying", [profile.Vertices.Select(v =>
    {
        var (y, z) = Moved(v.Y, v.Z, isMirrored, turns);
        return new OutlineVertex(y, z, isMirrored ? -v.Bulge : v.Bulge);
    }).ToImmutableArray()]);

    private static (double Y, double Z) Moved(double y, double z, bool isMirrored, int turns)
    {
        if (isMirrored) y = -y;
        for (var turn = 0; turn < turns; turn++) (y, z) = (-z, y);
        return (y, z);
    }
}
