using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Devices;

public class HybridPiTests
{
    private static readonly Resistance Source = Resistance.FromOhm(50);
    private static readonly Resistance Load = Resistance.FromOhm(200);

    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("hybrid_pi_gain");

    [Theory]
    [MemberData(nameof(Rows))]
    public void TransducerGain_ResistorsAround_MatchesTheRow(ReferenceRow row)
    {
        Resistance? Ohm(string column) => row.Has(column) ? Resistance.FromOhm(row.Number(column)) : null;
        var around = new StageResistors(Ohm("base_shunt_ohm"), Ohm("emitter_ohm"), Ohm("feedback_ohm"));

        var y = Model().At(Frequency.FromMegahertz(row.Number("frequency_mhz")), around);

        Assert.Equal(row.Number("gain_db"), y.TransducerGain(Source, Load).Db, row.Number("tolerance"));
        if (row.Has("stability_factor")) Assert.Equal(row.Number("stability_factor"), y.StabilityFactor, row.Number("tolerance"));
    }

    [Fact]
    public void InputImpedance_At7MHz_MatchesWorkedFigures()
    {
        var z = Model().At(Frequency.FromMegahertz(7)).InputImpedance(Load);

        Assert.Equal(24.64, z.Real, 0.01);
        Assert.Equal(-22.86, z.Imaginary, 0.01);
    }

    [Fact]
    [Evidence(typeof(HybridPi), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(AdmittanceTwoPort), EvidenceKind.ClosedFormLimit)]
    public void TransducerGain_VeryLowFrequency_IsTheResistiveClosedForm()
    {
        var model = Model();
        var (rpi, load) = (100 / model.TransconductanceSiemens, 1 / ((1 / 200.0) + (1 / 50e3)));

        var gain = model.At(Frequency.FromHertz(10)).TransducerGain(Source, Load);

        var voltage = model.TransconductanceSiemens * load * rpi / (rpi + 20 + 50);
        Assert.Equal(10 * Math.Log10(voltage * voltage * 4 * 50 / 200), gain.Db, 1e-6);
    }

    [Fact]
    [Evidence(typeof(HybridPi), EvidenceKind.ClosedFormLimit)]
    public void At_VanishingEmitterResistor_ApproachesTheGroundedEmitter()
    {
        var f = Frequency.FromMegahertz(14);

        var small = Model().At(f, new StageResistors(Emitter: Resistance.FromOhm(1e-7)));

        Assert.Equal(0, (small.Y21 - Model().At(f).Y21).Magnitude, 1e-6);
    }

    [Fact]
    public void TryCreate_FeedbackCapacitanceBeyondTheTransitionFrequency_IsRefused() =>
        Assert.False(HybridPi.TryCreate(Current.FromMilliampere(1), new(100, Frequency.FromMegahertz(300)), Capacitance.FromPicofarad(30), Resistance.FromOhm(20), out _));

    [Theory]
    [Evidence(typeof(BaseShunt), EvidenceKind.RoundTrip)]
    [InlineData(7, 28.05, 24.4)]
    [InlineData(3.5, 28.05, 15.0)]
    [InlineData(14, 22.23, 17.2)]
    [InlineData(14, 27.61, 310)]
    public void BaseShunt_WantedGain_MatchesWorkedFigures(double megahertz, double wantedDb, double ohm)
    {
        var solved = BaseShunt.For(Model(), Frequency.FromMegahertz(megahertz), Source, Load, Decibels.FromDb(wantedDb));

        Assert.Equal(ohm, solved.Value!.Value.Ohm, ohm * 0.01);
        Assert.Equal(wantedDb, solved.Gain.Db, 1e-6);
    }

    [Fact]
    public void BaseShunt_NotEvenNoneReachesIt_TellsWhatIsMissing()
    {
        var solved = BaseShunt.For(Model(), Frequency.FromMegahertz(14), Source, Load, Decibels.FromDb(33.32));

        Assert.Null(solved.Value);
        Assert.Equal(5.27, solved.Missing.Db, 0.02);
    }

    internal static HybridPi Model() =>
        HybridPi.TryCreate(Current.FromMilliampere(20), new(100, Frequency.FromMegahertz(300)), Capacitance.FromPicofarad(3.5), Resistance.FromOhm(20), out var model)
            ? model!
            : throw new InvalidOperationException();
}
