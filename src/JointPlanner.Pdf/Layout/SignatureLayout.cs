namespace JointPlanner.Pdf.Layout;

/// <summary>Boxes for signatures, two across.</summary>
internal static class SignatureLayout
{
    private const double Gap = 14, BoxHeight = 62, LabelHeight = 14, Inset = 3;

    public static IEnumerable<Strip> Strips(SignatureFields block, Frame frame)
    {
        for (var i = 0; i < block.Fields.Count; i += 2)
        {
            var fields = block.Fields.Skip(i).Take(2).ToList();
            var width = (frame.Width - Gap) / 2;
            var boxes = fields.Select(f => (Field: f, Label: frame.Root.Child("P"), Form: frame.Root.Child("Form"))).ToList();
            yield return new(BoxHeight, (canvas, top) =>
            {
                for (var k = 0; k < boxes.Count; k++)
                {
                    var left = Frame.Left + (k * (width + Gap));
                    Paint(canvas, frame, boxes[k].Field, boxes[k].Label, boxes[k].Form, left, top, width);
                }
            })
            { SpaceBefore = i == 0 ? 9 : Gap, Link = i + 2 < block.Fields.Count ? Link.Weak : Link.None };
        }
    }

    private static void Paint(PageCanvas canvas, Frame frame, SignatureField field, StructureElement label, StructureElement form, double left, double top, double width)
    {
        canvas.Furniture(() => canvas.Box(left, top, width, BoxHeight, Pen.Thin));
        var name = frame.Set.Fitted(field.Label, width * 0.4, new(Measures.Tiny, LabelHeight, Faces.FaceStyle.Strong));
        canvas.For(label, () =>
        {
            Frame.PaintLine(canvas, name, left + 5, top + 1, LabelHeight);
            if (field.Person is null) return;
            var person = frame.Set.Fitted(field.Person, width - name.Width - 22, new(Measures.Tiny, LabelHeight, Faces.FaceStyle.Regular, Measures.Quiet));
            Frame.PaintLine(canvas, person, left + width - 5 - person.Width, top + 1, LabelHeight);
        });
        var place = new FieldPlace(field, new(canvas.Index, left + Inset, top + LabelHeight + 1, left + width - Inset, top + BoxHeight - Inset), form);
        form.Add(place);
        canvas.Fields.Add(place);
    }
}
