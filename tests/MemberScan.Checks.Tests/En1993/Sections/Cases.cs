using MemberScan.Checks.En1993.Sections;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Forces;

namespace MemberScan.Checks.Tests.En1993.Sections;

/// <summary>Sections under design forces, in the units of a hand calculation.</summary>
internal static class Cases
{
    /// <summary>Hot-finished RHS 200x100x8: A 44.8 cm², Wpl 282 and 172 cm³, EN 10210-2 table, from memory.</summary>
    public static Box Rhs200x100x8 { get; } = new(Si.Mm(100), Si.Mm(200), Si.Mm(8), Si.Mm(12), Si.Mm(8));

    /// <summary>CHS 114.3x5: A 17.2 cm², Wpl 59.8 cm³, EN 10210-2 table, from memory.</summary>
    public static Tube Chs114x5 { get; } = new(Si.Mm(114.3) / 2, Si.Mm(5));

    public static Rectangle Flat20x60 { get; } = new(Si.Mm(20), Si.Mm(60));

    public static SectionCase Of(CrossSection section, double fyMPa, double nKN = 0, double vyKN = 0, double vzKN = 0, double tKNm = 0, double myKNm = 0, double mzKNm = 0) => new()
    {
        Section = section,
        Properties = PropertiesOf(section),
        Forces = new SectionForces(Si.KN(nKN), Si.KN(vyKN), Si.KN(vzKN), Si.KNm(tKNm), Si.KNm(myKNm), Si.KNm(mzKNm)),
        Kind = SituationKind.Design,
        Yield = Si.MPa(fyMPa),
    };

    // A sharp-cornered box by hand, without the torsion constant, whose numerical field takes its time.
    private static SectionProperties PropertiesOf(CrossSection section)
    {
        if (section is not Box { OuterRadius: 0 } box) return SectionProperties.Of(section);

        var (b, h, bi, hi) = (box.Width, box.Depth, box.Width - 2 * box.Wall, box.Depth - 2 * box.Wall);
        var (iy, iz) = ((b * h * h * h - bi * hi * hi * hi) / 12, (h * b * b * b - hi * bi * bi * bi) / 12);
        return new SectionProperties
        {
            Area = b * h - bi * hi,
            Iy = iy,
            Iz = iz,
            Iyz = 0,
            J = null,
            JSource = "left out here",
            WelY = 2 * iy / h,
            WelZ = 2 * iz / b,
            Extremes = new ExtremeModuli(2 * iy / h, 2 * iy / h, 2 * iz / b, 2 * iz / b),
            QY = (b * h * h - bi * hi * hi) / 8,
            QZ = (h * b * b - hi * bi * bi) / 8,
            WplY = (b * h * h - bi * hi * hi) / 4,
            WplZ = (h * b * b - hi * bi * bi) / 4,
            Wt = null,
            JThinWall = null,
            ShearCentreY = 0,
            ShearCentreZ = 0,
        };
    }

    public static double Utilization(this CheckSet set, string key) => set.Checks.Single(c => c.Key == key).Utilization!.Value;
}
