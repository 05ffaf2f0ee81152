namespace JointPlanner.Exchange.Documents;

/// <summary>How large a document may be; beyond it nothing is looked at.</summary>
/// <param name="MostBytes">Bytes of the file.</param>
/// <param name="MostDepth">Lists and maps inside one another.</param>
/// <param name="MostItems">Items of all lists together.</param>
public sealed record DocumentLimits(int MostBytes, int MostDepth, int MostItems)
{
    /// <summary>A plan or rule set from people.</summary>
    public static readonly DocumentLimits OfPeople = new(Bytes, Depth, Items);
    /// <summary>A calculation package: a plan and a rule set with what surrounds them.</summary>
    public static readonly DocumentLimits OfPackages = new(3 * Bytes, Depth + 2, 3 * Items);

    /// <summary>Bytes of a file.</summary>
    public const int Bytes = 2 * 1024 * 1024;
    /// <summary>Lists and maps inside one another.</summary>
    public const int Depth = 12;
    /// <summary>Items of all lists together.</summary>
    public const int Items = 20_000;
    /// <summary>Characters of a name.</summary>
    public const int NameLength = 200;
    /// <summary>Characters of a note or source.</summary>
    public const int NoteLength = 4_000;
}
