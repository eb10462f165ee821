using System.Text.Json;
using MemberScan.Inputs.Json;
using MemberScan.Inputs.Values;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Frames;

namespace MemberScan.Inputs.Frames;

/// <summary>Sections of a frame file: a section text with its own unit, or bare constants in the units of the file.</summary>
internal static class FrameSectionReader
{
    public static FrameSection? Read(FrameValues values, FrameUnits units, JsonEntry entry)
    {
        var path = $"sections.{entry.Key}";
        return entry.Value.Kind switch
        {
            JsonValueKind.String => OfText(values, entry, path),
            JsonValueKind.Object => OfConstants(values, units, entry, path),
            _ => Neither(values, entry, path),
        };
    }

    private static FrameSection? Neither(FrameValues values, JsonEntry entry, string path)
    {
        values.Json.Fail(InputCodes.WrongType, entry.Value, $"{path} is {entry.Value.Word}; give a section text such as \"round 20 mm\", or an object of A, Iy, Iz and J");
        return null;
    }

    private static FrameSection? OfText(FrameValues values, JsonEntry entry, string path)
    {
        if (values.Json.Text(entry.Value, path) is not { } text) return null;
        if (!SectionText.TryParse(text, out var section, out var error))
        {
            values.Json.Fail(InputCodes.TextUnusable, entry.Value, $"{path}: {error}");
            return null;
        }

        if (OfShape(entry.Key, section) is { } found) return found;

        values.Json.Fail(InputCodes.TextUnusable, entry.Value, $"{path}: there is no torsion constant for this section, whose dimensions are too far apart; give A, Iy, Iz and J");
        return null;
    }

    /// <summary>The constants of a section; null where it has no torsion constant.</summary>
    public static FrameSection? OfShape(string name, CrossSection shape)
    {
        var p = SectionProperties.Of(shape);
        return p.J is not { } j ? null : new FrameSection
        {
            Name = name,
            Shape = shape,
            Area = p.Area,
            Iy = p.Iy,
            Iz = p.Iz,
            Iyz = p.Iyz,
            J = j,
            ShearCentreY = p.ShearCentreY,
            ShearCentreZ = p.ShearCentreZ,
        };
    }

    private static FrameSection OfConstants(FrameValues values, FrameUnits units, JsonEntry entry, string path)
    {
        var entries = values.Entries(entry.Value, path, ["A", "Iy", "Iz", "J"], ["Iyz", "Asy", "Asz"]);
        var square = units.Length.Factor * units.Length.Factor;
        return new FrameSection
        {
            Name = entry.Key,
            Area = Positive("A") * square,
            Iy = Positive("Iy") * square * square,
            Iz = Positive("Iz") * square * square,
            J = Positive("J") * square * square,
            Iyz = entries.TryGetValue("Iyz", out var product) ? values.Number(product, $"{path}.Iyz") * square * square : 0,
            ShearAreaY = Area("Asy"),
            ShearAreaZ = Area("Asz"),
        };

        double Positive(string key) => entries.TryGetValue(key, out var item) ? values.Positive(item, $"{path}.{key}") : 1;

        double Area(string key) => entries.TryGetValue(key, out var item) ? values.Positive(item, $"{path}.{key}", zeroToo: true) * square : 0;
    }
}
