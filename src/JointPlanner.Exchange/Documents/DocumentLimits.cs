namespace JointPlanner.Exchange.Documents;

/// <summary>How large a document from people may be; beyond it nothing is looked at.</summary>
public static class DocumentLimits
{
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
