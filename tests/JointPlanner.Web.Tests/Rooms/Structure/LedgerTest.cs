using System.Text.Json.Nodes;
using AngleSharp.Dom;
using Bunit;
using JointPlanner.Exchange.Plans;
using JointPlanner.Issuing;
using JointPlanner.Web.Rooms.Structure;
using JointPlanner.Web.Shared;
using JointPlanner.Web.Shell;
using Microsoft.AspNetCore.Components;
using Microsoft.Extensions.DependencyInjection;

namespace JointPlanner.Web.Tests.Rooms.Structure;

/// <summary>Parts of the ledger over a real workbench: what is typed is read and computed as on the site.</summary>
public abstract class LedgerTest : MudTest
{
    protected const string Composite = "sorrel-creek-crossing", Viaduct = "tarn-moss-viaduct", Us = "plover-flats-bridge";

    private static readonly string SeedData = Path.Combine(AppContext.BaseDirectory, "seed-data");

    protected static readonly PlanDesk Desk = new(OwnerRuleShelf.Read(Path.Combine(SeedData, "owner-rules")));

    protected LedgerTest()
    {
        Services.AddSingleton(Desk);
        Services.AddScoped<Handout>();
    }

    /// <summary>The open structure of the last <see cref="Open"/>.</summary>
    protected Workbench Bench { get; private set; } = null!;

    protected Preferences Preferences => Services.GetRequiredService<Preferences>();

    /// <summary>The whole ledger page of a demo structure, changed where a test needs it.</summary>
    protected IRenderedComponent<BenchView> Ledger(string structure = Composite, Action<JsonNode>? change = null, bool isReadOnly = false) =>
        Part<BenchView>(_ => { }, structure, change, isReadOnly);

    /// <summary>One part of it.</summary>
    protected IRenderedComponent<TPart> Part<TPart>(
        Action<ComponentParameterCollectionBuilder<TPart>> parameters, string structure = Composite, Action<JsonNode>? change = null, bool isReadOnly = false)
        where TPart : WorkbenchPart
    {
        Open(structure, change, isReadOnly);
        return Shown(parameters);
    }

    /// <summary>A part of the structure that is open already.</summary>
    protected IRenderedComponent<TPart> Shown<TPart>(Action<ComponentParameterCollectionBuilder<TPart>> parameters)
        where TPart : WorkbenchPart =>
        Render<CascadingValue<Workbench>>(p => p.Add(c => c.Value, Bench).Add(c => c.IsFixed, true).AddChildContent(parameters)).FindComponent<TPart>();

    protected void Open(string structure = Composite, Action<JsonNode>? change = null, bool isReadOnly = false)
    {
        var plan = JsonNode.Parse(File.ReadAllText(Path.Combine(SeedData, "structures", structure + ".json")))!;
        change?.Invoke(plan);
        Open(PlanDocument.Parse(plan.ToJsonString()).Document!, isReadOnly);
    }

    protected void Open(PlanDocument document, bool isReadOnly = false) => Bench = new Workbench(document, Desk.Known, Desk.Compute, isReadOnly);

    /// <summary>Types into a field as a person does. An entry that meets a handler which is just being replaced by a redraw is lost here, though not in a browser: it is made again until the document holds it.</summary>
    protected void Type<TPart>(IRenderedComponent<TPart> cut, string path, string text)
        where TPart : IComponent => Enter(cut, path, text, () => cut.Find($"input[data-path='{path}']").Input(text));

    /// <summary>Chooses in a field with fixed words.</summary>
    protected void Choose<TPart>(IRenderedComponent<TPart> cut, string path, string word)
        where TPart : IComponent => Enter(cut, path, word, () => cut.Find($"select[data-path='{path}']").Change(word));

    private void Enter<TPart>(IRenderedComponent<TPart> cut, string path, string text, Action act)
        where TPart : IComponent => cut.WaitForAssertion(() =>
        {
            if (Bench.Document.TextAt(path) != text) act();
            Assert.Equal(text, Bench.Document.TextAt(path));
        });

    /// <summary>What stands beside a field once it is there.</summary>
    protected static IElement Beside<TPart>(IRenderedComponent<TPart> cut, string path, string kind = ".fault")
        where TPart : IComponent
    {
        var place = $"#f-{path.Replace('/', '-')}-says {kind}";
        cut.WaitForElement(place);
        return cut.Find(place);
    }

    /// <summary>The entry in the list of faults.</summary>
    protected static string Listed<TPart>(IRenderedComponent<TPart> cut, string path)
        where TPart : IComponent
    {
        cut.WaitForElement($"li[data-fault='{path}']");
        return Words(cut.Find($"li[data-fault='{path}']"));
    }

    /// <summary>Text with its spaces joined.</summary>
    protected static string Words(INode node) => string.Join(' ', node.TextContent.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries));

    /// <summary>The button with this text.</summary>
    protected static IElement Button<TPart>(IRenderedComponent<TPart> cut, string text, string within = "")
        where TPart : IComponent => cut.FindAll($"{within} button".Trim()).First(b => Words(b) == text || b.GetAttribute("aria-label") == text);

    protected override void Dispose(bool disposing)
    {
        Bench?.Dispose();
        base.Dispose(disposing);
    }
}
