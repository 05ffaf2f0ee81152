using System.Linq.Expressions;
using Tree = System.Linq.Expressions.Expression;

namespace JointPlanner.Engine.Formulas;

/// <summary>Turns an expression into a delegate over plain doubles, in the order of the formula's operands.</summary>
internal static class Compiler
{
    public static Func<double[], double> Compile(Expression body, IReadOnlyList<Operand> operands)
    {
        var values = Tree.Parameter(typeof(double[]), "values");
        return Tree.Lambda<Func<double[], double>>(Translate(body, operands, values), values).Compile();
    }

    /// <summary>The comparison of a choice alone.</summary>
    public static Func<double[], bool> CompileComparison(Choice choice, IReadOnlyList<Operand> operands)
    {
        var values = Tree.Parameter(typeof(double[]), "values");
        var one = new Choice(choice.Left, choice.Relation, choice.Right, 1, 0);
        var decides = Tree.Lambda<Func<double[], double>>(Translate(one, operands, values), values).Compile();
        return given => decides(given) > 0;
    }

    private static Tree Translate(Expression body, IReadOnlyList<Operand> operands, ParameterExpression values)
    {
        return Visit(body);

        Tree Visit(Expression e) => e switch
        {
            Operand o => Tree.ArrayIndex(values, Tree.Constant(IndexOf(o))),
            Constant c => Tree.Constant(c.Value),
            Zero => Tree.Constant(0.0),
            Binary { Sign: '+' } b => Tree.Add(Visit(b.Left), Visit(b.Right)),
            Binary { Sign: '−' } b => Tree.Subtract(Visit(b.Left), Visit(b.Right)),
            Binary { Sign: '·' } b => Tree.Multiply(Visit(b.Left), Visit(b.Right)),
            Binary { Sign: '/' } b => Tree.Divide(Visit(b.Left), Visit(b.Right)),
            Powered p => Call(nameof(Arithmetic.Power), Visit(p.Base), Tree.Constant(p.Exponent)),
            RaisedTo p => Call(nameof(Arithmetic.ToThe), Visit(p.Base), Visit(p.Exponent)),
            Function { Name: "exp" } f => Call(nameof(Arithmetic.Exp), Visit(f.Argument)),
            Function { Name: "ln" } f => Call(nameof(Arithmetic.Ln), Visit(f.Argument)),
            Function { Name: "√" } f => Call(nameof(Arithmetic.Root), Visit(f.Argument)),
            Function { Name: "cos" } f => Call(nameof(Arithmetic.Cos), Visit(f.Argument)),
            Function { Name: "sin" } f => Call(nameof(Arithmetic.Sin), Visit(f.Argument)),
            Function { Name: "tanh" } f => Call(nameof(Arithmetic.Tanh), Visit(f.Argument)),
            Extreme x => Call(x.IsLarger ? nameof(Arithmetic.Larger) : nameof(Arithmetic.Smaller), Visit(x.Left), Visit(x.Right)),
            Aggregate a => Call(a.Kind.ToString(), values, Tree.Constant(IndexOf(a.Each))),
            Rounded r => Call(nameof(Arithmetic.RoundTo), Visit(r.Value), Visit(r.Step), Tree.Constant(r.Rounding)),
            Choice c => Tree.Condition(Compare(c), Visit(c.Then), Visit(c.Otherwise)),
            Measured m => Tree.Divide(Visit(m.Value), Tree.Constant(m.Unit.Factor)),
            _ => throw new ArgumentException($"No rule to compute {e.GetType().Name}."),
        };

        Tree Compare(Choice c) => c.Relation switch
        {
            Relation.AtMost => Tree.LessThanOrEqual(Visit(c.Left), Visit(c.Right)),
            Relation.AtLeast => Tree.GreaterThanOrEqual(Visit(c.Left), Visit(c.Right)),
            Relation.Below => Tree.LessThan(Visit(c.Left), Visit(c.Right)),
            Relation.Above => Tree.GreaterThan(Visit(c.Left), Visit(c.Right)),
            _ => throw new ArgumentException($"Unknown relation {c.Relation}."),
        };

        int IndexOf(Operand o)
        {
            for (var i = 0; i < operands.Count; i++)
                if (ReferenceEquals(operands[i], o)) return i;
            throw new ArgumentException($"Operand {o.Symbol} is not listed with the formula.");
        }
    }

    private static MethodCallExpression Call(string name, params Tree[] arguments) =>
        Tree.Call(typeof(Arithmetic).GetMethod(name) ?? throw new ArgumentException($"No arithmetic called {name}."), arguments);
}
