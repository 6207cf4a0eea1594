using System.Globalization;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Noise;

public class CascadeTests
{
    private static readonly Gen<ReceiverStage> AnyStage = Gen.Select(Gen.Double[-10, 20], Gen.Double[0.1, 15], Gen.Double[-10, 30], (gain, noise, intercept) =>
        new ReceiverStage(Decibels.FromDb(gain), Decibels.FromDb(noise), PowerLevel.FromDbm(intercept)));

    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("cascade");

    [Theory]
    [Evidence(typeof(Cascade), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Rows))]
    public void Chain_ReferenceRow_GivesThePrintedFigure(ReferenceRow row)
    {
        var chain = row["chain"].Split(' ').Select(Stage).ToList();
        var nf = Cascade.NoiseFigure(chain);

        var figure = row["quantity"] switch
        {
            "nf_db" => nf.Db,
            "mds_dbm" => Cascade.MinimumDiscernibleSignal(nf, row.Number("bandwidth_hz")).Dbm,
            "iip3_dbm" => Cascade.InputIntercept(chain)!.Value.Dbm,
            "sfdr_db" => Cascade.SpuriousFreeRange(
                Cascade.InputIntercept(chain)!.Value, Cascade.MinimumDiscernibleSignal(nf, row.Number("bandwidth_hz"))).Db,
            var other => throw new InvalidOperationException(other),
        };

        Assert.Equal(row.Number("expected"), figure, row.Number("tolerance"));
    }

    [Fact]
    [Evidence(typeof(Cascade), EvidenceKind.Identity)]
    [Evidence(typeof(ReceiverStage), EvidenceKind.ClosedFormLimit)]
    public void NoiseFigure_PadInFront_AddsItsLoss() =>
        Gen.Select(Gen.Double[0, 20], Gen.Double[0, 20]).Sample((lossDb, nfDb) =>
        {
            var pad = ReceiverStage.Loss(Decibels.FromDb(lossDb), Temperature.FromCelsius(290 - 273.15));
            var stage = new ReceiverStage(Decibels.FromDb(20), Decibels.FromDb(nfDb));
            Assert.Equal(lossDb + nfDb, Cascade.NoiseFigure([pad, stage]).Db, 1e-9);
        });

    [Fact]
    public void InputIntercept_NoneStated_IsNotGiven() =>
        Assert.Null(Cascade.InputIntercept([new ReceiverStage(Decibels.FromDb(10), Decibels.FromDb(3))]));

    [Fact]
    [Evidence(typeof(Cascade), EvidenceKind.ClosedFormLimit)]
    public void Gain_OfAChain_IsTheSum() =>
        Assert.Equal(7, Cascade.Gain([new(Decibels.FromDb(10), default), new(Decibels.FromDb(-3), default)]).Db, 1e-12);

    [Fact]
    public void NoiseFigure_NoStage_Throws() => Assert.Throws<ArgumentOutOfRangeException>(() => Cascade.NoiseFigure([]));

    [Fact]
    [Evidence(typeof(Cascade), EvidenceKind.Identity)]
    public void Chain_StagesTakenTogetherFirst_IsTheSameChain() => Gen.Select(AnyStage, AnyStage, AnyStage).Sample((a, b, c) =>
    {
        var together = new ReceiverStage(Cascade.Gain([a, b]), Cascade.NoiseFigure([a, b]), Cascade.InputIntercept([a, b]));
        Assert.Equal(Cascade.NoiseFigure([a, b, c]).Db, Cascade.NoiseFigure([together, c]).Db, 1e-9);
        Assert.Equal(Cascade.InputIntercept([a, b, c])!.Value.Dbm, Cascade.InputIntercept([together, c])!.Value.Dbm, 1e-9);
    });

    [Fact]
    [Evidence(typeof(Cascade), EvidenceKind.IndependentRecomputation)]
    public void NoiseFigure_NoisePowersFollowedFromStageToStage_Agrees() => Gen.Select(AnyStage, AnyStage, AnyStage).Sample((a, b, c) =>
    {
        const double thermalWatt = 1.380649e-23 * 290 * 500;
        var (noise, signal) = (thermalWatt, 1e-12);
        foreach (var stage in new[] { a, b, c })
        {
            noise = (noise + (thermalWatt * (stage.NoiseFigure.PowerRatio - 1))) * stage.Gain.PowerRatio;
            signal *= stage.Gain.PowerRatio;
        }

        Assert.Equal(10 * Math.Log10(1e-12 / thermalWatt / (signal / noise)), Cascade.NoiseFigure([a, b, c]).Db, 1e-9);
        Assert.Equal(10 * Math.Log10(noise / signal * 1e-12 / 1e-3), Cascade.MinimumDiscernibleSignal(Cascade.NoiseFigure([a, b, c]), 500).Dbm, 1e-9);
    });

    [Fact]
    [Evidence(typeof(ReceiverStage), EvidenceKind.ClosedFormLimit)]
    public void Loss_AtAbsoluteZero_AddsNoNoise() =>
        Assert.Equal(0, ReceiverStage.Loss(Decibels.FromDb(10), Temperature.FromCelsius(-273.15)).NoiseFigure.Db, 1e-9);

    [Fact]
    [Evidence(typeof(ReceiverStage), EvidenceKind.Identity)]
    public void Loss_TwoPadsInARow_AreOnePadOfTheSum() => Gen.Select(Gen.Double[0, 20], Gen.Double[0, 20], Gen.Double[-100, 200]).Sample((a, b, celsius) =>
    {
        ReceiverStage Pad(double db) => ReceiverStage.Loss(Decibels.FromDb(db), Temperature.FromCelsius(celsius));
        Assert.Equal(Pad(a + b).NoiseFigure.Db, Cascade.NoiseFigure([Pad(a), Pad(b)]).Db, 1e-9);
    });

    [Theory]
    [Evidence(typeof(ReceiverStage), EvidenceKind.IndependentRecomputation)]
    [InlineData(3, 290)]
    [InlineData(6, 400)]
    [InlineData(10, 77)]
    public void Loss_ThermalNoiseOfEveryResistorOfAPad_AddsUpToIt(double lossDb, double kelvin)
    {
        var k = Math.Pow(10, lossDb / 20);
        var (series, shunt) = (50 * (k - 1) / (k + 1), 100 * k / ((k * k) - 1));

        // Nodes: 1 at the source, 2 in the middle of the T, 3 at the load. A resistor's noise is a current of 4kT/R beside it.
        var volts = Enumerable.Range(1, 3).Select(into => new NodalCircuit(3)
            .Element(1, 0, 50).Element(1, 2, series).Element(2, 0, shunt).Element(2, 3, series).Element(3, 0, 50).Voltages(into, 1)[3]).ToList();
        double Share(System.Numerics.Complex transfer, double ohm, double temperature) => temperature / ohm * Math.Pow(transfer.Magnitude, 2);
        var added = Share(volts[0] - volts[1], series, kelvin) + Share(volts[1], shunt, kelvin) + Share(volts[1] - volts[2], series, kelvin);

        var pad = ReceiverStage.Loss(Decibels.FromDb(lossDb), Temperature.FromCelsius(kelvin - 273.15));

        Assert.Equal(1 + (added / Share(volts[0], 50, 290)), pad.NoiseFigure.PowerRatio, 1e-9);
    }

    internal static ReceiverStage Stage(string text)
    {
        var cells = text.Split(':');
        return new ReceiverStage(Decibels.FromDb(Number(cells[0])), Decibels.FromDb(Number(cells[1])),
            cells.Length > 2 && cells[2].Length > 0 ? PowerLevel.FromDbm(Number(cells[2])) : null);
    }

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
