namespace JointPlanner.Recomputation.Tests.Reading;

/// <summary>Powers of metre, kilogram, second and kelvin.</summary>
public readonly record struct Powers(int M, int Kg, int S, int K)
{
    public static Powers operator +(Powers a, Powers b) => new(a.M + b.M, a.Kg + b.Kg, a.S + b.S, a.K + b.K);
    public static Powers operator -(Powers a, Powers b) => new(a.M - b.M, a.Kg - b.Kg, a.S - b.S, a.K - b.K);
    public static Powers operator *(Powers a, int times) => new(a.M * times, a.Kg * times, a.S * times, a.K * times);

    public Powers Half() => M % 2 == 0 && Kg % 2 == 0 && S % 2 == 0 && K % 2 == 0
        ? new(M / 2, Kg / 2, S / 2, K / 2)
        : throw new FormatException($"no square root of {this}");
}
