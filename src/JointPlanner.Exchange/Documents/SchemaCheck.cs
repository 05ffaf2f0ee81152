using System.Globalization;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Exchange.Documents;

/// <summary>Is this the kind of document that is expected, in a major that this program knows? If not, nothing else in it is judged.</summary>
public static class SchemaCheck
{
    /// <summary>The fault; null where the document is of the table's kind and major.</summary>
    public static Fault? Of(FieldTable table, MapNode root)
    {
        var allowed = $"Allowed: \"{table.Schema}\".";
        if (root["schema"] is not TextNode { Text: var schema })
            return new("schema.missing", "schema", root["schema"] is { } other ? FormCheck.Shown(other) : "", "Nothing says what this file is.", allowed,
                $"Write \"schema\": \"{table.Schema}\" first, or choose the right file.");
        if (schema == table.Schema) return null;
        var parts = schema.Split('/');
        if (parts is [var kind, var text] && kind == table.Kind && int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var major) && major > table.Major)
            return new("schema.newer", "schema", schema, $"This file was written by a newer version of this program ({PersonText.Shown(schema)}).",
                allowed, "Open it with the newer version.");
        return new("schema.other", "schema", PersonText.Shown(schema), $"“{PersonText.Shown(schema)}” is not a schema that can be read here.", allowed,
            $"Choose the right file, or write \"{table.Schema}\".");
    }
}
