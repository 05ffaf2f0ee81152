namespace JointPlanner.Pictures;

/// <summary>How an area is filled; the shade itself belongs to the screen's styles and to the sheet.</summary>
public enum Fill
{
    /// <summary>Not at all: what lies behind shows.</summary>
    None,

    /// <summary>With the paper: what lies behind is covered.</summary>
    Paper,

    /// <summary>With a light tint of the ink.</summary>
    Tint,

    /// <summary>With full ink.</summary>
    Ink,
}
