using System.Diagnostics;
using System.Globalization;

namespace JointPlanner.Pdf.Reading;

/// <summary>Counts the work done on one file and stops it at the limits.</summary>
internal sealed class ReadingBudget(PdfReadLimits limits, CancellationToken cancellation)
{
    private const int WorkBetweenLooksAtTheClock = 64 * 1024;

    private readonly long _start = Stopwatch.GetTimestamp();
    private int _values;
    private long _text;
    private long _inflated;
    private int _entries;
    private int _work = WorkBetweenLooksAtTheClock; // so that the first piece of work looks at once

    public PdfReadLimits Limits { get; } = limits;

    /// <summary>Charges bytes looked at, or as many steps of like cost.</summary>
    public void Work(int amount)
    {
        _work += amount;
        if (_work < WorkBetweenLooksAtTheClock) return;
        _work = 0;
        cancellation.ThrowIfCancellationRequested();
        if (Stopwatch.GetElapsedTime(_start) > Limits.Time)
            throw new PdfReadException(PdfReadFailure.TookTooLong, Text($"Reading the PDF took longer than {Limits.Time.TotalSeconds} s."));
    }

    public void Value()
    {
        if (++_values > Limits.Values)
            throw new PdfReadException(PdfReadFailure.TooManyObjects, Text($"The PDF holds more than {Limits.Values} values."));
        Work(1);
    }

    public void KeepText(int bytes)
    {
        _text += bytes;
        if (_text > Limits.TextBytes)
            throw new PdfReadException(PdfReadFailure.TooManyObjects, Text($"The PDF holds more than {Limits.TextBytes} bytes of strings."));
        Work(bytes);
    }

    public void Entry()
    {
        if (++_entries > Limits.Objects)
            throw new PdfReadException(PdfReadFailure.TooManyObjects, Text($"The PDF holds more than {Limits.Objects} objects."));
        Work(1);
    }

    public void Inflated(int bytes, long ofThisStream)
    {
        _inflated += bytes;
        if (ofThisStream > Limits.InflatedStreamBytes)
            throw new PdfReadException(PdfReadFailure.InflatesTooFar, Text($"A stream of the PDF unpacks to more than {Limits.InflatedStreamBytes} bytes."));
        if (_inflated > Limits.InflatedBytes)
            throw new PdfReadException(PdfReadFailure.InflatesTooFar, Text($"The PDF's streams unpack to more than {Limits.InflatedBytes} bytes."));
        Work(bytes);
    }

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
