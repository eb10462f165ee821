using MemberScan.Mechanics.Forces;

namespace MemberScan.SampleModels.HandCalculation;

/// <summary>Solid rectangle with sharp or rounded corners; no torsion.</summary>
/// <remarks>Shear V·Q/(I·b) per axis, b the width at the height of the point.</remarks>
internal sealed class HandSolid : HandSection
{
    private const int Steps = 40;

    private readonly double _width;
    private readonly double _depth;
    private readonly double _radius;

    private HandSolid(double width, double depth, double radius) => (_width, _depth, _radius) = (width, depth, radius);

    public static HandSolid From(double b, double h, double r)
    {
        var area = b * h - (4 - Math.PI) * r * r;
        return new HandSolid(b, h, r) { Area = area, Iy = Inertia(b, h, r), Iz = Inertia(h, b, r) };
    }

    /// <summary>Second moment of a rounded rectangle about the axis along its width: the rectangle less four spandrels.</summary>
    /// <remarks>Spandrel (square less quarter circle): area (1 − π/4)r², centroid (10 − 3π)/(12 − 3π)·r from its sides, own second moment 0.0075451 r⁴.</remarks>
    public static double Inertia(double b, double h, double r)
    {
        var spandrel = (1 - Math.PI / 4) * r * r;
        var own = (1.0 / 3 - Math.PI / 16 - 1 / (3 * (12 - 3 * Math.PI))) * Math.Pow(r, 4);
        var arm = h / 2 - (10 - 3 * Math.PI) / (12 - 3 * Math.PI) * r;
        return b * h * h * h / 12 - 4 * (own + spandrel * arm * arm);
    }

    public override HandPoint Worst(in SectionForces f)
    {
        if (f.T != 0) throw new NotSupportedException("Torsion of solid rectangles is not calculated by hand here.");

        var worst = At(f, 0, 0);
        for (var i = -Steps; i <= Steps; i++)
        {
            var z = _depth / 2 * i / Steps;
            var half = Width(z, _width, _depth) / 2;
            for (var j = -Steps; j <= Steps; j++) worst = HandPoint.Worse(worst, At(f, half * j / Steps, z));
        }

        return worst;
    }

    private HandPoint At(in SectionForces f, double y, double z)
    {
        var tauY = Shear(f.Vy, y, _depth, _width, Iz);
        var tauZ = Shear(f.Vz, z, _width, _depth, Iy);
        return new HandPoint(y, z, Normal(f, y, z), Math.Sqrt(tauY * tauY + tauZ * tauZ));
    }

    private double Shear(double v, double height, double b, double h, double inertia)
    {
        var width = Width(height, b, h);
        return v == 0 || width <= 1e-9 ? 0 : v * Beyond(Math.Abs(height), b, h) / (inertia * width);
    }

    // First moment of what lies beyond a height: a strip of full width, then one that the corners narrow.
    private double Beyond(double height, double b, double h)
    {
        var straightEnd = h / 2 - _radius;
        var inCorner = Math.Max(height, straightEnd) - straightEnd;
        var full = height < straightEnd ? b * (straightEnd * straightEnd - height * height) / 2 : 0;
        var between = (b - 2 * _radius) * (h * h / 4 - Math.Pow(straightEnd + inCorner, 2)) / 2;
        if (_radius == 0) return full + between;

        var chord = Math.Sqrt(Math.Max(0, _radius * _radius - inCorner * inCorner));
        var area = Math.PI * _radius * _radius / 4 - (inCorner * chord + _radius * _radius * Math.Asin(Math.Min(1, inCorner / _radius))) / 2;
        return full + between + 2 * (straightEnd * area + Math.Pow(chord, 3) / 3);
    }

    private double Width(double height, double b, double h)
    {
        var intoCorner = Math.Abs(height) - (h / 2 - _radius);
        if (intoCorner <= 0 || _radius == 0) return b;
        return b - 2 * _radius + 2 * Math.Sqrt(Math.Max(0, _radius * _radius - intoCorner * intoCorner));
    }
}
