using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Switching;

/// <summary>Times between key and antenna. Key down: mute, oscillator settles, switch over, then power; key up in reverse. Immutable.</summary>
/// <remarks>Method: sums of times. Source: common practice (relay 5 to 10 ms, unmute 5 to 20 ms after the switch).</remarks>
/// <param name="SwitchTime">Until contacts or diodes have settled.</param>
/// <param name="RiseTime">Rise of the envelope.</param>
/// <param name="FallTime">Fall of the envelope.</param>
/// <param name="SwitchHold">From key up until the switch opens.</param>
public sealed record SwitchSequence(Duration SwitchTime, Duration RiseTime, Duration FallTime, Duration SwitchHold)
{
    /// <summary>From key down to full power.</summary>
    public Duration Delay => SwitchTime + RiseTime;

    /// <summary>What is left of the first dot; zero when all of it is lost.</summary>
    /// <param name="dot">Length of a dot.</param>
    public Duration FirstDotLeft(Duration dot) => Delay < dot ? dot - Delay : Duration.FromSecond(0);

    /// <summary>Whether a first dot keeps at least three quarters: 15 ms of a 60 ms dot.</summary>
    public bool KeepsFirstDot(Duration dot) => Delay <= dot * 0.25;

    /// <summary>Whether the power is gone before the switch opens: else it opens under power.</summary>
    public bool SwitchesCold => FallTime <= SwitchHold;
}
