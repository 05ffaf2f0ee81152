using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Sections;

/// <summary>
/// Slab and steel with a connection that yields: force between them, slip and shear flow at the ends of the deck, and what happens between
/// relief joints where they do not act together.
/// </summary>
public static class InteractionFormulas
{
    private static readonly Operand Upper = new("σ_t", "stress at the layer's upper edge, tension positive", Quantity.Stress);
    private static readonly Operand Lower = new("σ_u", "stress at the layer's lower edge, tension positive", Quantity.Stress);
    private static readonly Operand Force = new("F_i", "force of a layer of the slab, tension positive", Quantity.Force);
    private static readonly Operand SlabForce = new("F", "force of the slab with full interaction, tension positive", Quantity.Force);
    private static readonly Operand Slab = new("EA_c", "axial stiffness of the slab", Quantity.AxialStiffness);
    private static readonly Operand Steel = new("EA_s", "axial stiffness of the steel", Quantity.AxialStiffness);
    private static readonly Operand SlabDepth = new("y_c", "depth of the slab's centroid", Quantity.Size);
    private static readonly Operand SteelDepth = new("y_a", "depth of the steel's centroid", Quantity.Size);
    private static readonly Operand Own = new("EI_0", "bending stiffness of slab and steel side by side, without connection", Quantity.BendingStiffness);
    private static readonly Operand Connection = new("k_v", "stiffness of the connection per length of deck", Quantity.ConnectionStiffness);
    private static readonly Operand Difference = new("Δε", "difference of the free strains of slab and steel", Quantity.Strain);
    private static readonly Operand Transfer = new("ℓ", "length over which the connection hands the force over", Quantity.Length);
    private static readonly Operand Length = new("L", "length of the deck segment", Quantity.Length);
    private static readonly Operand Start = new("x_start", "station of the lower end", Quantity.Length);
    private static readonly Operand End = new("x_end", "station of the upper end", Quantity.Length);
    private static readonly Operand SteelExpansion = new("α_s", "coefficient of expansion of the steel", Quantity.Expansion);
    private static readonly Operand SlabExpansion = new("α_c", "coefficient of expansion of the slab", Quantity.Expansion);
    private static readonly Operand Spacing = new("s", "spacing of the relief joints", Quantity.Length);
    private static readonly Operand Hot = new("T_max", "highest effective temperature", Quantity.Temperature);
    private static readonly Operand Cold = new("T_min", "lowest effective temperature", Quantity.Temperature);

    private static readonly Provenance Newmark = Provenance.Derived(
        "slip s along the deck obeys s″ = s/ℓ² with 1/ℓ² = k_v·(1/EA_c + 1/EA_s + d²/EI_0), the ends free of force (theory of partial interaction)");
    private static readonly Provenance Two = Provenance.Derived("two bars held together: Δε = F·(1/EA_c + 1/EA_s + d²/EI_0)");

    private static Expression Compliance => 1 / Slab + 1 / Steel + Power(SteelDepth - SlabDepth, 2) / Own;

    /// <summary>Difference of free strains that belongs to the force.</summary>
    public static readonly Formula FreeDifference = new(
        "interaction.free-difference", "Δε", "difference of the free strains of slab and steel, slab shorter positive", Quantity.Strain,
        [SlabForce, Slab, Steel, SlabDepth, SteelDepth, Own], SlabForce * Compliance, Two,
        new(150e-6, 0.05e-6, "own arithmetic: slab 2500 mm by 250 mm 15 K cooler than a girder of 46 800 mm²",
            347.4e3, 34.077e9 * 0.625, 210e9 * 0.0468, 0.125, 1.00908, (34.077e9 * 0.625 * 0.0625 / 12) + (210e9 * 1.26174e-2)));

    /// <summary>Transfer length.</summary>
    public static readonly Formula TransferLength = new(
        "interaction.transfer-length", "ℓ", "length over which the connection hands the force over", Quantity.Length,
        [Connection, Slab, Steel, SlabDepth, SteelDepth, Own], Root(1 / (Connection * Compliance)), Newmark,
        new(1.522, 0.0005, "own arithmetic: the same section, 1000 N/mm of deck for a slip of 1 mm", 1e9, 34.077e9 * 0.625, 210e9 * 0.0468, 0.125,
            1.00908, (34.077e9 * 0.625 * 0.0625 / 12) + (210e9 * 1.26174e-2)));

    /// <summary>Slip at the end.</summary>
    public static readonly Formula EndSlip = new(
        "interaction.end-slip", "s_e", "slip between slab and steel at the end of the deck", Quantity.Movement, [Difference, Transfer, Length],
        Difference * Transfer * Tanh(Length / (2 * Transfer)), Newmark, new(0.2283e-3, 0.0005e-3, "own arithmetic", 150e-6, 1.522, 40));

    /// <summary>Shear flow at the end.</summary>
    public static readonly Formula EndShearFlow = new(
        "interaction.end-shear-flow", "v_e", "longitudinal shear per length at the end of the deck", Quantity.LineLoad, [SlabForce, Transfer, Length],
        SlabForce / Transfer * Tanh(Length / (2 * Transfer)), Newmark, new(228e3, 500, "own arithmetic", 347.4e3, 1.522, 40));

    /// <summary>Length of the deck.</summary>
    public static readonly Formula DeckLength = new(
        "interaction.deck-length", "L", "length of the deck segment", Quantity.Length, [End, Start], End - Start,
        Provenance.Derived("difference of its stations"), new(40, 1e-9, "own arithmetic", 50, 10));

    /// <summary>Force of a layer.</summary>
    public static readonly Formula LayerForce = new(
        "interaction.layer-force", "F_i", "force of a layer of the slab, tension positive", Quantity.Force, [Upper, Lower, SectionFormulas.Area],
        (Upper + Lower) / 2 * SectionFormulas.Area, Provenance.Derived("stress varies linearly over a strip; its mean times the area"),
        new(6e5, 1e-6, "own arithmetic", 1e6, 2e6, 0.4));

    /// <summary>Force of the slab.</summary>
    public static readonly Formula InterfaceForce = new(
        "interaction.force", "F", "force of the slab with full interaction, tension positive; the connection hands it over at each end", Quantity.Force,
        [Force], Total(Force), Provenance.Derived("equilibrium of the slab: what it carries inside must be handed over at its ends"),
        new(3e5, 1e-6, "own arithmetic", 1e5, 2e5));

    /// <summary>Relative movement between relief joints.</summary>
    public static readonly Formula BetweenReliefJoints = new(
        "interaction.relief-movement", "Δ_s", "movement of steel against slab over the spacing of relief joints, from mean temperature to either extreme",
        Quantity.Movement, [SteelExpansion, SlabExpansion, Spacing, Hot, Cold], (SteelExpansion - SlabExpansion) * Spacing * (Hot - Cold) / 2,
        Provenance.Derived("free change of length of both over the spacing; common practice, no source: relief joints about every 50 ft keep it to about a millimetre"),
        new(0.9144e-3, 1e-7, "own arithmetic: 2 millionths per K over 15.24 m and 30 K", 12e-6, 10e-6, 15.24, 40, -20));
}
