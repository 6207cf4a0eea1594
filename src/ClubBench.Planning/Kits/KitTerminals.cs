namespace ClubBench.Planning.Kits;

/// <summary>The terminals of a kit as a whole.</summary>
internal static class KitTerminals
{
    public static IReadOnlyList<string> Names { get; } =
        [Port.Antenna.Name, Port.Phones.Name, Port.Microphone.Name, Port.Key.Name, Port.SupplyInput.Name];
}
