using ClubBench.Planning.Advising;
using ClubBench.Planning.Plans;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Sheets;

namespace ClubBench.Benchmarks;

/// <summary>Build cards of a plan of the demonstration kit.</summary>
internal static class PrintingWork
{
    private static readonly Lazy<Plan> Planned = new(() => Planner.Plan(PlanningWork.InputsOn("20 m")));

    private static readonly CardContext Context = new(
        "Example club", "Quern-30", "1", "30 m", "20 m", "", "1", null, 1, 1, new DateOnly(2026, 12, 1), "http://localhost/b/1", PaperSize.A4, new Dictionary<InstrumentClass, string>());

    public static IEnumerable<Workload> All =>
    [
        new("card-with-the-most-parts", 300, () => CardSet.Pdf(CardsOf(Planned.Value).MaxBy(c => c.Content.Fit.Count)!)),
        new("cards-of-a-whole-plan", 3000, () => CardSet.Pdf(CardsOf(Planned.Value))),
    ];

    private static List<PrintedCard> CardsOf(Plan plan) => [.. plan.Stages.Select(s => new PrintedCard(s.Card, Context))];
}
