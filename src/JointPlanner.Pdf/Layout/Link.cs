namespace JointPlanner.Pdf.Layout;

/// <summary>How strongly a strip holds to the one after it. When all that hangs together is higher than a page, the weak links part first.</summary>
internal enum Link
{
    /// <summary>A page may end here.</summary>
    None,

    /// <summary>Rows of one group, lines of one calculation step.</summary>
    Weak,

    /// <summary>A heading and what follows, lines of one table row, the first and last two lines of a paragraph.</summary>
    Strong,
}
