using System.Text;

namespace JointPlanner.Pdf.Writing;

/// <summary>A dictionary in the making; its entries keep the order in which they came.</summary>
internal sealed class PdfDictionary
{
    private readonly StringBuilder _entries = new();

    public PdfDictionary()
    {
    }

    public PdfDictionary(string type) => Name("Type", type);

    public PdfDictionary Name(string key, string value) => Raw(key, Syntax.Name(value));

    public PdfDictionary Text(string key, string value) => Raw(key, Syntax.Text(value));

    public PdfDictionary Number(string key, double value) => Raw(key, Syntax.Number(value));

    public PdfDictionary Reference(string key, int id) => Raw(key, Syntax.Reference(id));

    public PdfDictionary References(string key, IEnumerable<int> ids) => Raw(key, "[" + string.Join(' ', ids.Select(Syntax.Reference)) + "]");

    public PdfDictionary Numbers(string key, params IEnumerable<double> values) => Raw(key, "[" + string.Join(' ', values.Select(Syntax.Number)) + "]");

    public PdfDictionary Dictionary(string key, PdfDictionary value) => Raw(key, value.ToString());

    /// <summary>A value that is in PDF syntax already.</summary>
    public PdfDictionary Raw(string key, string value)
    {
        _entries.Append(Syntax.Name(key));
        if (value[0] is not ('/' or '[' or '(' or '<')) _entries.Append(' ');
        _entries.Append(value);
        return this;
    }

    public override string ToString() => "<<" + _entries + ">>";
}
