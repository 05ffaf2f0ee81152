namespace JointPlanner.Pictures.Tests;

public class PlainCharactersTests
{
    [Theory]
    [InlineData("Ångström, Łódź, ΔT ≤ 5 °C, 10⁻⁶", "Ångström, Łódź, ΔT ≤ 5 °C, 10⁻⁶")]
    [InlineData("a\u202Eb", "a[U+202E]b")]
    [InlineData("a\u0000b\tc", "a[U+0000]b[U+0009]c")]
    [InlineData("a\u2028b\u200Bc", "a[U+2028]b[U+200B]c")]
    [InlineData("A\u030A", "Å")]
    [InlineData("12\u2009345\u00A0m", "12\u2009345\u00A0m")]
    public void Invisible_characters_are_spelt_out_and_the_rest_is_left_alone(string text, string plain) =>
        Assert.Equal(plain, PlainCharacters.Of(text));

    [Fact]
    public void Half_of_a_surrogate_pair_is_spelt_out() =>
        Assert.Equal("a[U+D83D]b", PlainCharacters.Of("a" + (char)0xD83D + "b"));
}
