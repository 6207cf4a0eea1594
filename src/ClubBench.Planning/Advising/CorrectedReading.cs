namespace ClubBench.Planning.Advising;

/// <summary>A reading after the known offset of its instrument, with its uncertainty. The raw value is kept.</summary>
/// <param name="RawSi">As read.</param>
/// <param name="Si">Offset subtracted.</param>
/// <param name="OffsetSi">What was subtracted.</param>
/// <param name="ExpandedUncertaintySi">Expanded uncertainty (k = 2) from the instrument's record; a cautious default of the trade where it is unknown.</param>
public sealed record CorrectedReading(double RawSi, double Si, double OffsetSi, double ExpandedUncertaintySi)
{
    /// <summary>Relative uncertainty taken for an instrument nobody recorded (common practice for club meters).</summary>
    private const double UnknownInstrument = 0.05;

    /// <summary>Applies the instrument's record to a reading.</summary>
    public static CorrectedReading Of(Reading reading, IReadOnlyList<Instrument> instruments)
    {
        var instrument = instruments.FirstOrDefault(i => i.Name == reading.Instrument);
        var offset = instrument?.OffsetSi ?? 0;
        var value = reading.Si - offset;
        var u = instrument is null ? UnknownInstrument * Math.Abs(value) : (instrument.RelativeUncertainty * Math.Abs(value)) + instrument.AbsoluteUncertaintySi;
        return new CorrectedReading(reading.Si, value, offset, u);
    }
}
