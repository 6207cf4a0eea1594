using ClubBench.Calculation.Audio;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.StageKinds.AudioBandPass;

/// <summary>Audio preamplifier and equal band-pass sections with operational amplifiers, read from its document. One section's parts stand for all.</summary>
internal sealed record BandPassStage(Part SectionInput, Part SectionShunt, Part SectionFeedback, IReadOnlyList<Part> Capacitors, StageDocument Document)
{
    public static BandPassStage Read(StageDocument stage) => new(
        stage.OneInRole(Roles.SectionInput)!,
        stage.OneInRole(Roles.SectionShunt)!,
        stage.OneInRole(Roles.SectionFeedback)!,
        [.. stage.InRole(Roles.SectionCapacitor)],
        stage);

    public int Sections => Math.Max(1, (int)Math.Round(Document.Setting(Settings.Sections, 2)));

    public double NoiseFigureDb => Document.Setting(Settings.NoiseFigure, 10);

    /// <summary>One section; capacitors that are nearly alike count by their geometric mean, exact for the centre frequency.</summary>
    public MultipleFeedbackBandPass Section => new(
        Ohms(SectionInput),
        Ohms(SectionShunt),
        Ohms(SectionFeedback),
        Capacitance.FromFarad(Math.Exp(Capacitors.Average(c => Math.Log(c.Need(PartValue.Capacitance))))));

    /// <summary>Largest over smallest section capacitor.</summary>
    public double CapacitorRatio => Capacitors.Max(c => c.Need(PartValue.Capacitance)) / Capacitors.Min(c => c.Need(PartValue.Capacitance));

    /// <summary>Resistors of the preamplifier; null where the papers show none.</summary>
    public (Resistance Input, Resistance Feedback)? Preamplifier =>
        Document.OneInRole(Roles.Input) is { } input && Document.OneInRole(Roles.Feedback) is { } feedback ? (Ohms(input), Ohms(feedback)) : null;

    private static Resistance Ohms(Part part) => Resistance.FromOhm(part.Need(PartValue.Resistance));

    public static class Roles
    {
        public const string PreamplifierCircuit = "preamplifier-circuit";
        public const string Input = "input-resistor";
        public const string Feedback = "feedback-resistor";
        public const string FeedbackCapacitor = "feedback-capacitor";
        public const string FilterCircuit = "filter-circuit";
        public const string SectionInput = "section-input-resistor";
        public const string SectionShunt = "section-shunt-resistor";
        public const string SectionFeedback = "section-feedback-resistor";
        public const string SectionCapacitor = "section-capacitor";
    }

    public static class Settings
    {
        public const string Sections = "sections";
        public const string NoiseFigure = "noiseFigureDb";
    }
}
