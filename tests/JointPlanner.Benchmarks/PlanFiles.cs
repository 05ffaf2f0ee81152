using System.Globalization;
using System.Text;
using JointPlanner.Exchange.Plans;
using JointPlanner.Issuing;

namespace JointPlanner.Benchmarks;

/// <summary>Plans to measure with: the demo structures, and decks of any length made here.</summary>
public static class PlanFiles
{
    /// <summary>Folder of the seed data.</summary>
    public static string Folder { get; } = Find();

    /// <summary>Names of the demo structures.</summary>
    public static IEnumerable<string> Structures => Directory.GetFiles(Path.Combine(Folder, "structures"), "*.json").Order(StringComparer.Ordinal).Select(f => Path.GetFileNameWithoutExtension(f)!);

    /// <summary>The rule sets that the demo structures name.</summary>
    public static OwnerRuleShelf Shelf { get; } = OwnerRuleShelf.Read(Path.Combine(Folder, "owner-rules"));

    /// <summary>A demo structure's file.</summary>
    public static byte[] Bytes(string structure) => File.ReadAllBytes(Path.Combine(Folder, "structures", structure + ".json"));

    /// <summary>A file as a document.</summary>
    /// <exception cref="InvalidDataException">It is none; the message says why.</exception>
    public static PlanDocument Document(byte[] utf8) =>
        PlanDocument.Parse(utf8) is ({ } document, _) ? document : throw new InvalidDataException(PlanDocument.Parse(utf8).Faults[0].Wrong);

    /// <summary>One steel segment over spans of 40 m, fixed at its middle support, with a joint at each end.</summary>
    /// <param name="spans">Number of spans.</param>
    public static byte[] Deck(int spans)
    {
        var text = new StringBuilder();
        text.Append("""{"schema":"joint-plan/1","structure":{"number":"B-1","name":"Deck to measure","place":"nowhere"},"display":"metric",""");
        text.Append("""
            "basis":{"code":"en-1991-1-5-2003","profile":"generic","owner-rules":"demonstration-metric","setting-doubt":"specified","safety":"degrees","answers":[]},
            "climate":{"source":"made to measure with","shade-max":"36 °C","shade-min":"-24 °C"},
            """);
        var supports = Enumerable.Range(0, spans + 1).Select(i =>
            $$"""{"id":"s{{i}}","mark":"S{{i}}","station":"{{40 * i}} m","kind":"{{(i == 0 || i == spans ? "abutment" : "pier")}}","stiffness":"rigid"}""");
        var bearings = Enumerable.Range(0, spans + 1).Select(i =>
            $$"""{"id":"b{{i}}","segment":"deck","on":"s{{i}}","kind":"{{(i == spans / 2 ? "fixed" : "free")}}","setting":{"temperature":"10 °C","deck-age":"60 d"} }""");
        text.Append(CultureInfo.InvariantCulture, $"\"supports\":[{string.Join(',', supports)}],\"bearings\":[{string.Join(',', bearings)}],");
        text.Append(CultureInfo.InvariantCulture, $$"""
            "segments":[{"id":"deck","mark":"Deck","start":"-0.5 m","end":"{{40 * spans}}.5 m","kind":"steel","axial-stiffness":"30 GN"}],
            "joints":[{"id":"j1","near":"s0","far":"deck","setting":{"temperature":"10 °C"} },{"id":"j2","near":"deck","far":"s{{spans}}","setting":{"temperature":"10 °C"} }]}
            """);
        return Encoding.UTF8.GetBytes(text.ToString());
    }

    private static string Find()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (File.Exists(Path.Combine(folder.FullName, "JointPlanner.sln"))) return Path.Combine(folder.FullName, "seed-data");
        throw new DirectoryNotFoundException("No folder above this program holds JointPlanner.sln.");
    }
}
