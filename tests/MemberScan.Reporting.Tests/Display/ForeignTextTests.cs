using MemberScan.Reporting.Display;

namespace MemberScan.Reporting.Tests.Display;

public sealed class ForeignTextTests
{
    [Theory]
    [InlineData("Geländer 渡船 🛥 \"x\" <b>", "Geländer 渡船 🛥 \"x\" <b>")]
    [InlineData("\u2067a\u0085b\u2028c\uFEFF", "⟨U+2067⟩a⟨U+0085⟩b⟨U+2028⟩c⟨U+FEFF⟩")]
    [InlineData("\u007F\u0007", "␡␇")]
    public void Makes_visible_what_would_act_unseen(string text, string expected) => Assert.Equal(expected, ForeignText.Visible(text));

    [Fact]
    public void Spells_out_half_a_character() => Assert.Equal("a⟨U+D83D⟩b⟨U+DEE5⟩", ForeignText.Visible("a\uD83Db\uDEE5"));

    [Fact]
    public void Never_cuts_a_character_in_half()
    {
        var text = new string('x', ForeignText.LongestName - 1) + "🛥🛥";

        Assert.Equal(new string('x', ForeignText.LongestName - 1) + "… (cut; 163 characters in all)", ForeignText.Name(text));
    }

    [Fact]
    public void Shows_nothing_for_nothing() => Assert.Equal("", ForeignText.Name(null));
}
