using System.Security.Cryptography;
using System.Text.Json;
using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Exchange.Plans;
using JointPlanner.Issuing;
using JointPlanner.Pdf.Signing;
using JointPlanner.Web.Rooms.Revisions;
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using SignRequest = JointPlanner.Pdf.Signing.SignRequest;

namespace JointPlanner.Web.Tests.Rooms.Revisions;

/// <summary>Leads revisions of the demonstration through their life by the acts themselves, so that a test begins where it has something to ask.</summary>
/// <param name="services">The running site's.</param>
/// <param name="folder">Its folder, with the key files.</param>
public sealed class RevisionLife(IServiceProvider services, string folder)
{
    private T The<T>()
        where T : notnull => services.GetRequiredService<T>();

    public async Task<ActCall> By(string account)
    {
        await using var scope = services.CreateAsyncScope();
        var person = await scope.ServiceProvider.GetRequiredService<UserManager<Person>>().FindByNameAsync(account);
        return ActCall.AtConsole(person!.Id, The<TimeProvider>().GetUtcNow());
    }

    public async Task<ArchiveScope> As(string account) => await ArchiveScope.Enter(The<IDbContextFactory<ArchiveContext>>(), (await By(account)).PersonId);

    /// <summary>A demo structure by its name.</summary>
    public async Task<Guid> Structure(string name)
    {
        await using var scope = await As("designer");
        return await scope.Structures().Where(s => s.Name == name).Select(s => s.Id).SingleAsync();
    }

    /// <summary>The latest revision of a structure.</summary>
    public async Task<Revision> Latest(Guid structure)
    {
        await using var scope = await As("designer");
        return await scope.Revisions().Include(r => r.States).Where(r => r.StructureId == structure).OrderByDescending(r => r.Number).FirstAsync();
    }

    /// <summary>Freezes the draft as the page does.</summary>
    public async Task<Guid> Frozen(string structure)
    {
        var draft = await Latest(await Structure(structure));
        await The<RevisionDesk>().Freeze(await By("designer"), draft.Id);
        return draft.Id;
    }

    /// <summary>Freezes the draft with stored texts and a sheet of the test's own.</summary>
    public async Task<Guid> FrozenWith(string structure, byte[] sheet, Func<FrozenCalculation, (string Package, string Results)>? texts = null)
    {
        var draft = await Latest(await Structure(structure));
        var calculation = The<Web.Rooms.Structure.PlanDesk>().Compute(PlanDocument.Parse(draft.PlanText).Document!, CancellationToken.None);
        var frozen = FrozenCalculation.Of(calculation, [], new SheetTitle { Revision = "1", Date = DateTimeOffset.UnixEpoch });
        var (package, results) = texts?.Invoke(frozen) ?? (System.Text.Encoding.UTF8.GetString(frozen.Package), System.Text.Encoding.UTF8.GetString(frozen.Results));
        await The<FreezeRevision>().Do(await By("designer"), new FreezeRequest(draft.Id, draft.PlanHash, [], package, results, sheet, ProgramVersion.Number));
        return draft.Id;
    }

    public async Task Accept(Guid revision)
    {
        await using var scope = await As("checker");
        var hash = await scope.Packages().Where(p => p.RevisionId == revision).Select(p => p.PackageHash).SingleAsync();
        await The<AcceptRevision>().Do(await By("checker"), new AcceptRequest(revision, hash));
    }

    public async Task Return(Guid revision, string remark) => await The<ReturnRevision>().Do(await By("checker"), new ReturnRequest(revision, [new RemarkText(remark)]));

    /// <summary>Signs with the demo key, as the person would at home; gives the signed sheet.</summary>
    public async Task<byte[]> Signed(Guid revision, SignatureField field)
    {
        var account = SignatureJudge.NameOf(field);
        var stored = await Document(revision);
        using var key = Key(account);
        var signed = await Signer.SignAsync(stored.Bytes, new SignRequest
        {
            Field = account,
            Certificate = key.Certificate,
            Instant = The<TimeProvider>().GetUtcNow(),
            SignerName = account,
            ExpectedSha256 = Convert.ToHexString(SHA256.HashData(stored.Bytes)),
        });
        return signed.Bytes;
    }

    public async Task Sign(Guid revision, SignatureField field)
    {
        var stored = await Document(revision);
        await The<RevisionDesk>().Sign(await By(SignatureJudge.NameOf(field)), revision, field, stored.Hash, await Signed(revision, field));
    }

    /// <summary>Issues a checked and signed revision; that values from memory are unconfirmed is another test's matter.</summary>
    public async Task Issue(Guid revision)
    {
        var stored = await Document(revision);
        using var designer = Key("designer");
        using var checker = Key("checker");
        var signatures = SignatureJudge.Verified(stored.Bytes, [designer.Certificate, checker.Certificate]);
        await The<IssueRevision>().Do(await By("owner"), new IssueRequest(revision, new IssueFacts(stored.Hash, [], [], [], signatures)));
    }

    /// <summary>All the way from the draft to issued.</summary>
    public async Task<Guid> Issued(string structure)
    {
        var revision = await Frozen(structure);
        await Accept(revision);
        await Sign(revision, SignatureField.Designer);
        await Sign(revision, SignatureField.Checker);
        await Issue(revision);
        return revision;
    }

    /// <summary>Begins the next revision with one field changed.</summary>
    public async Task<Guid> Changed(string structure, string path, string text)
    {
        var id = await Structure(structure);
        var plan = PlanDocument.Parse((await Latest(id)).PlanText).Document!.With(path, text);
        return (await The<BeginRevision>().Do(await By("designer"), new BeginRequest(id, plan.ToJson()))).RevisionId;
    }

    public async Task Withdraw(Guid revision, string reason) => await The<WithdrawRevision>().Do(await By("owner"), new WithdrawRequest(revision, reason));

    public async Task<StoredDocument> Document(Guid revision)
    {
        await using var scope = await As("designer");
        return await scope.Document(revision);
    }

    /// <summary>A demo signer's key.</summary>
    public Pfx Key(string account) => Pfx.Load(File.ReadAllBytes(Path.Combine(folder, $"demo-{account}.pfx")), Password(account)).Key!;

    public string Password(string account) => JsonSerializer.Deserialize<Dictionary<string, string>>(File.ReadAllText(Path.Combine(folder, "demo-people.json")))![account];
}
