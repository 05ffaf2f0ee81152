using System.Globalization;
using System.Text;
using System.Xml;

namespace JointPlanner.Pdf.Writing;

/// <summary>
/// The file's properties as XMP (ISO 16684-1). Makes no claim of conformance to PDF/A or PDF/UA: no validator has passed a sample yet.
/// </summary>
internal static class MetadataWriter
{
    private const string Rdf = "http://www.w3.org/1999/02/22-rdf-syntax-ns#", Dc = "http://purl.org/dc/elements/1.1/",
        Xmp = "http://ns.adobe.com/xap/1.0/", Pdf = "http://ns.adobe.com/pdf/1.3/";

    public static byte[] Write(Document document)
    {
        using var target = new MemoryStream();
        target.Write(Encoding.UTF8.GetBytes("<?xpacket begin=\"\uFEFF\" id=\"W5M0MpCehiHzreSzNTczkc9d\"?>\n"));
        using (var xml = XmlWriter.Create(target, new() { OmitXmlDeclaration = true, Encoding = new UTF8Encoding(false), NewLineChars = "\n", Indent = true }))
        {
            xml.WriteStartElement("x", "xmpmeta", "adobe:ns:meta/");
            xml.WriteStartElement("rdf", "RDF", Rdf);
            xml.WriteStartElement("rdf", "Description", Rdf);
            xml.WriteAttributeString("rdf", "about", Rdf, "");
            xml.WriteElementString("dc", "format", Dc, "application/pdf");
            List(xml, "title", "Alt", document.Title, "x-default");
            List(xml, "creator", "Seq", document.Author, null);
            List(xml, "language", "Bag", document.Language, null);
            var date = document.Date.UtcDateTime.ToString("yyyy-MM-dd'T'HH:mm:ss'Z'", CultureInfo.InvariantCulture);
            xml.WriteElementString("xmp", "CreatorTool", Xmp, Pictures.PlainCharacters.Of(document.Program));
            xml.WriteElementString("xmp", "CreateDate", Xmp, date);
            xml.WriteElementString("xmp", "ModifyDate", Xmp, date);
            xml.WriteElementString("pdf", "Producer", Pdf, Pictures.PlainCharacters.Of(document.Program));
            xml.WriteEndElement();
            xml.WriteEndElement();
            xml.WriteEndElement();
        }
        target.Write("\n<?xpacket end=\"w\"?>"u8);
        return target.ToArray();
    }

    private static void List(XmlWriter xml, string name, string kind, string value, string? language)
    {
        xml.WriteStartElement("dc", name, Dc);
        xml.WriteStartElement("rdf", kind, Rdf);
        xml.WriteStartElement("rdf", "li", Rdf);
        if (language is not null) xml.WriteAttributeString("xml", "lang", null, language);
        xml.WriteString(Pictures.PlainCharacters.Of(value));
        xml.WriteEndElement();
        xml.WriteEndElement();
        xml.WriteEndElement();
    }
}
