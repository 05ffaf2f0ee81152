using JointPlanner.Exchange.Packages;

namespace JointPlanner.Issuing.Comparing;

/// <summary>One frozen calculation as it is stored: the package and the results that were hashed, read and nothing computed.</summary>
/// <param name="Package">Everything that can change a number.</param>
/// <param name="Results">The numbers.</param>
/// <param name="PackageHash">SHA-256 of the package's bytes.</param>
/// <param name="ResultsHash">SHA-256 of the results' bytes.</param>
public sealed record StoredCalculation(CalculationPackage Package, StoredResults Results, string PackageHash, string ResultsHash)
{
    /// <summary>Reads the two stored texts.</summary>
    /// <exception cref="InvalidDataException">One of them cannot be read, or they do not belong together; the message says which and why.</exception>
    public static StoredCalculation Read(ReadOnlySpan<byte> package, ReadOnlySpan<byte> results)
    {
        var packed = PackageReader.Read(package);
        if (packed.Package is null) throw new InvalidDataException($"The calculation package cannot be read: {packed.Faults[0].Path}: {packed.Faults[0].Wrong} {packed.Faults[0].Remedy}");
        var (stored, fault) = ResultsFile.Read(results);
        if (stored is null) throw new InvalidDataException($"The results cannot be read: {fault!.Path}: {fault.Wrong} {fault.Remedy}");
        var hash = ContentHash.Of(package);
        return stored.Package == hash
            ? new StoredCalculation(packed.Package, stored, hash, ContentHash.Of(results))
            : throw new InvalidDataException($"The results belong to another package: they name {stored.Package}, the package at hand has the hash {hash}. Take both from the same sheet.");
    }
}
