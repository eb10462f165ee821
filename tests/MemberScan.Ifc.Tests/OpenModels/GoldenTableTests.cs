using System.Globalization;
using System.Text.RegularExpressions;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;
using MemberScan.OpenModels;
using MemberScan.Part21;

namespace MemberScan.Ifc.Tests.OpenModels;

/// <summary>
/// One reviewed table for each real file: how many members of a class and name, their section, length, material and source or reason, and the
/// key of the first. A table that no longer fits is written beside the test's output for review.
/// </summary>
/// <remarks>
/// Reviewed by hand against the text of the files: every row was read beside the sizes that names and profiles spell (Strip 30x5, PL5*30, L65/130/8,
/// 100x6.0SHS, HSS6x6x.375, 25x200 in cm), and the first keys of these rows were followed from the element's line to profile, depth and
/// material: KOKER L120/12 and POORTDORPEL of the steel job, Strip 70x10, BMR, P10, L6x4x1/2. The rafters of the house: extents of the file's own bounding box
/// 5.5 × 3.360 m give a slope of 30°, 5.5/cos 30° = 6.351 m, and 6.351·sin 30° + 0.16/cos 30° = 3.360 m. Lengths of the steel job are compared with its
/// quantity sets, sizes with names, in <see cref="CandidateTests"/>. The railings of the stairs were counted on their four different meshes: rails of twelve sides
/// (chord 10.9 mm, 42 mm across corners) and bars of eight (chord 8.4 mm, 22 mm), 6 + 16, 6 + 16, 4 + 1 and 5 + 10, in 4, 3, 5 and 1 railings; the
/// mesh of 4 + 1 has rails of 883 mm between mitres at middle lines 883 mm apart, so its bar too is 883 mm long. One rail of seven railings is 126 mm, less than three
/// times its section. The pipes spell their sizes: BUIS160/1, BUIS110/1.
/// </remarks>
public sealed partial class GoldenTableTests
{
    public static TheoryData<string> Files =>
    [
        "balcony-railings-ifc2x3.ifc", "carwash-steel-ifc2x3.ifc", "columns-on-grid-ifc4x3.ifc", "concrete-frame-spanish-ifc2x3.ifc", "house-german-ifc4.ifc",
        "members-mirrored-profiles-inch-ifc4.ifc", "stair-railings-ifc2x3.ifczip", "steel-frame-drawn-sections-ifc2x3.ifc",
    ];

    [Theory]
    [MemberData(nameof(Files))]
    public void Members_sections_lengths_materials_and_reasons_are_those_reviewed(string file)
    {
        var lines = Table(Reading.Of(ModelContainer.Read(OpenModel.Path(file)).Bytes, new ReadingRules { RecogniseMeshes = true }).Catalog.Members);

        var reviewed = Reviewed(file);
        if (!lines.SequenceEqual(reviewed, StringComparer.Ordinal)) Keep(file, lines);
        Assert.Equal(reviewed, lines);
    }

    private static string[] Table(IEnumerable<Member> members) =>
    [
        .. members.GroupBy(m => (Head: $"{m.Element.Class} '{Stem(m.Element.Name)}'", Section: SectionOf(m), Material: m.Material.Name, Source: SourceOf(m)))
            .Select(g => string.Create(CultureInfo.InvariantCulture, $"{g.Count()} x {g.Key.Head} | {g.Key.Section} | {Lengths(g)} | {(g.Key.Material.Length > 0 ? g.Key.Material : "no material")} | {g.Key.Source} | {g.First().Key}")),
    ];

    // Names that only differ by a number at their end are one.
    private static string Stem(string name) => Number().Replace(name, "");

    private static string SectionOf(Member member) => member.Section.TryGet(out var found, out var why)
        ? string.Join(" and ", found.Value.Shapes.Select(s => s.Designation))
        : why.Code.Text();

    private static string SourceOf(Member member)
    {
        var words = member.Section.TryGet(out var found, out var why) ? found.Source : why.Message;
        return Steps().Replace(Deviation().Replace(words, ""), "");
    }

    private static string Lengths(IEnumerable<Member> members)
    {
        var lengths = members.Select(m => (m.Length as Finding<double>.Found)?.Value).Where(l => l is not null).Select(l => l!.Value).ToList();
        if (lengths.Count == 0) return "no length";

        var (least, most) = (Math.Round(lengths.Min(), 3), Math.Round(lengths.Max(), 3));
        return least == most ? string.Create(CultureInfo.InvariantCulture, $"{least} m") : string.Create(CultureInfo.InvariantCulture, $"{least} to {most} m");
    }

    internal static string[] Reviewed(string file)
    {
        using var stream = typeof(GoldenTableTests).Assembly.GetManifestResourceStream($"Golden/{file}.txt");
        if (stream is null) return [];

        using var reader = new StreamReader(stream);
        return reader.ReadToEnd().Split('\n', StringSplitOptions.RemoveEmptyEntries);
    }

    internal static void Keep(string file, IEnumerable<string> lines)
    {
        var folder = Directory.CreateDirectory(Path.Combine(AppContext.BaseDirectory, "golden-found"));
        File.WriteAllText(Path.Combine(folder.FullName, file + ".txt"), string.Join('\n', lines) + "\n");
    }

    [GeneratedRegex(" ?[:-] ?[0-9]+$")]
    private static partial Regex Number();

    [GeneratedRegex(" #[0-9]+")]
    private static partial Regex Steps();

    [GeneratedRegex(", largest deviation [0-9.]+ mm")]
    private static partial Regex Deviation();
}
