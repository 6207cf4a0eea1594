using System.Globalization;
using System.Numerics;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Chokes and broadband windings on ferrite, by the permeability at the frequency.</summary>
internal static class FerriteSheets
{
    private static readonly SourceRef Permeability = SourceRef.Derived("impedance from the complex permeability of the mix; the table holds within 30 %");

    private static readonly WorksheetInput Index = new("index", QuantityKind.InductanceFactor, 350e-9);
    private static readonly WorksheetInput Mix = new("ferrite-mix", QuantityKind.Count, 43);

    /// <summary>Impedance of a choke and whether it loads its node.</summary>
    public static Worksheet Choke { get; } = new(
        "ferrite-choke", "windings", Permeability,
        [
            Index, Mix, Turns(10),
            new("frequency", QuantityKind.Frequency, 10.1e6),
            new("winding-capacitance", QuantityKind.Capacitance, 0, 0),
            new("node-resistance", QuantityKind.Resistance, 50),
        ],
        v => MixConflict(v, "frequency") ?? Choked(Wound(v).Impedance(v.Hertz("frequency"), v.Farad("winding-capacitance"))!.Value, v.Ohm("node-resistance")));

    /// <summary>Whether a transformer winding has enough impedance at its lowest frequency.</summary>
    public static Worksheet Winding { get; } = new(
        "ferrite-winding", "windings", SourceRef.CommonPractice("four times the impedance at the lowest frequency, little loss in the core"),
        [Index, Mix, Turns(5), new("lowest-frequency", QuantityKind.Frequency, 7e6), new("winding-resistance", QuantityKind.Resistance, 50)],
        v => MixConflict(v, "lowest-frequency") ?? Wide(WindingJudgement.Of(new(Wound(v), v.Hertz("lowest-frequency"), v.Ohm("winding-resistance")))!));

    private static WorksheetInput Turns(int usual) => new("turns", QuantityKind.Count, usual, 1, 10_000);

    private static Outcome<WorksheetAnswer>? MixConflict(WorksheetValues v, string frequency)
    {
        if (FerritePermeability.RangeOf(Named(v)) is not { } range) return Conflict("worksheet-conflict.mix-unknown", Mix.Name);
        return range.Contains(v.Hertz(frequency)) ? null : Conflict("worksheet-conflict.mix-outside-table", Mix.Name, frequency);
    }

    private static string Named(WorksheetValues v) => v[Mix.Name].ToString(CultureInfo.InvariantCulture);

    // Index and mix decide; any listed core of the mix lends its initial permeability.
    private static FerriteWinding Wound(WorksheetValues v) =>
        new(Cores.Ferrite.First(c => c.Mix == Named(v)) with { InductanceFactor = v.Index(Index.Name) }, v.Whole("turns"));

    private static Outcome<WorksheetAnswer> Choked(Complex impedance, Resistance node)
    {
        var judgement = ChokeJudgement.Of(impedance, node);
        return Judged(
            Phrases.CodeOf(judgement.Verdict),
            Figure.Of("loss-resistance", QuantityKind.Resistance, impedance.Real),
            Figure.Of("choke-reactance", QuantityKind.Resistance, impedance.Imaginary),
            Figure.Of("impedance", QuantityKind.Resistance, Complex.Abs(impedance)),
            Figure.Of("impedance-ratio", QuantityKind.Number, judgement.ImpedanceRatio));
    }

    private static Outcome<WorksheetAnswer> Wide(WindingJudgement judgement) => Judged(
        Phrases.CodeOf(judgement.Verdict),
        Figure.Of("impedance", QuantityKind.Resistance, Complex.Abs(judgement.Loading.Impedance)),
        Figure.Of("impedance-ratio", QuantityKind.Number, judgement.Loading.Ratio),
        Figure.Of("loss", judgement.Loading.InsertionLoss),
        Figure.Of("core-loss", judgement.Loading.CoreDissipation),
        Figure.Of("standing-wave-ratio", QuantityKind.Number, judgement.Loading.StandingWaveRatio),
        Figure.Of("proposed-turns", QuantityKind.Count, judgement.ProposedTurns));
}
