namespace JointPlanner.Pdf.Reading;

/// <summary>Where one version of an object is found.</summary>
/// <param name="Kind">Free, at a byte of the file, or packed in an object stream.</param>
/// <param name="Place">Byte offset, or the number of the object stream.</param>
/// <param name="Detail">Generation, or the index in the object stream.</param>
internal readonly record struct CrossReference(CrossReferenceKind Kind, int Place, int Detail);

internal enum CrossReferenceKind
{
    Free,
    InFile,
    InStream,
}

/// <summary>One state of the file: the entries that its cross-reference section gives, and where the state ends.</summary>
/// <param name="CrossReferenceStart">Byte at which the section stands.</param>
/// <param name="MarkEnd">Byte behind its "%%EOF".</param>
/// <param name="End">Byte behind the line end that follows, or the same byte where none does.</param>
/// <param name="Entries">What the section says of each object number.</param>
/// <param name="Trailer">Its trailer dictionary.</param>
/// <param name="IsTable">Written as a table, not as a stream.</param>
internal sealed record Revision(
    int CrossReferenceStart, int MarkEnd, int End, Dictionary<int, CrossReference> Entries, PdfDictionary Trailer, bool IsTable);
