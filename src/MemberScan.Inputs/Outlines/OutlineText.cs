using System.Collections.Immutable;
using System.Diagnostics.CodeAnalysis;
using System.Text.Json;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Values;
using MemberScan.Mechanics.Profiles;

namespace MemberScan.Inputs.Outlines;

/// <summary>A section by its outline from a small JSON text: outer ring and holes of lines and arcs.</summary>
/// <remarks>
/// <c>{ "unit": "mm", "outer": { "points": [[0, 0], [60, 0], [60, 40, 0.4142], [0, 40]] }, "holes": [{ "circle": [30, 20, 8] }] }</c>. A third
/// number of a corner is the bulge of the way to the next one: see <see cref="OutlineVertex"/>.
/// </remarks>
public static class OutlineText
{
    /// <summary>Longest text that is read [characters].</summary>
    public const int LongestText = 256 * 1024;

    /// <summary>Reads an outline.</summary>
    /// <param name="json">The text.</param>
    /// <param name="name">What the section is called.</param>
    /// <param name="section">The section; null on failure.</param>
    /// <param name="error">One sentence that says what is wrong and how to mend it; empty on success.</param>
    public static bool TryParse(string json, string name, [NotNullWhen(true)] out OutlineSection? section, out string error)
    {
        ArgumentNullException.ThrowIfNull(json);
        ArgumentNullException.ThrowIfNull(name);
        section = null;
        if (json.Length > LongestText)
        {
            error = $"the outline is longer than {LongestText} characters; leave corners out";
            return false;
        }

        if (!TryRead(json, out var file, out error)) return false;
        if (!UnitText.TryRead(file.Unit, Quantity.Length, out var unit, out error)) return false;

        var rings = ImmutableArray.CreateBuilder<ImmutableArray<OutlineVertex>>();
        foreach (var ring in (OutlineFileRing?[])[file.Outer, .. file.Holes ?? []])
        {
            if (!TryRing(ring, unit.Factor, out var vertices, out error)) return false;
            rings.Add(vertices);
        }

        var all = rings.ToImmutable();
        error = OutlineSection.Fault(all)?.Message ?? "";
        if (error.Length == 0) section = new OutlineSection(name, all);
        return section is not null;
    }

    private static bool TryRead(string json, [NotNullWhen(true)] out OutlineFile? file, out string error)
    {
        error = "the outline file holds nothing; write a unit and an outer ring";
        file = null;
        try
        {
            file = JsonSerializer.Deserialize(json, OutlineJson.Default.OutlineFile);
        }
        catch (JsonException exception)
        {
            error = $"line {exception.LineNumber + 1}, column {exception.BytePositionInLine + 1} of the outline file is not understood; write unit, outer and holes as the README shows";
        }

        return file is not null;
    }

    private static bool TryRing(OutlineFileRing? ring, double factor, out ImmutableArray<OutlineVertex> vertices, out string error)
    {
        vertices = [];
        error = "a ring needs either points, lists of 2 or 3 numbers each, or a circle of 3 numbers";
        switch (ring)
        {
            case { Points: null, Circle: [var y, var z, var radius] }:
                if (!(radius > 0))
                {
                    error = "the radius of a circle is not above zero";
                    return false;
                }

                vertices = [new((y - radius) * factor, z * factor, 1), new((y + radius) * factor, z * factor, 1)];
                return true;
            case { Points: { } points, Circle: null } when points.All(p => p is { Length: 2 or 3 }):
                vertices = [.. points.Select(p => new OutlineVertex(p[0] * factor, p[1] * factor, p.Length == 3 ? p[2] : 0))];
                return true;
            default:
                return false;
        }
    }
}
