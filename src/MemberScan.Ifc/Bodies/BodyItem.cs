using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Sections;
using MemberScan.Part21;

namespace MemberScan.Ifc.Bodies;

/// <summary>One solid of an element's body, unwrapped from mapped items and booleans.</summary>
/// <param name="Record">The solid.</param>
/// <param name="Map">From the solid's coordinates to the element's.</param>
/// <param name="IsCut">Whether other solids are taken out of it.</param>
internal readonly record struct BodyItem(Part21Record Record, Transform3 Map, bool IsCut)
{
    /// <summary>Class and STEP id.</summary>
    public string Called => string.Create(CultureInfo.InvariantCulture, $"{Record.Keyword} #{Record.Id}");

    /// <summary>What a reader must know of it.</summary>
    public ImmutableArray<string> Notes => IsCut ? ["cut: the body is clipped; its full section is used"] : [];

    /// <summary>The scale of the map when it is a rotation, maybe mirrored, times one factor; null when it is not.</summary>
    public double? UniformScale
    {
        get
        {
            var (sx, sy, sz) = (Map.X.Length, Map.Y.Length, Map.Z.Length);
            var square = Math.Max(Math.Abs(Map.X.Dot(Map.Y)), Math.Max(Math.Abs(Map.X.Dot(Map.Z)), Math.Abs(Map.Y.Dot(Map.Z))));
            var isUniform = sx is >= ProfileShape.LeastScale and <= ProfileShape.MostScale && Math.Abs(sy / sx - 1) < 1e-6 && Math.Abs(sz / sx - 1) < 1e-6 && square < 1e-6 * sx * sx;
            return isUniform ? sx : null;
        }
    }
}
