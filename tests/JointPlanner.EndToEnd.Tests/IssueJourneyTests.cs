using JointPlanner.Pdf.Verifying;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>From a demo structure to an issued sheet: the owner confirms, the designer freezes and signs, another person checks and signs, the owner issues.</summary>
public sealed class IssueJourneyTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_demo_structure_is_confirmed_frozen_checked_signed_twice_and_issued()
    {
        var issued = await site.Issue("Plover Flats Bridge");

        var download = await issued.Owner.Page.Context.APIRequest.GetAsync($"{site.Address}{issued.Revision}/sheet.pdf");
        var report = new Verifier([]).Verify(await download.BodyAsync());
        Assert.Equal(["designer", "checker"], report.Signatures.Select(s => s.Field));
        Assert.All(report.Signatures, s => Assert.Equal(UnchangedVerdict.Unchanged, s.Unchanged.Verdict));
        Assert.Empty(issued.Owner.Troubles.Concat(issued.Designer.Troubles).Concat(issued.Checker.Troubles));
    }
}
