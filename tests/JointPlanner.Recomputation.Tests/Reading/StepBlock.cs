using System.Globalization;
using System.Text.RegularExpressions;

namespace JointPlanner.Recomputation.Tests.Reading;

/// <summary>One step as read from the printed text.</summary>
/// <param name="Number">Its number.</param>
/// <param name="Heading">Symbol and meaning.</param>
/// <param name="Calculation">The line with values put in; null where no formula was used.</param>
/// <param name="Rows">Terms in rows.</param>
/// <param name="Result">The result.</param>
/// <param name="CarriedOn">What later steps use.</param>
/// <param name="SaysItFallsShort">True when the text itself says that its digits do not suffice.</param>
public sealed partial record StepBlock(
    int Number, string Heading, string? Calculation, IReadOnlyList<string> Rows, PrintedValue Result, PrintedValue CarriedOn, bool SaysItFallsShort)
{
    /// <summary>Every step in a text, in order; lines that belong to no step are passed over.</summary>
    public static IReadOnlyList<StepBlock> All(string text)
    {
        var blocks = new List<StepBlock>();
        List<string>? open = null;
        foreach (var line in text.ReplaceLineEndings("\n").Split('\n'))
        {
            if (Head().IsMatch(line))
            {
                Close();
                open = [line];
            }
            else if (line.StartsWith("     ", StringComparison.Ordinal) && open is not null) open.Add(line.Trim());
            else Close();
        }
        Close();
        return blocks;

        void Close()
        {
            if (open is not null) blocks.Add(Read(open));
            open = null;
        }
    }

    private static StepBlock Read(List<string> lines)
    {
        var head = Head().Match(lines[0]);
        var number = int.Parse(head.Groups[1].Value, CultureInfo.InvariantCulture);
        var equals = lines.Skip(2).Where(l => l.StartsWith("= ", StringComparison.Ordinal)).Select(l => l[2..]).ToArray();
        var result = equals.Length switch
        {
            0 => lines[1][(lines[1].IndexOf(" = ", StringComparison.Ordinal) + 3)..],
            2 => equals[1],
            _ => throw new FormatException($"step {number} has {equals.Length} lines that begin with an equals sign"),
        };
        var parts = result.Split(", carried on as ");
        return new StepBlock(
            number, head.Groups[2].Value, equals.Length == 2 ? equals[0] : null,
            [.. lines.Where(l => l.StartsWith("| ", StringComparison.Ordinal)).Select(l => l[2..])],
            PrintedValue.Whole(parts[0]), PrintedValue.Whole(parts[^1]),
            lines.Any(l => l.StartsWith("printed digits do not suffice", StringComparison.Ordinal)));
    }

    [GeneratedRegex(@"^\[(\d+)\] (.*)$")]
    private static partial Regex Head();
}
