using ClubBench.Planning;
using ClubBench.Planning.Text;

namespace ClubBench.Web.Components.Controls;

/// <summary>What stands in a field: the text as typed, and what was understood of it.</summary>
public sealed record QuantityEntry(string Typed, Outcome<ParsedQuantity> Read)
{
    public double? Si => Read.Succeeded ? Read.Value.Si : null;
}
