using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Tests.Databases;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Tests.Acts;

public class SignRevisionTests
{
    [Theory, BothDatabases]
    public async Task The_sheet_is_the_frozen_bytes_with_each_signature_behind_them(Kind kind)
    {
        await using var world = await World.Make(kind);
        var hash = await world.Signed();
        await using var scope = await world.As(world.Mara);
        var document = await scope.Document(world.RevisionId);
        Assert.Equal(hash, Fingerprint.Of(document.Bytes));
        Assert.Equal(3, document.Segments.Count);
        Assert.True(document.Bytes.AsSpan().StartsWith(Journey.Sheet));
        var length = 0;
        foreach (var segment in document.Segments)
        {
            length += (int)segment.Length;
            Assert.Equal(length, segment.PrefixLength);
            Assert.Equal(Fingerprint.Of(document.Bytes.AsSpan(0, length)), segment.PrefixHash);
        }
    }

    [Theory, BothDatabases]
    public async Task The_designer_may_sign_before_and_the_checker_first_after_accepting(Kind kind)
    {
        await using var world = await World.Make(kind);
        var frozen = await world.Frozen();
        await world.Sign.Do(world.By(world.Ines), await world.SignRequest(world.Ines, world.RevisionId, SignatureField.Designer));
        var early = await world.SignRequest(world.Otto, world.RevisionId, SignatureField.Checker);
        await Journey.Refused(RefusalReason.WrongState, () => world.Sign.Do(world.By(world.Otto), early));
        await world.Accept.Do(world.By(world.Otto), new AcceptRequest(world.RevisionId, frozen.PackageHash));
        await world.Sign.Do(world.By(world.Otto), early);
    }

    [Theory, BothDatabases]
    public async Task Each_wrong_upload_is_refused_by_name(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Checked();
        var right = await world.SignRequest(world.Ines, world.RevisionId, SignatureField.Designer);
        var jons = await world.SignRequest(world.Jon, world.RevisionId, SignatureField.Designer);
        var flipped = (byte[])right.Document.Clone();
        flipped[3] ^= 1;
        var cases = new (RefusalReason, SignRequest)[]
        {
            (RefusalReason.DocumentMoved, right with { ExpectedPreviousHash = new string('c', 64) }),
            (RefusalReason.NotAPrefix, right with { Document = flipped }),
            (RefusalReason.NotAPrefix, right with { Document = Journey.Sheet }),
            (RefusalReason.NotAPrefix, right with { Document = [] }),
            (RefusalReason.CertificateUnknown, right with { Facts = jons.Facts }),
            (RefusalReason.CertificateUnknown, right with { Facts = right.Facts with { CertificateFingerprint = new string('d', 64) } }),
            (RefusalReason.CertificateUnknown, right with { Facts = right.Facts with { PublicKeyHash = Journey.KeyOf(world.Kim) } }),
            (RefusalReason.SignatureObjection, right with { Facts = right.Facts with { Objections = ["A page was added."] } }),
        };
        foreach (var (reason, request) in cases) await Journey.Refused(reason, () => world.Sign.Do(world.By(world.Ines), request));
        await Journey.Refused(RefusalReason.FieldNotYours, () => world.Sign.Do(world.By(world.Jon), jons));
        await Journey.Refused(RefusalReason.FieldNotYours, () => world.Sign.Do(world.By(world.Ines), right with { Field = SignatureField.Checker }));

        await world.Sign.Do(world.By(world.Ines), right);
        await Journey.Refused(RefusalReason.FieldTaken, () => world.Sign.Do(world.By(world.Ines), right));
    }

    [Theory, BothDatabases]
    public async Task A_certificate_that_no_administrator_confirmed_does_not_sign(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Frozen();
        var request = await world.SignRequest(world.Ines, world.RevisionId, SignatureField.Designer);
        await world.Database.Insider("""UPDATE "Certificates" SET "ConfirmedAt" = NULL""");
        await Journey.Refused(RefusalReason.CertificateUnknown, () => world.Sign.Do(world.By(world.Ines), request));
    }

    [Theory, BothDatabases]
    public async Task The_same_key_in_both_fields_is_refused(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Checked();
        await world.Sign.Do(world.By(world.Ines), await world.SignRequest(world.Ines, world.RevisionId, SignatureField.Designer));
        await world.Certified(world.Otto, key: Journey.KeyOf(world.Ines));
        var request = await world.SignRequest(world.Otto, world.RevisionId, SignatureField.Checker);
        request = request with { Facts = request.Facts with { PublicKeyHash = Journey.KeyOf(world.Ines) } };
        await Journey.Refused(RefusalReason.SameKey, () => world.Sign.Do(world.By(world.Otto), request));
    }

    [Theory, BothDatabases]
    public async Task A_request_is_told_its_first_answer_before_it_makes_another_signature(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Frozen();
        var call = world.By(world.Ines);
        Assert.Null(await world.Sign.Given(call, world.RevisionId, SignatureField.Designer));
        var answer = await world.Sign.Do(call, await world.SignRequest(world.Ines, world.RevisionId, SignatureField.Designer));
        Assert.Equal(answer, await world.Sign.Given(call, world.RevisionId, SignatureField.Designer));
        Assert.Null(await world.Sign.Given(world.By(world.Ines), world.RevisionId, SignatureField.Designer));
        await Journey.Refused(RefusalReason.RequestIdReused, () => world.Sign.Given(call, world.RevisionId, SignatureField.Checker));
        await Journey.Refused(RefusalReason.RequestIdReused, () => world.Sign.Given(call with { PersonId = world.Otto.Id }, world.RevisionId, SignatureField.Designer));
    }
}
