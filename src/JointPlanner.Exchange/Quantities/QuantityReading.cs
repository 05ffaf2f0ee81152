using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Quantities;

/// <summary>What a text says as a quantity: a value with its unit, or a fault that tells what to type instead.</summary>
public sealed record QuantityReading
{
    private QuantityReading(double value, Unit? unit, QuantityFault? fault) => (Value, Unit, Fault) = (value, unit, fault);

    /// <summary>Value in SI (temperature readings in °C); NaN where the text could not be read.</summary>
    public double Value { get; }

    /// <summary>Unit it was typed in (of feet and inches: the foot); null where the text could not be read.</summary>
    public Unit? Unit { get; }

    /// <summary>Why it could not be read; null where it could.</summary>
    public QuantityFault? Fault { get; }

    /// <summary>A value that was read.</summary>
    public static QuantityReading Of(double value, Unit unit) => new(value, unit, null);

    /// <summary>A text that could not be read.</summary>
    public static QuantityReading Failed(string id, string wrong, string allowed, string remedy) =>
        new(double.NaN, null, new QuantityFault(id, wrong, allowed, remedy));
}

/// <summary>Why a text is not a quantity.</summary>
/// <param name="Id">Permanent id of the kind of fault.</param>
/// <param name="Wrong">What is wrong, a sentence.</param>
/// <param name="Allowed">What is allowed.</param>
/// <param name="Remedy">What to do.</param>
public sealed record QuantityFault(string Id, string Wrong, string Allowed, string Remedy);
