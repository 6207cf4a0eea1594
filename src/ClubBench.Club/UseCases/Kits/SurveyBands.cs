using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Noise;
using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning;
using ClubBench.Planning.Plans;

namespace ClubBench.Club.UseCases.Kits;

/// <summary>Asks what every band would take.</summary>
/// <param name="KitId">The kit.</param>
/// <param name="Region">ITU region of the club.</param>
/// <param name="Site">Noise at the site.</param>
public sealed record SurveyBandsInput(Guid KitId, ItuRegion Region = ItuRegion.Region1, NoiseSite Site = NoiseSite.Residential);

/// <summary>Bands at a glance for one kit.</summary>
public sealed class SurveyBands(ClubStore store) : Query<SurveyBandsInput, BandSurvey>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<BandSurvey>> Handle(Work work, SurveyBandsInput input, CancellationToken cancellation)
    {
        if (await work.Db.KitAsync(input.KitId, revision: null, cancellation) is not { } kit) return NotFound("kitId");
        return Success(BandSurvey.Of(kit, await work.Db.ShelfAsync(cancellation), LearntValues.None, input.Region, input.Site));
    }
}
