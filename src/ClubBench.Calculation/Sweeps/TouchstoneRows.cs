using System.Globalization;
using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Sweeps;

/// <summary>Rows of a sweep file as points. Source: ibis-touchstone.</summary>
internal sealed class TouchstoneRows(TouchstoneHeader header, TouchstoneIssues issues)
{
    private const int NoiseNumbers = 5;
    private const double HighestHertz = 1e15;
    private const double LargestSize = 1e6;
    private readonly List<SweepPoint> _points = [];
    private double _previousHertz;

    public bool NoiseSkipped { get; private set; } = header.NoiseSkipped;

    public IReadOnlyList<SweepPoint> Read()
    {
        foreach (var line in header.Rows)
            if (Numbers(line) is { } numbers) Take(line, numbers);
        if (header.AnnouncedRows is { } announced && announced != header.Rows.Count) issues.Add(LastLine, TouchstoneFault.WrongRowCount, Text(header.Rows.Count), Text(announced));
        if (_points.Count == 0 && !issues.Any) issues.Add(LastLine, TouchstoneFault.NoRows);
        return _points;
    }

    private int LastLine => header.Rows.Count > 0 ? header.Rows[^1].Number : 1;

    private void Take(TouchstoneLine line, double[] numbers)
    {
        var hertz = numbers[0] * header.Options.UnitHertz;
        if (IsNoise(numbers, hertz)) Noise(line, numbers);
        else if (numbers.Length != (2 * header.Places.Count) + 1) issues.Add(line.Number, TouchstoneFault.WrongNumberCount, Text(numbers.Length), Text((2 * header.Places.Count) + 1));
        else if (hertz is not (> 0 and <= HighestHertz)) issues.Add(line.Number, TouchstoneFault.FrequencyNotAboveZero, line.Words[0]);
        else if (hertz <= _previousHertz) issues.Add(line.Number, TouchstoneFault.FrequencyNotIncreasing, line.Words[0]);
        else Point(line, hertz, numbers);
    }

    // The noise block of a version 1 file begins where the frequency falls back in a row of five.
    private bool IsNoise(double[] numbers, double hertz) =>
        header is { IsVersion2: false, Ports: 2 } && (NoiseSkipped || (numbers.Length == NoiseNumbers && _points.Count > 0 && hertz <= _previousHertz));

    private void Noise(TouchstoneLine line, double[] numbers)
    {
        NoiseSkipped = true;
        if (numbers.Length != NoiseNumbers) issues.Add(line.Number, TouchstoneFault.WrongNumberCount, Text(numbers.Length), Text(NoiseNumbers));
    }

    private void Point(TouchstoneLine line, double hertz, double[] numbers)
    {
        _previousHertz = hertz;
        var values = new Complex[4];
        for (var i = 0; i < header.Places.Count; i++) values[header.Places[i]] = header.Options.Value(numbers[(2 * i) + 1], numbers[(2 * i) + 2]);
        if (header.Places.Count == 3) values[1] = values[2] = values[1] + values[2];
        if (ScatteringOf(values) is { } s && IsPossible(s)) _points.Add(PointOf(Frequency.FromHertz(hertz), s));
        else issues.Add(line.Number, TouchstoneFault.ImpossibleValues, line.Text);
    }

    private Matrix2? ScatteringOf(Complex[] values)
    {
        var kind = header.Options.Kind;
        var stated = new Matrix2(values[0], values[1], values[2], values[3]);
        var normalised = header.IsVersion2 ? ParameterConversion.Normalised(kind, stated, header.Reference1, header.Reference2) : stated;
        if (header.Ports == 2) return ParameterConversion.ToScattering(kind, normalised);
        return ParameterConversion.ToScattering(kind, normalised.A11) is { } s11 ? new(s11, 0, 0, 0) : null;
    }

    private SweepPoint PointOf(Frequency f, Matrix2 s) => header.Ports == 1 ? new(f, s.A11) : new(f, s.A11, s.A21, s.A12, s.A22);

    // The comparison also refuses what is no number.
    private static bool IsPossible(Matrix2 s) => new[] { s.A11, s.A12, s.A21, s.A22 }.All(x => x.Magnitude <= LargestSize);

    private double[]? Numbers(TouchstoneLine line)
    {
        var numbers = line.Words.Select(w => (Word: w, Value: TouchstoneText.Number(w))).ToList();
        if (numbers.Find(n => n.Value is null).Word is not { } word) return [.. numbers.Select(n => n.Value!.Value)];
        issues.Add(line.Number, TouchstoneFault.NotANumber, word);
        return null;
    }

    private static string Text(int number) => number.ToString(CultureInfo.InvariantCulture);
}
