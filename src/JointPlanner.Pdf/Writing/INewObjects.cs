namespace JointPlanner.Pdf.Writing;

/// <summary>Where new objects go: a file in the making, or an update appended to a finished one.</summary>
internal interface INewObjects
{
    /// <summary>Adds a dictionary and gives its object number.</summary>
    int Add(PdfDictionary content);

    /// <summary>Adds a stream and gives its object number.</summary>
    int AddStream(PdfDictionary head, ReadOnlySpan<byte> data, bool compress = true);
}
