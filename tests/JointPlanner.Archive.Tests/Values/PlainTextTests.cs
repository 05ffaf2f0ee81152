using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Tests.Values;

public class PlainTextTests
{
    [Theory]
    [InlineData("\u202E", "U+202E")]
    [InlineData("\u2066", "U+2066")]
    [InlineData("\0", "U+0000")]
    [InlineData("\u001B", "U+001B")]
    public void Characters_that_hide_what_is_written_are_refused_by_name(string character, string name)
    {
        var refusal = Assert.Throws<ActRefused>(() => PlainText.Required("remark", $"a{character}b", 10));
        Assert.Equal(RefusalReason.TextForbidden, refusal.Reason);
        Assert.Contains(name, refusal.Message, StringComparison.Ordinal);
        Assert.Contains("\"remark\"", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Half_a_character_is_refused() =>
        Assert.Equal(RefusalReason.TextForbidden, Assert.Throws<ActRefused>(() => PlainText.Required("name", "a\uD800b", 10)).Reason);

    [Fact]
    public void Text_is_kept_composed_and_trimmed() => Assert.Equal("é\nß 漢 𝛼", PlainText.Required("name", "  e\u0301\nß 漢 𝛼 ", 20));

    [Fact]
    public void A_text_over_the_limit_is_refused_and_one_at_it_is_not()
    {
        Assert.Equal("abcde", PlainText.Required("name", "abcde", 5));
        Assert.Equal(RefusalReason.TextTooLong, Assert.Throws<ActRefused>(() => PlainText.Required("name", "abcdef", 5)).Reason);
    }

    /// <summary>SHA-256 of "abc": FIPS 180-2, Secure Hash Standard, appendix B.1 (from memory).</summary>
    [Fact]
    public void A_hash_is_sha_256_in_small_hexadecimal() =>
        Assert.Equal("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad", Fingerprint.Of("abc"));

    [Fact]
    public void A_text_that_has_no_utf_8_bytes_has_no_hash() => Assert.Throws<System.Text.EncoderFallbackException>(() => Fingerprint.Of("a\uD800"));
}
