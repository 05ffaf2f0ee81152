using JointPlanner.Issuing.Setting;

namespace JointPlanner.Issuing.Tests.Setting;

public sealed class SiteTimeTests
{
    private static readonly SiteTime Oslo = new("Europe/Oslo");

    [Fact]
    public void An_instant_is_shown_by_the_clock_of_the_place_with_its_zone() =>
        Assert.Equal("2031-05-04 06:10 Europe/Oslo", Oslo.Moment(new DateTimeOffset(2031, 5, 4, 4, 10, 0, TimeSpan.Zero)));

    [Fact]
    public void A_clock_reading_becomes_the_instant_and_back()
    {
        var instant = Oslo.Instant("2031-01-15T23:30")!.Value;
        Assert.Equal((TimeSpan.Zero, new DateTime(2031, 1, 15, 22, 30, 0)), (instant.Offset, instant.DateTime));
        Assert.Equal("2031-01-15T23:30", Oslo.Clock(instant));
    }

    // Summer time in 2031 begins on 30 March and ends on 26 October: 02:30 does not exist on the first day and comes twice on the second.
    [Theory]
    [InlineData("2031-03-30T02:30")]
    [InlineData("yesterday")]
    [InlineData("")]
    [InlineData(null)]
    public void A_reading_that_does_not_exist_is_none(string? clock) => Assert.Null(Oslo.Instant(clock));

    [Fact]
    public void Of_an_hour_that_comes_twice_the_earlier_is_meant() =>
        Assert.Equal(new DateTime(2031, 10, 26, 0, 30, 0), Oslo.Instant("2031-10-26T02:30")!.Value.UtcDateTime);
}
