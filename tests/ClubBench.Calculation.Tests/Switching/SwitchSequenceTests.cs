using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Switching;
using CsCheck;

namespace ClubBench.Calculation.Tests.Switching;

public class SwitchSequenceTests
{
    private static readonly Gen<(int Relay, int Rise, int Dot)> Cases = Gen.Select(Gen.Int[0, 40], Gen.Int[1, 20], Gen.Int[20, 120]);

    [Fact]
    [Evidence(typeof(SwitchSequence), EvidenceKind.IndependentRecomputation)]
    public void FirstDotLeft_MillisecondsOfFullPowerCounted_IsTheirNumber() =>
        Cases.Sample(c =>
        {
            var full = 0;
            for (var ms = 0; ms < c.Dot; ms++)
            {
                var raised = ms < c.Relay ? 0 : Math.Min(1.0, (double)(ms - c.Relay) / c.Rise);
                if (raised == 1) full++;
            }

            return Math.Abs(Sequence(c.Relay, c.Rise).FirstDotLeft(Duration.FromMillisecond(c.Dot)).Millisecond - full) < 1e-9;
        });

    [Fact]
    [Evidence(typeof(SwitchSequence), EvidenceKind.Identity)]
    public void FirstDotLeft_AllTimesScaled_KeepsTheVerdictAndDelayPlusRestIsTheDot() =>
        Gen.Select(Cases, Gen.Double[0.5, 4]).Where((c, _) => c.Dot != 4 * (c.Relay + c.Rise)).Sample((c, k) =>
        {
            var (dot, plain, scaled) = (Duration.FromMillisecond(c.Dot), Sequence(c.Relay, c.Rise), Sequence(k * c.Relay, k * c.Rise));
            var whole = plain.FirstDotLeft(dot) + plain.Delay;
            return plain.KeepsFirstDot(dot) == scaled.KeepsFirstDot(dot * k) && (plain.FirstDotLeft(dot).Second == 0 ? whole >= dot : Math.Abs((whole / dot) - 1) < 1e-9);
        });

    private static SwitchSequence Sequence(double relayMs, double riseMs) => new(
        Duration.FromMillisecond(relayMs), Duration.FromMillisecond(riseMs), Duration.FromMillisecond(5), Duration.FromMillisecond(10));
}
