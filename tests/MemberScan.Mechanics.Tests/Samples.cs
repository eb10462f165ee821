using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests;

/// <summary>Sections and fields that many tests run over: parts of a cable-ferry landing.</summary>
internal static class Samples
{
    /// <summary>Hanger rods, gangway rails, trapeze struts, mast stays, thick and thin, flat and square.</summary>
    public static CrossSection[] Sections { get; } =
    [
        new Round(0.010),
        new Tube(0.02415, 0.0032),
        new Tube(0.030, 0.020),
        new Tube(0.030, 0.0285),
        new Tube(0.100, 0.0005),
        new Rectangle(0.040, 0.080),
        new Rectangle(0.080, 0.012),
        new Rectangle(0.050, 0.0501),
        new Rectangle(0.200, 0.005),
        new RoundedRectangle(0.050, 0.030, 0.006),
        new RoundedRectangle(0.040, 0.040, 0.020),
        new Box(0.050, 0.100, 0.005, 0.010, 0.005),
        new RoundedRectangle(0.120, 0.010, 0.001),
        new Box(0.060, 0.060, 0.003),
        new Box(0.080, 0.050, 0.012, 0.006, 0),
    ];

    /// <summary>Every section in every model that has it, ν = 0.3.</summary>
    public static IEnumerable<StressField> Fields => Sections.SelectMany(section => new[] { ShearModel.Elementary, ShearModel.Elasticity }
        .Select(model => StressField.TryCreate(section, model, 0.3, out var made, out _) ? made : null)
        .OfType<StressField>());

    /// <summary>One field; it must exist.</summary>
    public static StressField Field(CrossSection section, ShearModel model, double poisson = 0.3) =>
        StressField.TryCreate(section, model, poisson, out var field, out var whyNot)
            ? field
            : throw new ArgumentException(whyNot);

    /// <summary>What a field is, for messages.</summary>
    public static string Name(StressField field) => $"{field.Section.Designation}, {field.Model}";

    /// <summary>Seeded forces that stress a section to about 100 MPa a component; some components are absent.</summary>
    public static SectionForces Forces(StressField field, Random random)
    {
        var p = field.Properties;
        var wt = p.Wt ?? 1;
        var pick = () => random.NextDouble() < 0.3 ? 0 : 2 * random.NextDouble() - 1;
        return 100e6 * new SectionForces(
            pick() * p.Area, pick() * p.Area / 2, pick() * p.Area / 2,
            field.CarriesTorsion ? pick() * wt : 0, pick() * p.WelY, pick() * p.WelZ);
    }

    /// <summary>Seeded points of the material.</summary>
    public static IEnumerable<(double Y, double Z)> Points(StressField field, Random random, int count)
    {
        var section = field.Section;
        while (count > 0)
        {
            var (y, z) = ((random.NextDouble() - 0.5) * section.ExtentY, (random.NextDouble() - 0.5) * section.ExtentZ);
            if (!field.Contains(y, z)) continue;
            count--;
            yield return (y, z);
        }
    }
}
