using System.Collections.Immutable;
using System.Text.Json;
using MemberScan.Mechanics.Sections;
using MemberScan.Reporting.Drawing;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Space;

/// <summary>The outlines that the view in space draws bars with, each once; number 0 is a stand-in for sections of unknown form.</summary>
internal sealed class OutlineSet
{
    /// <summary>Half of the stand-in's side [m].</summary>
    public const double HalfStandIn = 0.02;

    /// <summary>Points of an outline that are drawn; of a longer ring every second, third … is taken.</summary>
    public const int MostPoints = 256;

    private readonly Dictionary<string, ImmutableArray<ImmutableArray<RingPoint>>> _rings;
    private readonly Dictionary<string, int> _numbers = new(StringComparer.Ordinal);
    private readonly List<ImmutableArray<ImmutableArray<RingPoint>>> _outlines =
        [[[new(-HalfStandIn, -HalfStandIn), new(HalfStandIn, -HalfStandIn), new(HalfStandIn, HalfStandIn), new(-HalfStandIn, HalfStandIn)]]];

    public OutlineSet(ScreeningRecord record) =>
        _rings = record.Sections.Where(s => !s.Rings.IsDefaultOrEmpty).GroupBy(s => s.Designation, StringComparer.Ordinal).Where(g => g.Count() == 1)
            .ToDictionary(g => g.Key, g => g.First().Rings, StringComparer.Ordinal);

    /// <summary>The number of a member's outline; 0 where its form is not known.</summary>
    public int NumberOf(MemberResult member)
    {
        var designation = member.Governing?.Section ?? member.Section;
        if (_numbers.TryGetValue(designation, out var number)) return number;

        var rings = RingsOf(designation);
        if (!rings.IsEmpty) _outlines.Add(rings);
        return _numbers[designation] = rings.IsEmpty ? 0 : _outlines.Count - 1;
    }

    /// <summary>Each outline: rings of y, z, y, z … in metres, to a hundredth of a millimetre.</summary>
    public void Write(Utf8JsonWriter json)
    {
        json.WriteStartArray("outlines");
        foreach (var rings in _outlines)
        {
            json.WriteStartArray();
            foreach (var ring in rings)
            {
                json.WriteStartArray();
                foreach (var (y, z) in ring)
                {
                    json.WriteNumberValue(Math.Round(y, 5));
                    json.WriteNumberValue(Math.Round(z, 5));
                }

                json.WriteEndArray();
            }

            json.WriteEndArray();
        }

        json.WriteEndArray();
    }

    private ImmutableArray<ImmutableArray<RingPoint>> RingsOf(string designation)
    {
        if (_rings.TryGetValue(designation, out var rings) && rings.All(r => r.Length > 2)) return [.. rings.Select(Thinned)];
        return SectionText.Read(designation) is { } section ? RingsOf(section) : [];
    }

    private static ImmutableArray<RingPoint> Thinned(ImmutableArray<RingPoint> ring)
    {
        var step = (ring.Length + MostPoints - 1) / MostPoints;
        return step == 1 ? ring : [.. ring.Where((_, i) => i % step == 0)];
    }

    private static ImmutableArray<ImmutableArray<RingPoint>> RingsOf(CrossSection section) => section switch
    {
        Round round => [Oblong(2 * round.Radius, 2 * round.Radius, round.Radius)],
        Tube tube => [Oblong(2 * tube.OuterRadius, 2 * tube.OuterRadius, tube.OuterRadius), Oblong(2 * tube.InnerRadius, 2 * tube.InnerRadius, tube.InnerRadius)],
        Rectangle rectangle => [Oblong(rectangle.Width, rectangle.Depth, 0)],
        RoundedRectangle rounded => [Oblong(rounded.Width, rounded.Depth, rounded.CornerRadius)],
        Box box => [Oblong(box.Width, box.Depth, box.OuterRadius), Oblong(box.Width - 2 * box.Wall, box.Depth - 2 * box.Wall, box.InnerRadius)],
        _ => [],
    };

    // A rectangle with quarter circles in four chords each; a circle is one whose sides are used up by them.
    private static ImmutableArray<RingPoint> Oblong(double width, double depth, double radius)
    {
        const int Chords = 4;
        var ring = ImmutableArray.CreateBuilder<RingPoint>();
        for (var corner = 0; corner < 4; corner++)
        {
            var (y, z) = ((corner is 0 or 3 ? 1 : -1) * (width / 2 - radius), (corner < 2 ? 1 : -1) * (depth / 2 - radius));
            for (var i = 0; i <= (radius > 0 ? Chords : 0); i++)
            {
                var (sin, cos) = Math.SinCos(Math.PI / 2 * (corner + (double)i / Chords));
                ring.Add(new RingPoint(y + radius * cos, z + radius * sin));
            }
        }

        return ring.ToImmutable();
    }
}
