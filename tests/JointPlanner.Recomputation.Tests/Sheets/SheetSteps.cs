using System.Globalization;
using System.Text.RegularExpressions;
using JointPlanner.Recomputation.Tests.Reading;

namespace JointPlanner.Recomputation.Tests.Sheets;

/// <summary>The steps of a calculation sheet as they stand in its text: tables of given and table values, formulas with their values put in, searches.</summary>
public static partial class SheetSteps
{
    private static readonly string[] HeadsOfValues = ["Step", "Symbol", "What it is", "Value", "Where it comes from"];

    /// <summary>Every step behind the heading of the steps, in order.</summary>
    public static IReadOnlyList<StepBlock> Of(IReadOnlyList<SheetPart> sheet)
    {
        var steps = new List<StepBlock>();
        var label = "";
        foreach (var part in sheet.SkipWhile(p => !(p.Type is "H1" && p.Text.EndsWith("Steps", StringComparison.Ordinal))).Skip(1))
        {
            switch (part.Type)
            {
                case "P" when Reference().IsMatch(part.Text):
                    label = part.Text;
                    break;
                case "P" when part.Text.StartsWith("Printed digits do not suffice", StringComparison.Ordinal):
                    steps[^1] = steps[^1] with { SaysItFallsShort = true };
                    break;
                case "Formula":
                    steps.Add(Computed(label, part));
                    break;
                case "Table" when Heads(part).SequenceEqual(HeadsOfValues):
                    steps.AddRange(part.Parts.Where(p => p.Type == "TR").Skip(1).Select(Given));
                    break;
                case "Table" when part.Parts is [{ Type: "Caption" } caption, ..] && Reference().IsMatch(caption.Text):
                    var value = PrintedValue.Whole(Plain(caption.Text[(caption.Text.LastIndexOf(": ", StringComparison.Ordinal) + 2)..]));
                    steps.Add(new StepBlock(NumberOf(caption.Text), Heading(caption.Text), null, [], value, value, false));
                    break;
            }
        }

        return steps;
    }

    /// <summary>Where the letters drawn for a formula are not those of the text that stands for them: brackets, bars of fractions, signs of roots, low and high places apart.</summary>
    public static IEnumerable<string> DrawnOtherwise(IReadOnlyList<SheetPart> sheet) =>
        from part in sheet
        where part.Type == "Formula"
        from line in part.Stretches
        where Letters(line.Drawn) != Letters(line.Read)
        select $"drawn “{line.Drawn}”, read “{line.Read}”";

    private static StepBlock Given(SheetPart row)
    {
        var cells = row.Parts.Select(p => p.Text).ToArray();
        var value = PrintedValue.Whole(Plain(cells[3]));
        return new StepBlock(NumberOf(cells[0]), $"{cells[1]}: {cells[2]}", null, [], value, value, false);
    }

    private static StepBlock Computed(string label, SheetPart formula)
    {
        var lines = new List<string>();
        foreach (var stretch in formula.Stretches.Select(s => Plain(s.Read)))
        {
            // A line that is too long goes on below without a sign of its own.
            if (lines.Count == 0 || stretch.StartsWith("= ", StringComparison.Ordinal) || stretch.StartsWith("| ", StringComparison.Ordinal)) lines.Add(stretch);
            else lines[^1] += " " + stretch;
        }

        var equals = lines.Skip(1).Where(l => l.StartsWith("= ", StringComparison.Ordinal)).Select(l => l[2..]).ToArray();
        if (equals.Length != 2) throw new FormatException($"{label} has {equals.Length} lines that begin with an equals sign: {string.Join(" ¶ ", lines)}");
        var result = equals[1].Split(", carried on as ");
        return new StepBlock(
            NumberOf(label), Heading(label), equals[0], [.. lines.Where(l => l.StartsWith("| ", StringComparison.Ordinal)).Select(l => l[2..])],
            PrintedValue.Whole(result[0]), PrintedValue.Whole(result[^1]), false);
    }

    private static IEnumerable<string> Heads(SheetPart table) => table.Parts.FirstOrDefault(p => p.Type == "TR")?.Parts.Select(p => p.Text) ?? [];

    private static int NumberOf(string text) => int.Parse(Reference().Match(text).Groups[1].Value, CultureInfo.InvariantCulture);

    private static string Heading(string text) => Reference().Replace(text, "").Trim();

    private static string Plain(string text) => text.Replace('\u00A0', ' ').Trim();

    private static string Letters(string text) => string.Concat(text.Where(c => !char.IsWhiteSpace(c) && c is not ('(' or ')' or '/' or '√' or '_' or '^')));

    [GeneratedRegex(@"^\[(\d+)\]")]
    private static partial Regex Reference();
}
