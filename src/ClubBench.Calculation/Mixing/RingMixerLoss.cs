using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Mixing;

/// <summary>
/// How a level-7 diode ring loses more as its oscillator weakens. Method: straight lines between the rows of <c>Tables/ring-mixer-loss.csv</c>.
/// Valid: -2 to +10 dBm at the port; typical figures, a measurement replaces them. Source: mixer-data-sheets, from memory.
/// </summary>
public static class RingMixerLoss
{
    private static readonly IReadOnlyList<(double Dbm, double LossDb)> Rows = [.. CsvTable.Read("ring-mixer-loss", r => (r.Number("drive_dbm"), r.Number("loss_db"))).OrderBy(r => r.Item1)];

    /// <summary>Conversion loss at an oscillator level; null outside the table. The noise figure is half a decibel more.</summary>
    public static Decibels? At(PowerLevel drive)
    {
        if (drive.Dbm < Rows[0].Dbm || drive.Dbm > Rows[^1].Dbm) return null;
        var upper = Rows.Skip(1).First(r => r.Dbm >= drive.Dbm);
        var lower = Rows.Last(r => r.Dbm < upper.Dbm);
        return Decibels.FromDb(lower.LossDb + ((upper.LossDb - lower.LossDb) * (drive.Dbm - lower.Dbm) / (upper.Dbm - lower.Dbm)));
    }
}
