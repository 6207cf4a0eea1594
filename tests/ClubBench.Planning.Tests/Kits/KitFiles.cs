using System.Text;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Tests.Kits;

/// <summary>Kit files as text, and small documents that hold what the other demonstration kits need.</summary>
internal static class KitFiles
{
    public static Stream StreamOf(string text) => new MemoryStream(Encoding.UTF8.GetBytes(text));

    public static string TextOf(Kit kit)
    {
        using var stream = new MemoryStream();
        KitFile.Write(kit, stream);
        return Encoding.UTF8.GetString(stream.ToArray());
    }

    /// <summary>A superhet receiver whose oscillator goes through a buffer to the mixer, with as-built places.</summary>
    public const string SuperhetExcerpt = """
        {
          "formatVersion": 1, "id": "5f2f0f6e-8c9e-4a3a-9a39-33c5f7c1d2b0", "revision": 1, "name": "Hobnail-80", "boardIssue": "A", "mode": "cw",
          "band": { "lowHz": 3500000, "highHz": 3580000 }, "supplyVoltageV": 12,
          "scheme": { "kind": "superhet", "conversions": [
            { "mixer": "B3", "oscillator": "B4", "side": "sum", "intermediateFrequencyHz": 5999120 },
            { "mixer": "B8", "oscillator": "B8", "side": "high", "intermediateFrequencyHz": "700 Hz" } ] },
          "stages": [
            { "key": "B2", "kind": "double-tuned-front-end", "variant": "top-coupled", "parts": [
              { "designator": "L1", "role": "winding", "type": "T50-2", "values": { "turns": 36, "linkTurns": 4, "wireDiameterM": "0,3 mm" },
                "place": { "footprint": "toroid up to 13 mm", "largestM": 0.013 } },
              { "designator": "C1", "role": "fixed-capacitor", "type": "NP0", "values": { "capacitanceF": "270 pF" },
                "place": { "footprint": "two holes 5 mm", "pitchM": 0.005, "pieces": 2 }, "from": "published" } ] },
            { "key": "B3", "kind": "gilbert-mixer", "parts": [] },
            { "key": "B4", "kind": "lc-oscillator", "parts": [], "settings": { "strayF": "8p" }, "stated": { "lowestFrequencyHz": 2419000 } },
            { "key": "B5", "kind": "oscillator-buffer", "parts": [ { "designator": "R3", "role": "bias-resistor", "values": { "resistanceOhm": "100k" } } ] },
            { "key": "B8", "kind": "product-detector", "parts": [] } ],
          "connections": [
            { "from": "antenna", "to": "B2.input" }, { "from": "B2.output", "to": "B3.signal" }, { "from": "B4.output", "to": "B5.input" },
            { "from": "B5.output", "to": "B3.oscillator" }, { "from": "B3.output", "to": "B8.signal" }, { "from": "B8.audio", "to": "phones" } ],
          "bringUp": [ "B8", "B4", "B5", "B3", "B2" ]
        }
        """;

    /// <summary>A sideband transmitter with two mixers and a carrier oscillator.</summary>
    public const string MixingTransmitterExcerpt = """
        {
          "formatVersion": 1, "id": "2f5b1d9b-0a4e-4f0a-b3a5-0a4f6f0c9c11", "revision": 2, "name": "Tollgate-40", "boardIssue": "B", "mode": "lower-sideband",
          "band": { "lowHz": "7,05 MHz", "highHz": "7.15 MHz" }, "supplyVoltageV": 13.8, "outputPowerW": 5,
          "scheme": { "kind": "mixing-transmitter", "conversions": [
            { "mixer": "C3", "oscillator": "C2", "side": "low", "intermediateFrequencyHz": 4916900 },
            { "mixer": "C7", "oscillator": "C6", "side": "low", "intermediateFrequencyHz": 4916900 } ] },
          "stages": [
            { "key": "C2", "kind": "carrier-oscillator", "parts": [] }, { "key": "C3", "kind": "diode-ring-modulator", "parts": [] },
            { "key": "C6", "kind": "lc-oscillator", "parts": [] }, { "key": "C7", "kind": "diode-ring-mixer", "parts": [] } ],
          "connections": [ { "from": "microphone", "to": "C3.audio" }, { "from": "C2.output", "to": "C3.carrier" }, { "from": "C6.output", "to": "C7.oscillator" }, { "from": "C3.output", "to": "C7.signal" } ],
          "bringUp": [ "C2", "C3", "C6", "C7" ]
        }
        """;
}
