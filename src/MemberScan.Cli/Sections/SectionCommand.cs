using System.CommandLine;
using System.Globalization;

namespace MemberScan.Cli.Sections;

/// <summary><c>memberscan section TEXT</c>: properties and stresses of one section, without a model.</summary>
internal static class SectionCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build()
    {
        var section = new Argument<string>("SECTION")
        {
            Description = "\"round 25 mm\", \"tube 48.3x3.2 mm\", \"rectangle 40x80 mm\" (y × z), \"rectangle 60x100 mm r 15\", \"box 50x30x3 mm\" with optional \"ro 6 ri 3\", \"L 100x80x8 mm\", \"I 200x100x5.6x8.5 mm r 12\", U and T alike (z × y × web × flange), \"outline FILE\"; inches likewise.",
        };
        var forces = new Option<string[]>("--forces") { Description = "Section forces, such as \"N=10kN My=0.1kNm\"; omitted ones are 0. Several times for several situations.", HelpName = "TEXT" };
        var at = new Option<string[]>("--at") { Description = "A point of the section, such as \"y=0mm z=10mm\"; may be given several times.", HelpName = "TEXT" };
        var shear = new Option<string>("--shear") { Description = "Shear model.", HelpName = "elementary|elasticity|both", DefaultValueFactory = _ => "elementary" };
        shear.AcceptOnlyFromAmong("elementary", "elasticity", "both");
        var poisson = new Option<string>("--poisson") { Description = "Poisson's ratio, from 0 to below 0.5.", HelpName = "NUMBER", DefaultValueFactory = _ => "0.3" };
        var yield = new Option<string?>("--yield") { Description = "Yield strength, such as 235MPa; gives the utilization by von Mises.", HelpName = "STRESS" };
        var svg = new Option<string?>("--svg") { Description = "Draw the section with its stresses and the governing point into this file.", HelpName = "FILE" };
        var smallest = new Option<bool>("--smallest") { Description = "Seek the smallest size of a round bar, tube or box that would pass, one dimension free; needs --yield." };
        var json = new Option<bool>("--json") { Description = "Print JSON in SI units." };

        var command = new Command("section", "Section properties and stresses of one section under given forces.") { section, forces, at, shear, poisson, yield, svg, smallest, json };
        command.SetAction((parsed, _) =>
        {
            var texts = parsed.GetValue(forces) ?? [];
            return Task.FromResult(SectionRun.Execute(
                new SectionRun.Options(
                    parsed.GetValue(section)!, texts.FirstOrDefault(""), parsed.GetValue(at) ?? [], parsed.GetValue(shear)!, Number(parsed.GetValue(poisson)!),
                    parsed.GetValue(yield), parsed.GetValue(json))
                {
                    MoreForces = [.. texts.Skip(1)],
                    Svg = parsed.GetValue(svg),
                    Smallest = parsed.GetValue(smallest),
                }));
        });
        return command;
    }

    private static double Number(string text) =>
        double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && value is >= 0 and < 0.5
            ? value
            : throw new Failure(ExitCodes.Usage, $"'{text}' is no Poisson's ratio; give a number from 0 to below 0.5.");
}
