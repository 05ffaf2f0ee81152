namespace JointPlanner.Archive.Acts;

public enum RefusalReason
{
    NotYourAct,
    PasswordNeeded,
    WrongState,
    DraftExists,
    PlanFaults,
    PlanMoved,
    PlanUnreadable,
    TextMissing,
    TextTooLong,
    TextForbidden,
    ValueOutOfRange,
    RemarkMissing,
    CheckerIsDesigner,
    SameKey,
    HashDiffers,
    Altered,
    DocumentMoved,
    NotAPrefix,
    FieldNotYours,
    FieldTaken,
    CertificateUnknown,
    SignatureObjection,
    MemoryValueUnconfirmed,
    SilenceUnanswered,
    CauseNotIncluded,
    SignatureMissing,
    NewerIssued,
    ReasonMissing,
    AlreadyDone,
    RequestIdReused,
    StructureClosed,
}

/// <summary>An act that was not done. The message is the sentence for the person: what stands in the way and what to do.</summary>
public sealed class ActRefused(RefusalReason reason, string sentence) : Exception(sentence)
{
    public RefusalReason Reason { get; } = reason;
}

/// <summary>
/// There is no such thing for this person. Said alike for what does not exist and for what belongs to others, so that ids cannot be tried out.
/// </summary>
public sealed class NotFound(string kind) : Exception($"No such {kind}.");
