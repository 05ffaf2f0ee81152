namespace JointPlanner.Pdf;

/// <summary>A prepared field for one signature.</summary>
/// <remarks>
/// What a signer finds in the file that <see cref="PdfWriter"/> makes:
/// <list type="bullet">
/// <item>One cross-reference <em>stream</em> and no classic table; an appended update therefore brings a cross-reference stream too.</item>
/// <item>Objects that an update may have to rewrite are plain objects and in no object stream: the catalog, the <c>/AcroForm</c> (an object
/// of its own, referred to by the catalog), the page tree, each page, each signature field. Everything else may be in object streams.</item>
/// <item>A field is one object, field and widget in one: <c>/Type/Annot /Subtype/Widget /FT/Sig /T</c> with <see cref="Name"/>, <c>/TU</c>
/// with <see cref="Label"/>, <c>/Rect</c> in points, <c>/P</c>, <c>/F 4</c>, <c>/StructParent</c>, an empty appearance <c>/AP</c> and no
/// <c>/V</c>. It stands in <c>/AcroForm /Fields</c> and in its page's <c>/Annots</c>.</item>
/// <item><c>/AcroForm</c> has <c>/SigFlags 3</c> from the start: signing changes the field alone.</item>
/// <item>A signer adds <c>/V</c> and replaces <c>/AP</c>; it keeps every other entry.</item>
/// </list>
/// </remarks>
/// <param name="Name">The field's name in the file, such as <c>designer</c>: letters a to z, digits and hyphens, once in a document.</param>
/// <param name="Label">What the box says, such as <c>Designer</c>.</param>
public sealed record SignatureField(string Name, string Label)
{
    /// <summary>A second line in the box, such as the name of the person who will sign; null for none.</summary>
    public string? Person { get; init; }
}
