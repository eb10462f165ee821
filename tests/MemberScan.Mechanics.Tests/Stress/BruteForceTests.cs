using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Stress;

/// <summary>Governing points against some 40 000 points of the section, edges and inside, for 200 seeded states a field.</summary>
public sealed class BruteForceTests
{
    private const int States = 200;
    private static readonly StressMeasure[] s_measures = Enum.GetValues<StressMeasure>();

    public static TheoryData<int> FieldNumbers => [.. Enumerable.Range(0, Samples.Fields.Count())];

    [Theory]
    [MemberData(nameof(FieldNumbers))]
    public void No_point_of_the_section_exceeds_the_governing_one(int number)
    {
        var field = Samples.Fields.ElementAt(number);
        var cloud = new Cloud(field);
        var random = new Random(20_000 + number);
        var (worst, where) = (0.0, "");
        for (var state = 0; state < States; state++)
        {
            var forces = Samples.Forces(field, random);
            var brute = cloud.Largest(forces);
            foreach (var measure in s_measures)
            {
                var found = field.Govern(forces, measure);

                Assert.True(field.Contains(found.Y, found.Z) && field.Decides(found.Y, found.Z));
                Assert.Equal(Of(measure, field.At(forces, found.Y, found.Z)), found.Value);
                Assert.Equal(field.At(forces, found.Y, found.Z), found.State);
                var size = Math.Abs(found.Value);
                var excess = brute[(int)measure] > 0 ? 1 - size / brute[(int)measure] : 0;
                if (excess > worst) (worst, where) = (excess, $"{measure} for {forces}, found at {found.Y:G6}, {found.Z:G6} ({found.Place})");
            }
        }

        // The promise is 0.1 %; what the search really keeps is far tighter. Numerical fields have small steps between their patches.
        Assert.True(worst <= (field.NumericalError is null && field.Section is not RoundedRectangle ? 1e-6 : 1e-4), $"{Samples.Name(field)}: a point exceeds the governing one by {worst:E2}: {where}");
        Assert.True(cloud.Count >= (field.NumericalError is null ? 35_000 : 25_000), $"{cloud.Count} points");
    }

    private static double Of(StressMeasure measure, StressState state) => measure switch
    {
        StressMeasure.VonMises => state.VonMises,
        StressMeasure.Tresca => state.Tresca,
        StressMeasure.AbsoluteSigma => state.Sigma,
        StressMeasure.Tau => state.Tau,
        StressMeasure.Sigma1 => state.Sigma1,
        _ => state.Sigma3,
    };

    /// <summary>Points of a section with the stresses per unit force at each.</summary>
    private sealed class Cloud
    {
        private readonly StressField _field;
        private readonly (double Y, double Z)[] _points;
        private readonly Unit[]? _units;

        public Cloud(StressField field)
        {
            _field = field;
            _points = [.. PointsOf(field.Section).Where(p => field.Contains(p.Y, p.Z) && field.Decides(p.Y, p.Z))];
            // The parabola along the resultant is the one field that does not superpose.
            if (field.Section is Round && field.Model == ShearModel.Elementary) return;

            var torsion = field.CarriesTorsion ? new SectionForces(0, 0, 0, 1, 0, 0) : default;
            _units = [.. _points.Select(p => new Unit(
                field.At(new SectionForces(0, 1, 0, 0, 0, 0), p.Y, p.Z),
                field.At(new SectionForces(0, 0, 1, 0, 0, 0), p.Y, p.Z),
                field.At(torsion, p.Y, p.Z)))];
        }

        public int Count => _points.Length;

        /// <summary>Largest magnitude of each measure, in the order of the enumeration.</summary>
        public double[] Largest(SectionForces f)
        {
            var p = _field.Properties;
            var (n, my, mz) = (f.N / p.Area, f.My / p.Iy, f.Mz / p.Iz);
            var (mises, tresca, sigmaLargest, tauSquared, sigma1, sigma3) = (0.0, 0.0, 0.0, 0.0, 0.0, 0.0);
            for (var i = 0; i < _points.Length; i++)
            {
                var (y, z) = _points[i];
                var (xy, xz) = _units is null ? Direct(f, y, z) : _units[i].Of(f.Vy, f.Vz, f.T);
                var sigma = n + my * z - mz * y;
                var square = xy * xy + xz * xz;
                var twiceRadius = Math.Sqrt(sigma * sigma + 4 * square);
                mises = Math.Max(mises, sigma * sigma + 3 * square);
                tresca = Math.Max(tresca, twiceRadius);
                sigmaLargest = Math.Max(sigmaLargest, Math.Abs(sigma));
                tauSquared = Math.Max(tauSquared, square);
                sigma1 = Math.Max(sigma1, 0.5 * (twiceRadius + sigma));
                sigma3 = Math.Max(sigma3, 0.5 * (twiceRadius - sigma));
            }

            return [Math.Sqrt(mises), tresca, sigmaLargest, Math.Sqrt(tauSquared), sigma1, sigma3];
        }

        private (double XY, double XZ) Direct(SectionForces f, double y, double z)
        {
            var state = _field.At(f, y, z);
            return (state.TauXY, state.TauXZ);
        }

        private static IEnumerable<(double Y, double Z)> PointsOf(CrossSection section) => section switch
        {
            Round round => Ring(0, round.Radius),
            Tube tube => Ring(tube.InnerRadius, tube.OuterRadius),
            Rectangle r => Raster(r.Width, r.Depth, 201),
            RoundedRectangle r => Raster(r.Width, r.Depth, 201).Concat(Edge(r.Width, r.Depth, r.CornerRadius)),
            Box b => Walls(b).Concat(Edge(b.Width, b.Depth, b.OuterRadius))
                .Concat(Edge(b.Width - 2 * b.Wall, b.Depth - 2 * b.Wall, b.InnerRadius)),
            _ => throw new ArgumentException(section.Kind),
        };

        private readonly struct Unit(StressState vy, StressState vz, StressState t)
        {
            private readonly double _a = vy.TauXY, _b = vz.TauXY, _c = t.TauXY, _d = vy.TauXZ, _e = vz.TauXZ, _f = t.TauXZ;

            public (double XY, double XZ) Of(double vy, double vz, double t) => (vy * _a + vz * _b + t * _c, vy * _d + vz * _e + t * _f);
        }

        private static IEnumerable<(double Y, double Z)> Ring(double inner, double outer) =>
            from i in Enumerable.Range(0, 101)
            from j in Enumerable.Range(0, 400)
            let radius = inner + (outer - inner) * i / 100
            let angle = Math.PI / 200 * (j + 0.37)
            select (radius * Math.Cos(angle), radius * Math.Sin(angle));

        private static IEnumerable<(double Y, double Z)> Raster(double width, double depth, int count) =>
            from i in Enumerable.Range(0, count)
            from j in Enumerable.Range(0, count)
            select (width * (i / (count - 1.0) - 0.5), depth * (j / (count - 1.0) - 0.5));

        private static IEnumerable<(double Y, double Z)> Walls(Box box) =>
            from share in Enumerable.Range(0, 17).Select(k => k / 16.0)
            let inset = 2 * box.Wall * share
            let radius = box.OuterRadius + (box.InnerRadius - box.OuterRadius) * share
            from point in Edge(box.Width - inset, box.Depth - inset, radius)
            select point;

        private static IEnumerable<(double Y, double Z)> Edge(double width, double depth, double radius) =>
            from sy in new[] { -1, 1 }
            from sz in new[] { -1, 1 }
            from k in Enumerable.Range(0, 301)
            let share = k / 300.0
            let angle = Math.PI / 2 * share
            from p in new[]
            {
                ((width / 2 - radius) * share, depth / 2),
                (width / 2, (depth / 2 - radius) * share),
                (width / 2 - radius + radius * Math.Cos(angle), depth / 2 - radius + radius * Math.Sin(angle)),
            }
            select (sy * p.Item1, sz * p.Item2);
    }
}
