using System.Text;
using JointPlanner.Pdf.Layout;

namespace JointPlanner.Pdf.Writing;

/// <summary>Writes one page's steps as a content stream and marks what belongs to which element of the structure.</summary>
internal sealed class ContentWriter(PageCanvas page, double pageHeight, FontShelf fonts)
{
    private readonly StringBuilder _content = new();
    private readonly List<StructureElement> _owners = [];
    private readonly Stack<Step> _open = new();
    private StructureElement? _marked;
    private double _fill = -1, _stroke = -1, _weight = -1, _size = -1;
    private string _font = "", _dash = "[] 0";

    /// <summary>The elements to which the page's marked stretches belong, by number of the stretch.</summary>
    public IReadOnlyList<StructureElement> Owners => _owners;

    public byte[] Write()
    {
        // Round joins: sharp corners of heavy lines would else stick out.
        _content.Append("1 j\n");
        foreach (var step in page.Steps) Write(step);
        EndMark();
        return Encoding.ASCII.GetBytes(_content.ToString());
    }

    private void Write(Step step)
    {
        switch (step)
        {
            case OpenElement:
                EndMark();
                _open.Push(step);
                break;
            case OpenArtifact artifact:
                EndMark();
                _open.Push(step);
                _content.Append("/Artifact").Append(PropertiesOf(artifact.Kind)).Append("BDC\n");
                break;
            case OpenReading reading:
                Mark();
                _open.Push(step);
                _content.Append("/Span<</ActualText").Append(Syntax.Text(reading.Text)).Append(">>BDC\n");
                break;
            case Close:
                CloseLast();
                break;
            case TextStep text:
                Mark();
                Write(text);
                break;
            case PathStep path:
                Mark();
                Write(path);
                break;
            case CircleStep circle:
                Mark();
                Write(circle);
                break;
            default:
                throw new InvalidOperationException($"The PDF writer does not know the step {step.GetType().Name}.");
        }
    }

    private void CloseLast()
    {
        switch (_open.Pop())
        {
            case OpenElement:
                EndMark();
                break;
            case OpenArtifact or OpenReading:
                _content.Append("EMC\n");
                break;
        }
    }

    // Begins the stretch of the element that what follows belongs to, unless it is open already.
    private void Mark()
    {
        foreach (var open in _open)
        {
            if (open is OpenReading) continue;
            if (open is OpenArtifact) return;
            var element = ((OpenElement)open).Element;
            if (_marked == element) return;
            EndMark();
            _content.Append('/').Append(element.Type).Append("<</MCID ").Append(Syntax.Number(_owners.Count)).Append(">>BDC\n");
            element.Add(new ContentMark(page.Index, _owners.Count));
            _owners.Add(element);
            _marked = element;
            return;
        }
        throw new InvalidOperationException("Something on the sheet belongs neither to the text nor to the page's furniture.");
    }

    private void EndMark()
    {
        if (_marked is null) return;
        _content.Append("EMC\n");
        _marked = null;
    }

    private void Write(TextStep step)
    {
        SetFill(step.Grey);
        var font = fonts.For(step.Face);
        _content.Append("BT ");
        if (font.Name != _font || step.Size != _size)
        {
            (_font, _size) = (font.Name, step.Size);
            _content.Append('/').Append(_font).Append(' ').Append(Syntax.Number(_size)).Append(" Tf ");
        }
        if (step.AngleDegrees == 0)
        {
            Numbers(step.X, pageHeight - step.Y).Append("Td ");
        }
        else
        {
            var turn = -step.AngleDegrees * Math.PI / 180;
            Numbers(Math.Cos(turn), Math.Sin(turn), -Math.Sin(turn), Math.Cos(turn), step.X, pageHeight - step.Y).Append("Tm ");
        }
        _content.Append(font.Encode(step.Text)).Append(" Tj ET\n");
    }

    private void Write(PathStep step)
    {
        SetPen(step.Pen);
        for (var i = 0; i < step.Points.Count; i++)
            Numbers(step.Points[i].X, pageHeight - step.Points[i].Y).Append(i == 0 ? "m " : "l ");
        if (step.Closed) _content.Append("h ");
        _content.Append(PaintOperator(step.Pen)).Append('\n');
    }

    private void Write(CircleStep step)
    {
        // Four cubic curves; the constant keeps them within 0.03 % of the radius.
        const double Kappa = 0.5522847498;
        SetPen(step.Pen);
        double x = step.X, y = pageHeight - step.Y, r = step.Radius, k = Kappa * step.Radius;
        Numbers(x + r, y).Append("m ");
        Numbers(x + r, y + k, x + k, y + r, x, y + r).Append("c ");
        Numbers(x - k, y + r, x - r, y + k, x - r, y).Append("c ");
        Numbers(x - r, y - k, x - k, y - r, x, y - r).Append("c ");
        Numbers(x + k, y - r, x + r, y - k, x + r, y).Append("c h ");
        _content.Append(PaintOperator(step.Pen)).Append('\n');
    }

    private static string PaintOperator(Pen pen) => (pen.Fill, pen.Weight) switch
    {
        (null, 0) => "n",
        (null, _) => "S",
        (_, 0) => "f*",
        _ => "B*",
    };

    private void SetPen(Pen pen)
    {
        if (pen.Fill is { } fill) SetFill(fill);
        if (pen.Weight == 0) return;
        if (pen.Grey != _stroke)
        {
            _stroke = pen.Grey;
            Numbers(_stroke).Append("G ");
        }
        if (pen.Weight != _weight)
        {
            _weight = pen.Weight;
            Numbers(_weight).Append("w ");
        }
        var dash = "[" + string.Join(' ', (pen.Dashes ?? []).Select(Syntax.Number)) + "] 0";
        if (dash == _dash) return;
        _dash = dash;
        _content.Append(dash).Append(" d ");
    }

    private void SetFill(double grey)
    {
        if (grey == _fill) return;
        _fill = grey;
        Numbers(grey).Append("g ");
    }

    private StringBuilder Numbers(params ReadOnlySpan<double> values)
    {
        foreach (var value in values) _content.Append(Syntax.Number(value)).Append(' ');
        return _content;
    }

    private static string PropertiesOf(string kind) => kind switch
    {
        "Layout" => "<</Type/Layout>>",
        "Pagination" => "<</Type/Pagination>>",
        "Header" or "Footer" or "Watermark" => "<</Type/Pagination/Subtype/" + kind + ">>",
        _ => throw new InvalidOperationException($"There is no page furniture of the kind {kind}."),
    };
}
