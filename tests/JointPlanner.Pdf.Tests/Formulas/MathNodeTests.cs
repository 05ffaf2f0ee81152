namespace JointPlanner.Pdf.Tests.Formulas;

public class MathNodeTests
{
    private static readonly MathNode A = MathNode.Variable("a"), B = MathNode.Variable("b"), Two = MathNode.Upright("2"), Plus = MathNode.Operator("+");

    public static TheoryData<MathNode, string> Lines => new()
    {
        { MathNode.Row(A, Plus, B), "a + b" },
        { new Fraction(A, B), "a/b" },
        { new Fraction(MathNode.Row(A, Plus, B), MathNode.Row(Two, MathNode.Operator("·"), B)), "(a + b)/(2 · b)" },
        { new Fraction(new Fraction(A, B), Two), "(a/b)/2" },
        { new Script(A, null, Two), "a^2" },
        { new Script(MathNode.Upright("10"), null, MathNode.Upright("−6")), "10^−6" },
        { new Script(new Script(A, null, Two), null, B), "(a^2)^b" },
        { new Script(MathNode.Row(A, Plus, B), null, Two), "(a + b)^2" },
        { new Script(MathNode.Indexed("T", "max"), null, Two), "T_max^2" },
        { MathNode.Indexed("T", "e,max"), "T_(e,max)" },
        { new Root(MathNode.Row(A, Plus, B)), "√(a + b)" },
        { new Parentheses(MathNode.Row(A, Plus, B)), "(a + b)" },
        { new Script(new Parentheses(A), null, Two), "(a)^2" },
    };

    [Theory]
    [MemberData(nameof(Lines))]
    public void The_line_form_says_the_same_as_the_set_form(MathNode node, string line) => Assert.Equal(line, node.Linear);
}
