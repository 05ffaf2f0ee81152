namespace JointPlanner.Pdf.Layout;

/// <summary>Where a signature field stands.</summary>
internal sealed record FieldPlace(SignatureField Field, Bounds Bounds, StructureElement Element);
