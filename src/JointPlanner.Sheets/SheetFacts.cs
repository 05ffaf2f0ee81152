using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Packages;

namespace JointPlanner.Sheets;

/// <summary>What a sheet says that is no result: whose it is, which revision, on what it rests. Dates are inputs, so the same facts give the same bytes.</summary>
public sealed record SheetFacts
{
    /// <summary>Revision as the owner prints it.</summary>
    public required string Revision { get; init; }
    /// <summary>Date of the sheet with the structure's zone.</summary>
    public required DateTimeOffset Date { get; init; }
    /// <summary>Name of the designer; empty where none is known yet.</summary>
    public string Designer { get; init; } = "";
    /// <summary>Name of the checker; empty where none is known yet.</summary>
    public string Checker { get; init; } = "";
    /// <summary>The owner's organisation.</summary>
    public string Organisation { get; init; } = "";
    /// <summary>Full title of the code edition.</summary>
    public required string Basis { get; init; }
    /// <summary>Id and revision of the code folder.</summary>
    public required string BasisId { get; init; }
    /// <summary>Name and version of the owner's rule set; empty for none.</summary>
    public string OwnerRules { get; init; } = "";
    /// <summary>The program and its version.</summary>
    public required string Program { get; init; }
    /// <summary>Stored text of the calculation package.</summary>
    public required ReadOnlyMemory<byte> Package { get; init; }
    /// <summary>Stored text of the results.</summary>
    public required ReadOnlyMemory<byte> Results { get; init; }
    /// <summary>What holds for every joint on the day of setting; null where no joint is set by this sheet.</summary>
    public StoredDay? Day { get; init; }
    /// <summary>Values from memory that an owner confirmed: value id → sentence.</summary>
    public IReadOnlyDictionary<string, string> Confirmed { get; init; } = new Dictionary<string, string>();
    /// <summary>True for a print that may not be signed.</summary>
    public bool IsPreliminary { get; init; }
    /// <summary>True where the installation runs for demonstration.</summary>
    public bool IsDemonstration { get; init; }
    /// <summary>Digest of a stored text as it is printed, SHA-256 in lower-case hexadecimal digits.</summary>
    public static string Digest(ReadOnlyMemory<byte> text) => Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(text.Span));

    /// <summary>What runs across every page; null for nothing.</summary>
    public string? Watermark => (IsDemonstration, IsPreliminary) switch
    {
        (true, true) => "PRELIMINARY, DEMONSTRATION, not for construction",
        (true, false) => "DEMONSTRATION, not for construction",
        (false, true) => "PRELIMINARY",
        (false, false) => null,
    };

    /// <summary>True when the owner confirmed the value.</summary>
    public bool IsConfirmed(Provenance value) => Confirmed.ContainsKey(value.ValueId);
}
