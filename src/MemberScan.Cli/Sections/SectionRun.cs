using System.Globalization;
using System.Text.Json;
using MemberScan.Inputs.Values;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Screening;

namespace MemberScan.Cli.Sections;

/// <summary>One run of the section command.</summary>
internal static class SectionRun
{
    private const double OverLimit = 1 + 1e-9;

    /// <summary>What was asked for on the command line.</summary>
    public sealed record Options(string Section, string Forces, IReadOnlyList<string> Points, string Shear, double Poisson, string? Yield, bool Json)
    {
        /// <summary>Forces of further situations.</summary>
        public IReadOnlyList<string> MoreForces { get; init; } = [];

        /// <summary>Where a drawing goes.</summary>
        public string? Svg { get; init; }

        /// <summary>Whether the smallest size that would pass is sought.</summary>
        public bool Smallest { get; init; }
    }

    /// <summary>Runs and returns the exit code.</summary>
    public static int Execute(Options options)
    {
        var section = SectionInput.Section(options.Section);
        var states = SectionInput.Situations([options.Forces, .. options.MoreForces]);
        if (!NumberRange.Holds(section) || !Array.TrueForAll(states, forces => NumberRange.Holds(section, SectionProperties.Of(section), forces)))
            throw Usage($"The numbers of '{options.Section}' under '{string.Join("', '", (string[])[options.Forces, .. options.MoreForces])}' are beyond any structure; check their units.");

        var yield = Yield(options);
        var isBoth = options.Shear == "both";
        var model = options.Shear == "elasticity" || (isBoth && section is OutlineSection) ? ShearModel.Elasticity : ShearModel.Elementary;
        var field = Field(section, model, options.Poisson);
        if (!field.CarriesTorsion && Array.Exists(states, forces => forces.T != 0))
            throw new Failure(ExitCodes.NotChecked, $"Not checked: torsion of this {section.Kind} needs a numerical field, for which its dimensions are too far apart.");

        var (largest, which) = (new GoverningPoint[6], new int[6]);
        field.GovernAll(states, largest, which);
        var deciding = which[(int)StressMeasure.VonMises];
        var forces = states[deciding];
        var points = options.Points.Select(point => Point(point, field, forces)).ToList();
        var result = SectionResult.Of(field, forces, points, yield);
        var compared = Compared(field, forces, result);
        if (states.Length > 1) result = result with { Situation = deciding + 1, Situations = [.. states.Select((state, i) => Line(field, state, i + 1, yield))] };
        if (yield is { } fy && (options.Smallest || isBoth)) result = result with { Plastic = Plastic(field, forces, fy) };
        if (options.Smallest) result = result with { SmallestSize = SmallestSize.Of(section, states, yield ?? throw Usage("The smallest size is sought against a strength; give --yield.")) };
        if (isBoth) result = result with { Comparison = compared };
        if (options.Svg is { } svg) Write(svg, SectionSvg.Draw(field, forces, field.Govern(forces, StressMeasure.VonMises)));
        if (options.Json) Console.Out.WriteLine(JsonSerializer.Serialize(result, SectionJson.Plain.SectionResult));
        else SectionPrint.Write(Console.Out, section.Designation, result with { Comparison = compared, Plastic = yield is { } f ? Plastic(field, forces, f) : null }, field);
        return result.Utilization > OverLimit ? ExitCodes.Overstressed : ExitCodes.WithinLimit;
    }

    private static double? Yield(Options options)
    {
        if (options.Yield is not { } text) return null;
        if (!StressText.TryParse(text, out var stress, out var error)) throw Usage(error);

        return stress > 0 ? stress : throw Usage($"The yield strength '{text}' must be above zero.");
    }

    private static StressField Field(CrossSection section, ShearModel model, double poisson) =>
        StressField.TryCreate(section, model, poisson, out var field, out var whyNot)
            ? field
            : throw Usage($"{char.ToUpperInvariant(whyNot[0])}{whyNot[1..]}; use --shear {(model == ShearModel.Elementary ? "elasticity" : "elementary")}.");

    private static SectionResult.OtherModel? Compared(StressField field, in SectionForces forces, SectionResult result)
    {
        var model = field.Model == ShearModel.Elementary ? ShearModel.Elasticity : ShearModel.Elementary;
        if (!StressField.TryCreate(field.Section, model, field.Poisson, out var other, out _)) return null;
        if (!other.CarriesTorsion && forces.T != 0) return null;

        var measures = SectionResult.Measures.Of(other, forces);
        var elasticity = model == ShearModel.Elasticity ? other : field;
        var own = result.Governing.VonMises.Value;
        return new SectionResult.OtherModel(
            model == ShearModel.Elasticity ? "elasticity" : "elementary", measures, own > 0 ? measures.VonMises.Value / own - 1 : 0,
            elasticity.FilletPeak(forces, StressMeasure.VonMises)?.Value, elasticity.NumericalError?.Stress);
    }

    private static SectionResult.SituationLine Line(StressField field, in SectionForces f, int number, double? yield)
    {
        var point = field.Govern(f, StressMeasure.VonMises);
        return new SectionResult.SituationLine(
            number, new SectionResult.Forces6(f.N, f.Vy, f.Vz, f.T, f.My, f.Mz), new SectionResult.Measure(point.Value, point.Y, point.Z, point.Place), point.Value / yield);
    }

    private static SectionResult.PlasticShare Plastic(StressField field, in SectionForces forces, double yield) =>
        new(Math.Abs(forces.My) / (field.Properties.WplY * yield), Math.Abs(forces.Mz) / (field.Properties.WplZ * yield));

    // Whole or not at all.
    private static void Write(string path, string text)
    {
        var beside = path + ".part";
        try
        {
            File.WriteAllText(beside, text);
            File.Move(beside, path, overwrite: true);
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            throw new Failure(ExitCodes.InputOutput, $"The drawing '{path}' cannot be written.", exception);
        }
    }

    private static SectionResult.Point Point(string text, StressField field, in SectionForces forces)
    {
        if (!PointText.TryParse(text, out var y, out var z, out var error)) throw Usage(error);
        if (!field.Contains(y, z))
            throw Usage(string.Create(CultureInfo.InvariantCulture, $"The point y = {y * 1e3:0.####} mm, z = {z * 1e3:0.####} mm lies outside the material of {field.Section.Designation}."));

        return SectionResult.Point.Of(y, z, field.At(forces, y, z));
    }

    private static Failure Usage(string message) => new(ExitCodes.Usage, message);
}
