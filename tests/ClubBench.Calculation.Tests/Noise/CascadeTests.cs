using System.Globalization;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Noise;

public class CascadeTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("cascade");

    [Theory]
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
    public void NoiseFigure_PadInFront_AddsItsLoss() =>
        Gen.Select(Gen.Double[0, 20], Gen.Double[0, 20]).Sample((lossDb, nfDb) =>
        {
            var pad = ReceiverStage.Loss(Decibels.FromDb(lossDb), Temperature.FromCelsius(290 - 273.15));
            var stage = new ReceiverStage(Decibels.FromDb(20), Decibels.FromDb(nfDb));
            Assert.Equal(lossDb + nfDb, Cascade.NoiseFigure([pad, stage]).Db, 1e-9);
        });

    [Fact]
    public void Loss_SixDecibelsAt400Kelvin_IsNoisierThanItsLoss() =>
        Assert.Equal(7.086, ReceiverStage.Loss(Decibels.FromDb(6), Temperature.FromCelsius(400 - 273.15)).NoiseFigure.Db, 0.001);

    [Fact]
    public void InputIntercept_NoneStated_IsNotGiven() =>
        Assert.Null(Cascade.InputIntercept([new ReceiverStage(Decibels.FromDb(10), Decibels.FromDb(3))]));

    [Fact]
    public void Gain_OfAChain_IsTheSum() =>
        Assert.Equal(7, Cascade.Gain([new(Decibels.FromDb(10), default), new(Decibels.FromDb(-3), default)]).Db, 1e-12);

    [Fact]
    public void ReciprocalMixingRange_Minus140PerHertzIn500_Is113() =>
        Assert.Equal(140 - 26.99, Cascade.ReciprocalMixingRange(-140, 500).Db, 0.01);

    [Fact]
    public void NoiseFigure_NoStage_Throws() => Assert.Throws<ArgumentOutOfRangeException>(() => Cascade.NoiseFigure([]));

    private static ReceiverStage Stage(string text)
    {
        var cells = text.Split(':');
        return new ReceiverStage(Decibels.FromDb(Number(cells[0])), Decibels.FromDb(Number(cells[1])),
            cells.Length > 2 && cells[2].Length > 0 ? PowerLevel.FromDbm(Number(cells[2])) : null);
    }

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
