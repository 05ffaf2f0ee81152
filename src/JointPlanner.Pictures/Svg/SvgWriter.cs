using System.Text;
using System.Xml;

namespace JointPlanner.Pictures.Svg;

/// <summary>
/// Writes a picture as SVG. One user unit is a millimetre. Colours are never written: lines are in the current text colour, areas in that
/// colour, a tint of it or <c>--picture-paper</c>; each element carries a class <c>pic-…</c> named after its role. There are no style
/// attributes, identifiers or scripts. The same picture gives the same text.
/// </summary>
public static class SvgWriter
{
    private const string Namespace = "http://www.w3.org/2000/svg";

    /// <summary>The picture as an SVG element without an XML declaration, fit to stand in a page or in a file of its own.</summary>
    /// <exception cref="InvalidOperationException">The picture holds an element that this writer does not know, or a coordinate that is not a
    /// finite number.</exception>
    public static string Write(Picture picture, SvgLook? look = null)
    {
        look ??= new();
        var text = new StringBuilder();
        using (var xml = XmlWriter.Create(text, new() { OmitXmlDeclaration = true, NewLineChars = "\n", ConformanceLevel = ConformanceLevel.Fragment }))
        {
            xml.WriteStartElement("svg", Namespace);
            xml.WriteAttributeString("viewBox", $"0 0 {SvgNumber.Of(picture.WidthMm)} {SvgNumber.Of(picture.HeightMm)}");
            if (look.TrueSize)
            {
                xml.WriteAttributeString("width", SvgNumber.Of(picture.WidthMm) + "mm");
                xml.WriteAttributeString("height", SvgNumber.Of(picture.HeightMm) + "mm");
            }
            xml.WriteAttributeString("class", "picture");
            xml.WriteAttributeString("role", look.Pressable ? "group" : "img");
            xml.WriteAttributeString("aria-label", PlainCharacters.Of(picture.Title));
            xml.WriteAttributeString("fill", "none");
            xml.WriteAttributeString("stroke-linecap", "butt");
            xml.WriteAttributeString("stroke-linejoin", "round");
            xml.WriteElementString("title", Namespace, PlainCharacters.Of(picture.Title));
            xml.WriteElementString("desc", Namespace, PlainCharacters.Of(picture.Description));
            var shapes = new SvgShapes(xml, look.Pressable);
            foreach (var element in picture.Elements) shapes.Write(element);
            xml.WriteEndElement();
        }
        return text.ToString();
    }
}
