using UglyToad.PdfPig;
using UglyToad.PdfPig.Content;
using UglyToad.PdfPig.Core;
using UglyToad.PdfPig.Tokens;

namespace JointPlanner.Recomputation.Tests.Sheets;

/// <summary>Reads a tagged PDF by its structure, with an outside reader; running heads and watermarks, which are no part of it, are left out.</summary>
public sealed class TaggedSheet : IDisposable
{
    private readonly PdfDocument pdf;
    private readonly Dictionary<IndirectReference, IReadOnlyDictionary<int, Stretch>> pages = [];

    private TaggedSheet(byte[] bytes)
    {
        pdf = PdfDocument.Open(bytes);
        foreach (var (page, reference) in pdf.GetPages().Zip(PageReferences(pdf.Structure.Catalog.CatalogDictionary.Data["Pages"]))) pages[reference] = Stretches(page);
    }

    /// <summary>The topmost elements in order.</summary>
    public static IReadOnlyList<SheetPart> Read(byte[] bytes)
    {
        using var sheet = new TaggedSheet(bytes);
        var root = sheet.Dictionary(sheet.pdf.Structure.Catalog.CatalogDictionary.Data["StructTreeRoot"]);
        return [.. sheet.Kids(root, null).SelectMany(kid => sheet.Element(kid)!.Parts)];
    }

    /// <inheritdoc/>
    public void Dispose() => pdf.Dispose();

    private SheetPart? Element(IToken token)
    {
        var element = Dictionary(token);
        if (!element.Data.TryGetValue("S", out var type)) return null;
        var ownPage = element.Data.GetValueOrDefault("Pg") as IndirectReferenceToken;
        var (stretches, parts) = (new List<Stretch>(), new List<SheetPart>());
        foreach (var kid in Kids(element, ownPage))
        {
            if (kid is NumericToken mark) stretches.Add(pages[ownPage!.Data][mark.Int]);
            else if (Dictionary(kid) is { } dictionary && dictionary.Data.TryGetValue("MCID", out var number))
                stretches.Add(pages[((IndirectReferenceToken)dictionary.Data["Pg"]).Data][((NumericToken)number).Int]);
            else if (Element(kid) is { } part) parts.Add(part);
        }

        return new SheetPart(((NameToken)Resolve(type)).Data, stretches, parts);
    }

    private IReadOnlyList<IToken> Kids(DictionaryToken element, IndirectReferenceToken? ownPage) => element.Data.TryGetValue("K", out var kids)
        ? Resolve(kids) is ArrayToken array ? array.Data : ownPage is not null || Resolve(kids) is DictionaryToken ? [kids] : []
        : [];

    private DictionaryToken Dictionary(IToken token) => Resolve(token) as DictionaryToken ?? throw new InvalidDataException($"{token} is no dictionary.");

    private IToken Resolve(IToken token) => token is IndirectReferenceToken reference ? pdf.Structure.GetObject(reference.Data).Data : token;

    // The reader tells pages by number, the structure by reference: the tree of pages has both, in order.
    private IEnumerable<IndirectReference> PageReferences(IToken node)
    {
        var tree = Dictionary(node);
        if (!tree.Data.TryGetValue("Kids", out var kids)) return [((IndirectReferenceToken)node).Data];
        return ((ArrayToken)Resolve(kids)).Data.SelectMany(PageReferences);
    }

    private static Dictionary<int, Stretch> Stretches(Page page)
    {
        var stretches = new Dictionary<int, Stretch>();
        foreach (var marked in page.GetMarkedContents().Where(m => !m.IsArtifact && m.MarkedContentIdentifier >= 0))
            stretches.Add(marked.MarkedContentIdentifier, new Stretch(Drawn(marked), Read(marked)));
        return stretches;
    }

    private static string Drawn(MarkedContentElement marked) => string.Concat(marked.Letters.Select(l => l.Value).Concat(marked.Children.Select(Drawn)));

    private static string Read(MarkedContentElement marked) => marked.ActualText ?? string.Concat(marked.Letters.Select(l => l.Value).Concat(marked.Children.Select(Read)));
}
