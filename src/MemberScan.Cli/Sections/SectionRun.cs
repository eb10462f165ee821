using System.Globalization;
using System.Text.Json;
using MemberScan.Inputs.Values;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Screening;

namespace MemberScan.Cli.Sections;

/// <summary>One run of the section command.</summary>
internal static class SectionRun
{
    private const double OverLimit = 1 + 1e-9;

    /// <summary>What was asked for on the command line.</summary>
    public sealed record Options(string Section, string Forces, IReadOnlyList<string> Points, string Shear, double Poisson, string? Yield, bool Json);

    /// <summary>Runs and returns the exit code.</summary>
    public static int Execute(Options options)
    {
        if (!SectionText.TryParse(options.Section, out var section, out var error)) throw Usage(error);
        var forces = default(SectionForces);
        if (options.Forces.Length > 0 && !ForcesText.TryParse(options.Forces, out forces, out error)) throw Usage(error);
        if (!NumberRange.Holds(section) || !NumberRange.Holds(section, SectionProperties.Of(section), forces))
            throw Usage($"The numbers of '{options.Section}' under '{options.Forces}' are beyond any structure; check their units.");

        double? yield = null;
        if (options.Yield is { } text)
        {
            if (!StressText.TryParse(text, out var stress, out error)) throw Usage(error);
            if (!(stress > 0)) throw Usage($"The yield strength '{text}' must be above zero.");

            yield = stress;
        }

        var model = options.Shear == "elasticity" ? ShearModel.Elasticity : ShearModel.Elementary;
        if (!StressField.TryCreate(section, model, options.Poisson, out var field, out var whyNot))
            throw Usage($"{char.ToUpperInvariant(whyNot[0])}{whyNot[1..]}; use --shear elementary.");
        if (!field.CarriesTorsion && forces.T != 0)
            throw new Failure(ExitCodes.NotChecked, $"Not checked: torsion of a {section.Kind} needs a numerical field, which is not available.");

        var points = options.Points.Select(point => Point(point, field, forces)).ToList();
        var result = SectionResult.Of(field, forces, points, yield);
        if (options.Json) Console.Out.WriteLine(JsonSerializer.Serialize(result, SectionJson.Plain.SectionResult));
        else SectionPrint.Write(Console.Out, section.Designation, result, field);
        return result.Utilization > OverLimit ? ExitCodes.Overstressed : ExitCodes.WithinLimit;
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
