using CsCheck;
using MathNet.Numerics.LinearAlgebra;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.States;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.States;

public sealed class PointStateTests
{
    // By hand: σ = 60, τ = 40 MPa: radius √(30² + 40²) = 50, σ1 = 80, σ3 = −20, tan 2θ = 80/60, 2θ = 53.1301°.
    [Fact]
    public void A_state_worked_out_by_hand()
    {
        var state = PointState.Of(new StressState(60e6, 24e6, 32e6));

        Assert.Equal((80e6, 0, -20e6), (state.Sigma1, state.Sigma2, state.Sigma3));
        Assert.Equal(53.13010235 / 2, state.Angle * 180 / Math.PI, 1e-8);
        Near(new Vector3(0, 0.6, 0.8), state.ShearDirection);
        Near(new Vector3(Math.Sqrt(0.8), 0.6 * Math.Sqrt(0.2), 0.8 * Math.Sqrt(0.2)), state.Direction1);    // cos² θ = (1 + 0.6)/2
        Near(new Vector3(0, -0.8, 0.6), state.Direction2);
        Assert.Equal((50e6, 30e6), (state.LargestShear.Shear, state.LargestShear.Normal));
        Assert.Equal([new MohrCircle("σ1–σ3", 30e6, 50e6), new MohrCircle("σ1–σ2", 40e6, 40e6), new MohrCircle("σ2–σ3", -10e6, 10e6)], state.Circles);
        Assert.Equal([new StressElement(ElementPlane.XY, 60e6, 24e6), new StressElement(ElementPlane.XZ, 60e6, 32e6)], state.Elements);
        // In the plane of x and y alone: 30 ± √(30² + 24²) = 30 ± 38.419.
        Assert.Equal(68.419e6, state.Elements[0].Largest, 0.001e6);
        Assert.Equal(-8.419e6, state.Elements[0].Smallest, 0.001e6);
        Assert.Equal(0.5 * Math.Atan2(48, 60), state.Elements[0].Angle, 1e-12);
        Assert.False(state.HasFreeDirections);
    }

    // The eigenvalues of the stress tensor, found by a program of others (MathNet.Numerics).
    [Fact]
    public void Principal_stresses_and_directions_are_those_of_the_tensor() =>
        Gen.Double[-300e6, 300e6].Array[3].Sample(s =>
        {
            var state = PointState.Of(new StressState(s[0], s[1], s[2]));
            var tensor = Matrix<double>.Build.DenseOfArray(new[,] { { s[0], s[1], s[2] }, { s[1], 0, 0 }, { s[2], 0, 0 } });
            var values = tensor.Evd(Symmetricity.Symmetric).EigenValues.Select(v => v.Real).Order().ToArray();
            var scale = s.Max(Math.Abs) + 1;

            Assert.Equal(values[0], state.Sigma3, 1e-12 * scale);
            Assert.Equal(values[1], state.Sigma2, 1e-12 * scale);
            Assert.Equal(values[2], state.Sigma1, 1e-12 * scale);
            foreach (var (direction, value) in new[] { (state.Direction1, state.Sigma1), (state.Direction2, 0), (state.Direction3, state.Sigma3) })
            {
                Assert.Equal(1, direction.Length, 1e-12);
                Near(value * direction, Traction(s, direction), 1e-9 * scale);
            }

            Near(state.Direction3, state.Direction1.Cross(state.Direction2));
        });

    [Fact]
    public void No_face_has_more_shear_than_the_one_reported_and_every_face_lies_between_the_circles() =>
        Gen.Select(Gen.Double[-300e6, 300e6].Array[3], Gen.Double[-1, 1].Array[3]).Sample((s, n) =>
        {
            if (!new Vector3(n[0], n[1], n[2]).TryNormalize(out var normal)) return;
            var state = PointState.Of(new StressState(s[0], s[1], s[2]));
            var tolerance = 1e-9 * (s.Max(Math.Abs) + 1);

            var (traction, face) = (Traction(s, normal), state.LargestShear);
            var sigma = traction.Dot(normal);
            var tau = (traction - sigma * normal).Length;
            var there = Traction(s, face.Direction);

            Assert.Equal(face.Normal, there.Dot(face.Direction), tolerance);
            Assert.Equal(face.Shear, (there - face.Normal * face.Direction).Length, tolerance);
            Assert.True(tau <= face.Shear + tolerance);
            double Beyond(MohrCircle c) => double.Hypot(sigma - c.Centre, tau) - c.Radius;
            Assert.True(Beyond(state.Circles[0]) <= tolerance && Beyond(state.Circles[1]) >= -tolerance && Beyond(state.Circles[2]) >= -tolerance);
        });

    [Fact]
    public void States_without_shear_or_without_stress_have_a_direction_by_rule()
    {
        var (pulled, pressed, none) = (PointState.Of(new StressState(5, 0, 0)), PointState.Of(new StressState(-5, 0, 0)), PointState.Of(default));

        Near(Vector3.UnitX, pulled.Direction1);
        Near(Vector3.UnitZ, pressed.Direction1);
        Near(Vector3.UnitX, pressed.Direction3);
        Assert.Equal((0, -5), (pressed.Sigma1, pressed.Sigma3));
        Assert.Equal((0, 0, 0), (none.Sigma1, none.Sigma3, none.LargestShear.Shear));
        Assert.True(pulled.HasFreeDirections && pressed.HasFreeDirections && none.HasFreeDirections);
        Assert.All(none.Circles, circle => Assert.Equal(0, circle.Radius));
    }

    [Theory]
    [InlineData(double.NaN, 0, 0)]
    [InlineData(0, double.PositiveInfinity, 0)]
    [InlineData(0, 0, double.NegativeInfinity)]
    public void Stresses_that_are_not_finite_are_refused(double sigma, double xy, double xz) =>
        Assert.Throws<ArgumentException>(() => PointState.Of(new StressState(sigma, xy, xz)));

    private static Vector3 Traction(double[] s, Vector3 n) => new(s[0] * n.X + s[1] * n.Y + s[2] * n.Z, s[1] * n.X, s[2] * n.X);

    private static void Near(Vector3 expected, Vector3 actual, double tolerance = 1e-12) =>
        Assert.True((expected - actual).Length <= tolerance, $"{expected} against {actual}");
}
