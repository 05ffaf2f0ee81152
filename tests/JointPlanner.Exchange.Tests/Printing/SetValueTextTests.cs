using JointPlanner.Exchange.Printing;

namespace JointPlanner.Exchange.Tests.Printing;

public class SetValueTextTests
{
    [Theory]
    [InlineData(1.875, "1 7/8 in")]
    [InlineData(1.9375, "1 15/16 in")]
    [InlineData(1.03125, "1 1/32 in")]
    [InlineData(2, "2 in")]
    [InlineData(0.5, "1/2 in")]
    [InlineData(0, "0 in")]
    [InlineData(-0.25, "−1/4 in")]
    [InlineData(1.9, "1.900 in")]
    public void Inches_that_a_ruler_carries_become_fractions(double inches, string text) =>
        Assert.Equal(text, SetValueText.Of(inches * 0.0254, DisplayProfile.Us));

    [Fact]
    public void Millimetres_keep_their_decimal() => Assert.Equal("38.0 mm", SetValueText.Of(0.038, DisplayProfile.Metric));
}
