using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Screening.Sheets;

namespace MemberScan.Screening.Tests.Sheets;

public sealed class SectionSamplesTests
{
    // All six act; none is small beside the others.
    private static readonly SectionForces s_forces = new(9e3, -2.1e3, 3.4e3, 150, 420, -260);

    public static TheoryData<CrossSection, ShearModel> Fields => new()
    {
        { new Round(12.5e-3), ShearModel.Elementary },
        { new Round(12.5e-3), ShearModel.Elasticity },
        { new Tube(24.15e-3, 3.2e-3), ShearModel.Elementary },
        { new Tube(24.15e-3, 3.2e-3), ShearModel.Elasticity },
        { new Rectangle(10e-3, 50e-3), ShearModel.Elementary },
        { new Rectangle(60e-3, 12e-3), ShearModel.Elasticity },
        { new Box(60e-3, 40e-3, 4e-3, 6e-3, 3e-3), ShearModel.Elementary },
        { new Box(60e-3, 40e-3, 4e-3, 6e-3, 3e-3), ShearModel.Elasticity },
    };

    [Theory]
    [MemberData(nameof(Fields))]
    public void Hold_the_stresses_of_the_field_at_every_point_of_the_material(CrossSection section, ShearModel model)
    {
        Assert.True(StressField.TryCreate(section, model, 0.3, out var field, out var whyNot), whyNot);
        var samples = SectionSamples.Of(field);
        var largest = field.Govern(s_forces, StressMeasure.VonMises).Value;

        var inside = Enumerable.Range(0, samples.Points.Length).Where(i => samples.Points[i].IsInside).ToList();

        Assert.True(inside.Count > 200, $"only {inside.Count} samples in the material");
        Assert.All(inside, i =>
        {
            var (point, got) = (samples.Points[i], samples.At(i, s_forces));
            var expected = field.At(s_forces, point.Y, point.Z);
            Assert.True(field.Contains(point.Y, point.Z));
            Assert.Equal(expected.Sigma, got.Sigma, 1e-9 * largest);
            Assert.Equal(expected.TauXY, got.TauXY, 1e-9 * largest);
            Assert.Equal(expected.TauXZ, got.TauXZ, 1e-9 * largest);
        });
    }

    [Theory]
    [MemberData(nameof(Fields))]
    public void Of_the_six_forces_alone_add_up_to_the_whole_unless_they_say_otherwise(CrossSection section, ShearModel model)
    {
        Assert.True(StressField.TryCreate(section, model, 0.3, out var field, out var whyNot), whyNot);
        var samples = SectionSamples.Of(field);
        SectionForces[] alone =
        [
            new(s_forces.N, 0, 0, 0, 0, 0), new(0, s_forces.Vy, 0, 0, 0, 0), new(0, 0, s_forces.Vz, 0, 0, 0),
            new(0, 0, 0, s_forces.T, 0, 0), new(0, 0, 0, 0, s_forces.My, 0), new(0, 0, 0, 0, 0, s_forces.Mz),
        ];
        var largest = field.Govern(s_forces, StressMeasure.VonMises).Value;

        var misses = Enumerable.Range(0, samples.Points.Length).Where(i =>
        {
            var whole = samples.At(i, s_forces);
            var parts = alone.Select(f => samples.At(i, f)).ToList();
            return Math.Abs(parts.Sum(p => p.Sigma) - whole.Sigma) > 1e-9 * largest
                || Math.Abs(parts.Sum(p => p.TauXY) - whole.TauXY) > 1e-9 * largest || Math.Abs(parts.Sum(p => p.TauXZ) - whole.TauXZ) > 1e-9 * largest;
        });

        Assert.Equal(samples.AddsUp, !misses.Any());
        Assert.Equal(section is Round && model == ShearModel.Elementary, !samples.AddsUp);
    }

    [Theory]
    [MemberData(nameof(Fields))]
    public void Surround_the_material_so_that_every_square_that_touches_it_has_all_its_corners(CrossSection section, ShearModel model)
    {
        Assert.True(StressField.TryCreate(section, model, 0.3, out var field, out var whyNot), whyNot);
        var samples = SectionSamples.Of(field);
        var grid = samples.Grid;

        // Points along the edges, every one of which lies in some square.
        var bare = samples.Rings.SelectMany(r => r).Where(p =>
        {
            var (column, row) = ((int)Math.Floor((p.Y - grid.Left) / grid.Cell), (int)Math.Floor((p.Z - grid.Bottom) / grid.Cell));
            var node = row * grid.Columns + column;
            return new[] { node, node + 1, node + grid.Columns, node + grid.Columns + 1 }.Any(n => grid.Numbers[n] < 0);
        });

        Assert.Empty(bare);
        Assert.True(samples.ArrowSites.Length is > 8 and < 120, $"{samples.ArrowSites.Length} arrows");
        Assert.All(samples.ArrowSites, i => Assert.True(samples.Points[i].IsInside));
    }
}
