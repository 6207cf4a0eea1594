using System.Globalization;
using System.Numerics;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Sweeps;
using CsCheck;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Sweeps;

public class TouchstoneWriterTests
{
    private static readonly IReadOnlyList<Frequency> Frequencies = FrequencyRange.FromMegahertz(1, 30).Points(60);

    private static readonly Gen<Complex> AnyComplex = Gen.Select(Gen.Double[-1, 1], Gen.Double[-1, 1], (a, b) => new Complex(a, b));

    [Fact]
    [Evidence(typeof(TouchstoneWriter), EvidenceKind.RoundTrip)]
    [Evidence(typeof(TouchstoneReader), EvidenceKind.RoundTrip)]
    public void Write_AnySweep_IsReadBackTheSame() =>
        Gen.Select(Gen.Select(AnyComplex, AnyComplex, AnyComplex, AnyComplex).Array[1, 20], Gen.Bool, Gen.Double[1, 500], Gen.Double[1, 500]).Sample((values, isOnePort, first, second) =>
        {
            var points = values.Select((v, i) => isOnePort
                ? new SweepPoint(Frequency.FromHertz(1234.5 * (i + 1)), v.Item1)
                : new SweepPoint(Frequency.FromHertz(1234.5 * (i + 1)), v.Item1, v.Item2, v.Item3, v.Item4));
            var sweep = new Sweep([.. points], Resistance.FromOhm(first), Resistance.FromOhm(isOnePort ? first : second));

            var back = TouchstoneReader.Read(TouchstoneWriter.Write(sweep, "made\nby hand"), "x" + TouchstoneWriter.ExtensionOf(sweep)).Sweep!;

            Assert.Equal((sweep.Reference1, sweep.Reference2), (back.Reference1, back.Reference2));
            Assert.Equal(sweep.Points.Select(p => p with { Frequency = default }), back.Points.Select(p => p with { Frequency = default }));
            Assert.All(sweep.Points.Zip(back.Points), p => Assert.Equal(1, p.First.Frequency / p.Second.Frequency, 1e-14));
        });

    [Fact]
    public void Write_NotMeasured_IsReadBackAsNotMeasured()
    {
        var half = new Sweep([new(Frequency.FromMegahertz(7), 0.1, 0.9)], FiftyOhm, FiftyOhm);

        Assert.Equal(half.Points[0], TouchstoneReader.Read(TouchstoneWriter.Write(half), "x.s2p").Sweep!.Points[0]);
    }

    [Fact]
    public void Write_Sweep_HasTheOptionLineThatWasPromised() =>
        Assert.StartsWith("! F7\n# MHz S RI R 50\n1 ", TouchstoneWriter.Write(Sweep.Of(F7.ToLadder(), Frequencies, FiftyOhm, FiftyOhm), "F7"), StringComparison.Ordinal);

    [Fact]
    [Evidence(typeof(TouchstoneWriter), EvidenceKind.ClosedFormLimit)]
    public void Write_OnePointOfTwoPorts_IsOneLineOfTheFormat() => Assert.Equal(
        "# MHz S RI R 50 75\n7 0.5 -0.25 0.75 0 0.125 1 -0.5 0.0625\n",
        TouchstoneWriter.Write(new([new(Frequency.FromMegahertz(7), new(0.5, -0.25), 0.75, new(0.125, 1), new(-0.5, 0.0625))], FiftyOhm, Resistance.FromOhm(75))));

    [Fact]
    [Evidence(typeof(TouchstoneWriter), EvidenceKind.IndependentRecomputation)]
    public void Write_LossyFilter_HoldsItsNumbersForAnyProgramThatSplitsLines()
    {
        var sweep = Sweep.Of(Seven20.ToLadder(150, 1000), Frequencies, FiftyOhm, FiftyOhm);

        var rows = TouchstoneWriter.Write(sweep).Split('\n', StringSplitOptions.RemoveEmptyEntries).Skip(1)
            .Select(l => l.Split(' ').Select(n => double.Parse(n, CultureInfo.InvariantCulture)));

        Assert.Equal(
            sweep.Points.SelectMany(p => new[] { p.S11, p.S21!.Value, p.S12!.Value, p.S22!.Value }.SelectMany(s => new[] { s.Real, s.Imaginary }).Prepend(p.Frequency.Megahertz)),
            rows.SelectMany(n => n));
    }

    [Fact]
    [Evidence(typeof(TouchstoneWriter), EvidenceKind.Identity)]
    public void Write_AnyComment_ChangesNothingOfWhatIsRead()
    {
        var sweep = Sweep.Of(F7.ToLadder(), Frequencies, FiftyOhm, FiftyOhm);
        var read = TouchstoneReader.Read(TouchstoneWriter.Write(sweep), "x.s2p").Sweep!.Points;

        Gen.String.Sample(comment => TouchstoneReader.Read(TouchstoneWriter.Write(sweep, comment), "x.s2p").Sweep!.Points.SequenceEqual(read), iter: 200);
    }
}
