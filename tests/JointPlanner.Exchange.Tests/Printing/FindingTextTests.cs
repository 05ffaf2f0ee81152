using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Exchange.Tests.Printing;

public class FindingTextTests
{
    private static readonly Finding Narrow = new("test.narrow", Severity.Warning, "joints/j1",
        "At {1} the gap of {0} is too narrow.", [(Quantity.Opening, 0.0254), (Quantity.Temperature, -10)]);

    [Fact]
    public void Numbers_go_into_the_sentence_in_the_readers_units()
    {
        Assert.Equal("At −10.0 °C the gap of 25.4 mm is too narrow.", FindingText.Of(Narrow, DisplayProfile.Metric));
        Assert.Equal("At 14.0 °F the gap of 1.000 in is too narrow.", FindingText.Of(Narrow, DisplayProfile.Us));
    }

    [Fact]
    public void A_sentence_without_numbers_may_hold_braces() =>
        Assert.Equal("as {is}", FindingText.Of(new Finding("test.plain", Severity.Note, "", "as {is}"), DisplayProfile.Metric));

    [Fact]
    public void A_place_without_a_number_is_a_fault_of_the_sentence() =>
        Assert.Throws<FormatException>(() => FindingText.Of(Narrow with { Template = "{2}" }, DisplayProfile.Metric));
}
