using System.Text.RegularExpressions;
using JointPlanner.Architecture.Tests.Tree;

namespace JointPlanner.Architecture.Tests;

/// <summary>Rooms are called after what they hold. A drawer for the rest is where a design goes to die.</summary>
public partial class NamesTests
{
    private static readonly string[] Drawers = ["Utilities", "Utils", "Helpers", "Common", "Services", "Managers", "Misc"];

    [Fact]
    public void No_folder_and_no_namespace_is_a_drawer_for_the_rest()
    {
        var files = Repository.FilesUnder("", ".cs", ".razor").Where(f => !f.StartsWith("tests/JointPlanner.Architecture.Tests/NamesTests", StringComparison.Ordinal)).ToList();

        Assert.True(files.Count > 50, $"only {files.Count} files");
        Expect.NoBreach(files.SelectMany(f => DrawersIn(f, Repository.Text(f))));
    }

    [Theory]
    [InlineData("src/JointPlanner.Web/Services/Clock.cs", "namespace JointPlanner.Web;", "src/JointPlanner.Web/Services/Clock.cs: Services")]
    [InlineData("src/JointPlanner.Common/Text.cs", "namespace JointPlanner.Text;", "src/JointPlanner.Common/Text.cs: Common")]
    [InlineData("src/A/B.cs", "namespace JointPlanner.Web.Helpers;", "src/A/B.cs: Helpers")]
    [InlineData("src/A/B.cs", "namespace JointPlanner.Utils.Text\n{", "src/A/B.cs: Utils")]
    [InlineData("src/A/B.razor", "@namespace JointPlanner.Web.Common", "src/A/B.razor: Common")]
    public void A_drawer_is_found(string file, string text, string breach) => Assert.Equal([breach], DrawersIn(file, text));

    [Theory]
    [InlineData("src/JointPlanner.Web/Rooms/Page.razor", "@inject IServiceProvider Services")]
    [InlineData("src/JointPlanner.Web/CommonGround.cs", "namespace JointPlanner.Web;\n\nusing X.Services;")]
    public void Words_elsewhere_are_left_in_peace(string file, string text) => Expect.NoBreach(DrawersIn(file, text));

    private static IEnumerable<string> DrawersIn(string file, string text)
    {
        var folders = file.Split('/')[..^1].SelectMany(f => f.Split('.'));
        var namespaces = Namespaces().Matches(text).SelectMany(m => m.Groups[1].Value.Split('.'));
        return folders.Concat(namespaces).Intersect(Drawers).Select(d => $"{file}: {d}");
    }

    [GeneratedRegex(@"^@?namespace\s+([\w.]+)", RegexOptions.Multiline)]
    private static partial Regex Namespaces();
}
