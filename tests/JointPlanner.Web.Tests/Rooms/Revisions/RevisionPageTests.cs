using System.Text;
using JointPlanner.Archive.Revisions;
using JointPlanner.Exchange.Packages;

namespace JointPlanner.Web.Tests.Rooms.Revisions;

/// <summary>What the revision's page says, as it is sent.</summary>
public sealed class RevisionPageTests(RevisionHouse house) : IClassFixture<RevisionHouse>
{
    [Fact]
    public async Task The_checkers_page_is_made_from_the_frozen_package_alone()
    {
        const string real = "Plover Flats Bridge", planted = "Planted Name Bridge";
        var revision = await house.Life.FrozenWith(real, "%PDF-1.7 planted"u8.ToArray(), frozen =>
        {
            var package = Encoding.UTF8.GetString(frozen.Package).Replace(real, planted, StringComparison.Ordinal);
            var results = ResultsFile.Read(frozen.Results).Results!;
            results = results with
            {
                Package = ContentHash.Of(Encoding.UTF8.GetBytes(package)),
                Values = [.. results.Values.Select(v => v.Key == "joint/j1/setting/set" ? v with { Value = 0.0254 * 7.25 } : v)],
            };
            return (package, Encoding.UTF8.GetString(ResultsFile.ToUtf8(results)));
        });
        var page = RevisionHouse.Text(await (await house.Browser("checker")).GetStringAsync($"/revisions/{revision}"));
        Assert.Contains(planted, page, StringComparison.Ordinal);
        Assert.Contains(" 7 1/4 in ", page, StringComparison.Ordinal);
        Assert.Contains("No earlier revision of this structure was issued; all of it is new.", page, StringComparison.Ordinal);
        Assert.Contains("Accept", page, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_differs_from_the_last_issue_is_told_in_words_units_and_direction_and_the_earlier_one_is_superseded_at_once()
    {
        const string structure = "Sorrel Creek Crossing", path = "joints/j1/setting/temperature";
        var first = await house.Life.Issued(structure);
        await house.Life.Changed(structure, path, "21 °C");
        var second = await house.Life.Frozen(structure);
        var checker = await house.Browser("checker");

        var page = RevisionHouse.Text(await checker.GetStringAsync($"/revisions/{second}"));
        Assert.Contains("What differs from revision 1, the last issue", page, StringComparison.Ordinal);
        Assert.Contains(path, page, StringComparison.Ordinal);
        Assert.Contains(Exchange.Plans.PlanFields.Table.At(path)!.Name, page, StringComparison.Ordinal);
        Assert.Contains(" 21 °C ", page, StringComparison.Ordinal);
        Assert.Matches(@"joint/j1/opens-by/uniform-temperature [\d.]+ mm [\d.]+ mm opens more, by [\d.]+ mm", page);

        await house.Life.Accept(second);
        await house.Life.Sign(second, SignatureField.Designer);
        await house.Life.Sign(second, SignatureField.Checker);
        Assert.Contains("Revision 1 issued", RevisionHouse.Text(await checker.GetStringAsync($"/revisions/{first}")), StringComparison.Ordinal);
        await house.Life.Issue(second);
        var earlier = RevisionHouse.Text(await checker.GetStringAsync($"/revisions/{first}"));
        Assert.Contains("Revision 1 superseded", earlier, StringComparison.Ordinal);
        Assert.Contains("Revision 2 was issued. Do not build or set a joint from this one.", earlier, StringComparison.Ordinal);

        await house.Life.Withdraw(second, "The skew of joint A was read from the wrong drawing.");
        var withdrawn = RevisionHouse.Text(await checker.GetStringAsync($"/revisions/{second}"));
        Assert.Contains("because: The skew of joint A was read from the wrong drawing. Do not build or set a joint from it.", withdrawn, StringComparison.Ordinal);
        Assert.Contains("Begin the next revision", RevisionHouse.Text(await (await house.Browser("designer")).GetStringAsync($"/revisions/{second}")), StringComparison.Ordinal);
        Assert.DoesNotContain("Begin the next revision", withdrawn, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_chain_names_who_did_what_and_explains_the_number_that_was_never_issued()
    {
        const string structure = "Tarn Moss Viaduct";
        var first = await house.Life.Frozen(structure);
        await house.Life.Return(first, "The pier heights of P2 are missing.");
        var second = await house.Life.Issued(structure);
        var designer = RevisionHouse.Text(await (await house.Browser("designer")).GetStringAsync($"/revisions/{second}"));
        Assert.Matches(@"returned with remarks by Milan Prochazka", designer);
        Assert.Contains("Remark: The pier heights of P2 are missing.", designer, StringComparison.Ordinal);
        Assert.Contains("Never issued: its number stays with what was frozen, and the work went on in revision 2.", designer, StringComparison.Ordinal);
        // Who sees only what was issued is told of the gap, and not what the checker wrote.
        var contractor = RevisionHouse.Text(await (await house.Browser("contractor")).GetStringAsync($"/revisions/{second}"));
        Assert.Contains("Revision 1 Not issued, and not open to you", contractor, StringComparison.Ordinal);
        Assert.DoesNotContain("pier heights", contractor, StringComparison.Ordinal);
    }

    [Fact]
    public async Task One_altered_byte_in_the_stored_package_is_told_and_no_act_is_offered()
    {
        var revision = await house.Life.Frozen("Kestrel Lane Overbridge");
        var checker = await house.Browser("checker");
        Assert.Contains("Accepting says that you checked", RevisionHouse.Text(await checker.GetStringAsync($"/revisions/{revision}")), StringComparison.Ordinal);
        await StoredBytes.Alter(house.Folder, revision);
        var page = RevisionHouse.Text(await checker.GetStringAsync($"/revisions/{revision}"));
        Assert.Contains("The stored calculation package was altered", page, StringComparison.Ordinal);
        Assert.DoesNotContain("Accepting says that you checked", page, StringComparison.Ordinal);
    }
}
