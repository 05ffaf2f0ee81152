using Microsoft.AspNetCore.Identity;

namespace JointPlanner.Archive.People;

/// <summary>Somebody with an account. Persons are deactivated, never removed: their names stand under issued things.</summary>
public sealed class Person : IdentityUser<Guid>
{
    public Person() => Id = Guid.CreateVersion7();

    /// <summary>The name as it is printed.</summary>
    public string Name { get; set; } = "";

    public bool Active { get; set; } = true;

    /// <summary>Accounts, organisations, roots, seal, time stamp and public address of the installation; no reading of calculations.</summary>
    public bool Administrator { get; set; }

    /// <summary>One of the demonstration's people; with one of these in it no archive is used in Production.</summary>
    public bool Demonstration { get; set; }
}
