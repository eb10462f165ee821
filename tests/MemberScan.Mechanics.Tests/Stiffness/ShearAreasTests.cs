using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stiffness;

namespace MemberScan.Mechanics.Tests.Stiffness;

/// <summary>Shear areas against the energy factors of textbooks (Timoshenko, Strength of Materials: 6/5 for a rectangle, 10/9 for a round bar, 2 for a thin tube; from memory).</summary>
public sealed class ShearAreasTests
{
    [Fact]
    public void Rectangle()
    {
        var (y, z) = ShearAreas.Of(new Rectangle(0.04, 0.08), 0.3)!.Value;

        Assert.Equal(0.04 * 0.08 / 1.2, y, 1e-9);
        Assert.Equal(0.04 * 0.08 / 1.2, z, 1e-9);
    }

    [Fact]
    public void Round_bar()
    {
        var (y, z) = ShearAreas.Of(new Round(0.01), 0.3)!.Value;

        Assert.Equal(0.9 * Math.PI * 1e-4, y, 1e-8);
        Assert.Equal(y, z, 1e-10);
    }

    [Fact]
    public void Thin_tube()
    {
        var tube = new Tube(0.1, 0.0005);
        var (y, z) = ShearAreas.Of(tube, 0.3)!.Value;

        Assert.InRange(y / (0.5 * SectionProperties.Of(tube).Area), 0.99, 1.01);
        Assert.Equal(y, z, 1e-8);
    }

    [Fact]
    public void Web_of_an_I_profile_carries_most_of_Vz()
    {
        var (y, z) = ShearAreas.Of(new OpenProfile(OpenShape.I, 0.2, 0.1, 0.0056, 0.0085, 0), 0.3)!.Value;

        Assert.InRange(z / (0.0056 * 0.1915), 0.9, 1.05);                        // web to the middles of the flanges
        Assert.InRange(y / (2 * 0.1 * 0.0085 / 1.2), 0.9, 1.1);                  // two flanges as rectangles
    }
}
