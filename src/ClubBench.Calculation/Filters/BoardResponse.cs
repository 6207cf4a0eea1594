namespace ClubBench.Calculation.Filters;

/// <summary>Response of a board whose parts are the nominal ones times factors. Keeps its working memory: one per task.</summary>
internal sealed class BoardResponse(LadderYieldInput input)
{
    private readonly LowPassDesign _design = input.Design;
    private readonly double _coilLoss = input.CoilQ is { } q ? 1 / q : 0;
    private readonly double _capacitorLoss = input.CapacitorQ is { } q ? 1 / q : 0;
    private readonly double[] _pass = [.. input.Requirement.Band.Points(input.PassPoints).Select(f => f.RadiansPerSecond)];
    private readonly double[][] _harmonics =
        [.. input.Requirement.Harmonics.Select(h => new[] { input.Requirement.Band.Low, input.Requirement.Band.High }.Select(f => f.Harmonic(h.Harmonic).RadiansPerSecond).ToArray())];

    private readonly double[] _values = new double[input.Design.Order];

    /// <summary>Attenuation of each harmonic, then the worst return loss, in dB.</summary>
    public void Of(ReadOnlySpan<double> factors, Span<double> figures)
    {
        for (var k = 0; k < _values.Length; k++)
            _values[k] = factors[k] * (_design.IsCapacitor(k) ? _design.Capacitors[k / 2].Farad * _design.Source.Ohm : _design.Coils[k / 2].Henry / _design.Source.Ohm);
        for (var h = 0; h < _harmonics.Length; h++)
        {
            var passed = 0.0;
            foreach (var w in _harmonics[h]) passed = Math.Max(passed, At(w).Passed);
            figures[h] = ToDb(passed);
        }

        var reflected = 0.0;
        foreach (var w in _pass) reflected = Math.Max(reflected, At(w).Reflected);
        figures[_harmonics.Length] = ToDb(reflected);
    }

    // Voltage and current in units of the source resistance, from one volt at the load back to the source.
    private (double Passed, double Reflected) At(double w)
    {
        var g = _design.Source / _design.Load;
        var (voltage, current) = ((Re: 1.0, Im: 0.0), (Re: g, Im: 0.0));
        for (var k = _values.Length - 1; k >= 0; k--)
        {
            if (_design.IsCapacitor(k)) current = Plus(current, voltage, w * _values[k] / (1 + (_capacitorLoss * _capacitorLoss)), _capacitorLoss);
            else voltage = Plus(voltage, current, w * _values[k], _coilLoss);
        }

        var forward = Square(voltage.Re + current.Re) + Square(voltage.Im + current.Im);
        return (4 * g / forward, (Square(voltage.Re - current.Re) + Square(voltage.Im - current.Im)) / forward);
    }

    // sum + x (loss + j) y
    private static (double Re, double Im) Plus((double Re, double Im) sum, (double Re, double Im) y, double x, double loss) =>
        (sum.Re + (x * ((loss * y.Re) - y.Im)), sum.Im + (x * ((loss * y.Im) + y.Re)));

    private static double Square(double x) => x * x;

    private static double ToDb(double share) => -10 * Math.Log10(Math.Max(share, 1e-30));
}
