using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;

namespace ClubBench.Club.Demo;

/// <summary>A board of the demonstration with its builder and what was read on its output filter, microhenry as typed.</summary>
internal sealed record DemoBoard(string Tag, string Builder, string? L4 = null, string? L5 = null, string? L6 = null, bool IsJunior = false);

/// <summary>An instrument of the demonstration.</summary>
internal sealed record DemoInstrument(string Name, InstrumentClass Class, double UncertaintyRelative, QuantityKind OffsetKind, string Post);

/// <summary>The invented Marrowby Radio Constructors: people, boards, readings. Nothing here is real.</summary>
internal static class DemoTables
{
    public const string Club = "Marrowby Radio Constructors";

    public const string Coordinator = "Ingrid";

    public static IReadOnlyList<string> Mentors { get; } = ["Tomas", "Bex"];

    /// <summary>Builders without a board yet; Seun misses the night.</summary>
    public static IReadOnlyList<string> Others { get; } = ["Emre", "Greta", "Kofi", "Seun"];

    public const string Absent = "Seun";

    /// <summary>Boards for 20 m. The readings were taken with a meter whose fixture offset of 20 nH nobody had subtracted; the last board is still to be read.</summary>
    public static IReadOnlyList<DemoBoard> TwentyMetres { get; } =
    [
        new("Q01", "Priya", "0.736", "0.836", "0.728"),
        new("Q02", "Callum", "0.728", "0.822", "0.725"),
        new("Q03", "Mirela", "0.728", "0.816", "0.721"),
        new("Q04", "Davit", "0.714", "0.809", "0.716"),
        new("Q05", "Hana", "0.734", "0.828", "0.732"),
        new("Q06", "Rolf", "0.727", "0.801", "0.717"),
        new("Q07", "Nia", IsJunior: true),
    ];

    /// <summary>Boards for 40 m.</summary>
    public static IReadOnlyList<DemoBoard> FortyMetres { get; } = [new("Q08", "Jonas"), new("Q09", "Oona"), new("Q10", "Piet"), new("Q11", "Yusuf"), new("Q12", "Lena")];

    /// <summary>Meter the readings were taken with; its offset is not entered yet.</summary>
    public const string Meter = "M2";

    /// <summary>Uncertainties are common practice for such instruments.</summary>
    public static IReadOnlyList<DemoInstrument> Instruments { get; } =
    [
        new(Meter, InstrumentClass.LcMeter, 0.02, QuantityKind.Inductance, "Post 1"),
        new("F1", InstrumentClass.Counter, 1e-5, QuantityKind.Frequency, "Post 2"),
        new("S1", InstrumentClass.Oscilloscope, 0.05, QuantityKind.PeakToPeakVoltage, "Post 3"),
        new("N1", InstrumentClass.NetworkAnalyser, 0.05, QuantityKind.Decibels, "Post 4"),
        new("P1", InstrumentClass.PowerMeter, 0.1, QuantityKind.Power, "Post 3"),
        new("V1", InstrumentClass.Multimeter, 0.02, QuantityKind.Voltage, "Post 1"),
    ];
}
