using System.Text.RegularExpressions;
using JointPlanner.Architecture.Tests.Tree;

namespace JointPlanner.Architecture.Tests;

/// <summary>No page asks anything of another host: no address of one stands in what is sent to a browser.</summary>
public partial class OtherHostsTests
{
    // Names of vocabularies, written as addresses but never fetched.
    private static readonly string[] Vocabularies = ["http://www.w3.org/2000/svg", "http://www.w3.org/1999/xlink", "http://www.w3.org/1999/xhtml"];

    private static readonly string[] Sent = [".razor", ".css", ".js", ".html", ".cshtml", ".svg", ".webmanifest"];

    [Fact]
    public void No_page_style_or_script_names_another_host()
    {
        var files = Repository.FilesUnder("src/JointPlanner.Web/", Sent);

        // From the first page on there must be something to search.
        Assert.Equal(Repository.Files.Contains("src/JointPlanner.Web/Program.cs"), files.Count > 0);
        Expect.NoBreach(files.SelectMany(f => HostsIn(f, Repository.Text(f))));
    }

    [Theory]
    [InlineData("<a href=\"https://example.org/help\">help</a>", "https://example.org")]
    [InlineData("<script src='//cdn.example.org/x.js'></script>", "//cdn.example.org")]
    [InlineData("@import url(http://fonts.example.org/css);", "http://fonts.example.org")]
    [InlineData("new WebSocket(\"wss://example.org/live\")", "wss://example.org")]
    public void Another_host_is_found(string text, string host) => Assert.Equal([$"Planted.razor: {host}"], HostsIn("Planted.razor", text));

    [Theory]
    [InlineData("<svg xmlns=\"http://www.w3.org/2000/svg\">")]
    [InlineData("<a href=\"/archive\">the archive</a> // a comment")]
    [InlineData("@* https has no host here: http:// *@")]
    public void Vocabularies_own_paths_and_comments_are_left_in_peace(string text) => Expect.NoBreach(HostsIn("Innocent.razor", text));

    private static IEnumerable<string> HostsIn(string file, string text)
    {
        foreach (var vocabulary in Vocabularies)
        {
            text = text.Replace(vocabulary, "", StringComparison.Ordinal);
        }
        return Hosts().Matches(text).Select(m => $"{file}: {m.Value.TrimStart('"', '\'', '(')}");
    }

    [GeneratedRegex(@"(https?|wss?|ftp)://[\w.-]+|[""'(]//[\w-]+\.[\w.-]+")]
    private static partial Regex Hosts();
}
