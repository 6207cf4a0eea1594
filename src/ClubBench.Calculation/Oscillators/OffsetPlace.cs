using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>Where a capacitor that shifts a pulled crystal oscillator between transmit and receive is connected.</summary>
public abstract record OffsetPlace
{
    private OffsetPlace()
    {
    }

    /// <summary>+1 where the capacitor raises the frequency while it is in circuit, -1 where it lowers it.</summary>
    public virtual int Sign => -1;

    /// <summary>The loop with the capacitor in circuit.</summary>
    public abstract PulledCrystalLoop With(PulledCrystalLoop loop, Capacitance added);

    /// <summary>Switched across the variable capacitor: lowers the frequency, right at one dial setting only.</summary>
    public sealed record AcrossVariable : OffsetPlace
    {
        /// <inheritdoc/>
        public override PulledCrystalLoop With(PulledCrystalLoop loop, Capacitance added) =>
            loop with { StrayAcrossVariable = loop.StrayAcrossVariable + added };
    }

    /// <summary>Switched across the whole sustaining circuit: lowers the frequency.</summary>
    public sealed record AcrossOscillator : OffsetPlace
    {
        /// <inheritdoc/>
        public override PulledCrystalLoop With(PulledCrystalLoop loop, Capacitance added) =>
            loop with { OscillatorCapacitance = loop.OscillatorCapacitance + added };
    }

    /// <summary>Switched across the emitter-ground capacitor of the feedback pair: lowers the frequency.</summary>
    /// <param name="Pair">The pair without the added capacitor; it gives the oscillator capacitance of the loop.</param>
    public sealed record AcrossEmitterCapacitor(FeedbackPair Pair) : OffsetPlace
    {
        /// <inheritdoc/>
        public override PulledCrystalLoop With(PulledCrystalLoop loop, Capacitance added) =>
            loop with { OscillatorCapacitance = Pair.WithAcrossEmitter(added).OscillatorCapacitance };
    }

    /// <summary>In series with the loop and shorted in the other state: raises the frequency while in circuit, nearly evenly over the dial.</summary>
    public sealed record InSeries : OffsetPlace
    {
        /// <inheritdoc/>
        public override int Sign => 1;

        /// <inheritdoc/>
        public override PulledCrystalLoop With(PulledCrystalLoop loop, Capacitance added) =>
            loop with { OscillatorCapacitance = FeedbackPair.InSeries(loop.OscillatorCapacitance, added) };
    }
}
