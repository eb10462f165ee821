using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Stress;

public sealed class StressFieldTests
{
    [Fact]
    public void Numerical_fields_know_the_error_that_is_left_and_closed_forms_have_none()
    {
        foreach (var field in Samples.Fields)
        {
            Assert.True(field.CarriesTorsion);
            if (field is { Model: ShearModel.Elasticity, Section: Box or RoundedRectangle })
            {
                Assert.InRange(field.NumericalError!.Value.Torsion, 0, 1e-6);
                Assert.InRange(field.NumericalError!.Value.Stress, 0, 2e-3);
            }
            else
            {
                Assert.True(field.NumericalError is null || field.Section is RoundedRectangle, Samples.Name(field));
            }
        }
    }

    [Fact]
    public void A_field_remembers_what_it_was_made_of()
    {
        var section = new Tube(0.03, 0.004);

        Assert.True(StressField.TryCreate(section, ShearModel.Elasticity, 0.28, out var field, out var whyNot));

        Assert.Null(whyNot);
        Assert.Equal((section, ShearModel.Elasticity, 0.28), (field.Section, field.Model, field.Poisson));
        Assert.Equal(SectionProperties.Of(section), field.Properties);
        Assert.True(field.CarriesTorsion);
    }

    [Theory]
    [InlineData(-0.1)]
    [InlineData(0.5)]
    [InlineData(double.NaN)]
    public void A_poisson_ratio_out_of_range_is_refused(double poisson) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => StressField.TryCreate(new Round(0.01), ShearModel.Elementary, poisson, out _, out _));

    [Fact]
    public void A_point_on_an_edge_belongs_to_the_material_and_one_beyond_does_not()
    {
        var tube = Samples.Field(new Tube(0.03, 0.004), ShearModel.Elementary);
        var box = Samples.Field(new Box(0.05, 0.1, 0.005, 0.01, 0.005), ShearModel.Elementary);
        var bar = Samples.Field(new RoundedRectangle(0.05, 0.03, 0.006), ShearModel.Elementary);

        Assert.True(tube.Contains(0.03, 0) && tube.Contains(0, -0.026) && !tube.Contains(0.0301, 0) && !tube.Contains(0, 0.0259));
        Assert.True(box.Contains(0.025, 0) && box.Contains(0.02, 0) && !box.Contains(0.0199, 0) && !box.Contains(0.025, 0.05));
        Assert.True(bar.Contains(0.025, 0) && bar.Contains(0, 0) && !bar.Contains(0.025, 0.015));
    }
}
