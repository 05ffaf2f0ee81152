using System.Globalization;
using System.Text;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Chains;

/// <summary>
/// The text of a row that is hashed: one line a field, name:length:value, so that no two different rows give one text. A missing value is name:- .
/// </summary>
public sealed class ChainText
{
    private readonly StringBuilder _text = new();

    public ChainText Add(string name, string? value)
    {
        _text.Append(name).Append(':');
        if (value is null) _text.Append('-');
        else _text.Append(CultureInfo.InvariantCulture, $"{Encoding.UTF8.GetByteCount(value)}:{value}");
        _text.Append('\n');
        return this;
    }

    public ChainText Add(string name, Guid? value) => Add(name, value?.ToString("D"));

    public ChainText Add(string name, long? value) => Add(name, value?.ToString(CultureInfo.InvariantCulture));

    public ChainText Add(string name, bool value) => Add(name, value ? "yes" : "no");

    /// <summary>Shortest digits that give the same bits back.</summary>
    public ChainText Add(string name, double? value) => Add(name, value?.ToString("R", CultureInfo.InvariantCulture));

    public ChainText Add(string name, DateOnly? value) => Add(name, value?.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture));

    public ChainText Add(string name, DateTimeOffset? value) =>
        Add(name, value?.ToUniversalTime().ToString("yyyy-MM-dd'T'HH:mm:ss.ffffff'Z'", CultureInfo.InvariantCulture));

    public string Hash() => Fingerprint.Of(_text.ToString());
}
