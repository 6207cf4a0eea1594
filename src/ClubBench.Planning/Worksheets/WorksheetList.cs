namespace ClubBench.Planning.Worksheets;

/// <summary>All worksheets. A new one is one entry in its subject's list, with its texts.</summary>
public static class WorksheetList
{
    /// <summary>Every worksheet, by subject.</summary>
    public static IReadOnlyList<Worksheet> All { get; } =
    [
        .. PartWorksheets.All,
        .. FilterWorksheets.All,
        .. OscillatorWorksheets.All,
        .. TransmitterWorksheets.All,
        .. ReceiverWorksheets.All,
        .. CrystalSheets.All,
        .. MeasuringSheets.All,
    ];

    /// <summary>The worksheet with this id, or null.</summary>
    public static Worksheet? Find(string id) => All.FirstOrDefault(w => w.Id == id);
}
