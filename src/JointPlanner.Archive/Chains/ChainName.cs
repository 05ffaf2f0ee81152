namespace JointPlanner.Archive.Chains;

/// <summary>The names of the chains.</summary>
public static class ChainName
{
    public const string Audit = "audit";

    /// <summary>States, edits, remarks, frozen packages and PDF segments of a structure.</summary>
    public static string Structure(Guid structureId) => $"structure/{structureId:D}";

    /// <summary>Setting record, acceptance, readings.</summary>
    public static string Joint(Guid structureId, string joint) => $"joint/{structureId:D}/{joint}";

    /// <summary>Confirmations and their revocations.</summary>
    public static string Organisation(Guid organisationId) => $"organisation/{organisationId:D}";
}
