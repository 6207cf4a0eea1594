using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.SignIn;

/// <summary>Somebody with a password comes in.</summary>
public sealed record SignInByPasswordInput(string DisplayName, string Password);

/// <summary>Signs in by name and password. A wrong name and a wrong password get the same answer.</summary>
public sealed class SignInByPassword(ClubStore store, FailureWindows failures) : Query<SignInByPasswordInput, Actor>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.ComeIn;

    /// <inheritdoc/>
    protected override async Task<Outcome<Actor>> Handle(Work work, SignInByPasswordInput input, CancellationToken cancellation)
    {
        if (failures.Passwords.IsFull) return Failure("", "sign-in.too-many-tries");
        var people = await work.Db.People.IgnoreQueryFilters().Where(p => p.DisplayName == input.DisplayName && p.PasswordHash != null).ToListAsync(cancellation);
        foreach (var person in people.Where(p => Passwords.Match(p, input.Password)))
        {
            work.Enter(person.ClubId);
            if (await work.ActorOfAsync(person.Id, nightId: null, cancellation) is { } actor) return Success(actor);
        }

        failures.Passwords.Note();
        return Failure("", "sign-in.wrong");
    }
}
