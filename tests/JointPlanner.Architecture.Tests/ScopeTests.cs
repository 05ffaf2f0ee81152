using System.Reflection.Emit;
using JointPlanner.Architecture.Tests.Compiled;

namespace JointPlanner.Architecture.Tests;

/// <summary>
/// Every query starts at the scope of a person. Other rooms touch no set, no context and no SQL at all; within the archive only the classes named here
/// take a set by hand, each for the reason beside it.
/// </summary>
public class ScopeTests
{
    private const string Context = "JointPlanner.Archive.ArchiveContext";

    private static readonly Dictionary<string, string> Doors = new(StringComparer.Ordinal)
    {
        ["Rights.ArchiveScope"] = "is the scope",
        ["Acts.ActDesk"] = "receipts, before anybody's scope is known",
        ["Acts.ActRun"] = "is handed to acts together with the person's scope",
        ["ArchiveDatabase"] = "looks for people of the demonstration at start, when nobody is signed in",
        ["Chains.AppendLock"] = "the lock, nobody's row",
        ["Chains.ArchiveChain"] = "chains are walked whole",
        ["Chains.ChainWalk"] = "chains are walked whole",
        ["Revisions.StoredDocument"] = "called with an id that a scope has given",
        ["Revisions.StoredPackage"] = "called with an id that a scope has given",
        ["Revisions.Designers"] = "called with an id that a scope has given",
        ["Revisions.SheetLookup"] = "who can give the hash has the sheet; nobody is signed in",
        ["Drafts.DraftShelf"] = "writes the person's own draft, on a structure that their scope gave",
        ["Setting.FieldLinks"] = "the holder of a link has no account",
        ["People.PasswordLinks"] = "the holder of a link is not signed in yet",
    };

    private static readonly string[] Forbidden =
    [
        Context, "Microsoft.EntityFrameworkCore.DbContext", "Microsoft.EntityFrameworkCore.RelationalDatabaseFacadeExtensions",
        "Microsoft.AspNetCore.Identity.EntityFrameworkCore.IdentityDbContext", "Microsoft.AspNetCore.Identity.EntityFrameworkCore.IdentityUserContext",
        "Microsoft.EntityFrameworkCore.IDbContextFactory",
    ];

    [Theory]
    [InlineData("JointPlanner.Web")]
    [InlineData("joint-planner")]
    [InlineData("JointPlanner.Issuing")]
    public void Other_rooms_read_through_the_scope_alone(string name)
    {
        using var room = Assembly.Of(name);
        Assert.True(room.Methods().Count() > 20, $"{name} is nearly empty");
        Expect.NoBreach(room.Methods().SelectMany(m => Breaches(m, Forbidden)));
    }

    [Fact]
    public void Within_the_archive_only_named_classes_take_a_set_by_hand()
    {
        using var archive = Assembly.Of("JointPlanner.Archive");
        var takers = archive.Methods().Where(m => !Outer(m.TypeName).EndsWith(".ArchiveContext", StringComparison.Ordinal)).Where(m => Sets(m).Any() && !ThroughRun(m)).Select(m => Outer(m.TypeName)["JointPlanner.Archive.".Length..]).Distinct().ToList();
        Expect.NoBreach(takers.Where(t => !Doors.ContainsKey(t)).Select(t => $"{t} takes a set by hand"));
    }

    [Fact]
    public void A_room_that_takes_a_set_or_a_context_is_found()
    {
        using var planted = Assembly.OfTheseTests();
        const string root = "JointPlanner.Architecture.Tests.Planted.Sets.";
        var found = planted.Methods().Where(m => m.TypeName.StartsWith(root + "Page", StringComparison.Ordinal)).SelectMany(m => Breaches(m, [root + "Context", root + "IFactory"])).ToList();
        Assert.Equal(3, found.Count);
        Assert.Contains(found, f => f.EndsWith("Context.get_Structures", StringComparison.Ordinal));
        Assert.Contains(found, f => f.EndsWith("Context.Set", StringComparison.Ordinal));
        Assert.Contains(found, f => f.EndsWith(".Create", StringComparison.Ordinal));
    }

    private static IEnumerable<string> Breaches(Method method, string[] forbidden) =>
        Called(method).Where(c => forbidden.Any(f => c.Owner.Name == f || c.Owner.Name.StartsWith(f + "`", StringComparison.Ordinal))).Select(c => $"{method.FullName}: {c.FullName}");

    private static IEnumerable<Member> Sets(Method method) => Called(method).Where(c =>
        (c.Owner.Name == Context || c.Owner.Name.StartsWith("Microsoft.AspNetCore.Identity.EntityFrameworkCore.", StringComparison.Ordinal)) && c.Name.StartsWith("get_", StringComparison.Ordinal)
        || (c.Owner.Name == "Microsoft.EntityFrameworkCore.DbContext" && c.Name == "Set"));

    // Acts take their sets from the run, which brings the scope of whoever does the act.
    private static bool ThroughRun(Method method) => Called(method).Any(c => c.Owner.Name == "JointPlanner.Archive.Acts.ActRun" && c.Name == "get_Archive");

    private static IEnumerable<Member> Called(Method method) =>
        method.Instructions.Where(i => i.Code.OperandType == OperandType.InlineMethod).Select(i => Member.Of(method.Reader, i.Entity));

    private static string Outer(string type) => type.Split('+')[0];
}
