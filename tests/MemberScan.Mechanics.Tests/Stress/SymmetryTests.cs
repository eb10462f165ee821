using CsCheck;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Stress;

/// <summary>What must hold for any field: turning, mirroring, scaling, adding up.</summary>
public sealed class SymmetryTests
{
    private static readonly Gen<SectionForces> s_forces = Gen.Double[-1, 1].Array[6].Select(a =>
        new SectionForces(50e3 * a[0], 20e3 * a[1], 20e3 * a[2], 100 * a[3], 500 * a[4], 500 * a[5]));

    [Fact]
    public void Round_bars_and_tubes_turn_with_the_axes_by_any_angle() =>
        Gen.Select(s_forces, Gen.Double[-7, 7], Gen.Double[0.35, 1], Gen.Double[0, 6.28]).Sample((forces, angle, share, direction) =>
        {
            foreach (var field in Samples.Fields.Where(f => f.Section is Round or Tube))
            {
                var radius = field.Section is Tube t ? t.InnerRadius + share * t.Wall : share * field.Section.ExtentY / 2;
                var (y, z) = (radius * Math.Cos(direction), radius * Math.Sin(direction));
                var (sin, cos) = Math.SinCos(angle);

                var state = field.At(forces, y, z);
                var turned = field.At(forces.Turned(angle), cos * y + sin * z, cos * z - sin * y);

                Near(state.Sigma, turned.Sigma, field, forces);
                Near(cos * state.TauXY + sin * state.TauXZ, turned.TauXY, field, forces);
                Near(cos * state.TauXZ - sin * state.TauXY, turned.TauXZ, field, forces);
            }
        }, iter: 200);

    [Fact]
    public void The_governing_value_of_round_bars_and_tubes_does_not_depend_on_the_axes() =>
        Gen.Select(s_forces, Gen.Double[-7, 7]).Sample((forces, angle) =>
        {
            foreach (var field in Samples.Fields.Where(f => f.Section is Round or Tube))
            {
                foreach (var measure in Enum.GetValues<StressMeasure>())
                {
                    var value = field.Govern(forces, measure).Value;
                    var turned = field.Govern(forces.Turned(angle), measure).Value;

                    Assert.True(Math.Abs(Math.Abs(value) - Math.Abs(turned)) <= 1e-6 * Math.Abs(value) + 1e-3, $"{Samples.Name(field)} {measure}: {value}, {turned}");
                }
            }
        }, iter: 40);

    [Fact]
    public void A_right_angle_exchanges_width_and_depth() =>
        Gen.Select(s_forces, Gen.Double[-0.5, 0.5], Gen.Double[-0.5, 0.5]).Sample((forces, u, v) =>
        {
            foreach (var field in Samples.Fields.Where(f => f.Section is Rectangle or RoundedRectangle or Box))
            {
                var other = Samples.Field(Exchanged(field.Section), field.Model);
                var acting = field.CarriesTorsion ? forces : forces with { T = 0 };
                var (y, z) = (u * field.Section.ExtentY, v * field.Section.ExtentZ);
                if (!field.Contains(y, z)) continue;

                // Turned by −90°: new y = −z, new z = y.
                var turned = acting.Turned(-Math.PI / 2);
                var state = field.At(acting, y, z);
                var there = other.At(turned, -z, y);

                // The mesh of the turned section need not be the turned mesh: numerical fields agree within their own error.
                var tolerance = field.NumericalError is null && field.Section is not RoundedRectangle ? 1e-8 : 2e-3;
                Near(state.Sigma, there.Sigma, field, acting);
                Near(-state.TauXZ, there.TauXY, field, acting, tolerance);
                Near(state.TauXY, there.TauXZ, field, acting, tolerance);
            }
        }, iter: 100);

    [Fact]
    public void Mirrored_forces_give_mirrored_stresses() =>
        Gen.Select(s_forces, Gen.Double[-0.5, 0.5], Gen.Double[-0.5, 0.5]).Sample((forces, u, v) =>
        {
            foreach (var field in Samples.Fields)
            {
                var acting = field.CarriesTorsion ? forces : forces with { T = 0 };
                var (y, z) = (u * field.Section.ExtentY, v * field.Section.ExtentZ);
                if (!field.Contains(y, z)) continue;

                var mirrored = acting with { Vz = -acting.Vz, My = -acting.My, T = -acting.T };
                var state = field.At(acting, y, z);
                var image = field.At(mirrored, y, -z);

                Near(state.Sigma, image.Sigma, field, acting);
                Near(state.TauXY, image.TauXY, field, acting);
                Near(-state.TauXZ, image.TauXZ, field, acting);
            }
        }, iter: 100);

    // Lengths ×λ, forces ×λ², moments ×λ³: the same stresses.
    [Fact]
    public void A_section_three_times_as_large_carries_nine_times_the_force_and_27_times_the_moment() =>
        s_forces.Sample(forces =>
        {
            foreach (var field in Samples.Fields)
            {
                var large = Samples.Field(Enlarged(field.Section, 3), field.Model);
                var acting = field.CarriesTorsion ? forces : forces with { T = 0 };
                var scaled = new SectionForces(9 * acting.N, 9 * acting.Vy, 9 * acting.Vz, 27 * acting.T, 27 * acting.My, 27 * acting.Mz);

                var small = field.Govern(acting, StressMeasure.VonMises).Value;

                Assert.Equal(1, large.Govern(scaled, StressMeasure.VonMises).Value / small, 1e-6);
            }
        }, iter: 20);

    [Fact]
    public void States_add_up_except_where_a_round_bar_turns_with_the_resultant() =>
        Gen.Select(s_forces, s_forces, Gen.Double[-0.5, 0.5], Gen.Double[-0.5, 0.5]).Sample((one, two, u, v) =>
        {
            foreach (var field in Samples.Fields)
            {
                var (a, b) = field.CarriesTorsion ? (one, two) : (one with { T = 0 }, two with { T = 0 });
                if (field.Section is Round && field.Model == ShearModel.Elementary) b = b with { Vy = 0.5 * a.Vy, Vz = 0.5 * a.Vz };
                var (y, z) = (u * field.Section.ExtentY, v * field.Section.ExtentZ);
                if (!field.Contains(y, z)) continue;

                var (first, second, both) = (field.At(a, y, z), field.At(b, y, z), field.At(a + b, y, z));

                // In the middle of a rounded mesh a side of each patch is a point: derivatives are taken a hair off it and lose digits.
                var digits = Math.Max(Math.Abs(u), Math.Abs(v)) < 1e-6 ? 1e-5 : 1e-8;
                Near(first.Sigma + second.Sigma, both.Sigma, field, a);
                Near(first.TauXY + second.TauXY, both.TauXY, field, a, digits);
                Near(first.TauXZ + second.TauXZ, both.TauXZ, field, a, digits);
            }
        }, iter: 100);

    [Fact]
    public void Larger_forces_of_the_same_kind_move_nothing_but_the_value() =>
        Gen.Select(s_forces, Gen.Double[0.01, 100]).Sample((forces, factor) =>
        {
            foreach (var field in Samples.Fields)
            {
                var acting = field.CarriesTorsion ? forces : forces with { T = 0 };

                var one = field.Govern(acting, StressMeasure.VonMises);
                var many = field.Govern(factor * acting, StressMeasure.VonMises);

                Assert.Equal(factor, many.Value / one.Value, 1e-6 * factor);
            }
        }, iter: 40);

    private static CrossSection Exchanged(CrossSection section) => section switch
    {
        Rectangle r => new Rectangle(r.Depth, r.Width),
        RoundedRectangle r => new RoundedRectangle(r.Depth, r.Width, r.CornerRadius),
        Box b => new Box(b.Depth, b.Width, b.Wall, b.OuterRadius, b.InnerRadius),
        _ => section,
    };

    private static CrossSection Enlarged(CrossSection section, double by) => section switch
    {
        Round r => new Round(by * r.Radius),
        Tube t => new Tube(by * t.OuterRadius, by * t.Wall),
        Rectangle r => new Rectangle(by * r.Width, by * r.Depth),
        RoundedRectangle r => new RoundedRectangle(by * r.Width, by * r.Depth, by * r.CornerRadius),
        Box b => new Box(by * b.Width, by * b.Depth, by * b.Wall, by * b.OuterRadius, by * b.InnerRadius),
        _ => throw new ArgumentException(section.Kind),
    };

    private static void Near(double expected, double actual, StressField field, SectionForces forces, double tolerance = 1e-8)
    {
        var scale = field.Govern(forces, StressMeasure.Tresca).Value;
        Assert.True(Math.Abs(expected - actual) <= tolerance * scale, $"{Samples.Name(field)}, {forces}: {expected} against {actual}");
    }
}
