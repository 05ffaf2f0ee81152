namespace JointPlanner.Pdf.Layout;

/// <summary>Pictures with their captions; a picture and its caption never part.</summary>
internal static class PictureLayout
{
    public static IEnumerable<Strip> Strips(PictureBlock block, Frame frame)
    {
        var look = TextLook.Cell with { Grey = Measures.Quiet };
        var captions = block.Caption is null ? [] : frame.Set.Lines(block.Caption, frame.Width, look);
        var captionHeight = captions.Count == 0 ? 0 : (captions.Count * look.LineHeight) + 5;
        var picture = block.Picture;
        double width = picture.WidthMm * Measures.Mm, height = picture.HeightMm * Measures.Mm;
        var scale = Math.Min(1, Math.Min(frame.Width / width, (frame.Height - captionHeight) / height));
        (width, height) = (width * scale, height * scale);
        var figure = frame.Root.Child("Figure", alternative: frame.Set.Settable(picture.Description.Length == 0 ? picture.Title : picture.Title + ". " + picture.Description));
        var caption = block.Caption is null ? null : frame.Root.Child("P");
        yield return new(height + captionHeight, (canvas, top) =>
        {
            var left = Frame.Left + ((frame.Width - width) / 2);
            figure.Enclose(new(canvas.Index, left, top, left + width, top + height));
            canvas.For(figure, () => new PicturePainter(canvas, frame.Set, left, top, scale * Measures.Mm).Paint(picture));
            for (var i = 0; i < captions.Count; i++)
            {
                var line = captions[i];
                var y = top + height + 5 + (i * look.LineHeight);
                canvas.For(caption!, () => Frame.PaintLine(canvas, line, Frame.Left, y, look.LineHeight));
            }
        })
        { SpaceBefore = 9 };
        yield return Strip.Space(4);
    }
}
