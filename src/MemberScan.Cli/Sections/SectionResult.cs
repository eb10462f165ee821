using System.Text.Json.Serialization;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.States;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Cli.Sections;

/// <summary>What the section command gives, in SI, under keys that stay as they are.</summary>
internal sealed record SectionResult(
    [property: JsonPropertyName("section")] string Section,
    [property: JsonPropertyName("properties")] SectionResult.Values Properties,
    [property: JsonPropertyName("shear")] string Shear,
    [property: JsonPropertyName("poisson")] double Poisson,
    [property: JsonPropertyName("forces")] SectionResult.Forces6 Forces,
    [property: JsonPropertyName("utilization"), JsonIgnore(Condition = JsonIgnoreCondition.WhenWritingNull)] double? Utilization,
    [property: JsonPropertyName("points")] IReadOnlyList<SectionResult.Point> Points,
    [property: JsonPropertyName("governing")] SectionResult.Measures Governing,
    [property: JsonPropertyName("closure")] SectionResult.ClosureValues Closure)
{
    /// <summary>Number of the situation, from 1, that the result is for; only where several are given.</summary>
    [JsonPropertyName("situation"), JsonIgnore(Condition = JsonIgnoreCondition.WhenWritingNull)]
    public int? Situation { get; init; }

    /// <summary>All situations, only where several are given.</summary>
    [JsonPropertyName("situations"), JsonIgnore(Condition = JsonIgnoreCondition.WhenWritingNull)]
    public IReadOnlyList<SituationLine>? Situations { get; init; }

    /// <summary>The other shear model, where it is asked for.</summary>
    [JsonPropertyName("comparison"), JsonIgnore(Condition = JsonIgnoreCondition.WhenWritingNull)]
    public OtherModel? Comparison { get; init; }

    /// <summary>Moments over the plastic moments, where they are asked for.</summary>
    [JsonPropertyName("plastic"), JsonIgnore(Condition = JsonIgnoreCondition.WhenWritingNull)]
    public PlasticShare? Plastic { get; init; }

    /// <summary>Smallest sizes that would pass, where they are asked for.</summary>
    [JsonPropertyName("smallestSize"), JsonIgnore(Condition = JsonIgnoreCondition.WhenWritingNull)]
    public IReadOnlyList<SmallestSize>? SmallestSize { get; init; }

    /// <summary>The stress state at the point of the largest von Mises stress.</summary>
    [JsonPropertyName("state")]
    public required State GoverningState { get; init; }

    /// <summary>The result of a field under given forces.</summary>
    public static SectionResult Of(StressField field, in SectionForces forces, IReadOnlyList<Point> points, double? yield)
    {
        var p = field.Properties;
        var f = forces;
        var governing = Measures.Of(field, forces);
        var c = field.Closure;
        var (areas, e) = (field.ShearAreas, p.Extremes);
        return new SectionResult(
            field.Section.Designation,
            new Values(p.Area, p.Iy, p.Iz, p.Iyz, p.J, p.WelY, p.WelZ, p.WplY, p.WplZ, p.Wt, p.JThinWall, p.ShearCentreY, p.ShearCentreZ, p.JSource)
            {
                Extremes = new Extremes(e.YTop, e.YBottom, e.ZRight, e.ZLeft),
                IMax = p.IMax,
                IMin = p.IMin,
                PrincipalAngle = p.PrincipalAngle,
                QY = p.QY,
                QZ = p.QZ,
                PlasticAxisY = p.PlasticAxisY,
                PlasticAxisZ = p.PlasticAxisZ,
                WtThinWall = p.WtThinWall,
                ShearAreaY = areas.Y,
                ShearAreaZ = areas.Z,
            },
            field.Model == ShearModel.Elasticity ? "elasticity" : "elementary", field.Poisson,
            new Forces6(f.N, f.Vy, f.Vz, f.T, f.My, f.Mz), yield is { } fy ? governing.VonMises.Value / fy : null, points, governing,
            new ClosureValues(c.N, c.Vy, c.Vz, c.T, c.My, c.Mz, c.LargestCross))
        { GoverningState = State.Of(PointState.Of(field.Govern(forces, StressMeasure.VonMises).State)) };
    }

    /// <summary>Properties of the section.</summary>
    internal sealed record Values(
        [property: JsonPropertyName("area")] double Area,
        [property: JsonPropertyName("Iy")] double Iy,
        [property: JsonPropertyName("Iz")] double Iz,
        [property: JsonPropertyName("Iyz")] double Iyz,
        [property: JsonPropertyName("J")] double? J,
        [property: JsonPropertyName("WelY")] double WelY,
        [property: JsonPropertyName("WelZ")] double WelZ,
        [property: JsonPropertyName("WplY")] double WplY,
        [property: JsonPropertyName("WplZ")] double WplZ,
        [property: JsonPropertyName("Wt")] double? Wt,
        [property: JsonPropertyName("JThinWall")] double? JThinWall,
        [property: JsonPropertyName("yS")] double ShearCentreY,
        [property: JsonPropertyName("zS")] double ShearCentreZ,
        [property: JsonPropertyName("JSource")] string JSource)
    {
        [JsonPropertyName("WelExtremes")]
        public required Extremes Extremes { get; init; }

        [JsonPropertyName("IMax")]
        public required double IMax { get; init; }

        [JsonPropertyName("IMin")]
        public required double IMin { get; init; }

        [JsonPropertyName("principalAngle")]
        public required double PrincipalAngle { get; init; }

        [JsonPropertyName("QY")]
        public required double QY { get; init; }

        [JsonPropertyName("QZ")]
        public required double QZ { get; init; }

        [JsonPropertyName("plasticAxisY")]
        public required double PlasticAxisY { get; init; }

        [JsonPropertyName("plasticAxisZ")]
        public required double PlasticAxisZ { get; init; }

        [JsonPropertyName("WtThinWall")]
        public required double? WtThinWall { get; init; }

        [JsonPropertyName("shearAreaY")]
        public required double ShearAreaY { get; init; }

        [JsonPropertyName("shearAreaZ")]
        public required double ShearAreaZ { get; init; }
    }

    /// <summary>Elastic moduli at the extreme fibres +z, −z, +y, −y.</summary>
    internal sealed record Extremes(
        [property: JsonPropertyName("YTop")] double YTop,
        [property: JsonPropertyName("YBottom")] double YBottom,
        [property: JsonPropertyName("ZRight")] double ZRight,
        [property: JsonPropertyName("ZLeft")] double ZLeft);

    /// <summary>The six section forces.</summary>
    internal sealed record Forces6(
        [property: JsonPropertyName("N")] double N,
        [property: JsonPropertyName("Vy")] double Vy,
        [property: JsonPropertyName("Vz")] double Vz,
        [property: JsonPropertyName("T")] double T,
        [property: JsonPropertyName("My")] double My,
        [property: JsonPropertyName("Mz")] double Mz);

    /// <summary>The stresses at a point that was asked for.</summary>
    internal sealed record Point(
        [property: JsonPropertyName("y")] double Y,
        [property: JsonPropertyName("z")] double Z,
        [property: JsonPropertyName("sigma")] double Sigma,
        [property: JsonPropertyName("tauXY")] double TauXY,
        [property: JsonPropertyName("tauXZ")] double TauXZ,
        [property: JsonPropertyName("tau")] double Tau,
        [property: JsonPropertyName("vonMises")] double VonMises,
        [property: JsonPropertyName("tresca")] double Tresca,
        [property: JsonPropertyName("sigma1")] double Sigma1,
        [property: JsonPropertyName("sigma3")] double Sigma3)
    {
        public static Point Of(double y, double z, in StressState s) =>
            new(y, z, s.Sigma, s.TauXY, s.TauXZ, s.Tau, s.VonMises, s.Tresca, s.Sigma1, s.Sigma3);
    }

    /// <summary>Where each measure is largest.</summary>
    internal sealed record Measures(
        [property: JsonPropertyName("vonMises")] Measure VonMises,
        [property: JsonPropertyName("tresca")] Measure Tresca,
        [property: JsonPropertyName("absSigma")] Measure AbsSigma,
        [property: JsonPropertyName("tau")] Measure Tau,
        [property: JsonPropertyName("sigma1")] Measure Sigma1,
        [property: JsonPropertyName("sigma3")] Measure Sigma3)
    {
        public static Measures Of(StressField field, in SectionForces forces)
        {
            var f = forces;
            Measure Most(StressMeasure measure)
            {
                var point = field.Govern(f, measure);
                return new Measure(point.Value, point.Y, point.Z, point.Place);
            }

            return new Measures(
                Most(StressMeasure.VonMises), Most(StressMeasure.Tresca), Most(StressMeasure.AbsoluteSigma), Most(StressMeasure.Tau),
                Most(StressMeasure.Sigma1), Most(StressMeasure.Sigma3));
        }
    }

    /// <summary>The stress state of a point worked out; vectors in the member's axes x, y, z, angles in radians.</summary>
    internal sealed record State(
        [property: JsonPropertyName("sigma")] double Sigma,
        [property: JsonPropertyName("tauXY")] double TauXY,
        [property: JsonPropertyName("tauXZ")] double TauXZ,
        [property: JsonPropertyName("sigma1")] double Sigma1,
        [property: JsonPropertyName("sigma2")] double Sigma2,
        [property: JsonPropertyName("sigma3")] double Sigma3,
        [property: JsonPropertyName("shearDirection")] IReadOnlyList<double> ShearDirection,
        [property: JsonPropertyName("angle")] double Angle,
        [property: JsonPropertyName("direction1")] IReadOnlyList<double> Direction1,
        [property: JsonPropertyName("direction2")] IReadOnlyList<double> Direction2,
        [property: JsonPropertyName("direction3")] IReadOnlyList<double> Direction3,
        [property: JsonPropertyName("freeDirections")] bool HasFreeDirections,
        [property: JsonPropertyName("largestShear")] ShearFace LargestShear,
        [property: JsonPropertyName("circles")] IReadOnlyList<Circle> Circles,
        [property: JsonPropertyName("elements")] IReadOnlyList<Element> Elements)
    {
        public static State Of(PointState s) => new(
            s.Stress.Sigma, s.Stress.TauXY, s.Stress.TauXZ, s.Sigma1, s.Sigma2, s.Sigma3, Three(s.ShearDirection), s.Angle,
            Three(s.Direction1), Three(s.Direction2), Three(s.Direction3), s.HasFreeDirections,
            new ShearFace(s.LargestShear.Shear, s.LargestShear.Normal, s.LargestShear.Angle, Three(s.LargestShear.Direction)),
            [.. s.Circles.Select(c => new Circle(c.Name, c.Centre, c.Radius))],
            [.. s.Elements.Select(e => new Element(e.Plane == ElementPlane.XY ? "xy" : "xz", e.Sigma, e.Tau, e.Largest, e.Smallest, e.Angle))]);

        // No negative zeros.
        private static double[] Three(Vector3 v) => [v.X + 0.0, v.Y + 0.0, v.Z + 0.0];
    }

    /// <summary>The face on which the shear stress is largest.</summary>
    internal sealed record ShearFace(
        [property: JsonPropertyName("shear")] double Shear,
        [property: JsonPropertyName("normal")] double Normal,
        [property: JsonPropertyName("angle")] double Angle,
        [property: JsonPropertyName("direction")] IReadOnlyList<double> Direction);

    /// <summary>One of Mohr's circles.</summary>
    internal sealed record Circle(
        [property: JsonPropertyName("name")] string Name,
        [property: JsonPropertyName("centre")] double Centre,
        [property: JsonPropertyName("radius")] double Radius);

    /// <summary>A stress element in one plane.</summary>
    internal sealed record Element(
        [property: JsonPropertyName("plane")] string Plane,
        [property: JsonPropertyName("sigma")] double Sigma,
        [property: JsonPropertyName("tau")] double Tau,
        [property: JsonPropertyName("largest")] double Largest,
        [property: JsonPropertyName("smallest")] double Smallest,
        [property: JsonPropertyName("angle")] double Angle);

    /// <summary>One situation of several.</summary>
    internal sealed record SituationLine(
        [property: JsonPropertyName("number")] int Number,
        [property: JsonPropertyName("forces")] Forces6 Forces,
        [property: JsonPropertyName("vonMises")] Measure VonMises,
        [property: JsonPropertyName("utilization"), JsonIgnore(Condition = JsonIgnoreCondition.WhenWritingNull)] double? Utilization);

    /// <summary>The other shear model beside the one of the result.</summary>
    /// <param name="Shear">Its name.</param>
    /// <param name="Governing">Its largest values.</param>
    /// <param name="Difference">Its largest von Mises stress over that of the result, less 1 [-].</param>
    /// <param name="FilletVonMises">Largest von Mises stress at rounded re-entrant corners of the elasticity model, which does not decide [Pa].</param>
    /// <param name="StressChange">Largest change of a shear stress at the last refinement of a numerical field [-].</param>
    internal sealed record OtherModel(
        [property: JsonPropertyName("shear")] string Shear,
        [property: JsonPropertyName("governing")] Measures Governing,
        [property: JsonPropertyName("difference")] double Difference,
        [property: JsonPropertyName("filletVonMises")] double? FilletVonMises,
        [property: JsonPropertyName("stressChange")] double? StressChange);

    /// <summary>Moments over the plastic moments Wpl·fy, magnitudes [-]; information beside an elastic value.</summary>
    internal sealed record PlasticShare(
        [property: JsonPropertyName("My")] double My,
        [property: JsonPropertyName("Mz")] double Mz);

    /// <summary>A largest value and its place.</summary>
    internal sealed record Measure(
        [property: JsonPropertyName("value")] double Value,
        [property: JsonPropertyName("y")] double Y,
        [property: JsonPropertyName("z")] double Z,
        [property: JsonPropertyName("place")] string Place);

    /// <summary>Section forces got back by integrating the field, for a unit of each.</summary>
    internal sealed record ClosureValues(
        [property: JsonPropertyName("N")] double N,
        [property: JsonPropertyName("Vy")] double Vy,
        [property: JsonPropertyName("Vz")] double Vz,
        [property: JsonPropertyName("T")] double T,
        [property: JsonPropertyName("My")] double My,
        [property: JsonPropertyName("Mz")] double Mz,
        [property: JsonPropertyName("largestCross")] double LargestCross);
}
