namespace JointPlanner.Codes.AashtoLrfdCreep;

/// <summary>Table of k_h in the text to 2004, held from memory: relative humidity and factor.</summary>
internal static class HumidityFactors
{
    public static readonly (double Humidity, double Factor)[] Rows = [(0.40, 1.43), (0.50, 1.29), (0.60, 1.14), (0.70, 1.00), (0.80, 0.86), (0.90, 0.43), (1.00, 0.00)];
}
