using System.Resources;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds;

/// <summary>Everything known of one kind of stage. Stateless; everything else treats stages generically through this.</summary>
public interface IStageKind
{
    /// <summary>Ports, roles, settings: what generic code needs to know.</summary>
    StageDescription Description { get; }

    /// <summary>The words of this kind: its title, roles, findings, cautions.</summary>
    ResourceManager Texts { get; }

    /// <summary>Checks a document; success means <see cref="Model"/> may be asked.</summary>
    IReadOnlyList<FieldMessage> Validate(StageDocument stage, string path);

    /// <summary>Computes the stage in its surroundings: the same code for back-check and target.</summary>
    IStageModel Model(StageDocument stage, Surroundings surroundings);

    /// <summary>What the stage as it stands has to say in these surroundings, given what is asked of it.</summary>
    IReadOnlyList<Finding> Judge(StageDocument stage, IStageModel model, Surroundings surroundings, IReadOnlyList<Demand> demands);

    /// <summary>Ways to make the stage do in new surroundings, best first; empty where nothing within reach would.</summary>
    IReadOnlyList<Alternative> Convert(StageDocument stage, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf);

    /// <summary>Searches the whole window as a job, best first; kinds whose quick search is already whole answer the same as <see cref="Convert"/>.</summary>
    IReadOnlyList<Alternative> SearchThoroughly(ThoroughSearch search, IProgress<double>? progress, CancellationToken cancellation);

    /// <summary>Why nothing within reach would do, and what would: asked where <see cref="Convert"/> gave nothing for a stage that must change.</summary>
    Finding Rethink(StageDocument stage, Surroundings to);

    /// <summary>What a builder should read, point by point, in bench order.</summary>
    IReadOnlyList<ExpectedReading> Expect(StageDocument stage, IStageModel model, Surroundings surroundings);

    /// <summary>What to do after a reading.</summary>
    Advice Advise(AdviceRequest request);

    /// <summary>The stage as an abstract schematic; with <paramref name="after"/> the changed parts are marked.</summary>
    Schematic Draw(StageDocument before, StageDocument? after);

    /// <summary>Plots that show the stage before and after; empty where a plot would say nothing.</summary>
    IReadOnlyList<Plot> Plots(StageComparison comparison);

    /// <summary>What the card says besides parts and readings: checks before power, cautions, what to do when a reading is outside.</summary>
    CardNotes Notes(StageDocument stage, Surroundings surroundings);

    /// <summary>Share of boards that meet their windows with the stated tolerances, or null where spread decides nothing.</summary>
    BoardYield? Yield(StageDocument stage, Surroundings surroundings, IReadOnlyList<Demand> demands, ulong seed);
}

/// <summary>What a thorough search starts from.</summary>
/// <param name="Stage">The kit's stage.</param>
/// <param name="From">Its own surroundings.</param>
/// <param name="To">The surroundings on the target, among the planned stages.</param>
/// <param name="Demands">What is asked of it.</param>
/// <param name="Shelf">Drawers.</param>
/// <param name="Seed">Seed of every yield.</param>
public sealed record ThoroughSearch(StageDocument Stage, Surroundings From, Surroundings To, IReadOnlyList<Demand> Demands, Shelf Shelf, ulong Seed);

/// <summary>A stage before and after, each in its surroundings. Before the kept parts on the target; null model where nothing changed.</summary>
/// <param name="Before">The kept stage on the target band.</param>
/// <param name="BeforeModel">Its model there.</param>
/// <param name="After">The planned stage.</param>
/// <param name="AfterModel">Its model.</param>
/// <param name="Surroundings">Where both are computed.</param>
/// <param name="Demands">What is asked of it.</param>
public sealed record StageComparison(
    StageDocument Before,
    IStageModel BeforeModel,
    StageDocument After,
    IStageModel AfterModel,
    Surroundings Surroundings,
    IReadOnlyList<Demand> Demands);
