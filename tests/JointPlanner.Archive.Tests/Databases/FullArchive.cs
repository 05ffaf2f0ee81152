using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.Setting;

namespace JointPlanner.Archive.Tests.Databases;

/// <summary>An archive with at least one row in every guarded table.</summary>
public static class FullArchive
{
    public static readonly EndVerdict Fits = new(true, "Fits: 12 mm of room left.");
    public static readonly EndVerdict Fails = new(false, "Too wide by 3 mm.");

    public static RecordRequest Record(Guid revisionId, EndVerdict? atMaximum = null) => new(
        revisionId, "j1", "strip seal no. 4471", new DateTimeOffset(2031, 5, 4, 6, 10, 0, TimeSpan.FromHours(2)), "before concreting",
        [
            new MeasuredPoint("left kerb", 0.0412, "normal to the joint", 11.5, "embedded", 1.0),
            new MeasuredPoint("right kerb", 0.0405, "normal to the joint", 11.5, "embedded", 1.0),
        ],
        Fits, atMaximum ?? Fits, DeckAge: 91 * 86400.0, TemperaturesRead: "deck slab 12.5 °C × 0.5; webs 10.5 °C × 0.5");

    public static async Task<World> Make(Kind kind) => await Fill(await World.Make(kind));

    /// <summary>Does every act once.</summary>
    public static async Task<World> Fill(World world)
    {
        await world.Frozen();
        var returned = await world.Return.Do(world.By(world.Otto), new ReturnRequest(world.RevisionId, [new("Again.")]));
        await world.Issued(returned.DraftId);
        var confirmed = await world.Confirmations.Confirm(
            world.By(world.Mara), new ConfirmRequest(world.Owner.Id, "table/cold", "Bridge design code", "2020", "Table 3", new DateOnly(2031, 5, 1)));
        await world.Confirmations.Revoke(world.By(world.Mara), confirmed.ConfirmationId, "Another edition.");
        var record = await world.Setting.Record(world.By(world.Kim), Record(returned.DraftId));
        await world.Setting.Accept(world.By(world.Ines), record.RecordId, null);
        await AddReading(world);
        return world;
    }

    // Readings have their table already and their act later; this writes one as that act will.
    private static async Task AddReading(World world)
    {
        var reading = new Reading
        {
            StructureId = world.StructureId,
            Joint = "j1",
            Device = "strip seal no. 4471",
            Point = "left kerb",
            Date = new DateOnly(2031, 11, 2),
            Opening = 0.0475,
            Direction = "normal to the joint",
            Temperature = 2.5,
            PersonId = world.Kim.Id,
        };
        await world.Desk.Once(
            world.By(world.Kim), Act.RecordReading, "joint j1", async (run, cancel) =>
            {
                await run.Structure(world.StructureId, Act.RecordReading, cancel);
                await run.Append(ChainName.Joint(world.StructureId, "j1"), reading, cancel);
                return reading.Id;
            }, CancellationToken.None);
    }
}
