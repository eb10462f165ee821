using System.Text.Json;
using MemberScan.Reporting.Display;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Sheets.Packed;

/// <summary>The sections of packed sheets: for each its outline and the shear stresses of unit forces at its samples, for <c>sheet.js</c>.</summary>
internal sealed class PackedSections
{
    // Steps into which the largest value of a unit force is cut: finer than any line of the picture.
    private const double Steps = 2000;

    private readonly Dictionary<SectionSamples, int> _numbers = [];
    private readonly List<SectionSamples> _sections = [];

    /// <summary>Takes a section in; sections have numbers in the order in which they are added.</summary>
    public void Add(SectionSamples samples)
    {
        if (_numbers.TryAdd(samples, _sections.Count)) _sections.Add(samples);
    }

    /// <summary>The number of a section that was added.</summary>
    public int NumberOf(SectionSamples samples) => _numbers[samples];

    /// <summary>Writes all sections as an array.</summary>
    public void Write(Utf8JsonWriter json)
    {
        json.WriteStartArray("sections");
        foreach (var section in _sections) Write(json, section);
        json.WriteEndArray();
    }

    private static void Write(Utf8JsonWriter json, SectionSamples section)
    {
        var (outer, properties, grid) = (section.Rings[0], section.Properties, section.Grid);
        json.WriteStartObject();
        json.WriteString("name", ForeignText.Name(section.Designation));
        json.WriteString("width", ShownUnit.Dimension.WithUnit(outer.Max(p => p.Y) - outer.Min(p => p.Y)));
        json.WriteString("depth", ShownUnit.Dimension.WithUnit(outer.Max(p => p.Z) - outer.Min(p => p.Z)));
        foreach (var (name, value) in new[] { ("area", properties.Area), ("iy", properties.Iy), ("iz", properties.Iz), ("iyz", properties.Iyz), ("radius", section.ResultantRadius) })
        {
            json.WritePropertyName(name);
            Write(json, value);
        }

        json.WriteStartArray("rings");
        foreach (var ring in section.Rings) Write(json, ring.SelectMany(p => new[] { p.Y, p.Z }));
        json.WriteEndArray();
        json.WritePropertyName("grid");
        Write(json, [grid.Columns, grid.Rows, grid.Left, grid.Bottom, grid.Cell]);
        json.WritePropertyName("nodes");
        Write(json, Nodes(section));
        var columns = Units(section);
        json.WritePropertyName("scales");
        Write(json, columns.Select(c => c.Scale));
        json.WriteStartArray("units");
        foreach (var (_, values) in columns) Write(json, values);
        json.WriteEndArray();
        json.WritePropertyName("sites");
        Write(json, section.ArrowSites.Select(i => (double)i));
        json.WriteEndObject();
    }

    // Distance from the node before, doubled, one more inside the material.
    private static IEnumerable<double> Nodes(SectionSamples section)
    {
        var last = -1;
        for (var node = 0; node < section.Grid.Numbers.Length; node++)
        {
            if (section.Grid.Numbers[node] is not (>= 0 and var number)) continue;

            yield return 2 * (node - last) + (section.Points[number].IsInside ? 1 : 0);
            last = node;
        }
    }

    private static (double Scale, double[] Changes)[] Units(SectionSamples section)
    {
        if (section.ResultantRadius > 0) return [];

        Func<UnitShear, double>[] parts = [u => u.VyXY, u => u.VyXZ, u => u.VzXY, u => u.VzXZ, u => u.TXY, u => u.TXZ];
        return
        [
            .. parts.Select(part =>
            {
                var values = section.Units.Select(part).ToArray();
                var largest = values.Max(Math.Abs);
                var scale = largest > 0 ? largest / Steps : 1;
                var steps = values.Select(v => Math.Round(v / scale)).ToArray();
                return (scale, steps.Select((s, i) => s - (i > 0 ? steps[i - 1] : 0)).ToArray());
            }),
        ];
    }

    private static void Write(Utf8JsonWriter json, IEnumerable<double> values)
    {
        json.WriteStartArray();
        foreach (var value in values) Write(json, value);
        json.WriteEndArray();
    }

    private static void Write(Utf8JsonWriter json, double value) => json.WriteRawValue(Raw(value));

    private static string Raw(double value) => (value + 0.0).ToString("G7", System.Globalization.CultureInfo.InvariantCulture);
}
