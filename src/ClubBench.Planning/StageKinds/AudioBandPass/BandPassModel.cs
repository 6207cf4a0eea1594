using System.Numerics;
using ClubBench.Calculation.Audio;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.AudioBandPass;

/// <summary>A computed audio band-pass: the same on any band, to be compared with the pitch the club listens at.</summary>
internal sealed class BandPassModel(BandPassStage stage, Surroundings surroundings) : IStageModel, IAddsNoise, IPresents
{
    private static readonly Resistance UsualInput = Resistance.FromOhm(10_000);

    public MultipleFeedbackBandPass Section { get; } = stage.Section;

    /// <summary>Pitch a station is heard at.</summary>
    public Frequency Pitch { get; } = surroundings.Pitch;

    /// <summary>Centre less pitch, hertz.</summary>
    public double OffPitchHertz => Section.Centre.Hertz - Pitch.Hertz;

    /// <summary>Width of all sections in a row at -3 dB. Method: n equal sections shrink by sqrt(2^(1/n) - 1).</summary>
    public double BandwidthHertz => Section.Bandwidth3dBHertz * Math.Sqrt(Math.Pow(2, 1.0 / stage.Sections) - 1);

    public Decibels PreamplifierGain { get; } =
        stage.Preamplifier is var (input, feedback) ? Decibels.FromAmplitudeRatio(feedback / input) : Decibels.Zero;

    /// <summary>Preamplifier and all sections at the centre.</summary>
    public Decibels Gain => PreamplifierGain + (Decibels.FromAmplitudeRatio(Section.CentreGain) * stage.Sections);

    public IReadOnlyList<Figure> Figures =>
    [
        Figure.Of("centre", Section.Centre, SectionWorking) with { Digits = 3 },
        Figure.Of("section-q", QuantityKind.Number, Section.Q, SectionWorking) with { Digits = 3 },
        Figure.Of("section-gain", QuantityKind.Number, Section.CentreGain, SectionWorking) with { Digits = 3 },
        Figure.Of("bandwidth", Frequency.FromHertz(BandwidthHertz), SectionWorking) with { Digits = 2 },
        .. stage.Preamplifier is var (input, feedback)
            ? [Figure.Of("preamplifier-gain", PreamplifierGain, new Working("inverting-gain", [Figure.Of("input", input), Figure.Of("feedback", feedback)], SourceRef.Derived("ratio of resistors"))) with { Digits = 3 }]
            : Array.Empty<Figure>(),
        Figure.Of("gain", Gain, SectionWorking) with { Digits = 2 },
        new Figure("noise-figure", QuantityKind.Decibels, stage.NoiseFigureDb, From: Provenance.Typical, Digits: 2),
    ];

    public Decibels NoiseFigure(Frequency at) => Decibels.FromDb(stage.NoiseFigureDb);

    public Decibels ReceiveGain(Frequency at) => Gain;

    public Complex Impedance(string port, Frequency at) =>
        port == AudioBandPassKind.Input ? (stage.Preamplifier?.Input ?? UsualInput).Ohm : 100;

    private Working SectionWorking => new(
        "multiple-feedback-band-pass",
        [
            Figure.Of("section-input", Section.Input),
            Figure.Of("section-shunt", Section.ToGround),
            Figure.Of("section-feedback", Section.Feedback),
            Figure.Of("section-capacitor", Section.Capacitor),
            Figure.Of("sections", QuantityKind.Count, stage.Sections),
        ],
        SourceRef.Derived("multiple-feedback band-pass"));
}
