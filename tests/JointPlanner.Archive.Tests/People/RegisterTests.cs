using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Structures;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.People;

public class RegisterTests
{
    [Theory, BothDatabases]
    public async Task A_certificate_counts_once_an_administrator_has_confirmed_its_fingerprint(Kind kind)
    {
        await using var world = await World.Make(kind);
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        var answer = await world.Certificates.Register(world.By(world.Ines), Certificate(key, "Ines Brandt"));
        await using var scope = await world.As(world.Ines);
        Assert.False((await scope.Certificates().SingleAsync()).Counts);

        await Journey.Refused(RefusalReason.NotYourAct, () => world.Certificates.Confirm(world.By(world.Mara), answer.CertificateId, answer.Fingerprint));
        await Journey.Refused(RefusalReason.HashDiffers, () => world.Certificates.Confirm(world.By(world.Ada), answer.CertificateId, new string('e', 64)));
        var readOut = string.Join(':', answer.Fingerprint.ToUpperInvariant().Chunk(2).Select(pair => new string(pair)));
        await world.Certificates.Confirm(world.By(world.Ada), answer.CertificateId, readOut);
        Assert.True((await scope.Certificates().SingleAsync()).Counts);

        await world.Certificates.Revoke(world.By(world.Ines), answer.CertificateId);
        Assert.False((await scope.Certificates().SingleAsync()).Counts);
    }

    [Theory, BothDatabases]
    public async Task The_hashes_are_those_of_the_certificate_and_of_its_public_key(Kind kind)
    {
        await using var world = await World.Make(kind);
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        var encoded = Certificate(key, "Ines Brandt");
        var answer = await world.Certificates.Register(world.By(world.Ines), encoded);
        Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(encoded)), answer.Fingerprint);
        Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(key.ExportSubjectPublicKeyInfo())), answer.PublicKeyHash);
    }

    [Theory, BothDatabases]
    public async Task Two_persons_do_not_register_one_key_and_nobody_something_else(Kind kind)
    {
        await using var world = await World.Make(kind);
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        var ines = Certificate(key, "Ines Brandt");
        await world.Certificates.Register(world.By(world.Ines), ines);
        await Journey.Refused(RefusalReason.AlreadyDone, () => world.Certificates.Register(world.By(world.Ines), ines));
        await Journey.Refused(RefusalReason.SameKey, () => world.Certificates.Register(world.By(world.Otto), Certificate(key, "Otto Quist")));
        await Journey.Refused(RefusalReason.CertificateUnknown, () => world.Certificates.Register(world.By(world.Otto), [1, 2, 3]));
    }

    [Theory, BothDatabases]
    public async Task Organisations_and_roles_are_the_administrators(Kind kind)
    {
        await using var world = await World.Make(kind);
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Organisations.Create(world.By(world.Mara), "A new board"));
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Organisations.SetRoles(world.By(world.Mara), world.Owner.Id, world.Mara.Id, [Role.Designer]));
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Accounts.SetActive(world.By(world.Mara), world.Kim.Id, active: false));

        var made = await world.Organisations.Create(world.By(world.Ada), "A new board");
        await Journey.Refused(RefusalReason.AlreadyDone, () => world.Organisations.Create(world.By(world.Ada), "A new board"));
        await world.Organisations.SetRoles(world.By(world.Ada), made.OrganisationId, world.Kim.Id, [Role.Designer, Role.Checker]);
        await world.Organisations.SetRoles(world.By(world.Ada), made.OrganisationId, world.Kim.Id, [Role.Checker, Role.Owner]);
        await using var scope = await world.As(world.Ada);
        Assert.Equal([Role.Checker, Role.Owner], await scope.Memberships().Where(row => row.OrganisationId == made.OrganisationId).Select(row => row.Role).OrderBy(role => role).ToListAsync());
        Assert.Equal("from [Checker, Designer] to [Checker, Owner]", Sorted((await scope.Audit().OrderBy(row => row.Position).LastAsync()).Detail!));
    }

    [Theory, BothDatabases]
    public async Task A_structure_is_opened_to_another_organisation_and_closed_to_it_again(Kind kind)
    {
        await using var world = await World.Make(kind);
        await using var scope = await world.As(world.Stranger);
        await world.Structures.GiveAccess(world.By(world.Mara), world.StructureId, world.Elsewhere.Id, [Role.Designer]);
        Assert.Single(await scope.Structures(Act.Freeze).ToListAsync());
        await world.Structures.GiveAccess(world.By(world.Mara), world.StructureId, world.Elsewhere.Id, []);
        Assert.Empty(await scope.Structures().ToListAsync());
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Structures.GiveAccess(world.By(world.Ines), world.StructureId, world.Elsewhere.Id, [Role.Designer]));
    }

    [Theory, BothDatabases]
    public async Task A_structure_needs_a_name_and_a_zone_that_there_is(Kind kind)
    {
        await using var world = await World.Make(kind);
        var request = new CreateRequest(world.Owner.Id, "Second bridge", "Europe/Oslo", World.FirstPlan);
        await Journey.Refused(RefusalReason.ValueOutOfRange, () => world.Structures.Create(world.By(world.Mara), request with { Zone = "Europe/Nowhere" }));
        await Journey.Refused(RefusalReason.TextMissing, () => world.Structures.Create(world.By(world.Mara), request with { Name = "" }));
        await Journey.Refused(RefusalReason.PlanUnreadable, () => world.Structures.Create(world.By(world.Mara), request with { PlanText = "no plan" }));
        await world.Structures.Create(world.By(world.Mara), request);
    }

    // The order in which a database gives rows back is not promised.
    private static string Sorted(string detail)
    {
        var parts = detail.Split(['[', ']']);
        return $"{parts[0]}[{string.Join(", ", parts[1].Split(", ").Order(StringComparer.Ordinal))}]{parts[2]}[{parts[3]}]";
    }

    private static byte[] Certificate(ECDsa key, string name)
    {
        var request = new CertificateRequest($"CN={name}", key, HashAlgorithmName.SHA256);
        using var certificate = request.CreateSelfSigned(new DateTimeOffset(2031, 1, 1, 0, 0, 0, TimeSpan.Zero), new DateTimeOffset(2033, 1, 1, 0, 0, 0, TimeSpan.Zero));
        return certificate.RawData;
    }
}
