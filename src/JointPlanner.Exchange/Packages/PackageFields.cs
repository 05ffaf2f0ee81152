using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Packages;

/// <summary>Every field of a calculation package, said once. Plan and rule set stand in it as they are, by value.</summary>
internal static class PackageFields
{
    private static Field Needed(string pattern, string name, Entry entry, string meaning) => new(pattern, name, entry, meaning) { IsRequired = true };

    private static Field Maybe(string pattern, string name, Entry entry, string meaning) => new(pattern, name, entry, meaning);

    public static readonly FieldTable Table = new("calculation", 1,
    [
        Needed("schema", "schema", new WordEntry(["calculation/1"]), "What this file is."),
        Needed("engine", "engine version", new TextEntry(60), "Version of the program that computed."),
        new("code", "code edition", new GroupEntry(), "The code edition.") { IsRequired = true },
        Needed("code/id", "id of the code edition", new TextEntry(200), "Id of the code edition."),
        Needed("code/revision", "revision of the code folder", new CountEntry(0, 1_000_000), "Number of our own corrections to it."),
        Needed("units", "units and rounding profile", new WordEntry(["metric", "us"]), "Units in which the sheet is printed."),
        Needed("rounding-step", "step of rounding", new QuantityEntry(Quantity.Opening, new("0.001 mm", "50 mm")), "Step to which set values are rounded where the owner's rules state none."),
        Maybe("climate-record", "climate record", new TextEntry(64), "SHA-256 of the climate record from which the extremes of the plan come."),
        Maybe("confirmations", "confirmations", new ListEntry(0, 2000, "confirmation"), "Values held from memory that an owner confirmed."),
        Needed("confirmations/*/value-id", "id of the value", new TextEntry(DocumentLimits.NameLength), "The value."),
        Needed("confirmations/*/document", "document", new TextEntry(DocumentLimits.NoteLength), "Document in which the person read it."),
        Maybe("confirmations/*/edition", "edition", new TextEntry(DocumentLimits.NameLength), "Its edition."),
        Maybe("confirmations/*/place", "place", new TextEntry(DocumentLimits.NoteLength), "Clause, table or page."),
        Needed("confirmations/*/person", "person", new TextEntry(DocumentLimits.NameLength), "Name of the person."),
        Needed("confirmations/*/date", "date", new TextEntry(10), "Day, as 2026-05-31."),
        Maybe("owner-rules", "owner's rules", new OpenGroupEntry(), "The owner's rule set, by value."),
        Maybe("plan", "plan", new OpenGroupEntry(), "The plan, by value."),
    ]);
}
