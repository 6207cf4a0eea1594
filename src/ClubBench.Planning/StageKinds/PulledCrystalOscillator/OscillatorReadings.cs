using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.PulledCrystalOscillator;

/// <summary>What a builder reads on the oscillator: both ends of the dial and the shift to receive. Windows: common practice.</summary>
internal static class OscillatorReadings
{
    /// <summary>Ends may be off by this share of the span (parts within tolerance), and by the crystals' marking.</summary>
    private const double EndRoomOfSpan = 0.15;
    private const double CrystalRoom = 30e-6;
    private const double OffsetRoom = 0.25;

    public static IReadOnlyList<ExpectedReading> Of(OscillatorModel model, Surroundings surroundings, string key)
    {
        if (model.Range is not { } range) return [];
        var room = (EndRoomOfSpan * range.SpanHertz) + (CrystalRoom * range.High.Hertz);
        var readings = new List<ExpectedReading>
        {
            End($"{key}.lowest-frequency", range.Low.Hertz, room),
            End($"{key}.highest-frequency", range.High.Hertz, room),
        };
        if (model.QuotedOffsetHertz is { } offset && surroundings.WantedPower is not null)
            readings.Add(new ExpectedReading(
                $"{key}.receive-offset",
                QuantityKind.FrequencyShift,
                offset,
                offset * (offset < 0 ? 1 + OffsetRoom : 1 - OffsetRoom),
                offset * (offset < 0 ? 1 - OffsetRoom : 1 + OffsetRoom),
                "set-up.offset-mid-dial",
                InstrumentClass.Counter,
                WindowSides.Both,
                new Dictionary<string, double>()));
        return readings;
    }

    private static ExpectedReading End(string point, double hertz, double room) =>
        new(point, QuantityKind.Frequency, hertz, hertz - room, hertz + room, "set-up.counter-at-buffer", InstrumentClass.Counter, WindowSides.Both, new Dictionary<string, double>());
}
