namespace JointPlanner.Archive.Rights;

public sealed class ArchiveScope;
