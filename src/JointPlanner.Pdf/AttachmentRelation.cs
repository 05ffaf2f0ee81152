namespace JointPlanner.Pdf;

/// <summary>What an attached file is to the sheet (ISO 32000-2, 7.11.3, AFRelationship).</summary>
public enum AttachmentRelation
{
    /// <summary>What the sheet was made from.</summary>
    Source,

    /// <summary>The numbers that the sheet shows.</summary>
    Data,
}
