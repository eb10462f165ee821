using System.Collections.Immutable;
using MemberScan.Inputs.Json;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Frames;

namespace MemberScan.Inputs.Frames;

/// <summary>The sections along a member whose <c>section</c> names one at its start and one at its end.</summary>
internal static class FrameTaper
{
    /// <summary>Steps of a taper between section texts; between them the constants change linearly, 0.04 % off for a bar that tapers to half its depth.</summary>
    public const int Steps = 64;

    /// <summary>The sections; none with an error. Of section texts the dimensions change evenly, of bare constants the constants do.</summary>
    public static ImmutableArray<TaperPoint> Of(FrameValues values, FrameSection start, FrameSection end, JsonItem item, string path)
    {
        if (start.Shape is null && end.Shape is null) return [new TaperPoint(0, start), new TaperPoint(1, end)];
        if (start.Shape is not { } first || end.Shape is not { } last || Taper.Of(first, last) is not { } taper)
        {
            values.Json.Fail(InputCodes.TextUnusable, item, $"{path}: a member tapers between two rounds, two tubes, two rectangles, or two sections of bare constants");
            return [];
        }

        var points = ImmutableArray.CreateBuilder<TaperPoint>(Steps + 1);
        for (var i = 0; i <= Steps; i++)
        {
            var share = (double)i / Steps;
            if (FrameSectionReader.OfShape(FormattableString.Invariant($"{start.Name} to {end.Name} at {share:0.####}"), taper.At(share)) is { } section)
            {
                points.Add(new TaperPoint(share, section));
                continue;
            }

            values.Json.Fail(InputCodes.TextUnusable, item, $"{path}: there is no torsion constant all along this taper; give A, Iy, Iz and J of both its ends");
            return [];
        }

        return points.MoveToImmutable();
    }
}
