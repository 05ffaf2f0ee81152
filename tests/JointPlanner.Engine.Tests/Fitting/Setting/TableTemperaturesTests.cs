using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Setting;

public sealed class TableTemperaturesTests
{
    [Fact]
    public void Rows_asked_for_from_end_to_end_are_given_even_beyond_the_range()
    {
        var rows = TableTemperatures.Of(new SettingTableRequest { From = F(-30), To = F(120), Step = 10 / 1.8 }, F(-10), F(110));

        Assert.Equal(Enumerable.Range(-3, 16).Select(i => 10.0 * i), rows.Select(t => Math.Round((t * 1.8) + 32, 9)));
    }

    [Fact]
    public void Without_ends_the_rows_lie_on_whole_steps_between_the_ends_of_the_range() =>
        Assert.Equal([-13.5, -10, -5, 0, 5, 10, 15, 20, 25, 30, 35, 38.5], TableTemperatures.Of(new SettingTableRequest { Step = 5 }, -13.5, 38.5));

    [Fact]
    public void Whole_steps_in_Fahrenheit_lie_on_that_scale()
    {
        var rows = TableTemperatures.Of(new SettingTableRequest { Step = 10 / 1.8 }, F(5), F(38));

        Assert.Equal([5, 10, 20, 30, 38], rows.Select(t => Math.Round((t * 1.8) + 32, 9)));
    }

    [Fact]
    public void A_range_from_whole_step_to_whole_step_has_no_row_twice() =>
        Assert.Equal([-10, 0, 10], TableTemperatures.Of(new SettingTableRequest { Step = 10 }, -10, 10));

    [Fact]
    public void A_range_narrower_than_a_step_has_its_two_ends() =>
        Assert.Equal([11, 14], TableTemperatures.Of(new SettingTableRequest { Step = 10 }, 11, 14));
}
