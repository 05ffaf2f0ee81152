namespace JointPlanner.Exchange.Printing;

/// <summary>Where a number is written; it decides minus sign and grouping.</summary>
public enum NumberStyle
{
    /// <summary>On screen and console: the minus sign U+2212, no grouping.</summary>
    Screen,
    /// <summary>On a sheet: the minus sign U+2212, digits before the decimal point in groups of three parted by thin spaces.</summary>
    Sheet,
    /// <summary>In a file: hyphen-minus, no grouping, powers of ten as e-6.</summary>
    File,
}
