namespace JointPlanner.Pdf;

/// <summary>One piece of a document's content.</summary>
public abstract record Block;
