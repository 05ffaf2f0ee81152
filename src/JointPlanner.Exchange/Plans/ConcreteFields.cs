using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Plans;

/// <summary>Fields of a deck's concrete, for a model of creep and shrinkage.</summary>
internal static class ConcreteFields
{
    /// <summary>Strength classes; the figure before the stroke is the cylinder strength in MPa.</summary>
    public static readonly ImmutableArray<string> Classes =
    [
        "C12/15", "C16/20", "C20/25", "C25/30", "C30/37", "C35/45", "C40/50", "C45/55", "C50/60", "C55/67", "C60/75", "C70/85", "C80/95", "C90/105",
    ];

    private static readonly QuantityEntry Strength = new(Quantity.Stress, new("8 MPa", "120 MPa")) { Usual = new("20 MPa", "90 MPa") };
    private static readonly QuantityEntry Modulus = new(Quantity.Stress, new("5 GPa", "80 GPa")) { Usual = new("20 GPa", "50 GPa") };
    private static readonly QuantityEntry Age = new(Quantity.Age, new("0.5 d", "200 a"));

    /// <summary>The group and its fields.</summary>
    public static IEnumerable<Field> Of(string group) =>
    [
        new(group, "concrete of the deck", new GroupEntry(),
            "What the deck's concrete is, so that a model gives its creep and shrinkage; instead of giving the strains, concrete decks only."),
        new($"{group}/model", "model of creep and shrinkage", new OutsideWordEntry("creep-model"), "Id of the model; the basis's own where nothing is given.")
        {
            Hint = "en-1992-1-1-2004",
        },
        new($"{group}/source", "source of the description", new TextEntry(DocumentLimits.NoteLength), "Where the description comes from.") { IsRequired = true, Hint = "concrete specification, sheet 3" },
        new($"{group}/strength-class", "strength class", new WordEntry(Classes), "Strength class; or give the strength itself.") { Hint = "C40/50" },
        new($"{group}/strength", "strength of the concrete", Strength, "Cylinder strength at 28 days as the model defines it: characteristic or specified.") { Hint = "6 ksi" },
        new($"{group}/transfer-strength", "strength at transfer", Strength, "Strength when prestress is put on, for models that ask for it; 0.80 of the strength where nothing is given.") { Hint = "4.8 ksi" },
        new($"{group}/modulus", "modulus of the concrete", Modulus, "Modulus that the model's creep coefficient belongs to; the model's own formula where nothing is given.") { Hint = "36 GPa" },
        new($"{group}/cement", "cement", new WordEntry(["slow", "normal", "rapid"]), "How quickly the cement hardens, for models that ask for it.")
        {
            Default = "normal", DefaultReason = "no cement is given: taken as normal",
        },
        new($"{group}/curing", "curing", new WordEntry(["moist", "steam"]), "How the concrete was cured, for models that ask for it.")
        {
            Default = "moist", DefaultReason = "no curing is given: taken as kept moist",
        },
        new($"{group}/curing-end", "end of curing", new QuantityEntry(Quantity.Age, new("0 d", "1 a")) { Usual = new("0.5 d", "28 d") },
            "Age at which curing ends and drying begins.") { IsRequired = true, Hint = "3 d" },
        new($"{group}/humidity", "relative humidity", new QuantityEntry(Quantity.Ratio, new("20 %", "100 %")) { Usual = new("40 %", "95 %") },
            "Relative humidity of the air round the deck, mean over the years.") { IsRequired = true, Hint = "75 %" },
        new($"{group}/area", "area of the concrete", new QuantityEntry(Quantity.Area, new("0.01 m²", "200 m²")), "Area of the concrete section, with its exposed perimeter.") { Hint = "5.4 m2" },
        new($"{group}/perimeter", "exposed perimeter", new QuantityEntry(Quantity.Length, new("0.1 m", "500 m")), "Perimeter in contact with air, inside a closed box as far as it dries there.") { Hint = "21 m" },
        new($"{group}/notional-size", "notional size", new QuantityEntry(Quantity.Size, new("20 mm", "5 m")) { Usual = new("50 mm", "1.5 m") },
            "Twice area over exposed perimeter, instead of giving both.") { Hint = "500 mm" },
        new($"{group}/volume-to-surface", "volume over surface", new QuantityEntry(Quantity.Size, new("10 mm", "2.5 m")) { Usual = new("25 mm", "0.75 m") },
            "Area over exposed perimeter, instead of giving both.") { Hint = "4 in" },
        new($"{group}/end-of-life", "end of life", new QuantityEntry(Quantity.Age, new("1 a", "200 a")) { Usual = new("30 a", "120 a") }, "Age at which the movement still to come is over.")
        {
            Default = "100 a", DefaultReason = "our proposal, not published: no end of life is given", Hint = "100 a",
        },
        new($"{group}/stages", "stresses on the deck", new ListEntry(0, 40, "stress"),
            "Mean axial stresses put on the deck, each at its age; without any, creep and prestress are not computed from this description."),
        new($"{group}/stages/*/age", "age at loading", Age, "Deck age at which the stress is put on; at the very age of setting it counts as coming after it.") { IsRequired = true, Hint = "7 d" },
        new($"{group}/stages/*/stress", "mean axial stress", new QuantityEntry(Quantity.Stress, new("-60 MPa", "60 MPa")) { Usual = new("-5 MPa", "20 MPa") },
            "Mean over the length, after losses, at the centroid; compression positive, a later loss negative.") { IsRequired = true, Hint = "4.5 MPa" },
        new($"{group}/stages/*/modulus", "modulus at loading", Modulus, "Modulus for the elastic strain where the stress comes after setting; the model's own formula where nothing is given.") { Hint = "34 GPa" },
        new($"{group}/stages/*/source", "source of the stress", new TextEntry(DocumentLimits.NoteLength), "What puts it on, and where the figure comes from.") { IsRequired = true, Hint = "prestress after losses, sheet 18" },
    ];
}
