using System.Globalization;
using System.Text;

namespace JointPlanner.Pdf.Reading;

/// <summary>Reads one value after another from bytes in the PDF language; never past its end, never deeper than allowed.</summary>
internal sealed class SyntaxReader(byte[] data, int start, int end, NameTable names, ReadingBudget budget)
{
    private const int LongestNumber = 32;

    public int Position { get; private set; } = start;

    public static bool IsWhite(byte b) => b is 0 or 9 or 10 or 12 or 13 or 32;

    public static bool IsDelimiter(byte b) => b is (byte)'(' or (byte)')' or (byte)'<' or (byte)'>' or (byte)'[' or (byte)']'
        or (byte)'{' or (byte)'}' or (byte)'/' or (byte)'%';

    /// <summary>Steps over white space and comments.</summary>
    public void SkipWhite()
    {
        int from = Position;
        while (Position < end)
        {
            byte b = data[Position];
            if (IsWhite(b)) Position++;
            else if (b == '%') while (Position < end && data[Position] is not (10 or 13)) Position++;
            else break;
        }
        budget.Work(Position - from);
    }

    /// <summary>Steps over the word if it stands here, as a whole word.</summary>
    public bool Take(ReadOnlySpan<byte> word)
    {
        SkipWhite();
        if (!data.AsSpan(Position, end - Position).StartsWith(word)) return false;
        int after = Position + word.Length;
        if (after < end && !IsWhite(data[after]) && !IsDelimiter(data[after])) return false;
        Position = after;
        return true;
    }

    public void Expect(ReadOnlySpan<byte> word)
    {
        if (!Take(word)) throw PdfReadException.Malformed($"\"{Encoding.ASCII.GetString(word)}\" expected", Position);
    }

    public int ReadInteger()
    {
        SkipWhite();
        if (!TryUnsigned(out int value)) throw PdfReadException.Malformed("a whole number expected", Position);
        return value;
    }

    /// <summary>Steps over the end of line that the keyword "stream" demands: LF or CR LF.</summary>
    public void SkipStreamLineEnd()
    {
        if (Position < end && data[Position] == 13) Position++;
        if (Position >= end || data[Position] != 10) throw PdfReadException.Malformed("end of line expected after \"stream\"", Position);
        Position++;
    }

    public void Jump(int to) => Position = to;

    public PdfValue ReadValue(int depth = 0)
    {
        if (depth > budget.Limits.Nesting)
            throw new PdfReadException(PdfReadFailure.NestedTooDeep, string.Create(CultureInfo.InvariantCulture, $"The PDF nests values deeper than {budget.Limits.Nesting}."));
        SkipWhite();
        budget.Value();
        if (Position >= end) throw PdfReadException.Malformed("it ends inside a value", Position);
        byte b = data[Position];
        switch (b)
        {
            case (byte)'/': return new PdfName(Name());
            case (byte)'(': return LiteralText();
            case (byte)'[': return Array(depth);
            case (byte)'<': return Position + 1 < end && data[Position + 1] == '<' ? Dictionary(depth) : HexText();
            default:
                if (b is >= (byte)'0' and <= (byte)'9' && Reference() is { } reference) return reference;
                return b is >= (byte)'0' and <= (byte)'9' or (byte)'+' or (byte)'-' or (byte)'.' ? Number() : Word();
        }
    }

    private PdfValue Word()
    {
        if (Take("null"u8)) return PdfNull.Instance;
        if (Take("true"u8)) return new PdfBoolean(true);
        if (Take("false"u8)) return new PdfBoolean(false);
        throw PdfReadException.Malformed("a value expected", Position);
    }

    private bool TryUnsigned(out int value)
    {
        long sum = 0;
        int from = Position;
        while (Position < end && data[Position] is >= (byte)'0' and <= (byte)'9' && sum <= int.MaxValue) sum = sum * 10 + (data[Position++] - '0');
        bool whole = Position > from && sum <= int.MaxValue && (Position == end || IsWhite(data[Position]) || IsDelimiter(data[Position]));
        value = whole ? (int)sum : 0;
        if (!whole) Position = from;
        return whole;
    }

    private PdfReference? Reference()
    {
        int from = Position;
        if (TryUnsigned(out int number))
        {
            while (Position < end && IsWhite(data[Position])) Position++;
            budget.Work(Position - from);
            if (TryUnsigned(out int generation) && Take("R"u8)) return new PdfReference(number, generation);
        }
        Position = from;
        return null;
    }

    private PdfNumber Number()
    {
        int from = Position;
        while (Position < end && !IsWhite(data[Position]) && !IsDelimiter(data[Position]) && Position - from <= LongestNumber) Position++;
        var text = data.AsSpan(from, Position - from);
        if (text.Length <= LongestNumber && double.TryParse(text, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out double value))
            return new PdfNumber(value, !text.Contains((byte)'.'));
        throw PdfReadException.Malformed("a number expected", from);
    }

    private string Name()
    {
        int from = ++Position;
        Span<char> text = stackalloc char[NameTable.Longest];
        int length = 0;
        while (Position < end && !IsWhite(data[Position]) && !IsDelimiter(data[Position]))
        {
            int b = data[Position++];
            if (b == '#')
            {
                if (Position + 2 > end || Hex(data[Position]) < 0 || Hex(data[Position + 1]) < 0)
                    throw PdfReadException.Malformed("# in a name needs two hexadecimal digits", from);
                b = Hex(data[Position]) << 4 | Hex(data[Position + 1]);
                Position += 2;
            }
            if (length == text.Length) throw PdfReadException.Malformed("a name is too long", from);
            text[length++] = (char)b;
        }
        return names.Of(text[..length], budget);
    }

    private PdfArray Array(int depth)
    {
        Position++;
        var items = new List<PdfValue>();
        while (true)
        {
            SkipWhite();
            if (Position < end && data[Position] == ']') break;
            items.Add(ReadValue(depth + 1));
        }
        Position++;
        return new PdfArray(items);
    }

    private PdfDictionary Dictionary(int depth)
    {
        Position += 2;
        var entries = new Dictionary<string, PdfValue>();
        while (true)
        {
            SkipWhite();
            if (Position + 1 < end && data[Position] == '>' && data[Position + 1] == '>') break;
            if (Position >= end || data[Position] != '/')
                throw PdfReadException.Malformed("a name expected as a dictionary's key", Position);
            int at = Position;
            string key = Name();
            // Readers differ in which of two equal keys they believe; a file that needs the answer is not accepted.
            if (!entries.TryAdd(key, ReadValue(depth + 1)))
                throw PdfReadException.Malformed($"the key /{key} stands twice in one dictionary", at);
        }
        Position += 2;
        return new PdfDictionary(entries);
    }

    private PdfText HexText()
    {
        int from = Position++;
        int close = data.AsSpan(Position, end - Position).IndexOf((byte)'>');
        if (close < 0) throw PdfReadException.Malformed("a hexadecimal string does not end", from);
        budget.KeepText(close / 2 + 1);
        var bytes = new byte[(close + 1) / 2];
        int digits = 0;
        foreach (byte b in data.AsSpan(Position, close))
        {
            if (IsWhite(b)) continue;
            int digit = Hex(b);
            if (digit < 0) throw PdfReadException.Malformed("a hexadecimal string holds another character", from);
            bytes[digits / 2] |= (byte)(digits % 2 == 0 ? digit << 4 : digit);
            digits++;
        }
        Position += close + 1;
        System.Array.Resize(ref bytes, (digits + 1) / 2);
        return new PdfText(bytes, true, from, Position);
    }

    private PdfText LiteralText()
    {
        int from = Position++;
        int close = LiteralEnd(from);
        budget.KeepText(close - from);
        var bytes = new byte[close - Position];
        int length = 0;
        while (Position < close)
        {
            byte b = data[Position++];
            if (b == 13)
            {
                if (Position < close && data[Position] == 10) Position++;
                bytes[length++] = 10;
            }
            else if (b != '\\') bytes[length++] = b;
            else if (Escaped(close) is { } meant) bytes[length++] = meant;
        }
        Position = close + 1;
        return new PdfText(bytes[..length], false, from, Position);
    }

    private int LiteralEnd(int from)
    {
        int open = 1;
        for (int i = from + 1; i < end; i++)
        {
            if (data[i] == '\\') i++;
            else if (data[i] == '(') open++;
            else if (data[i] == ')' && --open == 0) return i;
        }
        throw PdfReadException.Malformed("a string does not end", from);
    }

    /// <summary>The byte that an escape means; null for a line that is only broken in the file.</summary>
    private byte? Escaped(int close)
    {
        byte b = data[Position++];
        switch (b)
        {
            case (byte)'n': return 10;
            case (byte)'r': return 13;
            case (byte)'t': return 9;
            case (byte)'b': return 8;
            case (byte)'f': return 12;
            case 10: return null;
            case 13:
                if (Position < close && data[Position] == 10) Position++;
                return null;
            case >= (byte)'0' and <= (byte)'7':
                int value = b - '0';
                for (int i = 0; i < 2 && Position < close && data[Position] is >= (byte)'0' and <= (byte)'7'; i++) value = value * 8 + (data[Position++] - '0');
                return (byte)(value & 255);
            default: return b;
        }
    }

    private static int Hex(byte b) => b switch
    {
        >= (byte)'0' and <= (byte)'9' => b - '0',
        >= (byte)'A' and <= (byte)'F' => b - 'A' + 10,
        >= (byte)'a' and <= (byte)'f' => b - 'a' + 10,
        _ => -1,
    };
}
