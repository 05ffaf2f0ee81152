using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Setting;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Chains;

/// <summary>One walk along all chains.</summary>
internal sealed class ChainWalk(ArchiveContext archive)
{
    private readonly Dictionary<string, string> _endByAudit = [];
    private long _rows;

    public async Task<ChainReport> Verify(CancellationToken cancel)
    {
        var broken = await Audit(cancel) ?? await Others(cancel) ?? await Strays(cancel);
        return new ChainReport(_rows, broken);
    }

    private async Task<ChainBreak?> Audit(CancellationToken cancel)
    {
        ChainedRow? last = null;
        await foreach (var entry in archive.AuditEntries.Where(row => row.Chain == ChainName.Audit).OrderBy(row => row.Position).AsAsyncEnumerable().WithCancellation(cancel))
        {
            if (Step(ChainName.Audit, last, entry) is { } broken) return broken;
            if (entry is { SubjectChain: { } chain, HashAfter: { } hash }) _endByAudit[chain] = hash;
            last = entry;
        }

        return await End(ChainName.Audit, last, cancel);
    }

    private async Task<ChainBreak?> Others(CancellationToken cancel)
    {
        var chains = await archive.ChainTips.Select(tip => tip.Chain).Where(chain => chain != ChainName.Audit).ToListAsync(cancel);
        foreach (var chain in chains.Union(_endByAudit.Keys).Order(StringComparer.Ordinal))
        {
            ChainedRow? last = null;
            foreach (var row in await Rows(chain, cancel))
            {
                if (Step(chain, last, row) is { } broken) return broken;
                if (await Content(row, cancel) is { } altered) return altered;
                last = row;
            }

            if (await End(chain, last, cancel) is { } cut) return cut;
            if (!_endByAudit.TryGetValue(chain, out var end) || end != last?.Hash)
                return new ChainBreak(chain, last?.Position ?? 0, Name(chain, last), "The chain does not end where the audit says it does: rows were cut off, or added by no act.");
        }

        return null;
    }

    private async Task<List<ChainedRow>> Rows(string chain, CancellationToken cancel)
    {
        var rows = new List<ChainedRow>();
        switch (chain.Split('/')[0])
        {
            case "structure":
                rows.AddRange(await Of<StateEntry>(chain).ToListAsync(cancel));
                rows.AddRange(await Of<RevisionEdit>(chain).ToListAsync(cancel));
                rows.AddRange(await Of<Remark>(chain).ToListAsync(cancel));
                rows.AddRange(await Of<FrozenPackage>(chain).ToListAsync(cancel));
                rows.AddRange(await Of<PdfSegment>(chain).ToListAsync(cancel));
                break;
            case "joint":
                rows.AddRange(await Of<SettingRecord>(chain).ToListAsync(cancel));
                rows.AddRange(await Of<SettingAcceptance>(chain).ToListAsync(cancel));
                rows.AddRange(await Of<Reading>(chain).ToListAsync(cancel));
                break;
            case "organisation":
                rows.AddRange(await Of<Confirmation>(chain).ToListAsync(cancel));
                rows.AddRange(await Of<ConfirmationRevocation>(chain).ToListAsync(cancel));
                break;
        }

        return [.. rows.OrderBy(row => row.Position)];
    }

    private IQueryable<TRow> Of<TRow>(string chain) where TRow : ChainedRow => archive.Set<TRow>().Where(row => row.Chain == chain);

    private ChainBreak? Step(string chain, ChainedRow? last, ChainedRow row)
    {
        var expected = (last?.Position ?? 0) + 1;
        if (row.Position != expected)
            return new ChainBreak(chain, expected, Name(chain, row), $"The row at position {expected} is missing; the next that stands there has position {row.Position}.");
        if (row.ComputeHash() != row.Hash)
            return new ChainBreak(chain, expected, Name(chain, row), "The row was altered: its content does not give its hash.");
        if (row.PreviousHash != (last?.Hash ?? Fingerprint.None))
            return new ChainBreak(chain, expected, Name(chain, row), "The row does not follow the one before it: that one, or this one, was replaced.");
        _rows++;
        return null;
    }

    private async Task<ChainBreak?> Content(ChainedRow row, CancellationToken cancel)
    {
        if (row is FrozenPackage package && !package.IsIntact)
            return new ChainBreak(row.Chain, row.Position, Name(row.Chain, row), "The stored package or its results were altered: the text does not give its hash.");
        if (row is not PdfSegment segment) return null;
        try
        {
            await StoredDocument.Read(archive, segment.RevisionId, cancel);
            return null;
        }
        catch (ActRefused refused)
        {
            return new ChainBreak(row.Chain, row.Position, Name(row.Chain, row), refused.Message);
        }
    }

    private async Task<ChainBreak?> End(string chain, ChainedRow? last, CancellationToken cancel)
    {
        var tip = await archive.ChainTips.FirstOrDefaultAsync(tip => tip.Chain == chain, cancel);
        if ((tip?.Position ?? 0) == (last?.Position ?? 0) && (tip?.Hash ?? Fingerprint.None) == (last?.Hash ?? Fingerprint.None)) return null;
        return new ChainBreak(chain, tip?.Position ?? 0, Name(chain, last), $"The chain should end at position {tip?.Position ?? 0} and ends at {last?.Position ?? 0}.");
    }

    // A row with an invented chain name would be walked by nobody.
    private async Task<ChainBreak?> Strays(CancellationToken cancel)
    {
        var all = await archive.StateEntries.LongCountAsync(cancel) + await archive.RevisionEdits.LongCountAsync(cancel) + await archive.Remarks.LongCountAsync(cancel)
            + await archive.FrozenPackages.LongCountAsync(cancel) + await archive.PdfSegments.LongCountAsync(cancel) + await archive.SettingRecords.LongCountAsync(cancel)
            + await archive.SettingAcceptances.LongCountAsync(cancel) + await archive.Readings.LongCountAsync(cancel) + await archive.Confirmations.LongCountAsync(cancel)
            + await archive.ConfirmationRevocations.LongCountAsync(cancel) + await archive.AuditEntries.LongCountAsync(cancel);
        return all == _rows ? null : new ChainBreak("", 0, "", $"{all - _rows} rows belong to no known chain.");
    }

    private static string Name(string chain, ChainedRow? row) => row is null ? chain : $"{row.GetType().Name} {row.Id:D}";
}
