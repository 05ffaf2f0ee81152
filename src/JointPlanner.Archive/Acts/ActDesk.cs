using System.Text.Json;
using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Rights;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Acts;

/// <summary>
/// Does an act once: one transaction, the roles read again in it, its audit entry and its receipt beside what it changed. A refused act changes nothing.
/// </summary>
public sealed class ActDesk(IDbContextFactory<ArchiveContext> archive, TimeProvider clock)
{
    /// <param name="subject">Kind and id of what the act is about; the same request id for another subject is refused.</param>
    internal async Task<TAnswer> Once<TAnswer>(
        ActCall call, Act act, string subject, Func<ActRun, CancellationToken, Task<TAnswer>> does, CancellationToken cancel)
    {
        try
        {
            return await InOneTransaction(call.RequestId, call.PersonId, call.From, act, subject, (run, stop) =>
            {
                PasswordAgain.Need(act, call, run.Now);
                return does(run, stop);
            }, cancel);
        }
        catch (ActRefused refused) when (refused.Reason == RefusalReason.Altered)
        {
            // The one refusal that is itself an event: somebody changed what must not change.
            await new AuditTrail(archive, clock).Write(
                new AuditNote("AlterationFound", call.From, subject) { PersonId = call.PersonId, Detail = refused.Message }, CancellationToken.None);
            throw;
        }
    }

    /// <summary>The answer that this request got before; null where it was not done yet. For work before the act that a second press must not repeat.</summary>
    internal async Task<TAnswer?> Given<TAnswer>(ActCall call, Act act, string subject, CancellationToken cancel)
        where TAnswer : class
    {
        await using var context = await archive.CreateDbContextAsync(cancel);
        var receipt = await context.ActReceipts.FindAsync([call.RequestId], cancel);
        return receipt is null ? null : Answered<TAnswer>(receipt, call.PersonId, act, subject);
    }

    /// <summary><see cref="Once"/> for the holder of a field link, who is nobody with an account.</summary>
    internal Task<TAnswer> OnceByLink<TAnswer>(
        Guid requestId, string from, Act act, string subject, Func<ActRun, CancellationToken, Task<TAnswer>> does, CancellationToken cancel) =>
        InOneTransaction(requestId, null, from, act, subject, does, cancel);

    /// <summary>The same at the console, before anybody can sign in.</summary>
    internal Task<TAnswer> OnceAtConsole<TAnswer>(Act act, string subject, Func<ActRun, CancellationToken, Task<TAnswer>> does, CancellationToken cancel) =>
        InOneTransaction(Guid.CreateVersion7(), null, "console", act, subject, does, cancel);

    private async Task<TAnswer> InOneTransaction<TAnswer>(
        Guid requestId, Guid? personId, string from, Act act, string subject, Func<ActRun, CancellationToken, Task<TAnswer>> does, CancellationToken cancel)
    {
        await using var context = await archive.CreateDbContextAsync(cancel);
        await using var transaction = await AppendLock.Take(context, cancel);
        var receipt = await context.ActReceipts.FindAsync([requestId], cancel);
        if (receipt is not null) return Answered<TAnswer>(receipt, personId, act, subject);

        var scope = personId is { } id ? await ArchiveScope.Of(context, id, cancel) : null;
        var run = new ActRun(context, scope, clock.GetUtcNow());
        var answer = await does(run, cancel);
        await run.Close(act, from, subject, cancel);
        context.ActReceipts.Add(new ActReceipt
        {
            RequestId = requestId,
            PersonId = personId,
            Act = act,
            Subject = subject,
            At = run.Now,
            Answer = JsonSerializer.Serialize(answer),
        });
        await context.SaveChangesAsync(cancel);
        await transaction.CommitAsync(cancel);
        return answer;
    }

    private static TAnswer Answered<TAnswer>(ActReceipt receipt, Guid? personId, Act act, string subject)
    {
        if (receipt.PersonId != personId || receipt.Act != act || receipt.Subject != subject)
            throw new ActRefused(RefusalReason.RequestIdReused, "This request was already used for another act. Load the page again and repeat what you wanted to do.");
        return JsonSerializer.Deserialize<TAnswer>(receipt.Answer)!;
    }
}
