using System.Text.Json.Serialization;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Advising;

/// <summary>Sort of instrument a reading needs.</summary>
public enum InstrumentClass
{
    /// <summary>Eyes and fingers.</summary>
    Eye,

    /// <summary>Multimeter.</summary>
    Multimeter,

    /// <summary>Inductance and capacitance meter.</summary>
    LcMeter,

    /// <summary>Frequency counter.</summary>
    Counter,

    /// <summary>Oscilloscope.</summary>
    Oscilloscope,

    /// <summary>Network analyser, or generator with detector.</summary>
    NetworkAnalyser,

    /// <summary>Power meter or dummy load with detector.</summary>
    PowerMeter,

    /// <summary>Spectrum instrument.</summary>
    Spectrum,

    /// <summary>Ears, an audio meter or a receiver.</summary>
    Receiver,
}

/// <summary>What a builder should read at one point.</summary>
/// <param name="Point">Stable point id, e.g. "A5.L4.L".</param>
/// <param name="Kind">What is measured.</param>
/// <param name="Nominal">Expected value, SI.</param>
/// <param name="LowSi">Lower end of the window; negative infinity is not used: a one-sided window repeats the widest sensible value.</param>
/// <param name="HighSi">Upper end of the window.</param>
/// <param name="SetUp">Code of the set-up text (load, probe, trimmer).</param>
/// <param name="Instrument">Sort of instrument.</param>
/// <param name="Sides">Which ends of the window count.</param>
/// <param name="DLnReadingByDLnPart">Relative change of the reading per relative change of a part, by designator.</param>
/// <param name="Winding">The winding behind the reading, for the one turn rule; null otherwise.</param>
public sealed record ExpectedReading(
    string Point,
    QuantityKind Kind,
    double Nominal,
    double LowSi,
    double HighSi,
    string SetUp,
    InstrumentClass Instrument,
    WindowSides Sides,
    IReadOnlyDictionary<string, double> DLnReadingByDLnPart,
    WindingUnderTest? Winding = null)
{
    /// <summary>Fewest digits a reading is written with.</summary>
    private const int FewestDigits = 3;

    /// <summary>Stage key at the front of the point id.</summary>
    [JsonIgnore]
    public string Stage => Point.Split('.')[0];

    /// <summary>Significant digits at which both ends of the window and a tenth of its width can be told apart.</summary>
    [JsonIgnore]
    public int Digits
    {
        get
        {
            var (width, size) = (Math.Abs(HighSi - LowSi), Math.Max(Math.Abs(HighSi), Math.Abs(LowSi)));
            return width > 0 && size > width ? Math.Clamp((int)Math.Ceiling(Math.Log10(size / width)) + 1, FewestDigits, 9) : FewestDigits;
        }
    }
}

/// <summary>Which ends of a window count.</summary>
public enum WindowSides
{
    /// <summary>Both.</summary>
    Both,

    /// <summary>Only a least value.</summary>
    AtLeast,

    /// <summary>Only a largest value.</summary>
    AtMost,
}

/// <summary>What the one turn rule needs to know of a winding.</summary>
/// <param name="Designator">The coil.</param>
/// <param name="Turns">Turns planned.</param>
/// <param name="Core">Core designation.</param>
/// <param name="SpreadMost">How much spreading lowers L, relative.</param>
/// <param name="SqueezeMost">How much squeezing raises L, relative.</param>
/// <param name="Trim">Range of L a trimmer still absorbs, relative; zero without one.</param>
/// <param name="TurnLengthM">Wire of one turn, metre; decides whether a turn can be added from the tail.</param>
public sealed record WindingUnderTest(string Designator, int Turns, string Core, double SpreadMost, double SqueezeMost, double Trim, double TurnLengthM);

/// <summary>One measured value. Append-only: a correction is a new reading.</summary>
/// <param name="Point">Point id.</param>
/// <param name="Kind">What was measured.</param>
/// <param name="Si">Value in SI units.</param>
/// <param name="TypedText">What was typed.</param>
/// <param name="Instrument">Instrument name; null makes it a remark.</param>
/// <param name="Ordinal">Server ordinal; order never relies on a clock.</param>
public sealed record Reading(string Point, QuantityKind Kind, double Si, string TypedText, string? Instrument, long Ordinal);

/// <summary>What is known of an instrument.</summary>
/// <param name="Name">Club name, e.g. "M2".</param>
/// <param name="Class">Sort.</param>
/// <param name="RelativeUncertainty">Expanded (k = 2), relative.</param>
/// <param name="AbsoluteUncertaintySi">Expanded, absolute, SI; added.</param>
/// <param name="OffsetSi">Known fixture offset; subtracted visibly, the raw value is kept.</param>
public sealed record Instrument(string Name, InstrumentClass Class, double RelativeUncertainty, double AbsoluteUncertaintySi, double OffsetSi);

/// <summary>What was really put on a board.</summary>
/// <param name="Turns">Turns wound, by coil.</param>
/// <param name="Parts">Type fitted, by designator, where it differs from the plan.</param>
public sealed record AsBuilt(IReadOnlyDictionary<string, int> Turns, IReadOnlyDictionary<string, string> Parts)
{
    /// <summary>As the plan says.</summary>
    public static AsBuilt AsPlanned { get; } = new(new Dictionary<string, int>(), new Dictionary<string, string>());
}
