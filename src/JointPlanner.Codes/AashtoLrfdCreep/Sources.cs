using JointPlanner.Engine.Formulas;

namespace JointPlanner.Codes.AashtoLrfdCreep;

/// <summary>Where the formulas of AASHTO LRFD 5.4.2 come from: three texts by edition, all held from memory.</summary>
internal static class Sources
{
    private const string Document = "AASHTO LRFD Bridge Design Specifications";

    /// <summary>The text up to the 3rd edition.</summary>
    public static Provenance First(string place) => new(Mark.Memory, Document, "to 2004", place, "aashto-lrfd-creep-2004/5.4.2.3");

    /// <summary>The text of the 2005 interims to the 7th edition.</summary>
    public static Provenance Second(string place) => new(Mark.Memory, Document, "2005 interims to 2014", place, "aashto-lrfd-creep-2005/5.4.2.3");

    /// <summary>The text from the 2015 interims on.</summary>
    public static Provenance Third(string place) => new(Mark.Memory, Document, "2015 interims on", place, "aashto-lrfd-creep-2015/5.4.2.3");

    /// <summary>Moduli.</summary>
    public static Provenance Modulus(string place) => new(Mark.Memory, Document, "", place, "aashto-lrfd-creep/modulus");

    /// <summary>A published example.</summary>
    public const string Fhwa = "FHWA, prestressed-girder design example, Appendix C, step C1.2";

    /// <summary>An example held from memory.</summary>
    public const string Pci = "from memory, check against the licensed text: PCI Bridge Design Manual, example 9.1a";
}
