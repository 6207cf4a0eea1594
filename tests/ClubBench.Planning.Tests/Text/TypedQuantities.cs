using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Tests.Text;

/// <summary>What people type, and what it must mean. Null stands for a refusal with the given code.</summary>
internal static class TypedQuantities
{
    public sealed record Row(QuantityKind Kind, string Text, double? Si, string? Code = null, string? DefaultUnit = null);

    public static IReadOnlyList<Row> All { get; } =
    [
        .. Typed(QuantityKind.Frequency,
            ("14.052 MHz", 14.052e6), ("14,052 MHz", 14.052e6), ("14.052MHz", 14.052e6), ("14.052 mhz", 14.052e6), ("14M052", 14.052e6), ("14.052M", 14.052e6),
            ("7030 kHz", 7.030e6), ("7030k", 7.030e6), ("7 030 kHz", 7.030e6), ("7\u00A0030 kHz", 7.030e6), ("7\u202F030,5 kHz", 7030.5e3), ("701 Hz", 701), ("701hz", 701),
            ("1.0e7 Hz", 1e7), ("1,0E7Hz", 1e7), ("0.1441 GHz", 144.1e6), ("+14.06 MHz", 14.06e6), ("10.120MHZ", 10.120e6), (".7 kHz", 700), ("7. MHz", 7e6)),
        .. Typed(QuantityKind.FrequencyShift,
            ("-882 Hz", -882), ("\u2212882 Hz", -882), ("\u2212 1,441 kHz", -1441), ("+700 Hz", 700), ("0.7k", 700), ("-1k4", -1400), ("27 kHz", 27e3)),
        .. Typed(QuantityKind.Inductance,
            ("0.734 uH", 0.734e-6), ("0,734 uH", 0.734e-6), ("0.734 µH", 0.734e-6), ("0.734 μH", 0.734e-6), ("734 nH", 734e-9), ("734n", 734e-9), ("2u2", 2.2e-6),
            ("2R2", 2.2e-6), ("6.8u", 6.8e-6), ("1 mH", 1e-3), ("0,734 UH", 0.734e-6), ("10 µ", 10e-6)),
        .. Typed(QuantityKind.Capacitance,
            ("270 pF", 270e-12), ("270p", 270e-12), ("2n2", 2.2e-9), ("n47", 470e-12), ("0.1 uF", 1e-7), ("0,1uF", 1e-7), ("100 NF", 1e-7), ("36,4 pF", 36.4e-12),
            ("4µ7", 4.7e-6), ("1e-10 F", 1e-10), ("5p6F", 5.6e-12), ("20 fF", 20e-15), ("20,4fF", 20.4e-15)),
        .. Typed(QuantityKind.Resistance,
            ("4k7", 4700), ("4K7", 4700), ("4R7", 4.7), ("0R47", 0.47), ("470R", 470), ("470 ohm", 470), ("470 Ω", 470), ("470 \u2126", 470), ("4,7 kΩ", 4700), ("1 M", 1e6), ("5 m", 0.005), ("0R", 0)),
        .. Typed(QuantityKind.Voltage, ("12.0 V", 12), ("12,0V", 12), ("3V3", 3.3), ("250 mV", 0.25), ("-5 V", null, "quantity.negative"), ("12 v", 12)),
        .. Typed(QuantityKind.PeakToPeakVoltage, ("250 mVpp", 0.25), ("250 mV p-p", 0.25), ("18 Vpp", 18), ("250 mV", 0.25)),
        .. Typed(QuantityKind.Current, ("30 mA", 0.030), ("0,164 A", 0.164), ("164 ma", 0.164), ("50 µA", 50e-6)),
        .. Typed(QuantityKind.Power, ("1.1 W", 1.1), ("1,1W", 1.1), ("94 mW", 0.094), ("2 mw", 0.002), ("1W1", 1.1), ("94 MW", null, "quantity.unit-unknown")),
        .. Typed(QuantityKind.PowerLevel, ("30.7 dBm", 30.7), ("-73 dBm", -73), ("\u221273,5 dbm", -73.5), ("30 dB", null, "quantity.unit-unknown")),
        .. Typed(QuantityKind.Decibels, ("41.7 dB", 41.7), ("-0,2 dB", -0.2), ("3 dBm", null, "quantity.unit-unknown")),
        .. Typed(QuantityKind.RelativeLevel, ("-43 dBc", -43), ("-43,5 dB", -43.5), ("\u2212 47 dBc", -47)),
        .. Typed(QuantityKind.Ratio, ("5 %", 0.05), ("7,4%", 0.074), ("20 ppm", 20e-6)),
        .. Typed(QuantityKind.Length, ("0.4 mm", 0.4e-3), ("0,4mm", 0.4e-3), ("29 cm", 0.29), ("1.5 m", 1.5), ("0.5 in", 0.0127)),
        .. Typed(QuantityKind.Temperature, ("63 °C", 63), ("63C", 63), ("-5 °C", -5)),
        .. Typed(QuantityKind.TemperatureRise, ("40 K", 40), ("40 °C", 40)),
        .. Typed(QuantityKind.Duration, ("5 ms", 5e-3), ("4 min", 240), ("1,5 s", 1.5)),
        .. Typed(QuantityKind.FluxDensity, ("767 G", 0.0767), ("76,7 mT", 0.0767), ("767 gauss", 0.0767)),
        .. Typed(QuantityKind.InductanceFactor, ("3.14 nH/t²", 3.14e-9), ("3,14 nH/t2", 3.14e-9), ("49 uH/100t", 4.9e-9), ("3.14 nH/turn²", 3.14e-9)),
        .. Typed(QuantityKind.Count, ("15", 15), ("15 turns", 15), ("15 t", 15), ("15.5", null, "quantity.not-whole")),
        .. Typed(QuantityKind.Number, ("2.9", 2.9), ("2,9", 2.9), ("1e3", 1000)),
        .. Typed(QuantityKind.Angle, ("45°", 45), ("-12,5 deg", -12.5)),
        new(QuantityKind.Inductance, "0.734", 0.734e-6, DefaultUnit: "µH"),
        new(QuantityKind.Inductance, "0,734", 0.734e-6, DefaultUnit: "µH"),
        new(QuantityKind.Inductance, "734 nH", 734e-9, DefaultUnit: "µH"),
        new(QuantityKind.Capacitance, "123,5", 123.5e-12, DefaultUnit: "pF"),
        new(QuantityKind.Frequency, "14,0523", 14.0523e6, DefaultUnit: "MHz"),
        new(QuantityKind.Decibels, "-43", -43, DefaultUnit: "dB"),
        new(QuantityKind.Inductance, "0.734", null, "quantity.no-unit"),
        new(QuantityKind.Frequency, "14.052", null, "quantity.no-unit"),
        .. Refused(QuantityKind.Frequency, "quantity.two-marks", "14.052,5 kHz", "14,052.5 kHz", "1.000.000 Hz", "14..052 MHz", "1,000,000 Hz"),
        .. Refused(QuantityKind.Capacitance, "quantity.two-marks", "1.000,5 pF", "1,2,3p"),
        .. Refused(QuantityKind.Frequency, "quantity.not-a-number", "about 14 MHz", "--7 MHz", "+-7 MHz", "1'000 Hz", "١٤ MHz", "NaN", "\u221E", "1e999 Hz", "14/2 MHz", "=7 MHz", "MHz"),
        .. Refused(QuantityKind.Inductance, "quantity.not-a-number", "NaN", "abc", "١ uH", "uH"),
        .. Refused(QuantityKind.Frequency, "quantity.unit-unknown", "14 MW", "14 V", "7 KK", "0x10 Hz"),
        .. Refused(QuantityKind.Capacitance, "quantity.unit-unknown", "3M3", "4K7", "47 ohm"),
        .. Refused(QuantityKind.Capacitance, "quantity.zero", "0 pF"),
        .. Refused(QuantityKind.Capacitance, "quantity.negative", "-4n7", "\u22124n7"),
        .. Refused(QuantityKind.Frequency, "quantity.negative", "-7 MHz"),
        .. Refused(QuantityKind.Voltage, "quantity.empty", "", "   ", "\u00A0"),
        .. Refused(QuantityKind.Voltage, "quantity.too-long", new string('1', 50) + " V"),
    ];

    private static IEnumerable<Row> Typed(QuantityKind kind, params IEnumerable<Entry> rows) => rows.Select(r => new Row(kind, r.Text, r.Si, r.Code));

    private static IEnumerable<Row> Refused(QuantityKind kind, string code, params IEnumerable<string> texts) => texts.Select(t => new Row(kind, t, null, code));

    public readonly record struct Entry(string Text, double? Si, string? Code)
    {
        public static implicit operator Entry((string Text, double Si) pair) => new(pair.Text, pair.Si, null);

        public static implicit operator Entry((string Text, double? Si, string Code) triple) => new(triple.Text, triple.Si, triple.Code);
    }
}
