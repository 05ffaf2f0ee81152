using System.Security.Cryptography;
using Microsoft.AspNetCore.DataProtection;

namespace JointPlanner.Web.Rooms.Revisions;

/// <summary>
/// Carries a refusal from a plain form to the page that it leads back to. The sentence goes through the address sealed, for ten minutes and for one revision:
/// a link that somebody made up can put no words on the page.
/// </summary>
public sealed class FormSays(IDataProtectionProvider protection)
{
    /// <summary>Name in the address.</summary>
    public const string Name = "says";

    private static readonly TimeSpan Shown = TimeSpan.FromMinutes(10);

    /// <summary>The address of the revision with the sentence.</summary>
    public string Address(Guid revisionId, string sentence) => $"/revisions/{revisionId}?{Name}={Protector(revisionId).Protect(sentence, Shown)}";

    /// <summary>The sentence; null where it is not ours, for another revision, or old.</summary>
    public string? Open(string note, Guid revisionId)
    {
        try
        {
            return Protector(revisionId).Unprotect(note);
        }
        catch (CryptographicException)
        {
            return null;
        }
    }

    private ITimeLimitedDataProtector Protector(Guid revisionId) => protection.CreateProtector("revision form", revisionId.ToString()).ToTimeLimitedDataProtector();
}
