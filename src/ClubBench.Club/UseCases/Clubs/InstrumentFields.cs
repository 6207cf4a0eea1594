using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Clubs;

/// <summary>What is checked of an instrument record.</summary>
internal static class InstrumentFields
{
    public static IEnumerable<FieldMessage> Check(double uncertaintyRelative, double uncertaintySi, double offsetSi)
    {
        if (!double.IsFinite(uncertaintyRelative) || uncertaintyRelative is < 0 or > 1) yield return FieldMessage.Error("uncertaintyRelative", "instrument.uncertainty-range");
        if (!double.IsFinite(uncertaintySi) || uncertaintySi < 0) yield return FieldMessage.Error("uncertaintySi", "instrument.uncertainty-range");
        if (!double.IsFinite(offsetSi)) yield return FieldMessage.Error("offsetSi", "field.not-a-number");
    }
}
