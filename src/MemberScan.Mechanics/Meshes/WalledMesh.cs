using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Meshes;

/// <summary>Patches of sections made of straight sides and quarter circles: the first quadrant of a box or a rounded rectangle.</summary>
internal static class WalledMesh
{
    /// <summary>The first quadrant of a box: columns from the middle of the top wall around the corner, layers across the wall.</summary>
    public static PatchMesh Of(Box section)
    {
        var (t, ro, ri) = (section.Wall, section.OuterRadius, section.InnerRadius);
        var (outerY, outerZ) = (section.Width / 2, section.Depth / 2);
        var (innerY, innerZ) = (outerY - t, outerZ - t);
        var block = Math.Max(ro, t + ri);
        var (flatY, flatZ) = (Nothing(outerY - block, t), Nothing(outerZ - block, t));
        var layers = Grading.Fractions(Grading.Layers(ri, t), 1);
        var patches = new List<Patch>();

        void Column(EdgeCurve inner, EdgeCurve outer)
        {
            for (var k = 1; k < layers.Length; k++) patches.Add(Patch.Ruled(inner, outer, (0, 1), (layers[k - 1], layers[k])));
        }

        // A piece of a corner, cut near the junction of arc and straight side, where the curvature jumps.
        void Bent(EdgeCurve inner, EdgeCurve outer, double from, double to)
        {
            if (ri < Grading.RoundFrom * t)
            {
                Column(inner, outer);
                return;
            }

            ReadOnlySpan<double> cuts = [0, from == 0 ? to : from, 1];
            for (var k = 1; k < cuts.Length; k++) Column(inner.Piece(cuts[k - 1], cuts[k]), outer.Piece(cuts[k - 1], cuts[k]));
        }

        void Wall((double Y, double Z) innerFrom, (double Y, double Z) innerTo, (double Y, double Z) outerFrom, (double Y, double Z) outerTo, double length)
        {
            if (length == 0) return;
            var (inner, outer) = (EdgeCurve.Line(innerFrom, innerTo), EdgeCurve.Line(outerFrom, outerTo));
            var cuts = Grading.Fractions(Grading.Graded(length, ri >= Grading.RoundFrom * t ? Grading.Ratio * t : Math.Max(ri, Grading.Finest * t), t), length);
            for (var k = 1; k < cuts.Length; k++) Column(inner.Piece(cuts[k - 1], cuts[k]), outer.Piece(cuts[k - 1], cuts[k]));
        }

        var diagonal = Math.PI / 4;
        var (innerCentre, outerCentre) = ((innerY - ri, innerZ - ri), (outerY - ro, outerZ - ro));
        Wall((0, innerZ), (flatY, innerZ), (0, outerZ), (flatY, outerZ), flatY);
        foreach (var (inner, outer) in HalfCorner(innerCentre, ri, outerCentre, ro, flatY, innerZ, outerZ)) Bent(inner, outer, 0, Grading.Ratio);
        // The other half is the mirror image in the line y = z of the same corner of the turned section.
        var turned = HalfCorner((innerZ - ri, innerY - ri), ri, (outerZ - ro, outerY - ro), ro, flatZ, innerY, outerY).Reverse();
        foreach (var (inner, outer) in turned) Bent(Mirrored(inner), Mirrored(outer), 1 - Grading.Ratio, 1);
        Wall((innerY, 0), (innerY, flatZ), (outerY, 0), (outerY, flatZ), flatZ);
        return new PatchMesh(patches, true, Math.Max(outerY, outerZ));

        // From the end of the straight wall to the diagonal, in a frame whose wall runs along the first axis.
        IEnumerable<(EdgeCurve Inner, EdgeCurve Outer)> HalfCorner(
            (double Y, double Z) ci, double radiusIn, (double Y, double Z) co, double radiusOut, double from, double levelIn, double levelOut)
        {
            var (straightIn, straightOut) = (Nothing(ci.Y - from, t), Nothing(co.Y - from, t));
            var innerLine = EdgeCurve.Line((from, levelIn), (ci.Y, levelIn));
            var outerLine = EdgeCurve.Line((from, levelOut), (co.Y, levelOut));
            var innerArc = Bend(ci, radiusIn, 2 * diagonal, diagonal);
            if (straightIn > 0)
            {
                var bent = radiusIn * diagonal + 0.5 * t;
                var split = diagonal * (1 + bent / (bent + straightIn));
                // Long beside a small radius: in several pieces, each with its share of the outer arc.
                var cuts = Grading.Fractions(Grading.Graded(straightIn, radiusIn >= Grading.RoundFrom * t ? straightIn : Math.Max(radiusIn, Grading.Finest * t), t), straightIn);
                var outerPart = Bend(co, radiusOut, 2 * diagonal, split);
                for (var k = 1; k < cuts.Length; k++) yield return (innerLine.Piece(cuts[k - 1], cuts[k]), outerPart.Piece(cuts[k - 1], cuts[k]));
                yield return (innerArc, Bend(co, radiusOut, split, diagonal));
            }
            else if (straightOut > 0)
            {
                if (radiusOut == 0)
                {
                    yield return (innerArc, outerLine);
                    yield break;
                }

                var share = straightOut / (straightOut + radiusOut * diagonal);
                yield return (innerArc.Piece(0, share), outerLine);
                yield return (innerArc.Piece(share, 1), Bend(co, radiusOut, 2 * diagonal, diagonal));
            }
            else
            {
                yield return (innerArc, Bend(co, radiusOut, 2 * diagonal, diagonal));
            }
        }
    }

    /// <summary>The first quadrant of a rounded rectangle: a middle, two sides and the corner's quarter circle.</summary>
    public static PatchMesh Of(RoundedRectangle section)
    {
        var r = section.CornerRadius;
        var (halfY, halfZ) = (section.Width / 2, section.Depth / 2);
        var (flatY, flatZ) = (Nothing(halfY - r, r), Nothing(halfZ - r, r));
        var (columns, rows) = (Steps(flatY), Steps(flatZ));
        var patches = new List<Patch>();
        // The quarter circle and what lies beside it in two layers, cut near the junctions of arc and side, where the curvature jumps.
        ReadOnlySpan<double> layers = [0, 1 - Grading.Ratio, 1];
        for (var i = 1; i < columns.Length; i++)
        {
            for (var j = 1; j < rows.Length; j++) Block(columns[i - 1], columns[i], rows[j - 1], rows[j]);
            for (var k = 1; k < layers.Length; k++) Block(columns[i - 1], columns[i], flatZ + layers[k - 1] * r, flatZ + layers[k] * r);
        }

        var centre = EdgeCurve.Line((flatY, flatZ), (flatY, flatZ));
        var arc = EdgeCurve.Arc((flatY, flatZ), r, Math.PI / 2, 0);
        ReadOnlySpan<double> shares = [0, Grading.Ratio / 2, 0.5, 1 - Grading.Ratio / 2, 1];
        for (var i = 1; i < shares.Length; i++)
        {
            for (var k = 1; k < layers.Length; k++)
                patches.Add(Patch.Ruled(centre, arc, (shares[i - 1], shares[i]), (layers[k - 1], layers[k])));
        }

        for (var j = rows.Length - 1; j >= 1; j--)
        {
            for (var k = 1; k < layers.Length; k++) Block(flatY + layers[k - 1] * r, flatY + layers[k] * r, rows[j - 1], rows[j]);
        }

        return new PatchMesh(patches, true, Math.Max(halfY, halfZ));

        void Block(double y0, double y1, double z0, double z1) =>
            patches.Add(Patch.Ruled(EdgeCurve.Line((y0, z0), (y1, z0)), EdgeCurve.Line((y0, z1), (y1, z1)), (0, 1), (0, 1)));

        double[] Steps(double length) => length == 0 ? [0]
            : [.. Grading.Fractions(Grading.Graded(length, Grading.Ratio * r, Math.Min(halfY, halfZ)), length).Select(share => share * length)];
    }

    private static EdgeCurve Bend((double Y, double Z) centre, double radius, double from, double to) =>
        radius == 0 ? EdgeCurve.Line(centre, centre) : EdgeCurve.Arc(centre, radius, from, to);

    // Walked backwards with y and z exchanged.
    private static EdgeCurve Mirrored(EdgeCurve curve) => curve.Reversed().Exchanged();

    // Rounding of a length that should be nothing.
    private static double Nothing(double length, double scale) => length <= 1e-9 * scale ? 0 : length;
}
