using System.Text;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Tests.Databases;

/// <summary>The usual way of a revision, step by step, so that a test goes as far as it needs and then does its one thing.</summary>
public static class Journey
{
    public const string Package = """{"package":"rev 1","plan":"…","α":"1.2e-5"}""";
    public const string Results = """{"joint/j1/opens-by":"0.0123"}""";
    public static readonly byte[] Sheet = Encoding.ASCII.GetBytes("%PDF-2.0 sheet as frozen");

    public static FreezeRequest FreezeRequest(Guid revisionId, string plan = World.FirstPlan) =>
        new(revisionId, World.PlanHash(plan), [], Package, Results, Sheet, "0.1.0");

    public static async Task<FreezeAnswer> Frozen(this World world, Person? by = null, Guid? revisionId = null) =>
        await world.Freeze.Do(world.By(by ?? world.Ines), FreezeRequest(revisionId ?? world.RevisionId));

    public static async Task<FreezeAnswer> Checked(this World world, Guid? revisionId = null)
    {
        var frozen = await world.Frozen(revisionId: revisionId);
        await world.Accept.Do(world.By(world.Otto), new AcceptRequest(frozen.RevisionId, frozen.PackageHash));
        return frozen;
    }

    /// <summary>Checked and signed in both fields; gives the document's hash.</summary>
    public static async Task<string> Signed(this World world, Guid? revisionId = null)
    {
        var frozen = await world.Checked(revisionId);
        var first = await world.Sign.Do(world.By(world.Ines), await world.SignRequest(world.Ines, frozen.RevisionId, SignatureField.Designer));
        var second = await world.Sign.Do(world.By(world.Otto), await world.SignRequest(world.Otto, frozen.RevisionId, SignatureField.Checker));
        Assert.NotEqual(first.DocumentHash, second.DocumentHash);
        return second.DocumentHash;
    }

    public static async Task<IssueAnswer> Issued(this World world, Guid? revisionId = null)
    {
        var id = revisionId ?? world.RevisionId;
        var hash = await world.Signed(id);
        return await world.Issue.Do(world.By(world.Mara), new IssueRequest(id, world.IssueFacts(hash)));
    }

    public static IssueFacts IssueFacts(this World world, string documentHash) => new(
        documentHash, [], [], [], [new(SignatureField.Designer, KeyOf(world.Ines)), new(SignatureField.Checker, KeyOf(world.Otto))]);

    /// <summary>A signed document as the person would upload it, with the person's confirmed certificate.</summary>
    public static async Task<SignRequest> SignRequest(this World world, Person person, Guid revisionId, SignatureField field)
    {
        await world.Certified(person);
        await using var scope = await world.As(person);
        var document = await scope.Document(revisionId);
        byte[] signed = [.. document.Bytes, .. Encoding.ASCII.GetBytes($" signature of the {field} {person.Name}")];
        return new SignRequest(revisionId, field, document.Hash, signed, new SignatureFacts(FingerprintOf(person), KeyOf(person), []));
    }

    /// <summary>Gives the person a registered and confirmed certificate (written directly; the register has its own tests).</summary>
    public static async Task Certified(this World world, Person person, string? key = null)
    {
        await using var context = world.Archive.CreateDbContext();
        if (context.Certificates.Any(row => row.PersonId == person.Id)) return;
        context.Certificates.Add(new Certificate
        {
            PersonId = person.Id,
            Subject = $"CN={person.Name}",
            Fingerprint = FingerprintOf(person),
            PublicKeyHash = key ?? KeyOf(person),
            Encoded = [1, 2, 3],
            ValidUntil = world.Clock.Now.AddYears(1),
            RegisteredAt = world.Clock.Now,
            ConfirmedAt = world.Clock.Now,
            ConfirmedById = world.Ada.Id,
        });
        await context.SaveChangesAsync();
    }

    public static string FingerprintOf(Person person) => Fingerprint.Of($"certificate of {person.Name}");

    public static string KeyOf(Person person) => Fingerprint.Of($"key of {person.Name}");

    public static async Task<RevisionState> StateOf(this World world, Guid revisionId)
    {
        await using var context = world.Archive.CreateDbContext();
        return context.StateEntries.Where(row => row.RevisionId == revisionId).OrderBy(row => row.Ordinal).ToList()[^1].State;
    }

    /// <summary>Demands this refusal.</summary>
    public static async Task<string> Refused(RefusalReason reason, Func<Task> act)
    {
        var refusal = await Assert.ThrowsAsync<ActRefused>(act);
        Assert.Equal(reason, refusal.Reason);
        Assert.False(string.IsNullOrWhiteSpace(refusal.Message));
        return refusal.Message;
    }
}
