using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.Tests.Databases;

namespace JointPlanner.Archive.Tests.Confirming;

public class ConfirmationsTests
{
    private static ConfirmRequest Request(World world, string edition = "2020") =>
        new(world.Owner.Id, "table/cold", "Bridge design code", edition, "Table 3", new DateOnly(2031, 5, 1));

    [Theory, BothDatabases]
    public async Task A_confirmation_counts_until_revoked_and_the_latest_counts(Kind kind)
    {
        await using var world = await World.Make(kind);
        var first = await world.Confirmations.Confirm(world.By(world.Mara), Request(world));
        await using var scope = await world.As(world.Ines);
        var counting = Assert.Single(await Confirmations.InForce(scope, world.Owner.Id)).Value;
        Assert.Equal(("Mara Ekholm", "2020", new DateOnly(2031, 5, 1)), (counting.PersonName, counting.Edition, counting.Date));

        var second = await world.Confirmations.Confirm(world.By(world.Mara), Request(world, "2024"));
        Assert.Equal("2024", (await Confirmations.InForce(scope, world.Owner.Id))["table/cold"].Edition);
        await world.Confirmations.Revoke(world.By(world.Mara), second.ConfirmationId, "Misread.");
        Assert.Equal("2020", (await Confirmations.InForce(scope, world.Owner.Id))["table/cold"].Edition);
        await world.Confirmations.Revoke(world.By(world.Mara), first.ConfirmationId, "Misread too.");
        Assert.Empty(await Confirmations.InForce(scope, world.Owner.Id));
        await Journey.Refused(RefusalReason.AlreadyDone, () => world.Confirmations.Revoke(world.By(world.Mara), first.ConfirmationId, "Again."));
    }

    [Theory, BothDatabases]
    public async Task Only_an_owner_of_that_organisation_confirms_and_revokes(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Organisations.SetRoles(world.By(world.Ada), world.Owner.Id, world.Jon.Id, [Archive.People.Role.Designer]);
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Confirmations.Confirm(world.By(world.Jon), Request(world)));
        var confirmed = await world.Confirmations.Confirm(world.By(world.Mara), Request(world));
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Confirmations.Revoke(world.By(world.Jon), confirmed.ConfirmationId, "x"));
    }

    [Theory, BothDatabases]
    public async Task Each_part_of_a_confirmation_is_needed(Kind kind)
    {
        await using var world = await World.Make(kind);
        foreach (var request in (ConfirmRequest[])[Request(world) with { Document = "" }, Request(world) with { Edition = " " }, Request(world) with { Place = "" }])
            await Journey.Refused(RefusalReason.TextMissing, () => world.Confirmations.Confirm(world.By(world.Mara), request));
    }
}
