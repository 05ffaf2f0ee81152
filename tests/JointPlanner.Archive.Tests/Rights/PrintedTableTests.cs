using JointPlanner.Archive.Rights;

namespace JointPlanner.Archive.Tests.Rights;

public class PrintedTableTests
{
    [Fact]
    public void The_table_in_the_developers_page_is_the_one_that_the_program_goes_by()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (!File.Exists(Path.Combine(folder.FullName, "JointPlanner.sln"))) folder = folder.Parent!;
        var page = File.ReadAllText(Path.Combine(folder.FullName, "DEVELOPERS.md")).ReplaceLineEndings("\n");
        var begin = page.IndexOf("| act | role |", StringComparison.Ordinal);
        Assert.True(begin >= 0, "DEVELOPERS.md has no rights table.");
        var printed = page[begin..];
        var end = printed.IndexOf("\n\n", StringComparison.Ordinal);
        Assert.Equal(RightsTable.Printed(), printed[..(end + 1)]);
    }
}
