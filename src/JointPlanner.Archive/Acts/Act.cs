namespace JointPlanner.Archive.Acts;

/// <summary>What a person may do. The rights table has one row for each role that may.</summary>
public enum Act
{
    // of a structure
    ReadIssued,
    ReadWork,
    Edit,
    Begin,
    Freeze,
    Return,
    Accept,
    Sign,
    Issue,
    Supersede,
    Withdraw,
    MakeLink,
    RevokeLink,
    RecordSetting,
    AcceptSetting,
    RecordReading,
    GiveAccess,
    CloseStructure,
    ReadAudit,

    // of an organisation
    CreateStructure,
    ConfirmValue,
    RevokeConfirmation,
    SetRule,

    // of oneself
    RegisterCertificate,
    ChangePassword,
    SetPassword,

    // of the installation
    ManageAccounts,
    ManageOrganisations,
    ConfirmCertificate,
    ManageRoots,
    ManageSeal,
    ManageTimeStamp,
    ManagePublicAddress,
    ReadInstallationAudit,
}
