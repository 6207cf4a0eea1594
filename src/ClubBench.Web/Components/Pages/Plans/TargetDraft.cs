using System.Globalization;
using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Text;

namespace ClubBench.Web.Components.Pages.Plans;

/// <summary>A target while somebody types it: texts as typed, read all at once when it is saved.</summary>
public sealed class TargetDraft
{
    public string BandName { get; set; } = "";

    public ItuRegion Region { get; set; } = ItuRegion.Region1;

    public NoiseSite Site { get; set; } = NoiseSite.Residential;

    public string LimitSetId { get; set; } = TargetDefaults.LimitSetId;

    public bool LimitsConfirmed { get; set; }

    public string Low { get; set; } = "";

    public string High { get; set; } = "";

    public string Reference { get; set; } = "";

    public string Power { get; set; } = "";

    public string Pitch { get; set; } = "";

    public string WishMargin { get; set; } = "";

    /// <summary>A draft that shows a target.</summary>
    public static TargetDraft Of(Target target) => new()
    {
        BandName = target.BandName,
        Region = target.Region,
        Site = target.Site,
        LimitSetId = target.LimitSetId,
        LimitsConfirmed = target.LimitsConfirmedBy is not null,
        Low = Megahertz(target.Segment.Low),
        High = Megahertz(target.Segment.High),
        Reference = Megahertz(target.Reference),
        Power = target.WantedPower is { } power ? power.Watt.ToString("0.###", CultureInfo.InvariantCulture) : "",
        Pitch = target.Pitch.Hertz.ToString("0.#", CultureInfo.InvariantCulture),
        WishMargin = target.WishMargin.Db.ToString("0.#", CultureInfo.InvariantCulture),
    };

    /// <summary>Reads all fields; a failure names every field that cannot be read.</summary>
    /// <param name="confirmedBy">Who confirms the limits, where the box is ticked.</param>
    public Outcome<Target> Read(string confirmedBy)
    {
        var messages = new List<FieldMessage>();
        var low = Number(Low, QuantityKind.Frequency, "MHz", "low");
        var high = Number(High, QuantityKind.Frequency, "MHz", "high");
        var reference = Number(Reference, QuantityKind.Frequency, "MHz", "reference");
        var power = Power.Trim().Length == 0 ? null : Number(Power, QuantityKind.Power, "W", "power");
        var pitch = Number(Pitch, QuantityKind.Frequency, "Hz", "pitch");
        var wish = Number(WishMargin, QuantityKind.Decibels, "dB", "wish");
        if (low > high) messages.Add(FieldMessage.Error("high", "kit.band-reversed"));
        return Outcome<Target>.From(
            () => new Target(
                BandName,
                new FrequencyRange(Frequency.FromHertz(low!.Value), Frequency.FromHertz(high!.Value)),
                Frequency.FromHertz(reference!.Value),
                Region,
                Site,
                power is { } watt ? Calculation.Quantities.Power.FromWatt(watt) : null,
                Frequency.FromHertz(pitch!.Value),
                LimitSetId,
                LimitsConfirmed ? confirmedBy : null,
                Decibels.FromDb(wish!.Value)),
            messages);

        double? Number(string text, QuantityKind kind, string unit, string field)
        {
            var read = QuantityText.Parse(text, kind, unit, path: field);
            messages.AddRange(read.Messages);
            if (read is { Succeeded: true, Value.Si: <= 0 } && kind != QuantityKind.Decibels) messages.Add(FieldMessage.Error(field, "field.not-positive"));
            return read.Succeeded ? read.Value.Si : null;
        }
    }

    private static string Megahertz(Frequency frequency) => frequency.Megahertz.ToString("0.######", CultureInfo.InvariantCulture);
}
