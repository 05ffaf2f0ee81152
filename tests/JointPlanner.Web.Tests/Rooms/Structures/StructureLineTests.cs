using JointPlanner.Web.Rooms.Structures;
using JointPlanner.Web.Tests.Rooms.Revisions;

namespace JointPlanner.Web.Tests.Rooms.Structures;

public sealed class StructureLineTests(RevisionHouse house) : IClassFixture<RevisionHouse>
{
    [Theory]
    [InlineData("plover", "Plover Flats Bridge")]
    [InlineData("PLÖVER flats", "Plover Flats Bridge")]
    [InlineData("D-003", "Kestrel Lane Overbridge")]
    [InlineData("d-003 township", "Kestrel Lane Overbridge")]
    public async Task A_structure_is_found_by_any_words_of_its_name_number_place_and_owner(string sought, string name)
    {
        await using var scope = await house.Life.As("designer");
        var found = (await StructureLine.All(scope)).Where(line => line.Answers(sought)).ToList();
        Assert.Equal(name, Assert.Single(found).Name);
    }

    [Fact]
    public async Task All_are_found_by_their_owner_and_none_by_a_word_that_no_field_holds()
    {
        await using var scope = await house.Life.As("designer");
        var all = await StructureLine.All(scope);
        Assert.True(all.Count >= 4);
        Assert.All(all, line => Assert.True(line.Answers("demonstration roads")));
        Assert.DoesNotContain(all, line => line.Answers("demonstration railways"));
        Assert.All(all, line => Assert.True(line.Answers("  ")));
    }

    [Fact]
    public async Task An_issued_sheet_is_one_press_from_the_list()
    {
        var revision = await house.Life.Issued("Plover Flats Bridge");
        var contractor = await house.Browser("contractor");
        var list = await contractor.GetStringAsync("/");
        Assert.Contains($"href=\"revisions/{revision}/sheet.pdf\"", list, StringComparison.Ordinal);
        var sheet = await contractor.GetByteArrayAsync($"/revisions/{revision}/sheet.pdf");
        Assert.Equal((await house.Life.Document(revision)).Bytes, sheet);
    }
}
