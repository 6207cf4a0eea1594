using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases;

/// <summary>A use case without its types, so that all of them can be listed.</summary>
public interface IUseCase
{
    /// <summary>What it asks of whoever runs it.</summary>
    Right Required { get; }
}

/// <summary>
/// Something a person does with the club: the only entry for pages, programming interface and commands. Every run first asks the right of the role and
/// the stored membership, so that nobody relies on a page to guard it and an ended membership or night counts at once.
/// </summary>
/// <typeparam name="TInput">What it needs.</typeparam>
/// <typeparam name="TResult">What it gives.</typeparam>
public abstract class UseCase<TInput, TResult> : IUseCase
    where TResult : notnull
{
    /// <inheritdoc/>
    public abstract Right Required { get; }

    /// <summary>Runs it for somebody. A refusal is a failure with code <c>refused.right</c> (or another <c>refused.</c> code that says why).</summary>
    public async Task<Outcome<TResult>> Run(Actor actor, TInput input, CancellationToken cancellation = default) =>
        Roles.RightsOf(actor.Role).Contains(Required) ? await ExecuteAsync(actor, input, cancellation) : Failure(Refusals.Right());

    private protected abstract Task<Outcome<TResult>> ExecuteAsync(Actor actor, TInput input, CancellationToken cancellation);

    /// <summary>What it does, once admitted.</summary>
    protected abstract Task<Outcome<TResult>> Handle(Work work, TInput input, CancellationToken cancellation);

    /// <summary>A failure with one message.</summary>
    protected static Outcome<TResult> Failure(string path, string code, params (string Name, string Value)[] arguments) =>
        Outcome<TResult>.Failure(FieldMessage.Error(path, code, arguments));

    /// <summary>A failure with these messages.</summary>
    protected static Outcome<TResult> Failure(params IEnumerable<FieldMessage> messages) => Outcome<TResult>.Failure(messages);

    /// <summary>A success.</summary>
    protected static Outcome<TResult> Success(TResult result, params IEnumerable<FieldMessage> warnings) => Outcome<TResult>.Success(result, warnings);

    /// <summary>The row an id names does not exist in this club.</summary>
    protected static Outcome<TResult> NotFound(string path) => Failure(path, "not-found");

    /// <summary>Admits the actor by the stored membership, or says why not.</summary>
    private protected async Task<Outcome<Actor>> AdmitAsync(Work work, CancellationToken cancellation)
    {
        var actor = work.Actor;
        if (actor.Role is Role.Visitor or Role.Host) return Outcome<Actor>.Success(actor);
        var stored = await work.Db.Memberships.AsNoTracking().FirstOrDefaultAsync(m => m.PersonId == actor.PersonId && m.EndedUtc == null, cancellation);
        if (stored is null) return Outcome<Actor>.Failure(Refusals.Membership());
        var admitted = actor with { Role = (Role)Math.Min((int)stored.Role, (int)actor.Role) };
        if (!Roles.RightsOf(admitted.Role).Contains(Required)) return Outcome<Actor>.Failure(Refusals.Right());
        return actor.NightId is { } night && !await work.Db.Nights.AnyAsync(n => n.Id == night && n.State == NightState.Open, cancellation)
            ? Outcome<Actor>.Failure(Refusals.NightOver())
            : Outcome<Actor>.Success(admitted);
    }
}
