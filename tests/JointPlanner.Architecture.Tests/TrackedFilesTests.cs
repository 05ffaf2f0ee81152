using System.Text;
using System.Text.RegularExpressions;
using JointPlanner.Architecture.Tests.Tree;

namespace JointPlanner.Architecture.Tests;

/// <summary>What a commit holds is for everyone to read: no key, no database, no trace of the machine it was written on.</summary>
public partial class TrackedFilesTests
{
    private static readonly string[] Kinds = [".pfx", ".p12", ".key", ".db", ".db-wal", ".db-shm", ".sqlite", ".sqlite3", ".user", ".suo", ".trx"];

    [Fact]
    public void No_file_holds_a_key_a_database_or_a_path_of_somebodys_machine()
    {
        Assert.True(Repository.Files.Count > 100, $"only {Repository.Files.Count} files");
        Expect.NoBreach(Repository.Files.SelectMany(f => Breaches(f, File.ReadAllBytes(Path.Combine(Repository.Root, f)), Repository.Root)));
    }

    // The plants are put together from pieces, for this file is among those searched.
    [Theory]
    [InlineData("a/b.pfx", "", "a/b.pfx is a file of a kind that is never committed")]
    [InlineData("data.db", "", "data.db is a file of a kind that is never committed")]
    [InlineData("a.pem", "x\n-----BEGIN |RSA PRIVATE KEY-----\n", "a.pem holds a private key")]
    [InlineData("a.cs", "var key = \"-----BEGIN |PRIVATE KEY-----\";", "a.cs holds a private key")]
    [InlineData("a.md", "see /ho|me/somebody/notes", "a.md holds the path /ho|me/somebody")]
    [InlineData("a.md", "see /Us|ers/somebody/notes", "a.md holds the path /Us|ers/somebody")]
    [InlineData("a.md", "see C:\\Us|ers\\somebody", "a.md holds the path C:\\Us|ers\\somebody")]
    [InlineData("a.sh", "cd /ro|ot/x", "a.sh holds the path /ro|ot/x")]
    [InlineData("a.sh", "cd /where/it/li|es/src", "a.sh holds the path /where/it/li|es")]
    public void A_breach_is_found(string file, string text, string breach) =>
        Assert.Equal([Whole(breach)], Breaches(file, Encoding.UTF8.GetBytes(Whole(text)), Whole("/where/it/li|es")));

    [Fact]
    public void Certificates_and_ordinary_paths_are_left_in_peace() =>
        Expect.NoBreach(Breaches("a.md", Encoding.UTF8.GetBytes("/tmp, /home, /var/lib, /usr/lib/postgresql\n-----BEGIN CERTIFICATE-----\n"), Whole("/where/it/li|es")));

    private static string Whole(string text) => text.Replace("|", "", StringComparison.Ordinal);

    private static IEnumerable<string> Breaches(string file, byte[] content, string root)
    {
        if (Kinds.Any(k => file.EndsWith(k, StringComparison.OrdinalIgnoreCase)))
        {
            yield return $"{file} is a file of a kind that is never committed";
        }
        if (content.AsSpan(0, Math.Min(content.Length, 8000)).Contains((byte)0))
        {
            yield break; // pictures and fonts: no text to search
        }
        var text = Encoding.UTF8.GetString(content);
        if (PrivateKeys().IsMatch(text))
        {
            yield return $"{file} holds a private key";
        }
        // A root as short as /src would be found in every script.
        var paths = Homes().Matches(text).Select(m => m.Value);
        if (root.Count(c => c is '/' or '\\') >= 3 && text.Contains(root, StringComparison.Ordinal))
        {
            paths = paths.Append(root);
        }
        foreach (var path in paths.Distinct())
        {
            yield return $"{file} holds the path {path}";
        }
    }

    [GeneratedRegex("-----BEGIN [A-Z ]*PRIVATE KEY-----")]
    private static partial Regex PrivateKeys();

    [GeneratedRegex(@"(?<![\w.}])(/home/|/Users/|[A-Za-z]:\\Users\\|/root/)[A-Za-z][\w-]*")]
    private static partial Regex Homes();
}
