using System.Numerics;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds;

/// <summary>A computed stage. Facets say what it does in the chain.</summary>
public interface IStageModel
{
    /// <summary>Its figures in the order they are shown; the first is the one a small block shows.</summary>
    IReadOnlyList<Figure> Figures { get; }
}

/// <summary>Facet: presents an impedance at a port.</summary>
public interface IPresents
{
    /// <summary>Impedance looking into the port, ohm.</summary>
    Complex Impedance(string port, Frequency at);
}

/// <summary>Facet: a linear two-port between the ends of its passage.</summary>
public interface IPasses
{
    /// <summary>The two-port at a frequency, from the first port of the passage to the second, transmit sense where both exist.</summary>
    TwoPort At(Frequency frequency);
}

/// <summary>Facet: amplifies on the way to the antenna.</summary>
public interface IAmplifies
{
    /// <summary>Drive power that gives an output power; the model says in its figures where it is an estimate.</summary>
    Power DriveFor(Power output, Frequency at);

    /// <summary>Largest output the stage can give, whatever the drive.</summary>
    Power MostOutput(Frequency at);

    /// <summary>Gain at small drive.</summary>
    Decibels Gain(Frequency at);
}

/// <summary>Facet: generates a frequency.</summary>
public interface IGenerates
{
    /// <summary>What it covers; null when the kept parts give no oscillation that could be computed.</summary>
    FrequencyRange? Covers { get; }

    /// <summary>Power available at its output.</summary>
    Power Available { get; }
}

/// <summary>Facet: adds noise and gain on the way from the antenna.</summary>
public interface IAddsNoise
{
    /// <summary>Noise figure (single-sideband sense), dB.</summary>
    Decibels NoiseFigure(Frequency at);

    /// <summary>Available gain, dB; negative for a loss.</summary>
    Decibels ReceiveGain(Frequency at);
}

/// <summary>Facet: delivers a local-oscillator voltage at a port.</summary>
public interface IDrivesMixer
{
    /// <summary>Open-circuit peak-to-peak voltage and source impedance behind the port, ohm.</summary>
    (Voltage OpenPeakToPeak, Complex Source) Drive(string port, Frequency at);
}

/// <summary>Facet: mixes, and wants a local-oscillator level.</summary>
public interface IMixes
{
    /// <summary>Port the oscillator comes in.</summary>
    string OscillatorPort { get; }

    /// <summary>Smallest and largest peak-to-peak voltage there.</summary>
    (Voltage Low, Voltage High) Window { get; }
}

/// <summary>Facet: makes harmonics of the carrier.</summary>
public interface IMakesHarmonics
{
    /// <summary>Level of harmonic <paramref name="order"/> at the stage's output relative to the carrier (negative dB), and one standard uncertainty.</summary>
    (Decibels Level, Decibels StandardUncertainty) Harmonic(int order);
}

/// <summary>Facet: turns supply power into heat.</summary>
public interface IGetsHot
{
    /// <summary>Dissipation at full output.</summary>
    Power Dissipation(Frequency at);

    /// <summary>Junction temperature at the given dissipation and ambient, and the largest permitted.</summary>
    (Temperature Junction, Temperature Limit) Heat(Power dissipation, Temperature ambient);
}

/// <summary>Facet: draws current from the supply.</summary>
public interface IDrawsSupply
{
    /// <summary>Direct current at full output.</summary>
    Current SupplyCurrent { get; }
}
