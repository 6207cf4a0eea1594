using ClubBench.Calculation.Quantities;

namespace ClubBench.Planning.Worksheets;

/// <summary>Values of a worksheet's inputs by name, as quantities.</summary>
/// <param name="si">Values in SI.</param>
public sealed class WorksheetValues(IReadOnlyDictionary<string, double> si)
{
    /// <summary>The value in SI.</summary>
    public double this[string name] => si[name];

    /// <summary>A count.</summary>
    public int Whole(string name) => (int)si[name];

    /// <summary>A choice of no and yes, entered as 0 and 1.</summary>
    public bool IsSet(string name) => si[name] > 0;

    /// <summary>A frequency.</summary>
    public Frequency Hertz(string name) => Frequency.FromHertz(si[name]);

    /// <summary>An inductance.</summary>
    public Inductance Henry(string name) => Inductance.FromHenry(si[name]);

    /// <summary>A capacitance.</summary>
    public Capacitance Farad(string name) => Capacitance.FromFarad(si[name]);

    /// <summary>A resistance.</summary>
    public Resistance Ohm(string name) => Resistance.FromOhm(si[name]);

    /// <summary>A resistor that is left out where zero is given.</summary>
    public Resistance? OhmIfAny(string name) => si[name] > 0 ? Ohm(name) : null;

    /// <summary>A voltage.</summary>
    public Voltage Volt(string name) => Voltage.FromVolt(si[name]);

    /// <summary>A current.</summary>
    public Current Ampere(string name) => Current.FromAmpere(si[name]);

    /// <summary>A power.</summary>
    public Power Watt(string name) => Power.FromWatt(si[name]);

    /// <summary>A gain or loss.</summary>
    public Decibels Db(string name) => Decibels.FromDb(si[name]);

    /// <summary>A length.</summary>
    public Length Metre(string name) => Length.FromMetre(si[name]);

    /// <summary>A temperature.</summary>
    public Temperature Celsius(string name) => Temperature.FromCelsius(si[name]);

    /// <summary>A thermal resistance.</summary>
    public ThermalResistance KelvinPerWatt(string name) => ThermalResistance.FromKelvinPerWatt(si[name]);

    /// <summary>An inductance index.</summary>
    public InductanceFactor Index(string name) => InductanceFactor.FromNanohenryPerTurnSquared(si[name] * 1e9);
}
