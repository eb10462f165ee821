using System.Collections.Immutable;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Frames;

namespace MemberScan.Ifc.Frames.Stiffness;

/// <summary>The sections along a tapering analytical member.</summary>
/// <param name="Taper">The taper.</param>
/// <param name="From">Share of the taper at the start of the analytical member [-].</param>
/// <param name="To">Share of the taper at its end [-]; less than at the start where it runs against the body.</param>
/// <param name="Constants">Constants of one section.</param>
internal sealed record SectionCourse(Taper Taper, double From, double To, Func<CrossSection, FrameSection?> Constants)
{
    /// <summary>Steps of a frame member: between them its constants change linearly, which is 0.04 % off for a bar that tapers to half its depth.</summary>
    public const int Steps = 64;

    /// <summary>The points of a stretch of the analytical member, by shares of its length; null where a section has no constants.</summary>
    public ImmutableArray<TaperPoint>? Between(double start, double end)
    {
        var points = ImmutableArray.CreateBuilder<TaperPoint>(Steps + 1);
        for (var i = 0; i <= Steps; i++)
        {
            var share = (double)i / Steps;
            var along = From + (start + share * (end - start)) * (To - From);
            if (Constants(Taper.At(Math.Clamp(along, 0, 1))) is not { } section) return null;

            points.Add(new TaperPoint(share, section));
        }

        return points.MoveToImmutable();
    }
}
