using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Writing;

/// <summary>The fonts of one file, in order of first use.</summary>
internal sealed class FontShelf
{
    private readonly Dictionary<Face, FaceSubset> _byFace = [];
    private readonly List<FaceSubset> _fonts = [];

    public FaceSubset For(Face face)
    {
        if (_byFace.TryGetValue(face, out var font)) return font;
        font = new(face, "F" + Syntax.Number(_fonts.Count + 1));
        _fonts.Add(font);
        return _byFace[face] = font;
    }

    /// <summary>Writes all fonts and gives the resource dictionary that all pages share.</summary>
    public PdfDictionary Write(INewObjects file)
    {
        var fonts = new PdfDictionary();
        foreach (var font in _fonts) fonts.Reference(font.Name, font.Write(file));
        return new PdfDictionary().Dictionary("Font", fonts);
    }
}
