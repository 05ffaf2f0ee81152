using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Bases;

/// <summary>
/// A model of creep and shrinkage as one document's edition prints it. A designer may use another document's model than the one that goes
/// with the basis; the result then says so. Answers are silent outside the limits of the model.
/// </summary>
public abstract class CreepModel
{
    /// <summary>Permanent id of the model: one edition, one id.</summary>
    public abstract string Id { get; }
    /// <summary>Document with edition.</summary>
    public abstract string Title { get; }
    /// <summary>Number of our own corrections to this model.</summary>
    public virtual int Revision => 1;
    /// <summary>Published examples that tests reproduce, in words, or the reason why there is none.</summary>
    public abstract string PublishedExamples { get; }
    /// <summary>Largest stress, as a share of the strength, up to which creep is proportional to the stress; null where the model states none.</summary>
    public virtual double? ProportionalUpTo => null;

    /// <summary>Creep strain over the elastic strain that goes with <see cref="CreepModulus"/>.</summary>
    /// <param name="concrete">The concrete.</param>
    /// <param name="age">Age at which it is asked for, s.</param>
    /// <param name="loadedAt">Age at which the stress was put on, s.</param>
    /// <param name="derivation">Where the steps go.</param>
    public abstract Answer<Number> CreepCoefficient(DescribedConcrete concrete, Number age, Number loadedAt, Derivation derivation);

    /// <summary>Modulus that the creep coefficient belongs to, Pa.</summary>
    /// <param name="concrete">The concrete.</param>
    /// <param name="loadedAt">Age at which the stress was put on, s.</param>
    /// <param name="derivation">Where the steps go.</param>
    public abstract Answer<Number> CreepModulus(DescribedConcrete concrete, Number loadedAt, Derivation derivation);

    /// <summary>Modulus for the elastic strain of a stress put on at an age, Pa.</summary>
    /// <param name="concrete">The concrete.</param>
    /// <param name="age">The age, s.</param>
    /// <param name="derivation">Where the steps go.</param>
    public virtual Answer<Number> ElasticModulus(DescribedConcrete concrete, Number age, Derivation derivation) =>
        new Silent<Number>("no development of the modulus is held; give the modulus with the stress");

    /// <summary>Shrinkage strain since concreting, shortening positive.</summary>
    /// <param name="concrete">The concrete.</param>
    /// <param name="age">Age at which it is asked for, s.</param>
    /// <param name="derivation">Where the steps go.</param>
    public abstract Answer<Number> Shrinkage(DescribedConcrete concrete, Number age, Derivation derivation);
}
