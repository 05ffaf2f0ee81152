using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Setting;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Tests.Setting;

public class SettingBookTests
{
    [Theory, BothDatabases]
    public async Task A_record_stands_at_the_head_of_the_joints_chain_with_every_point_as_measured(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Issued();
        await world.Setting.Record(world.By(world.Kim), FullArchive.Record(world.RevisionId));
        await using var scope = await world.As(world.Mara);
        var record = await scope.SettingRecords().SingleAsync();
        Assert.Equal(1, record.Position);
        Assert.Equal("Kim Sand", record.PersonName);
        Assert.Equal("Europe/Oslo", record.Zone);
        Assert.Equal(new DateTimeOffset(2031, 5, 4, 4, 10, 0, TimeSpan.Zero), record.MeasuredAt);
        Assert.Equal((91 * 86400.0, "deck slab 12.5 °C × 0.5; webs 10.5 °C × 0.5"), (record.DeckAge, record.TemperaturesRead));
        Assert.Equal([0.0412, 0.0405], record.Points.OrderBy(point => point.Ordinal).Select(point => point.Opening));
        Assert.All(record.Points, point => Assert.Equal(("normal to the joint", 11.5, "embedded", 1.0), (point.Direction, point.Temperature, point.Method, point.Uncertainty)));
    }

    [Theory, BothDatabases]
    public async Task A_record_that_fails_is_kept_and_not_accepted_without_a_reason(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Issued();
        var answer = await world.Setting.Record(world.By(world.Kim), FullArchive.Record(world.RevisionId, FullArchive.Fails));
        Assert.False(answer.Holds);
        var sentence = await Journey.Refused(RefusalReason.ReasonMissing, () => world.Setting.Accept(world.By(world.Ines), answer.RecordId, " "));
        Assert.Contains("Too wide by 3 mm", sentence, StringComparison.Ordinal);
        await world.Setting.Accept(world.By(world.Ines), answer.RecordId, "The seal's true limit is 5 mm wider; certificate on file.");
        await using var scope = await world.As(world.Kim);
        var acceptance = await scope.SettingAcceptances().SingleAsync();
        Assert.Equal(2, acceptance.Position);
        await Journey.Refused(RefusalReason.AlreadyDone, () => world.Setting.Accept(world.By(world.Ines), answer.RecordId, "Again."));
    }

    [Theory, BothDatabases]
    public async Task Only_a_designer_accepts(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Issued();
        var answer = await world.Setting.Record(world.By(world.Kim), FullArchive.Record(world.RevisionId));
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Setting.Accept(world.By(world.Kim), answer.RecordId, null));
        await Journey.Refused(RefusalReason.NotYourAct, () => world.Setting.Accept(world.By(world.Mara), answer.RecordId, null));
    }

    [Theory, BothDatabases]
    public async Task Nothing_is_recorded_by_a_revision_that_is_not_issued(Kind kind)
    {
        await using var world = await World.Make(kind);
        await Journey.Refused(RefusalReason.WrongState, () => world.Setting.Record(world.By(world.Ines), FullArchive.Record(world.RevisionId)));
        await world.Issued();
        await world.Withdraw.Do(world.By(world.Mara), new WithdrawRequest(world.RevisionId, "Wrong."));
        await Journey.Refused(RefusalReason.WrongState, () => world.Setting.Record(world.By(world.Kim), FullArchive.Record(world.RevisionId)));
    }

    [Theory, BothDatabases]
    public async Task Values_that_cannot_be_are_refused_by_name(Kind kind)
    {
        await using var world = await World.Make(kind);
        await world.Issued();
        var right = FullArchive.Record(world.RevisionId);
        var cases = new (MeasuredPoint, string)[]
        {
            (right.Points[0] with { Opening = -0.01 }, "opening"),
            (right.Points[0] with { Opening = double.NaN }, "opening"),
            (right.Points[0] with { Temperature = -273.15 }, "temperature"),
            (right.Points[0] with { Temperature = double.PositiveInfinity }, "temperature"),
            (right.Points[0] with { Uncertainty = -1 }, "uncertainty of the temperature"),
        };
        foreach (var (point, field) in cases)
        {
            var sentence = await Journey.Refused(RefusalReason.ValueOutOfRange, () => world.Setting.Record(world.By(world.Kim), right with { Points = [point] }));
            Assert.Contains($"\"{field}\"", sentence, StringComparison.Ordinal);
        }

        var age = await Journey.Refused(RefusalReason.ValueOutOfRange, () => world.Setting.Record(world.By(world.Kim), right with { DeckAge = -1 }));
        Assert.Contains("\"deck age\"", age, StringComparison.Ordinal);
        await Journey.Refused(RefusalReason.TextMissing, () => world.Setting.Record(world.By(world.Kim), right with { Points = [] }));
        await Journey.Refused(RefusalReason.TextForbidden, () => world.Setting.Record(world.By(world.Kim), right with { Device = "seal\u202Elaes" }));
    }
}
