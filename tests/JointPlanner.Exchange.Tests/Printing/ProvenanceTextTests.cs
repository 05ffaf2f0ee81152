using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Exchange.Tests.Printing;

public class ProvenanceTextTests
{
    [Theory]
    [InlineData(Mark.Seen, "A code, 2003, 6.1.3")]
    [InlineData(Mark.Memory, "A code, 2003, 6.1.3 (from memory, check against the licensed text)")]
    [InlineData(Mark.Own, "our own proposal, not published: A code, 2003, 6.1.3")]
    [InlineData(Mark.Given, "given by designer or owner: A code, 2003, 6.1.3")]
    public void Each_mark_says_in_words_how_surely_a_value_is_known(Mark mark, string text) =>
        Assert.Equal(text, ProvenanceText.Of(new(mark, "A code", "2003", "6.1.3")));

    [Fact]
    public void A_derivation_says_its_reasoning_alone() =>
        Assert.Equal("our own derivation: movements add", ProvenanceText.Of(Provenance.Derived("movements add")));
}
