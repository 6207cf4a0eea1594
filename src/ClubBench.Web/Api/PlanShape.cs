using System.Text.Json.Nodes;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Budgets;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Text;

namespace ClubBench.Web.Api;

/// <summary>A plan as the programming interface writes it.</summary>
internal static class PlanShape
{
    public static JsonObject Of(OpenedPlan opened) => new()
    {
        ["id"] = opened.Id,
        ["name"] = opened.Name,
        ["kitId"] = opened.KitId,
        ["revision"] = opened.Revision,
        ["state"] = Shapes.Camel(opened.State.ToString()),
        ["band"] = opened.Plan.Inputs.Target.BandName,
        ["verdict"] = Shapes.Camel(opened.Plan.Judgement.Verdict.ToString()),
        ["reasons"] = new JsonArray([.. opened.Plan.Judgement.Reasons.Select(r => (JsonNode)Phrases.Say(r))]),
        ["openItems"] = new JsonArray([.. opened.Plan.OpenItems.Select(i => (JsonNode)new JsonObject { ["code"] = i.Code, ["stage"] = i.Stage, ["closedBy"] = i.ClosedBy, ["text"] = Phrases.Say(i) })]),
        ["stages"] = new JsonArray([.. opened.Plan.Stages.Select(Of)]),
        ["budgets"] = new JsonArray([.. opened.Plan.Budgets.Select(Of)]),
    };

    private static JsonObject Of(StagePlan stage) => new()
    {
        ["stage"] = stage.Stage,
        ["action"] = Shapes.Camel(stage.Action.ToString()),
        ["alternativeId"] = stage.AlternativeId,
        ["changes"] = new JsonArray([.. stage.Changes.Select(c => (JsonNode)new JsonObject { ["designator"] = c.Designator, ["before"] = Of(c.Before), ["after"] = Of(c.After) })]),
        ["why"] = Shapes.Of(stage.WhyChanged, stage.Card.Kind),
        ["findings"] = Shapes.Of(stage.Findings, stage.Card.Kind),
        ["figures"] = Shapes.Of(stage.Figures),
        ["alternatives"] = new JsonArray([.. stage.Alternatives.Select(a => (JsonNode)a.Id)]),
        ["expected"] = new JsonArray([.. stage.Expected.Select(Of)]),
        ["yieldShare"] = stage.Yield?.Share,
    };

    private static JsonObject? Of(Part? part)
    {
        if (part is null) return null;
        var shape = new JsonObject { ["designator"] = part.Designator, ["role"] = part.Role, ["type"] = part.Type };
        foreach (var (name, si) in part.ValuesSi) shape[name] = si;
        return shape;
    }

    private static JsonObject Of(ExpectedReading expected)
    {
        var shape = new JsonObject { ["point"] = expected.Point, ["instrument"] = Shapes.Camel(expected.Instrument.ToString()), ["sides"] = Shapes.Camel(expected.Sides.ToString()) };
        shape.Put("nominal", expected.Kind, expected.Nominal);
        shape.Put("low", expected.Kind, expected.LowSi);
        shape.Put("high", expected.Kind, expected.HighSi);
        return shape;
    }

    private static JsonObject Of(Budget budget) => new()
    {
        ["budget"] = budget.Id,
        ["lines"] = new JsonArray([.. budget.Lines.Select(l => (JsonNode)new JsonObject { ["stage"] = l.Stage, ["figures"] = Shapes.Of(l.Figures) })]),
        ["findings"] = Shapes.Of(budget.Findings),
    };
}
