namespace JointPlanner.Pdf;

/// <summary>
/// What a sheet says, in reading order, as plain data; it knows nothing of pages, fonts or PDF. The same document gives the same bytes on
/// the same build, whatever the thread, the culture and the clock: dates are part of the document.
/// </summary>
public sealed record Document
{
    /// <summary>The document's title, shown in the reader's title bar.</summary>
    public required string Title { get; init; }

    /// <summary>Who answers for the content, for the file's properties.</summary>
    public required string Author { get; init; }

    /// <summary>The program and its version, for the file's properties.</summary>
    public required string Program { get; init; }

    /// <summary>The date of the sheet, for the file's properties.</summary>
    public required DateTimeOffset Date { get; init; }

    /// <summary>Language tag of the text, by BCP 47.</summary>
    public string Language { get; init; } = "en";

    /// <summary>The paper.</summary>
    public PaperSize Paper { get; init; } = PaperSize.A4;

    /// <summary>The line at the head of each page.</summary>
    public RunningLine Head { get; init; } = new("", "");

    /// <summary>The words on the left at the foot of each page; "Page x of y" stands on the right by itself.</summary>
    public string Foot { get; init; } = "";

    /// <summary>
    /// Words across every page, such as PRELIMINARY or DEMONSTRATION, not for construction; they stand behind the text, and once more in the
    /// page's head where nothing covers them. Null for none.
    /// </summary>
    public string? Watermark { get; init; }

    /// <summary>The content in reading order.</summary>
    public required IReadOnlyList<Block> Blocks { get; init; }

    /// <summary>Files that travel inside the PDF.</summary>
    public IReadOnlyList<Attachment> Attachments { get; init; } = [];
}
