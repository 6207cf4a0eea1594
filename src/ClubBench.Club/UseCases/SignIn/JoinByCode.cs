using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.SignIn;

/// <summary>Somebody joins by the code spoken in the room.</summary>
public sealed record JoinByCodeInput(string Code, string DisplayName);

/// <summary>Joins the open night with this code, with builder rights that end with it. Wrong and expired codes get the same answer.</summary>
public sealed class JoinByCode(ClubStore store, WrongCodes wrongCodes) : Command<JoinByCodeInput, Actor>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.ComeIn;

    /// <inheritdoc/>
    protected override async Task<Outcome<Actor>> Handle(Work work, JoinByCodeInput input, CancellationToken cancellation)
    {
        if (await Joining.NightOfAsync(work, input.Code, cancellation) is { } night)
            return await Joining.ByNameAsync(work, night.Id, input.DisplayName, cancellation);
        await wrongCodes.NoteAsync(work, cancellation);
        return Failure("code", "join.code-unknown");
    }
}
