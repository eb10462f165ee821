using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Stress;

public sealed class ClosureTests
{
    [Fact]
    public void Elasticity_gives_back_all_six_section_forces()
    {
        foreach (var field in Samples.Fields.Where(f => f.Model == ShearModel.Elasticity))
            Assert.True(field.Closure.LargestError <= (field.NumericalError is null ? 1e-6 : 1e-4), $"{Samples.Name(field)}: {field.Closure}");
    }

    [Theory]
    [InlineData(0)]
    [InlineData(0.25)]
    [InlineData(0.49)]
    public void Elasticity_closes_at_any_poisson_ratio(double poisson)
    {
        foreach (var section in Samples.Sections)
        {
            var field = Samples.Field(section, ShearModel.Elasticity, poisson);

            Assert.True(field.Closure.LargestError <= (field.NumericalError is null ? 1e-6 : 1e-4), $"{Samples.Name(field)}: {field.Closure}");
        }
    }

    [Fact]
    public void Axial_force_and_moments_close_in_every_model()
    {
        foreach (var field in Samples.Fields)
        {
            var closure = field.Closure;

            Assert.Equal(1, closure.N, 1e-7);
            Assert.Equal(1, closure.My, 1e-7);
            Assert.Equal(1, closure.Mz, 1e-7);
            Assert.True(closure.LargestCross <= (field.NumericalError is null ? 1e-7 : 1e-4), $"{Samples.Name(field)}: {closure}");
        }
    }

    [Fact]
    public void The_elementary_bars_close_in_shear_and_torsion()
    {
        foreach (var field in Samples.Fields.Where(f => f.Model == ShearModel.Elementary && f.Section is Round or Rectangle or RoundedRectangle))
            Assert.True(field.Closure.LargestError <= 1e-5, $"{Samples.Name(field)}: {field.Closure}");
    }

    // ⅔(b² + ab + a²)/(b² + a²) of V: the radial cut knows nothing of radial stress.
    [Fact]
    public void The_elementary_tube_gives_back_the_known_share_of_shear()
    {
        foreach (var tube in Samples.Sections.OfType<Tube>())
        {
            var (a, b) = (tube.InnerRadius, tube.OuterRadius);

            var closure = Samples.Field(tube, ShearModel.Elementary).Closure;

            var share = 2.0 / 3 * (b * b + a * b + a * a) / (b * b + a * a);
            Assert.Equal(share, closure.Vy, 1e-9);
            Assert.Equal(share, closure.Vz, 1e-9);
            Assert.Equal(1, closure.T, 1e-9);
        }
    }

    [Fact]
    public void A_thin_elementary_box_nearly_closes_in_shear_and_is_on_the_cautious_side_in_torsion()
    {
        foreach (var box in Samples.Sections.OfType<Box>().Where(b => 10 * b.Wall <= b.Width))
        {
            var closure = Samples.Field(box, ShearModel.Elementary).Closure;

            Assert.InRange(closure.Vy, 0.97, 1.03);
            Assert.InRange(closure.Vz, 0.97, 1.03);
            Assert.InRange(closure.T, 1, 1.2);
        }
    }
}
