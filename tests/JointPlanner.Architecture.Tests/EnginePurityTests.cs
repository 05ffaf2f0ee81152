using System.Text.RegularExpressions;
using JointPlanner.Architecture.Tests.Compiled;
using JointPlanner.Architecture.Tests.Tree;

namespace JointPlanner.Architecture.Tests;

/// <summary>The engine is arithmetic on a plan: it knows no code by name, no clock, culture, file, network or randomness of its own.</summary>
public partial class EnginePurityTests
{
    private static readonly string[] ForbiddenTypes =
        ["System.IO.", "System.Net.", "System.Data.", "System.Globalization.", "System.Text.Json.", "System.Xml.", "System.Diagnostics.Stopwatch",
         "System.Diagnostics.Process", "System.TimeProvider", "System.TimeZoneInfo", "System.Console", "System.Random", "System.Threading.Timer",
         "System.Threading.Thread", "System.Security.Cryptography."];

    private static readonly HashSet<string> ForbiddenMembers =
        ["System.DateTime.get_Now", "System.DateTime.get_UtcNow", "System.DateTime.get_Today", "System.DateTimeOffset.get_Now",
         "System.DateTimeOffset.get_UtcNow", "System.Environment.get_TickCount", "System.Environment.get_TickCount64",
         "System.Environment.GetEnvironmentVariable", "System.Environment.get_CurrentDirectory", "System.Environment.get_MachineName",
         "System.Guid.NewGuid"];

    [Fact]
    public void The_engine_names_no_code()
    {
        var files = Repository.FilesUnder("src/JointPlanner.Engine/", ".cs");

        Assert.True(files.Count > 10, $"only {files.Count} files");
        Expect.NoBreach(files.SelectMany(f => CodesNamed(f, Repository.Text(f))));
    }

    [Theory]
    [InlineData("if (code == \"AASHTO LRFD\") { }", "AASHTO")]
    [InlineData("// as the Eurocode has it", "Eurocode")]
    [InlineData("/// <summary>EN 1991-1-5, 6.1.3</summary>", "EN 1991")]
    [InlineData("var id = \"en-1991-1-5-2003\";", "en-1991")]
    [InlineData("\"WSDOT BDM 9.1.3\"", "WSDOT")]
    [InlineData("// CSA S6:19", "CSA")]
    public void A_code_named_in_the_engine_is_found(string line, string name) =>
        Assert.Equal([$"Planted.cs:2 names {name}"], CodesNamed("Planted.cs", "namespace Planted;\n" + line));

    [Theory]
    [InlineData("var end = given.Length; // then 1991 of them")]
    [InlineData("the causal chain, discards, dinner, fibres")]
    public void Words_that_only_look_like_a_codes_name_are_left_in_peace(string line) => Expect.NoBreach(CodesNamed("Innocent.cs", line));

    [Fact]
    public void The_engine_uses_no_clock_culture_file_or_chance()
    {
        using var engine = Assembly.Of("JointPlanner.Engine");

        Assert.True(engine.Methods().Count() > 100);
        Expect.NoBreach(Impurities(engine));
    }

    [Fact]
    public void A_clock_a_culture_a_file_and_chance_are_found()
    {
        using var planted = Assembly.OfTheseTests();

        string[] expected =
            ["System.IO.File", "System.Globalization.CultureInfo", "System.Diagnostics.Stopwatch", "System.DateTime.get_UtcNow", "System.DateTimeOffset.get_Now",
             "System.Random", "System.Guid.NewGuid", "a number written in the machine's culture"];
        Assert.Empty(expected.Except(Impurities(planted)));
    }

    private static IEnumerable<string> CodesNamed(string file, string text) => text.Split('\n').SelectMany((line, index) =>
        NamesOfCodes().Matches(line).Take(1).Select(m => $"{file}:{index + 1} names {m.Value}"));

    private static List<string> Impurities(Assembly assembly)
    {
        var types = assembly.TypesUsed().Where(t => ForbiddenTypes.Any(f => t == f || (f[^1] == '.' && t.StartsWith(f, StringComparison.Ordinal))));
        var members = assembly.MembersUsed().Select(m => m.FullName).Where(ForbiddenMembers.Contains);
        // A number put into an interpolated text is written in the culture of the moment, and no analyser says so.
        var interpolated = assembly.Methods().SelectMany(m => m.Instructions.Where(i => i.Code.OperandType == System.Reflection.Emit.OperandType.InlineMethod)
                .Select(i => Member.Of(m.Reader, i.Entity)))
            .Where(m => m.FullName == "System.Runtime.CompilerServices.DefaultInterpolatedStringHandler.AppendFormatted" && m.Parameters[0].Names()
                .Any(n => n is "System.Double" or "System.Single" or "System.Decimal" or "System.DateTime" or "System.DateOnly"))
            .Select(_ => "a number written in the machine's culture");
        return [.. types.Concat(members).Concat(interpolated).Distinct()];
    }

    [GeneratedRegex(@"AASHTO|\bLRFD\b|Euro-?code|\b[Ee][Nn][- ]?199\d|\b(BS|DS|SS|NS|NF|UNE|UNI|SFS|PN|ISO|ASTM|AS|NZS|JTG|CJJ|TB|GB|IS|IRC|SNiP)[- /]?\d{2,}|\bDIN\b|\bCSA\b|\bCAN/|\bS6[-:]|WSDOT|\bFHWA\b|\b[A-Z][A-Za-z]{0,4}DOT\b|Caltrans|\bNCHRP\b|\bACI[- ]\d|\bCEB\b|\bfib\b|Model Code|\bUIC\b|\bAREMA\b|\bDMRB\b|\bBD ?\d\d|\bCD ?\d{3}\b|\bAASHO\b|\bPTI\b|\bRiL\b|\bZTV")]
    private static partial Regex NamesOfCodes();
}
