using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Materials;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.Tests.Materials;

public sealed class GradeTableTests
{
    [Theory]
    [InlineData("S235JR", "S235")]
    [InlineData("S235JRG2", "S235")]
    [InlineData("S 235 JR", "S235")]
    [InlineData("s235", "S235")]
    [InlineData("  S235  ", "S235")]
    [InlineData("Steel S235JR", "S235")]
    [InlineData("Stahl: S235", "S235")]
    [InlineData("S235JR EN 10025-2", "S235")]
    [InlineData("S275J0", "S275")]
    [InlineData("S355J2+N", "S355")]
    [InlineData("S355 J2G3", "S355")]
    [InlineData("S355JO", "S355")]
    [InlineData("S355K2+AR", "S355")]
    [InlineData("S450J0", "S450")]
    [InlineData("S235JRH", "S235H")]
    [InlineData("S275J2H", "S275H")]
    [InlineData("S275NH", "S275NH")]
    [InlineData("S275MLH", "S275NH")]
    [InlineData("S355J2H", "S355H")]
    [InlineData("S 355 J0H", "S355H")]
    [InlineData("S355J2H EN 10219-1", "S355H")]
    [InlineData("S420MH", "S420MH")]
    [InlineData("S460NH", "S460NH")]
    [InlineData("1.4301", "1.4301")]
    [InlineData("X5CrNi18-10", "1.4301")]
    [InlineData("Stainless steel 1.4404", "1.4404")]
    [InlineData("1.4401 (X5CrNiMo17-12-2)", "1.4401")]
    [InlineData("ASTM A36", "A36")]
    [InlineData("A36", "A36")]
    [InlineData("A36/A36M", "A36")]
    [InlineData("A500 Gr. B", "A500 Gr B")]
    [InlineData("ASTM A500 Grade C", "A500 Gr C")]
    [InlineData("A500-B", "A500 Gr B")]
    [InlineData("A53 Grade B", "A53 Gr B")]
    [InlineData("ASTM A53 Type E, Gr. B", "A53 Gr B")]
    [InlineData("A992", "A992")]
    [InlineData("A992 Gr 50", "A992")]
    [InlineData("ASTM A1085", "A1085")]
    [InlineData("A572 Gr 50", "A572 Gr 50")]
    [InlineData("A572-50", "A572 Gr 50")]
    [InlineData("EN AW-6063 T6", "EN AW-6063 T6")]
    [InlineData("EN AW-6063 T66", "EN AW-6063 T66")]
    [InlineData("Aluminium EN AW-6060 T66", "EN AW-6060 T66")]
    [InlineData("AW 6082-T6", "EN AW-6082 T6")]
    [InlineData("EN AW-6082 T6 (unwelded)", "EN AW-6082 T6 unwelded")]
    [InlineData("6061-T6", "6061-T6")]
    [InlineData("Aluminum 6063-T5", "6063-T5")]
    [InlineData("6061-T6 unwelded", "6061-T6 unwelded")]
    public void A_material_name_finds_its_grade(string name, string expected)
    {
        Assert.Equal(expected, GradeTable.Shipped.Find(name)?.Name);
    }

    [Theory]
    [InlineData("")]
    [InlineData("S")]
    [InlineData("Steel")]
    [InlineData("Stahl")]
    [InlineData("Stainless steel")]
    [InlineData("A")]
    [InlineData("ASTM")]
    [InlineData("235")]
    [InlineData("S2355")]
    [InlineData("S235 or S355")]
    [InlineData("S355J2W")]
    [InlineData("S355N")]
    [InlineData("A500")]
    [InlineData("A572")]
    [InlineData("A572 Gr 65")]
    [InlineData("A53 Gr A")]
    [InlineData("1a4301")]
    [InlineData("Aluminium")]
    [InlineData("EN AW-6063")]
    [InlineData("6061")]
    [InlineData("Concrete C30/37")]
    [InlineData("S235JR\nS355")]
    public void A_plain_or_foreign_name_finds_none(string name)
    {
        Assert.Null(GradeTable.Shipped.Find(name));
    }

    [Theory]
    // EN 10025-2:2004 table 7, from memory: S235 at 16, 40, 100 mm; S355 at 16, 40, 63, 80, 100 mm.
    [InlineData("S235", 16, 235)]
    [InlineData("S235", 16.1, 225)]
    [InlineData("S235", 100, 215)]
    [InlineData("S355", 16, 355)]
    [InlineData("S355", 40, 345)]
    [InlineData("S355", 63, 335)]
    [InlineData("S355", 80, 325)]
    [InlineData("S355", 100, 315)]
    // EN 10210-1:2006 annexes A and B, from memory.
    [InlineData("S355J2H", 12.5, 355)]
    [InlineData("S460NH", 20, 440)]
    // ASTM A36, A500, A992, from memory: 36, 42 (Grade B, round), 50 ksi; 1 ksi = 6.894757 MPa.
    [InlineData("A36", 10, 36 * 6.894757)]
    [InlineData("A36", 210, 32 * 6.894757)]
    [InlineData("A500 Gr B", 6, 42 * 6.894757)]
    [InlineData("A500 Gr C", 6, 46 * 6.894757)]
    [InlineData("A992", 6, 50 * 6.894757)]
    // EN 1999-1-1:2007 table 3.2b, from memory: 6063 T6 160 and 65 MPa, 6082 T6 250 to 5 mm, 260 to 15 mm, 125 MPa in the welded zone.
    [InlineData("EN AW-6063 T6 unwelded", 3, 160)]
    [InlineData("EN AW-6063 T6", 3, 65)]
    [InlineData("EN AW-6082 T6 unwelded", 5, 250)]
    [InlineData("EN AW-6082 T6 unwelded", 6, 260)]
    [InlineData("EN AW-6082 T6", 6, 125)]
    // Aluminum Design Manual 2015 table A.4.3, from memory: 6061-T6 35 and 15 ksi, 6063-T5 16 and 8 ksi.
    [InlineData("6061-T6 unwelded", 6, 35 * 6.8947573)]
    [InlineData("6061-T6", 6, 15 * 6.8947573)]
    [InlineData("6063-T5", 6, 8 * 6.8947573)]
    public void The_strength_follows_the_thickness(string name, double thicknessMm, double expectedMPa)
    {
        var grade = GradeTable.Shipped.Find(name)!;

        var yield = grade.Yields.First(range => Si.Mm(thicknessMm) <= range.UpTo + 1e-12).Yield;

        Assert.Equal(expectedMPa, yield / 1e6, 3);
    }

    [Fact]
    public void Every_shipped_grade_is_sound_and_marked_as_from_memory()
    {
        var grades = GradeTable.Shipped.Grades;

        Assert.True(grades.Length >= 20);
        Assert.All(grades, grade =>
        {
            Assert.True(grade.FromMemory);
            var isAluminium = grade.Standard.Contains("EN 1999", StringComparison.Ordinal) || grade.Standard.Contains("Aluminum", StringComparison.Ordinal);
            Assert.Equal(!isAluminium, grade.IsSteel);
            Assert.InRange(grade.Modulus, isAluminium ? Si.GPa(69) : Si.GPa(190), isAluminium ? Si.GPa(71) : Si.GPa(211));
            Assert.Equal(0.3, grade.Poisson);
            Assert.NotEmpty(grade.Standard);
            Assert.Equal(grade.Yields.OrderBy(range => range.UpTo), grade.Yields);
            if (grade.IsSteel) Assert.Equal(grade.Yields.OrderByDescending(range => range.Yield), grade.Yields);
        });
    }

    [Fact]
    public void Every_shipped_grade_is_found_by_its_own_name()
    {
        foreach (var grade in GradeTable.Shipped.Grades)
            Assert.Equal(grade.Name, GradeTable.Shipped.Find(grade.Name is "S235H" ? "S235JRH" : grade.Name is "S275H" or "S355H" ? grade.Name.Replace("H", "J2H", StringComparison.Ordinal) : grade.Name)?.Name);
    }

    [Fact]
    public void A_hostile_name_takes_no_unbounded_time()
    {
        var pattern = new Grade("slow", "(a+)+b", "none", [new YieldRange(1, 235e6)], 210e9, 0.3, true, false);
        var table = new GradeTable([pattern]);

        Assert.Null(table.Find(new string('a', GradePattern.LongestName)));
        Assert.Equal("slow", table.Find(new string('a', GradePattern.LongestName - 1) + "b")?.Name);
        Assert.Null(table.Find(new string('a', GradePattern.LongestName) + "b"));
    }

    [Fact]
    public void The_first_grade_that_fits_wins()
    {
        var mine = new Grade("mine", "S235.*", "own tests", [new YieldRange(1, 240e6)], 210e9, 0.3, true, false);

        var table = new GradeTable([mine, .. GradeTable.Shipped.Grades]);

        Assert.Equal("mine", table.Find("S235JR")?.Name);
    }

    [Fact]
    public void A_grades_file_without_grades_is_refused()
    {
        var diagnostics = new DiagnosticList();

        var grades = GradeTable.Read(Encoding.UTF8.GetBytes("{}"), "grades.json", diagnostics);

        Assert.Empty(grades);
        Assert.Equal("INP-0109", Assert.Single(diagnostics.Items).Code);
    }
}
