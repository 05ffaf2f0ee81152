using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>The figures of one size as values with their steps: those of the size cover those of the family.</summary>
/// <param name="rules">The owner's rules for the family.</param>
/// <param name="size">The size.</param>
/// <param name="derivation">Where the steps go.</param>
public sealed class RuleSetFigures(FamilyRules rules, FamilySize size, Derivation derivation)
{
    private readonly Dictionary<string, Number> known = [];

    /// <summary>Required figures that neither the size nor the family gives.</summary>
    public static IEnumerable<FamilyFigure> Missing(JointFamily family, FamilyRules rules, FamilySize size) =>
        family.Figures.Where(f => f.IsRequired && !size.Figures.ContainsKey(f.Word) && !rules.Figures.ContainsKey(f.Word));

    /// <summary>The figure as a step; null where the rule set does not give it.</summary>
    public Number? this[FamilyFigure figure]
    {
        get
        {
            if (known.TryGetValue(figure.Word, out var number)) return number;
            var ofSize = size.Figures.TryGetValue(figure.Word, out var value);
            if (!ofSize && !rules.Figures.TryGetValue(figure.Word, out value)) return null;
            return known[figure.Word] = derivation.KeepsSteps ? Step(figure, ofSize, value) : new Number(-1, value);
        }
    }

    /// <summary>A figure that the family cannot do without.</summary>
    /// <exception cref="KeyNotFoundException">The rule set does not give it; <see cref="Missing"/> tells beforehand.</exception>
    public Number Required(FamilyFigure figure) => this[figure]
        ?? throw new KeyNotFoundException($"The rules for {rules.Family} give no {figure.Word} for size {size.Name}.");

    /// <summary>The column that the figure is judged by: as the rule set says, else as the family does.</summary>
    public Column? JudgedBy(FamilyFigure figure) => Note(figure)?.JudgedBy ?? figure.JudgedBy;

    /// <summary>The direction in which the figure is measured: as the rule set says, else as the family does.</summary>
    public Measure MeasureOf(FamilyFigure figure) => Note(figure)?.Measure ?? figure.Measure ?? Measure.Normal;

    /// <summary>Where the figure comes from.</summary>
    public Provenance SourceOf(FamilyFigure figure) => Note(figure)?.Source ?? rules.Source;

    private FigureNote? Note(FamilyFigure figure) => rules.Notes.GetValueOrDefault(figure.Word);

    private Number Step(FamilyFigure figure, bool ofSize, double value)
    {
        var path = ofSize ? $"owner-rules/families/{rules.Family}/sizes/{size.Name}/{figure.Word}" : $"owner-rules/families/{rules.Family}/{figure.Word}";
        var source = SourceOf(figure);
        return derivation.Given(path, figure.Symbol, figure.Meaning, figure.Quantity, value, $"{source.Document} {source.Edition} {source.Place}".Trim());
    }
}
