using System.Globalization;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Plans;

/// <summary>Makes a deck's concrete from the values of its fields; what could not be read stands in it as NaN.</summary>
internal static class ConcreteMaking
{
    /// <summary>The concrete; null where the segment describes none.</summary>
    public static Concrete? Of(string path, FieldValues values) => !values.HasGroup(path) ? null : new Concrete
    {
        Model = values.Text($"{path}/model"),
        Source = values.Text($"{path}/source"),
        StrengthClass = values.Text($"{path}/strength-class"),
        Strength = StrengthOf(path, values),
        TransferStrength = values.NumberOrNone($"{path}/transfer-strength"),
        Modulus = values.NumberOrNone($"{path}/modulus"),
        Cement = MemberWords.Of<CementClass>(values.Text($"{path}/cement")),
        Curing = MemberWords.Of<Curing>(values.Text($"{path}/curing")),
        CuringEnd = values.Number($"{path}/curing-end"),
        Humidity = values.Number($"{path}/humidity"),
        Size = SizeOf(path, values),
        EndOfLife = values.Number($"{path}/end-of-life"),
        Stages = [.. values.Items($"{path}/stages").Select(p => new StressStage(
            values.Number($"{p}/age"), values.Number($"{p}/stress"), values.NumberOrNone($"{p}/modulus"), values.Text($"{p}/source")))],
    };

    /// <summary>What is wrong with the fields of one description together.</summary>
    public static IEnumerable<Fault> Faults(string path, PlanDocument document, FieldValues values)
    {
        var concrete = $"{path}/concrete";
        if (!values.HasGroup(concrete)) yield break;
        if (OneWay(document, [[$"{concrete}/strength-class"], [$"{concrete}/strength"]]) is { } strength)
            yield return new("concrete.strength", $"{concrete}/strength", document.TextAt($"{concrete}/strength") ?? "", $"The strength of the concrete is {strength}.",
                "Allowed: either a strength class or a strength.", "Give one of the two.");
        if (OneWay(document, [[$"{concrete}/area", $"{concrete}/perimeter"], [$"{concrete}/notional-size"], [$"{concrete}/volume-to-surface"]]) is { } size)
            yield return new("concrete.size", $"{concrete}/notional-size", document.TextAt($"{concrete}/notional-size") ?? "", $"How thick the concrete is for drying is {size}.",
                "Allowed: area with exposed perimeter, or notional size, or volume over surface.", "Give one of the three.");
        foreach (var (own, inTheWay) in new[] { ("shrinkage", concrete), ("creep", $"{concrete}/stages") })
            if (values.HasGroup($"{path}/{own}") && document.Has(inTheWay))
                yield return new("concrete.two-strains", $"{path}/{own}", "", $"The {own} of the segment is given, and {(own == "creep" ? "stresses on its concrete from which it is computed" : "a concrete from which it is computed")}.",
                    "Allowed: one of the two.", "Take one of them out.");
    }

    private static string? OneWay(PlanDocument document, string[][] ways)
    {
        var given = ways.Count(way => way.Any(document.Has));
        return given > 1 ? "given in more than one way"
            : given == 0 ? "not given"
            : ways.First(way => way.Any(document.Has)).All(document.Has) ? null : "given only in part";
    }

    private static double StrengthOf(string path, FieldValues values) => values.Text($"{path}/strength-class") is { Length: > 0 } name
        ? Unit.Megapascal.ToSi(double.Parse(name[1..name.IndexOf('/', StringComparison.Ordinal)], CultureInfo.InvariantCulture))
        : values.Number($"{path}/strength");

    private static ConcreteSize SizeOf(string path, FieldValues values) =>
        values.NumberOrNone($"{path}/notional-size") is { } size ? new NotionalSize(size)
        : values.NumberOrNone($"{path}/volume-to-surface") is { } ratio ? new VolumeToSurface(ratio)
        : new SectionSize(values.Number($"{path}/area"), values.Number($"{path}/perimeter"));
}
