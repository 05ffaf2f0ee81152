using System.Text;
using System.Text.Json;
using JointPlanner.Archive.Acts;

namespace JointPlanner.Archive.Drafts;

/// <summary>A plan as the archive sees it: a JSON object of a bounded size. What stands in it is the plan reader's matter.</summary>
internal static class PlanDocument
{
    private const int Limit = 2 * 1024 * 1024;

    private static readonly JsonDocumentOptions Form = new() { AllowDuplicateProperties = false, MaxDepth = 32 };

    public static void Check(string text) => Parse(text).Dispose();

    public static JsonDocument Parse(string text)
    {
        var size = Encoding.UTF8.GetByteCount(text);
        if (size > Limit)
            throw new ActRefused(RefusalReason.TextTooLong, $"The plan has {size} bytes; at most {Limit} are allowed.");
        try
        {
            var document = JsonDocument.Parse(text, Form);
            if (document.RootElement.ValueKind == JsonValueKind.Object) return document;
            document.Dispose();
        }
        catch (JsonException problem)
        {
            throw new ActRefused(RefusalReason.PlanUnreadable, $"The plan is no readable JSON: {problem.Message}");
        }

        throw new ActRefused(RefusalReason.PlanUnreadable, "The plan is not a JSON object ({ … }).");
    }
}
