using MemberScan.Inputs.Outlines;

namespace MemberScan.Inputs.Tests.Outlines;

public sealed class OutlineTextTests
{
    [Fact]
    public void A_plate_with_a_round_hole_and_a_round_end_is_read()
    {
        const string Json = """
            {
              // a half circle closes the right end
              "unit": "mm",
              "outer": { "points": [[0, 0], [60, 0, 1], [60, 40], [0, 40]] },
              "holes": [{ "circle": [50, 20, 8] }],
            }
            """;

        var read = OutlineText.TryParse(Json, "lug", out var section, out var error);

        Assert.True(read, error);
        Assert.Equal("outline lug", section!.Designation);
        Assert.Equal(0.080, section.ExtentY, 1e-12);
        Assert.Equal(2, section.Rings.Length);
    }

    [Theory]
    [InlineData("", "line 1, column 1 of the outline file is not understood; write unit, outer and holes as the README shows")]
    [InlineData("null", "the outline file holds nothing; write a unit and an outer ring")]
    [InlineData("""{ "unit": "mm" }""", "of the outline file is not understood")]
    [InlineData("""{ "unit": "mm", "outer": { "points": [[0, 0], [1, 0], [0, 1]] }, "colour": 1 }""", "of the outline file is not understood")]
    [InlineData("""{ "unit": "mm", "unit": "m", "outer": { "points": [[0, 0], [1, 0], [0, 1]] } }""", "of the outline file is not understood")]
    [InlineData("""{ "unit": "kN", "outer": { "points": [[0, 0], [1, 0], [0, 1]] } }""", "'kN' is a unit of force, not of length")]
    [InlineData("""{ "unit": "mm", "outer": { "points": [[0, 0], [1], [0, 1]] } }""", "a ring needs either points")]
    [InlineData("""{ "unit": "mm", "outer": { "points": [[0, 0], null, [0, 1]] } }""", "a ring needs either points")]
    [InlineData("""{ "unit": "mm", "outer": { } }""", "a ring needs either points")]
    [InlineData("""{ "unit": "mm", "outer": { "circle": [0, 0, 0] } }""", "the radius of a circle is not above zero")]
    [InlineData("""{ "unit": "mm", "outer": { "points": [[0, 0], [1, 1], [1, 0], [0, 1]] } }""", "the outline crosses itself")]
    [InlineData("""{ "unit": "mm", "outer": { "circle": [0, 0, 5] }, "holes": [null] }""", "a ring needs either points")]
    public void A_wrong_file_is_refused_with_the_remedy(string json, string words)
    {
        var read = OutlineText.TryParse(json, "x", out var section, out var error);

        Assert.False(read);
        Assert.Null(section);
        Assert.Contains(words, error, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_that_is_too_long_is_refused()
    {
        Assert.False(OutlineText.TryParse(new string(' ', OutlineText.LongestText + 1), "x", out _, out var error));

        Assert.Contains("longer than", error, StringComparison.Ordinal);
    }
}
