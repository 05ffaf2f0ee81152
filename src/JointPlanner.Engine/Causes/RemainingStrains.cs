using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Causes;

/// <summary>
/// What each deck segment still shortens by after a setting state, cause by cause: by a model from its concrete, or by the designer's own
/// strain and development.
/// </summary>
public sealed class RemainingStrains
{
    /// <summary>The causes, in the order of the movement table.</summary>
    public static readonly ImmutableArray<Cause> Causes = [Cause.Creep, Cause.Shrinkage, Cause.Prestress];

    private readonly Plan plan;
    private readonly CodeBasis basis;
    private readonly IReadOnlyList<CreepModel> models;

    /// <summary>Strains of a plan's segments.</summary>
    /// <param name="plan">The plan.</param>
    /// <param name="basis">The basis; its own model serves where the plan names none.</param>
    /// <param name="models">Models that the plan may name.</param>
    public RemainingStrains(Plan plan, CodeBasis basis, IReadOnlyList<CreepModel> models) => (this.plan, this.basis, this.models) = (plan, basis, models);

    /// <summary>True where the plan says enough of the segment for this cause to be computed.</summary>
    public static bool Has(Cause cause, Segment segment) => cause switch
    {
        Cause.Creep => segment.Creep is not null || segment.Concrete is { Stages.IsEmpty: false },
        Cause.Shrinkage => segment.Shrinkage is not null || segment.Concrete is not null,
        Cause.Prestress => segment.Concrete is { Stages.IsEmpty: false },
        _ => false,
    };

    /// <summary>Strain of a segment still to come, shortening positive; null where this cause brings none.</summary>
    /// <param name="cause">Creep, shrinkage or prestress (the elastic strain of stresses still to come).</param>
    /// <param name="segment">The segment.</param>
    /// <param name="age">Its age at the setting state, s.</param>
    /// <param name="derivation">Where the steps go.</param>
    /// <exception cref="SilentBasisException">The model, or the basis for want of one, does not answer.</exception>
    public Number? Of(Cause cause, Segment segment, Number age, Derivation derivation)
    {
        if (!Has(cause, segment)) return null;
        var word = Keys.Word(cause);
        if (cause == Cause.Creep && segment.Creep is { } creep) return OwnStrain.ToCome($"segments/{segment.Id}/{word}", word, creep, age, derivation);
        if (cause == Cause.Shrinkage && segment.Shrinkage is { } shrinkage) return OwnStrain.ToCome($"segments/{segment.Id}/{word}", word, shrinkage, age, derivation);
        var concrete = new DescribedConcrete(plan, segment);
        var questions = new ModelQuestions(ModelOf(segment), concrete, segment.Id);
        return cause switch
        {
            Cause.Creep => CreepStrain.Of(concrete, questions, age, derivation),
            Cause.Shrinkage => ShrinkageStrain.Of(concrete, questions, age, derivation),
            _ => ElasticStrain.Of(concrete, questions, age, derivation),
        };
    }

    /// <summary>All strain still to come, without steps.</summary>
    public double Total(Segment segment, double age)
    {
        var withoutSteps = new Derivation(keepsSteps: false);
        return Causes.Sum(c => Of(c, segment, new Number(-1, age), withoutSteps)?.Value ?? 0);
    }

    /// <summary>Says which model each described concrete follows, and where a stress is beyond what its creep is proportional to.</summary>
    public void Note(Derivation derivation)
    {
        foreach (var segment in plan.Segments.Where(s => s.Concrete is not null))
        {
            var (model, path) = (ModelOf(segment), $"segments/{segment.Id}/concrete");
            derivation.Note(new("creep-model", Severity.Note, $"{path}/model", $"Creep and shrinkage of segment {segment.Id} follow {model.Title}{Standing(model)}. {model.PublishedExamples}."));
            foreach (var stage in segment.Concrete!.Stages.Where(s => s.Stress > model.ProportionalUpTo * segment.Concrete.Strength))
                derivation.Note(new("creep-not-proportional", Severity.Warning, $"{path}/stages",
                    $"A mean stress of {{0}} on segment {segment.Id} is more than {{1}} of its strength {{2}}: beyond that creep grows faster than the stress, and more movement comes than is computed.",
                    [(Quantity.Stress, stage.Stress), (Quantity.Ratio, model.ProportionalUpTo!.Value), (Quantity.Stress, segment.Concrete.Strength)]));
        }
    }

    private string Standing(CreepModel model) => basis.CreepModel switch
    {
        Said<CreepModel> own when own.Value.Id == model.Id => ", the model of the basis",
        Said<CreepModel> own => $", chosen in the plan; the model of the basis is {own.Value.Title}",
        _ => ", chosen in the plan; the basis has no model of its own",
    };

    private CreepModel ModelOf(Segment segment)
    {
        var (id, path) = (segment.Concrete!.Model, $"segments/{segment.Id}/concrete/model");
        if (id.Length > 0)
            return models.FirstOrDefault(m => m.Id == id) ?? throw Missing(path, $"There is no model of creep and shrinkage called {id}.");
        return basis.CreepModel is Said<CreepModel> own
            ? own.Value
            : throw Missing(path, $"{basis.Title} has no model of creep and shrinkage of its own: name one for segment {segment.Id}.");
    }

    private static SilentBasisException Missing(string path, string sentence) => new(new Finding("creep-model-missing", Severity.Error, path, sentence));
}
