using System.Resources;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds;

/// <summary>Base of a stage kind: reads the generic document into its own typed view and answers for the generic interface.</summary>
/// <typeparam name="TStage">The kind's typed view of a stage.</typeparam>
/// <typeparam name="TModel">The kind's computed model.</typeparam>
public abstract class StageKind<TStage, TModel> : IStageKind
    where TStage : class
    where TModel : class, IStageModel
{
    /// <inheritdoc/>
    public abstract StageDescription Description { get; }

    /// <inheritdoc/>
    public abstract ResourceManager Texts { get; }

    /// <inheritdoc/>
    public IReadOnlyList<FieldMessage> Validate(StageDocument stage, string path)
    {
        var generic = StageValidation.Check(stage, Description, path).ToList();
        return generic.Any(m => m.Severity == MessageSeverity.Error) ? generic : [.. generic, .. Check(Read(stage), stage, path)];
    }

    /// <inheritdoc/>
    public IStageModel Model(StageDocument stage, Surroundings surroundings) => Model(Read(stage), surroundings);

    /// <inheritdoc/>
    public IReadOnlyList<Finding> Judge(StageDocument stage, IStageModel model, Surroundings surroundings, IReadOnlyList<Demand> demands) =>
        Judge(Read(stage), (TModel)model, surroundings, demands, stage.Key);

    /// <inheritdoc/>
    public virtual IReadOnlyList<Alternative> Convert(StageDocument stage, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf) => [];

    /// <inheritdoc/>
    public virtual IReadOnlyList<Alternative> SearchThoroughly(ThoroughSearch search, IProgress<double>? progress, CancellationToken cancellation) =>
        Convert(search.Stage, search.From, search.To, search.Demands, search.Shelf);

    /// <inheritdoc/>
    public virtual Finding Rethink(StageDocument stage, Surroundings to) =>
        new("rethink.nothing-in-reach", Severity.Fault, stage.Key, null, [Figures.Figure.Of("at", to.Reference)], StageAction.Rethink, OpenItemCodes.Rethink);

    /// <inheritdoc/>
    public IReadOnlyList<ExpectedReading> Expect(StageDocument stage, IStageModel model, Surroundings surroundings) =>
        Expect(Read(stage), (TModel)model, surroundings, stage.Key);

    /// <inheritdoc/>
    public virtual Advice Advise(AdviceRequest request) => ReadingAdvice.Give(request);

    /// <inheritdoc/>
    public abstract Schematic Draw(StageDocument before, StageDocument? after);

    /// <inheritdoc/>
    public virtual IReadOnlyList<Plot> Plots(StageComparison comparison) => [];

    /// <inheritdoc/>
    public abstract CardNotes Notes(StageDocument stage, Surroundings surroundings);

    /// <inheritdoc/>
    public virtual BoardYield? Yield(StageDocument stage, Surroundings surroundings, IReadOnlyList<Demand> demands, ulong seed) => null;

    /// <summary>Reads a validated document into the typed view.</summary>
    protected abstract TStage Read(StageDocument stage);

    /// <summary>Issues beyond the generic ones (roles, values, settings).</summary>
    protected virtual IEnumerable<FieldMessage> Check(TStage stage, StageDocument document, string path) => [];

    /// <summary>Computes the stage.</summary>
    protected abstract TModel Model(TStage stage, Surroundings surroundings);

    /// <summary>What the stage has to say.</summary>
    protected abstract IReadOnlyList<Finding> Judge(TStage stage, TModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key);

    /// <summary>What a builder should read.</summary>
    protected virtual IReadOnlyList<ExpectedReading> Expect(TStage stage, TModel model, Surroundings surroundings, string key) => [];
}
