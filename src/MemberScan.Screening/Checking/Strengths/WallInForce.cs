using MemberScan.Checks.Aisc360;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Limits;
using MemberScan.Model.Members;

namespace MemberScan.Screening.Checking.Strengths;

/// <summary>The wall of a member's hollow sections that stresses are taken of.</summary>
internal sealed class WallInForce
{
    private readonly double _share;
    private readonly Dictionary<CrossSection, string> _words = [];

    /// <summary>The wall by the settings and the grade.</summary>
    public WallInForce(Member member, LimitSet limits) => _share = limits.WallInForce switch
    {
        WallBasis.Nominal => 1,
        WallBasis.Design => DesignWall.Share,
        _ => DesignWall.ShareOf(member.Material.Name),
    };

    /// <summary>Whether walls are thinner than modelled.</summary>
    public bool IsReduced => _share < 1;

    /// <summary>A section with that wall.</summary>
    public SectionFinding Of(SectionFinding nominal)
    {
        var shapes = nominal.Shapes.Select(Of).ToArray();
        return IsReduced ? nominal with { Shapes = [.. shapes] } : nominal;
    }

    /// <summary>The wall of a section that came from here, in words.</summary>
    public string Words(CrossSection shape) => _words.GetValueOrDefault(shape, "gross section");

    /// <summary>The wall of every hollow section, in words.</summary>
    public IEnumerable<string> All => _words.Values;

    private CrossSection Of(CrossSection nominal)
    {
        var shape = IsReduced ? DesignWall.Of(nominal, _share) : nominal;
        if (nominal is Tube or Box) _words[shape] = DesignWall.Words(nominal, _share);
        return shape;
    }
}
