namespace JointPlanner.Pdf.Layout;

/// <summary>Places strips on pages, from top to bottom.</summary>
internal sealed class Paginator(double top, double bottom, Action<PageCanvas> beginPage)
{
    private readonly List<PageCanvas> _pages = [];
    private double _y;
    private bool _fresh;

    public List<PageCanvas> Place(IReadOnlyList<Strip> strips)
    {
        NewPage();
        for (var i = 0; i < strips.Count;)
        {
            if (strips[i].BeginsPage && !_fresh) NewPage();
            var end = EndOfUnit(strips, i);
            if (!_fresh && !strips[i].IsSpace && _y + Height(strips, i, end, false) > bottom) NewPage();
            for (; i <= end; i++) Paint(strips[i]);
        }
        return _pages;
    }

    // As much as hangs together and still fits on one page.
    private int EndOfUnit(IReadOnlyList<Strip> strips, int start)
    {
        foreach (var weakest in new[] { Link.Weak, Link.Strong })
        {
            var end = start;
            while (end + 1 < strips.Count && strips[end].Link >= weakest && !strips[end + 1].BeginsPage) end++;
            if (top + Height(strips, start, end, true) <= bottom) return end;
        }
        return start;
    }

    private static double Height(IReadOnlyList<Strip> strips, int start, int end, bool atTop)
    {
        var height = atTop ? strips[start].Head?.Height ?? 0 : strips[start].SpaceBefore;
        for (var i = start; i <= end; i++) height += strips[i].Height + (i > start ? strips[i].SpaceBefore : 0);
        return height;
    }

    private void Paint(Strip strip)
    {
        if (_fresh)
        {
            if (strip.IsSpace) return;
            if (strip.Head is { } head)
            {
                var y = _y;
                _pages[^1].Furniture(() => head.Paint(_pages[^1], y), "Pagination");
                _y += head.Height;
            }
        }
        else
        {
            _y += strip.SpaceBefore;
        }
        strip.Paint(_pages[^1], _y);
        _y += strip.Height;
        _fresh &= strip.Height == 0;
    }

    private void NewPage()
    {
        _pages.Add(new(_pages.Count));
        beginPage(_pages[^1]);
        (_y, _fresh) = (top, true);
    }
}
