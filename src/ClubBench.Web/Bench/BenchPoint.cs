using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using ClubBench.Web.Components.Pages.Club;

namespace ClubBench.Web.Bench;

/// <summary>An instrument a builder may name, with what the device needs for a first judgement.</summary>
public sealed record BenchInstrument(string Name, double Offset, double Relative, double Absolute)
{
    /// <summary>Offset and absolute uncertainty count only for readings of the kind they were recorded in.</summary>
    public static BenchInstrument Of(Instrument i, QuantityKind kind) => InstrumentOffsets.KindOf(i.Class) == kind
        ? new(i.Name, i.OffsetSi, i.RelativeUncertainty, i.AbsoluteUncertaintySi)
        : new(i.Name, 0, i.RelativeUncertainty, 0);
}

/// <summary>One point to measure, as the script gets it. Values are SI.</summary>
public sealed record BenchPoint(
    string Point,
    string Label,
    double Nominal,
    double Low,
    double High,
    string Sides,
    bool Signed,
    bool Slips,
    bool Relative,
    int Digits,
    string InstrumentClass,
    IReadOnlyList<BenchUnit> Units,
    IReadOnlyList<BenchSpelling> Spellings,
    IReadOnlyList<BenchInstrument> Instruments)
{
    public static BenchPoint Of(ExpectedReading expected, string label, IEnumerable<Instrument> instruments) => new(
        expected.Point,
        label,
        expected.Nominal,
        expected.LowSi,
        expected.HighSi,
        expected.Sides.ToString(),
        IsLevel(expected.Kind) || expected.Kind is QuantityKind.Temperature or QuantityKind.FrequencyShift,
        !IsLevel(expected.Kind),
        !IsLevel(expected.Kind) && expected.Sides == WindowSides.Both && expected.Nominal != 0,
        expected.Digits,
        expected.Instrument.ToString(),
        BenchUnits.Switch(expected.Kind, expected.Nominal),
        BenchUnits.Spellings(expected.Kind),
        [.. instruments.Where(i => i.Class == expected.Instrument).Select(i => BenchInstrument.Of(i, expected.Kind))]);

    private static bool IsLevel(QuantityKind kind) => kind is QuantityKind.Decibels or QuantityKind.PowerLevel or QuantityKind.RelativeLevel;
}
