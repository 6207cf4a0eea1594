using ClubBench.Calculation.BandPass;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Tuned band-pass filters of two or three coils, and traps.</summary>
internal static class BandPassSheets
{
    public static Worksheet Coupled { get; } = new(
        "coupled-band-pass", "filters", new("zverev-1967", "k and q tables", SourceStatus.Published),
        [
            new("resonators", QuantityKind.Count, 2, 2, 3),
            new("ripple", QuantityKind.Decibels, 0, 0, 3),
            new("middle", QuantityKind.Frequency, 7.1e6),
            new("bandwidth", QuantityKind.Frequency, 300e3),
            new("inductance", QuantityKind.Inductance, 2e-6),
            new("unloaded-q", QuantityKind.Number, 200),
            new("unavoidable", QuantityKind.Capacitance, 0, 0),
        ],
        v =>
        {
            var task = new BandPassTask(PrototypeOf(v), v.Hertz("middle"), v.Hertz("bandwidth"), v.Henry("inductance"), v["unloaded-q"], v.Farad("unavoidable"));
            var design = TopCoupledDesign.Of(task);
            return design.Filter is { } filter ? Answer(task, design, filter) : Refused(design.Refusal);
        });

    public static Worksheet Trap { get; } = new(
        "line-trap", "filters", SourceRef.Derived("one resonant arm in a line"),
        [
            new("trap-in-line", QuantityKind.Count, 0, 0, 1),
            new("notch", QuantityKind.Frequency, 9e6),
            new("inductance", QuantityKind.Inductance, 2.2e-6),
            new("unloaded-q", QuantityKind.Number, 150),
            new("frequency", QuantityKind.Frequency, 7.03e6),
            new("line", QuantityKind.Resistance, 50),
        ],
        v =>
        {
            var trap = new LineTrap(v.IsSet("trap-in-line") ? TrapPlace.InLine : TrapPlace.Shunt, v.Hertz("notch"), v.Henry("inductance"), v["unloaded-q"]);
            var harm = trap.Loss(v.Hertz("frequency"), v.Ohm("line"), v.Ohm("line"));
            var verdict = !trap.KeepsAwayFrom(FrequencyRange.At(v.Hertz("frequency"))) ? "worksheet-verdict.trap-too-near"
                : harm > LineTrap.LossWorthAWarning ? "worksheet-verdict.trap-costs" : "worksheet-verdict.trap-harmless";
            return Judged(verdict, Figure.Of("capacitance", trap.Capacitor), Figure.Of("trap-depth", trap.Loss(trap.Notch, v.Ohm("line"), v.Ohm("line"))), Figure.Of("loss", harm));
        });

    private static CouplingPrototype PrototypeOf(WorksheetValues v) => v["ripple"] > 0
        ? CouplingPrototype.Chebyshev(v.Whole("resonators"), PassBandRipple.FromRipple(v.Db("ripple")))
        : CouplingPrototype.Butterworth(v.Whole("resonators"));

    private static Outcome<WorksheetAnswer> Answer(BandPassTask task, TopCoupledDesign design, TopCoupledFilter filter)
    {
        var verdict = design.Remarks.Count > 0 ? Phrases.CodeOf(design.Remarks[0]) : "worksheet-verdict.band-pass-good";
        var response = BandPassResponse.Of(filter.Loss, task.Center, task.Bandwidth3dB);
        Figure[] passing = response is null ? [] : [Figure.Of("loss", response.PeakLoss), Figure.Of("bandwidth", QuantityKind.Frequency, response.Band.WidthHertz) with { Digits = 4 }];
        return Judged(
            verdict,
            [
                Figure.Of("coupling-capacitor", filter.Coupling),
                Figure.Of("end-node", filter.NodeCapacitances[0]),
                .. filter.NodeCapacitances.Length == 3 ? new[] { Figure.Of("middle-node", filter.NodeCapacitances[1]) } : [],
                Figure.Of("end-resistance", filter.End),
                .. passing,
                Figure.Of("second-harmonic", filter.Loss(task.Center * 2)),
                Figure.Of("half-frequency", filter.Loss(task.Center * 0.5)),
            ]);
    }

    private static Outcome<WorksheetAnswer> Refused(BandPassRefusal refusal) => refusal switch
    {
        BandPassRefusal.TooWide => Conflict("worksheet-conflict.band-pass-too-wide", "bandwidth", "middle"),
        BandPassRefusal.NodeOvercommitted => Conflict("worksheet-conflict.node-overcommitted", "inductance", "unavoidable"),
        BandPassRefusal.ThreeTooLossy => Conflict("worksheet-conflict.three-too-lossy", "resonators", "bandwidth", "unloaded-q"),
        _ => Conflict("worksheet-conflict.coils-too-lossy", "bandwidth", "unloaded-q"),
    };
}
