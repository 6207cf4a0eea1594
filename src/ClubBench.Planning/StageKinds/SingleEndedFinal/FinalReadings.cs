using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.StageKinds.SingleEndedFinal;

/// <summary>What a builder reads on the final, dummy load on. Windows: common practice.</summary>
internal static class FinalReadings
{
    public static IReadOnlyList<ExpectedReading> Of(FinalModel model, string key) =>
    [
        new($"{key}.idle-current", QuantityKind.Current, 0, 0, 1e-3, "set-up.key-up", InstrumentClass.Multimeter, WindowSides.AtMost, new Dictionary<string, double>()),
        new($"{key}.output-power", QuantityKind.Power, model.Output.Watt, 0.8 * model.Output.Watt, 1.3 * model.Output.Watt, "set-up.key-down-dummy-load", InstrumentClass.PowerMeter, WindowSides.Both, new Dictionary<string, double>()),
        new($"{key}.supply-current", QuantityKind.Current, model.SupplyCurrent.Ampere, 0.8 * model.SupplyCurrent.Ampere, 1.25 * model.SupplyCurrent.Ampere, "set-up.key-down-dummy-load", InstrumentClass.Multimeter, WindowSides.Both, new Dictionary<string, double>()),
    ];
}
