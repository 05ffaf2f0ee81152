using System.Globalization;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Exchange.Tests.Printing;

public class NumberTextTests
{
    [Theory]
    [InlineData(42.5, "length", "42.500 m", "139.436 ft")]
    [InlineData(-0.0179, "movement", "−17.9 mm", "−0.705 in")]
    [InlineData(-18, "temperature", "−18.0 °C", "−0.4 °F")]
    [InlineData(10, "temperature-difference", "10.0 K", "18.0 °F")]
    [InlineData(11.7e-6, "expansion", "11.7×10⁻⁶ /K", "6.50×10⁻⁶ /°F")]
    [InlineData(0.00035, "strain", "350.0×10⁻⁶", "350.0×10⁻⁶")]
    [InlineData(Math.PI / 12, "angle", "15.00°", "15.00°")]
    [InlineData(4448.2216152605, "force", "4.4 kN", "1.0 kip")]
    [InlineData(2592000, "age", "30 d", "30 d")]
    [InlineData(5e7, "stiffness", "50.00 kN/mm", "285.5 kip/in")]
    [InlineData(1e-13, "flexibility", "1.000×10⁻⁷ mm/kN", "1.751×10⁻⁸ in/kip")]
    [InlineData(-1e-9, "movement", "0.0 mm", "0.000 in")]
    public void A_value_shows_in_the_units_and_digits_of_each_profile(double si, string quantity, string metric, string us)
    {
        var kind = Quantity.All.Single(q => q.Id == quantity);
        Assert.Equal(metric, NumberText.WithUnit(si, kind, DisplayProfile.Metric));
        Assert.Equal(us, NumberText.WithUnit(si, kind, DisplayProfile.Us));
    }

    [Fact]
    public void Rounding_up_to_the_next_power_of_ten_keeps_the_number_of_digits() =>
        Assert.Equal("10.00 kN/mm", NumberText.WithUnit(9.9996e6, Quantity.Stiffness, DisplayProfile.Metric));

    [Fact]
    public void Digits_before_the_decimal_point_are_never_rounded_away() =>
        Assert.Equal("123457 MN", NumberText.WithUnit(1.23456789e11, Quantity.AxialStiffness, DisplayProfile.Metric));

    [Theory]
    [InlineData(12345.6789, "12\u2009345.679")]
    [InlineData(-1234567.8, "−1\u2009234\u2009567.800")]
    [InlineData(1234.5, "1234.500")]
    public void Sheets_group_figures_by_thin_spaces_from_five_on(double si, string text) =>
        Assert.Equal(text, NumberText.Of(si, Quantity.Length, DisplayProfile.Metric, NumberStyle.Sheet));

    [Theory]
    [InlineData(-12345.5, "length", "-12345.500")]
    [InlineData(12e-6, "expansion", "12.0e-6")]
    public void Files_keep_plain_characters(double si, string quantity, string text) =>
        Assert.Equal(text, NumberText.Of(si, Quantity.All.Single(q => q.Id == quantity), DisplayProfile.Metric, NumberStyle.File));

    [Fact]
    public void The_machines_culture_changes_nothing()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            Assert.Equal("−1234.500 m", NumberText.WithUnit(-1234.5, Quantity.Length, DisplayProfile.Metric));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Every_kind_of_quantity_has_a_fitting_unit_in_every_profile() =>
        Assert.All(DisplayProfile.All, profile => Assert.All(Quantity.All, quantity =>
        {
            var unit = profile[quantity].Unit;
            Assert.Equal(quantity.Dimension, unit.Dimension);
            Assert.Equal(quantity.IsReading, unit.IsReading);
        }));

    [Fact]
    public void An_unknown_profile_is_refused_with_the_known_ones() =>
        Assert.Contains("metric and us", Assert.Throws<ArgumentException>(() => DisplayProfile.Of("imperial")).Message, StringComparison.Ordinal);
}
