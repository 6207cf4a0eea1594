using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.SignIn;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Clubs;

/// <summary>A person comes into the club.</summary>
public sealed record AddPersonInput(string DisplayName, Role Role, bool IsJunior = false);

/// <summary>Adds a person with a role.</summary>
public sealed class AddPerson(ClubStore store) : Command<AddPersonInput, Guid>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.KeepClub;

    /// <inheritdoc/>
    protected override Task<Outcome<Guid>> Handle(Work work, AddPersonInput input, CancellationToken cancellation)
    {
        if (string.IsNullOrWhiteSpace(input.DisplayName)) return Task.FromResult(Failure("displayName", "field.needed"));
        if (input.Role is not (Role.Builder or Role.Mentor or Role.Coordinator)) return Task.FromResult(Failure("role", "field.role-unknown"));
        return Task.FromResult(Success(work.Admit(input.DisplayName, input.Role, input.IsJunior).Id));
    }
}
