namespace JointPlanner.Archive.People;

/// <summary>What a person is in an organisation, and as what another organisation's structure is opened to it.</summary>
public enum Role
{
    Designer,
    Checker,
    Contractor,
    Owner,
}
