namespace JointPlanner.Engine.Formulas;

/// <summary>
/// The flat list of steps of one calculation, in order of making. Shared values are computed and listed once. A derivation that does
/// not keep steps computes through the same delegates, so both ways give the same bits.
/// </summary>
public sealed class Derivation
{
    private readonly List<Step>? steps;
    private readonly Dictionary<string, Number> given = [];
    private readonly Dictionary<string, Number> shared = [];
    private readonly List<Finding> findings = [];

    /// <summary>A derivation that keeps its steps, or only computes.</summary>
    public Derivation(bool keepsSteps = true) => steps = keepsSteps ? [] : null;

    /// <summary>A derivation that goes on from steps made before, so that a number computed without steps can be explained afterwards. The steps it starts from are copied.</summary>
    /// <param name="made">Steps of a finished calculation.</param>
    public static Derivation Continuing(IReadOnlyList<Step> made)
    {
        var going = new Derivation();
        going.steps!.AddRange(made);
        foreach (var step in made)
            if (step.Origin is GivenOrigin { Path: var path }) going.given.TryAdd(path, new Number(step.Index, step.Value));
        return going;
    }

    /// <summary>Steps in order of making; empty where they are not kept.</summary>
    public IReadOnlyList<Step> Steps => steps ?? [];

    /// <summary>What a person must know about this calculation.</summary>
    public IReadOnlyList<Finding> Findings => findings;

    /// <summary>True when steps are kept.</summary>
    public bool KeepsSteps => steps is not null;

    /// <summary>Notes a finding.</summary>
    public void Note(Finding finding) => findings.Add(finding);

    /// <summary>A value of the plan or rule set. Asking twice for one path gives one step.</summary>
    public Number Given(string path, string symbol, string meaning, Quantity quantity, double value, string source = "", bool isDefault = false)
    {
        if (given.TryGetValue(path, out var known) && known.Value.Equals(value)) return known;
        return given[path] = Add(symbol, meaning, quantity, value, new GivenOrigin(path, source, isDefault), "");
    }

    /// <summary>A value read from a table or clause.</summary>
    public Number Table(string symbol, string meaning, Quantity quantity, double value, Provenance source, string row) =>
        Add(symbol, meaning, quantity, value, new TableOrigin(source, row), "");

    /// <summary>One use of a formula.</summary>
    /// <param name="formula">The formula.</param>
    /// <param name="key">Result key, or empty for an intermediate value.</param>
    /// <param name="operands">Earlier values, in the formula's order.</param>
    /// <exception cref="NotFiniteException">The result is not a number; the finding names the step.</exception>
    public Number Use(Formula formula, string key, params Number[] operands)
    {
        var value = formula.Compute(Array.ConvertAll(operands, o => o.Value));
        return Add(formula.Symbol, formula.Meaning, formula.Quantity, value,
            new FormulaOrigin(formula, Array.ConvertAll(operands, o => o.Step)), key);
    }

    /// <summary>One use of a formula that several components ask for: with the same operands it is listed once.</summary>
    /// <exception cref="NotFiniteException">The result is not a number; the finding names the step.</exception>
    public Number Once(Formula formula, params Number[] operands) =>
        Shared($"{formula.Id}({string.Join(',', operands.Select(o => o.Step))})", () => Use(formula, "", operands));

    /// <summary>A table value that several components ask for, listed once.</summary>
    public Number TableOnce(string symbol, string meaning, Quantity quantity, double value, Provenance source, string row) =>
        Shared(FormattableString.Invariant($"{source.Document}/{source.Edition}/{source.Place}/{row}/{symbol}/{value:R}"), () => Table(symbol, meaning, quantity, value, source, row));

    private Number Shared(string key, Func<Number> make)
    {
        if (steps is null) return make();
        return shared.TryGetValue(key, out var known) ? known : shared[key] = make();
    }

    /// <summary>An unknown of a solved model.</summary>
    public Number Solved(string key, string symbol, string meaning, Quantity quantity, double value, string model, double residual, params Number[] from) =>
        Add(symbol, meaning, quantity, value, new SolvedOrigin(model, residual, Array.ConvertAll(from, o => o.Step)), key);

    /// <summary>A choice among candidates.</summary>
    public Number Search(string key, string symbol, string meaning, Quantity quantity, double value, IReadOnlyList<Candidate> candidates, params Number[] from) =>
        Add(symbol, meaning, quantity, value, new SearchOrigin(candidates, Array.ConvertAll(from, o => o.Step)), key);

    private Number Add(string symbol, string meaning, Quantity quantity, double value, Origin origin, string key)
    {
        if (!double.IsFinite(value)) throw new NotFiniteException(symbol, meaning);
        if (steps is null) return new Number(-1, value);
        steps.Add(new Step(steps.Count, symbol, meaning, quantity, value, origin, key));
        return new Number(steps.Count - 1, value);
    }
}

/// <summary>A step whose result is infinite or not a number: a finding, never a printed value.</summary>
public sealed class NotFiniteException(string symbol, string meaning)
    : Exception($"{symbol} ({meaning}) has no finite value for these inputs.");
