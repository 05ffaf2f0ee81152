using System.Security.Claims;
using JointPlanner.Web.Rooms.Accounts;
using Microsoft.AspNetCore.DataProtection;
using Microsoft.AspNetCore.Identity;

namespace JointPlanner.Web.Tests.Rooms.Accounts;

public sealed class PasswordMarkTests
{
    private static readonly DateTimeOffset At = new(2031, 5, 4, 9, 0, 0, TimeSpan.Zero);
    private readonly PasswordMark mark = new(new EphemeralDataProtectionProvider());

    [Fact]
    public void A_sealed_mark_opens_for_its_own_person_alone()
    {
        var (owner, other) = (Guid.CreateVersion7(), Guid.CreateVersion7());
        var text = mark.Seal(owner, At);
        Assert.Equal(At, mark.Open(text, owner));
        Assert.Null(mark.Open(text, other));
    }

    [Fact]
    public void A_mark_that_was_not_sealed_here_does_not_open()
    {
        var person = Guid.CreateVersion7();
        Assert.Null(mark.Open(new PasswordMark(new EphemeralDataProtectionProvider()).Seal(person, At), person));
        Assert.Null(mark.Open("nonsense", person));
        Assert.Null(mark.Open("", person));
    }

    [Fact]
    public async Task The_mark_stays_when_the_cookie_is_made_anew()
    {
        var before = new ClaimsPrincipal(new ClaimsIdentity([PasswordMark.ClaimOf(At)], "test"));
        var after = new ClaimsPrincipal(new ClaimsIdentity("test"));
        Assert.Null(PasswordMark.Of(after));
        await PasswordMark.Keep(new SecurityStampRefreshingPrincipalContext { CurrentPrincipal = before, NewPrincipal = after });
        Assert.Equal(At, PasswordMark.Of(after));
    }
}
