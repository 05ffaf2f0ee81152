namespace JointPlanner.Pdf.Reading;

/// <summary>Why a PDF could not be read.</summary>
public enum PdfReadFailure
{
    /// <summary>The bytes do not begin as a PDF file does.</summary>
    NotAPdf,

    /// <summary>The file breaks a rule of ISO 32000 that the reader depends on.</summary>
    Malformed,

    /// <summary>The file uses a part of ISO 32000 that this program never writes (encryption, hybrid or linearised files, rare filters).</summary>
    Unsupported,

    /// <summary>The file is larger than allowed.</summary>
    FileTooLarge,

    /// <summary>More objects or values than allowed.</summary>
    TooManyObjects,

    /// <summary>More revisions than allowed.</summary>
    TooManyRevisions,

    /// <summary>A revision points to a later place of the file as its predecessor: a loop or a linearised file.</summary>
    RevisionsNotDescending,

    /// <summary>Arrays and dictionaries nested deeper than allowed.</summary>
    NestedTooDeep,

    /// <summary>A compressed stream, or all of them together, unpack to more than allowed.</summary>
    InflatesTooFar,

    /// <summary>Reading took longer than allowed.</summary>
    TookTooLong,
}
