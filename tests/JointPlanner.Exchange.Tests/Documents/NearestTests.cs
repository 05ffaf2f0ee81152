using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Tests.Documents;

public sealed class NearestTests
{
    [Theory]
    [InlineData("staton", "station")]
    [InlineData("Station", "station")]
    [InlineData("markk", "mark")]
    [InlineData("xyz", null)]
    [InlineData("", null)]
    public void The_word_with_the_fewest_letters_to_change_is_offered(string typed, string? offered) =>
        Assert.Equal(offered, Nearest.Of(typed, ["station", "kind", "mark", "stiffness"]));

    [Fact]
    public void A_very_long_word_is_near_to_nothing() => Assert.Null(Nearest.Of(new string('a', 101), [new string('a', 101)]));
}
