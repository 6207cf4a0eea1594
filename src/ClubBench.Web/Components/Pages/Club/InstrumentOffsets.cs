using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;

namespace ClubBench.Web.Components.Pages.Club;

/// <summary>What the known offset of an instrument is usually measured in.</summary>
internal static class InstrumentOffsets
{
    public static QuantityKind KindOf(InstrumentClass @class) => @class switch
    {
        InstrumentClass.LcMeter => QuantityKind.Inductance,
        InstrumentClass.Counter => QuantityKind.FrequencyShift,
        InstrumentClass.Multimeter => QuantityKind.Voltage,
        InstrumentClass.Oscilloscope => QuantityKind.PeakToPeakVoltage,
        InstrumentClass.PowerMeter => QuantityKind.Power,
        _ => QuantityKind.Decibels,
    };
}
