using System.Runtime.CompilerServices;

[assembly: InternalsVisibleTo("JointPlanner.Pdf.Tests")]
