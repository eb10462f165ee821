using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Tests.Properties;

/// <summary>
/// Tables of EN 10210-2:2006 and EN 10219-2:2006 (cm², cm⁴, cm³) and of the AISC Steel Construction Manual, 14th/15th edition,
/// Tables 1-11 to 1-14 (in², in⁴, in³), all from memory. Every value to its printed digits.
/// </summary>
public sealed class HollowSectionTableTests
{
    private const double Inch = 0.0254;

    [Theory]
    [InlineData(48.3, 3.2, "A 4.53; Iy 11.6; WelY 4.8; WplY 6.52; J 23.2; Wt 9.59")]
    [InlineData(114.3, 5, "A 17.2; Iy 257; WelY 45.0; WplY 59.8; J 514; Wt 89.9")]
    [InlineData(168.3, 6.3, "A 32.1; Iy 1053; WelY 125; WplY 165; J 2107; Wt 250")]
    [InlineData(219.1, 10, "A 65.7; Iy 3598; WelY 328; WplY 438; J 7197; Wt 657")]
    public void Round_hollow_sections_agree_with_the_european_tables(double diameterMm, double wallMm, string table)
    {
        var section = new Tube(diameterMm / 2e3, wallMm / 1e3);

        AssertTable(table, SectionProperties.Of(section), 1e-2);
    }

    // EN 10210-2: ro = 1.5 T, ri = 1.0 T.
    [Theory]
    [InlineData(50, 50, 4, "A 7.19; Iy 25.0; WelY 9.99; WplY 12.3; J 40.4; Wt 14.5")]
    [InlineData(80, 80, 5, "A 14.7; Iy 137; WelY 34.2; WplY 41.1; J 217; Wt 49.8")]
    [InlineData(100, 100, 5, "A 18.7; Iy 279; WelY 55.9; WplY 66.4; J 439; Wt 81.8")]
    [InlineData(50, 100, 5, "A 13.7; Iy 167; Iz 54.3; WelY 33.3; WelZ 21.7; WplY 42.6; WplZ 25.8; J 135; Wt 36.9")]
    [InlineData(60, 120, 5, "A 16.7; Iy 299; Iz 98.8; WelY 49.9; WelZ 32.9; WplY 63.1; WplZ 38.4; J 242; Wt 56.0")]
    [InlineData(100, 200, 8, "A 44.8; Iy 2234; Iz 739; WelY 223; WelZ 148; WplY 282; WplZ 172; J 1804; Wt 251")]
    public void Hot_finished_boxes_agree_with_the_european_tables(double widthMm, double depthMm, double wallMm, string table)
    {
        var t = wallMm / 1e3;
        var section = new Box(widthMm / 1e3, depthMm / 1e3, t, 1.5 * t, t);

        AssertTable(table, SectionProperties.Of(section), 1e-2);
    }

    // EN 10219-2: ro/ri = 2.0/1.0 T up to 6 mm, 2.5/1.5 T up to 10 mm.
    [Theory]
    [InlineData(60, 60, 3, 2.0, 1.0, "A 6.61; Iy 35.1; WelY 11.7; WplY 14.0; J 57.1; Wt 17.7")]
    [InlineData(100, 100, 5, 2.0, 1.0, "A 18.4; Iy 271; WelY 54.2; WplY 64.6; J 441")]
    [InlineData(50, 100, 4, 2.0, 1.0, "A 10.95; Iy 134; Iz 44.9; J 113")]
    [InlineData(150, 150, 8, 2.5, 1.5, "A 43.2; Iy 1412; WelY 188; WplY 226; J 2364; Wt 289")]
    [InlineData(200, 200, 10, 2.5, 1.5, "A 72.6; Iy 4251; WelY 425; WplY 508; J 7072; Wt 651")]
    public void Cold_formed_boxes_agree_with_the_european_tables(
        double widthMm, double depthMm, double wallMm, double outerPerWall, double innerPerWall, string table)
    {
        var t = wallMm / 1e3;
        var section = new Box(widthMm / 1e3, depthMm / 1e3, t, outerPerWall * t, innerPerWall * t);

        AssertTable(table, SectionProperties.Of(section), 1e-2);
    }

    // Design wall, corners 2.0/1.0 of it; the tabulated J is the thin-wall one.
    [Theory]
    [InlineData(2, 2, 0.116, "A 0.840; Iy 0.486; WelY 0.486; WplY 0.584; JThinWall 0.796")]
    [InlineData(3, 3, 0.233, "A 2.44; Iy 3.02; WelY 2.01; WplY 2.48; JThinWall 5.08")]
    [InlineData(4, 4, 0.233, "A 3.37; Iy 7.80; WelY 3.90; WplY 4.69; JThinWall 12.8")]
    [InlineData(6, 6, 0.233, "A 5.24; Iy 28.6; WelY 9.54; WplY 11.2; JThinWall 45.6")]
    [InlineData(4, 8, 0.233, "A 5.24; Iy 42.5; Iz 14.4; WelY 10.6; WelZ 7.21; WplY 13.3; WplZ 8.20; JThinWall 35.3")]
    [InlineData(8, 8, 0.349, "A 10.4; Iy 100; WelY 24.9; WplY 29.4; JThinWall 160")]
    public void Rectangular_tubes_agree_with_the_american_tables(double widthIn, double depthIn, double wallIn, string table)
    {
        var section = new Box(widthIn * Inch, depthIn * Inch, wallIn * Inch, 2 * wallIn * Inch, wallIn * Inch);

        AssertTable(table, SectionProperties.Of(section), Inch);
    }

    [Theory]
    [InlineData(4.000, 0.233, "A 2.76; Iy 4.91; WelY 2.45; WplY 3.31; J 9.82")]
    [InlineData(6.000, 0.233, "A 4.22; Iy 17.6; WelY 5.86; WplY 7.75; J 35.2")]
    [InlineData(1.900, 0.135, "A 0.749; Iy 0.293; WelY 0.309; WplY 0.421; J 0.586")]
    [InlineData(2.375, 0.143, "Iy 0.627; WelY 0.528; WplY 0.713; J 1.25")]
    [InlineData(4.500, 0.221, "Iy 6.82; WelY 3.03; WplY 4.05; J 13.6")]
    public void Round_tubes_and_pipes_agree_with_the_american_tables(double diameterIn, double wallIn, string table)
    {
        var section = new Tube(diameterIn * Inch / 2, wallIn * Inch);

        AssertTable(table, SectionProperties.Of(section), Inch);
    }

    private static void AssertTable(string table, SectionProperties properties, double unit)
    {
        foreach (var entry in table.Split("; "))
        {
            var (name, printed) = (entry.Split(' ')[0], entry.Split(' ')[1]);
            var (value, power) = name switch
            {
                "A" => (properties.Area, 2),
                "Iy" => (properties.Iy, 4),
                "Iz" => (properties.Iz, 4),
                "J" => ((properties.JAnnex ?? properties.J)!.Value, 4),
                "JThinWall" => (properties.JThinWall!.Value, 4),
                "WelY" => (properties.WelY, 3),
                "WelZ" => (properties.WelZ, 3),
                "WplY" => (properties.WplY, 3),
                "WplZ" => (properties.WplZ, 3),
                "Wt" => (properties.Wt!.Value, 3),
                _ => throw new ArgumentException(name),
            };
            Printed.Agrees(printed, value / Math.Pow(unit, power), name);
        }
    }
}
