using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;
using MemberScan.Statics.Assembly;
using MemberScan.Statics.Sparse;

namespace MemberScan.Statics.Mechanisms;

/// <summary>The shape in which a frame gives way, by inverse iteration on the scaled stiffness.</summary>
internal static class MechanismSearch
{
    /// <summary>Pivots below this make a look at the shape worthwhile.</summary>
    public const double Suspicious = 1e-10;

    /// <summary>
    /// Smallest resistance, scaled to a diagonal of ones, of what still counts as a structure. Rounding leaves some 1e-16 of a mechanism, a
    /// cantilever of 625 storeys has 1e-11.
    /// </summary>
    private const double LeastResistance = 1e-14;

    private const double Shift = 1e-11;
    private const int Rounds = 10;

    /// <summary>Says where a frame gives way; false when it does not.</summary>
    public static bool Tell(FrameMatrix frame, ScaledMatrix matrix, Symbolic symbolic, int threads, DiagnosticList diagnostics)
    {
        var shifted = SupernodalCholesky.Factor(new ScaledMatrix(matrix.Matrix, matrix.IsFixed) { Shift = Shift }, symbolic, threads);
        var shape = shifted.IsWhole ? Iterate(matrix, shifted) : Unit(matrix, shifted);
        var resistance = shifted.IsWhole ? Resistance(matrix, shape) : 0;
        if (resistance > LeastResistance) return false;

        var (node, direction) = Largest(frame, matrix, shape);
        var frameNode = frame.Frame.Frame.Nodes[node];
        var verb = direction >= Direction.Rx ? "turns about" : "moves along";
        var axes = new Vector3(((int)direction % 3) == 0 ? 1 : 0, ((int)direction % 3) == 1 ? 1 : 0, ((int)direction % 3) == 2 ? 1 : 0);
        diagnostics.Add(StaticsCodes.Mechanism, Severity.Error, string.Create(CultureInfo.InvariantCulture,
            $"the frame is a mechanism: node {frameNode.Name} {verb} {FreeDirections.Name(axes, direction >= Direction.Rx, frame, node)} without resistance{MemberAt(frame, node)}; add a support or close a release"));
        return true;
    }

    private static double[] Iterate(ScaledMatrix matrix, SupernodalCholesky shifted)
    {
        var x = new double[matrix.Scale.Length];
        for (var i = 0; i < x.Length; i++) x[i] = matrix.IsFixed[i] ? 0 : (1 + 0.3 * Math.Sin(1.7 * i)) * (i % 7 < 4 ? 1 : -0.6);
        for (var round = 0; round < Rounds; round++)
        {
            for (var i = 0; i < x.Length; i++) x[i] = matrix.IsFixed[i] ? 0 : x[i] / matrix.Scale[i];
            TriangularSolve.Solve(shifted, [x], 1);
            var largest = 0.0;
            for (var i = 0; i < x.Length; i++)
            {
                x[i] = matrix.IsFixed[i] ? 0 : x[i] / matrix.Scale[i];
                largest = Math.Max(largest, Math.Abs(x[i]));
            }

            for (var i = 0; i < x.Length; i++) x[i] /= largest;
        }

        return x;
    }

    private static double[] Unit(ScaledMatrix matrix, SupernodalCholesky factor)
    {
        var x = new double[matrix.Scale.Length];
        for (var node = 0; node < matrix.Weight.Length; node++)
        {
            var place = factor.Symbolic.DofPlace[node];
            for (var d = 0; d < 6; d++)
                if (!matrix.IsFixed[6 * node + d] && place++ == factor.Smallest.Place) x[6 * node + d] = 1;
        }

        return x;
    }

    // Rayleigh quotient of the scaled matrix.
    private static double Resistance(ScaledMatrix matrix, double[] shape)
    {
        var n = shape.Length;
        var (u, residual, low, zero) = (new double[n], new double[n], new double[n], new double[n]);
        for (var i = 0; i < n; i++) u[i] = matrix.Scale[i] * shape[i];
        matrix.Matrix.Residual(u, zero, zero, residual, low);
        var (work, size) = (0.0, 0.0);
        for (var i = 0; i < n; i++) (work, size) = (work - u[i] * residual[i], size + shape[i] * shape[i]);
        return work / size;
    }

    // Turns count by half the length of a member, so that they compare with shifts and a shift is named first.
    private static (int Node, Direction Direction) Largest(FrameMatrix frame, ScaledMatrix matrix, double[] shape)
    {
        var length = 0.5 * frame.Frame.Members.Average(m => m.Body.Length);
        var (best, at) = (-1.0, 0);
        for (var i = 0; i < shape.Length; i++)
        {
            var size = Math.Abs(matrix.Scale[i] * shape[i]) * (i % 6 < 3 ? 1 : length);
            if (size > best * (1 + 1e-6)) (best, at) = (size, i);
        }

        return (at / 6, (Direction)(at % 6));
    }

    private static string MemberAt(FrameMatrix frame, int node)
    {
        var there = frame.Frame.Frame.Members.Where(m => m.Start == node || m.End == node).ToList();
        var named = there.Find(m => m.TrussOnly || HasRelease(m.StartJoint) || HasRelease(m.EndJoint)) ?? there.FirstOrDefault();
        return named is null ? ", and no member ends there" : $", at member {named.Name}";
    }

    private static bool HasRelease(Restraints joint) => Enum.GetValues<Direction>().Any(d => joint[d].Kind != RestraintKind.Fixed);
}
