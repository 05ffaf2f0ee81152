namespace JointPlanner.Pictures.Tests;

public class PictureTests
{
    [Theory]
    [InlineData(0, 10)]
    [InlineData(10, -1)]
    [InlineData(double.NaN, 10)]
    [InlineData(10, double.PositiveInfinity)]
    public void A_picture_without_a_size_is_refused(double width, double height) =>
        Assert.Throws<ArgumentException>(() => new Picture(width, height, "Elevation", "", []));

    [Fact]
    public void A_picture_without_a_title_is_refused() => Assert.Throws<ArgumentException>(() => new Picture(10, 10, " ", "", []));
}
