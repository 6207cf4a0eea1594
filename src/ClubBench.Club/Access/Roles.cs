namespace ClubBench.Club.Access;

/// <summary>What a person is in the club, least first.</summary>
public enum Role
{
    /// <summary>Not signed in.</summary>
    Visitor,

    Builder,

    Mentor,

    Coordinator,

    /// <summary>The program itself: first start and commands on the machine.</summary>
    Host,
}

/// <summary>What a use case asks of whoever runs it.</summary>
public enum Right
{
    /// <summary>Come in: sign in, join.</summary>
    ComeIn,

    /// <summary>See kits, plans, cards, boards, nights and the room.</summary>
    See,

    /// <summary>Write on a board; builders on their own only.</summary>
    Build,

    /// <summary>Answer calls, sign off, reopen.</summary>
    Mentor,

    /// <summary>Print for the room.</summary>
    Print,

    /// <summary>Take in kits, make and change plans.</summary>
    PlanKits,

    /// <summary>Issue and withdraw plans.</summary>
    IssuePlans,

    /// <summary>Group builds, boards, nights.</summary>
    RunNights,

    /// <summary>People, stock, instruments, tokens, links.</summary>
    KeepClub,

    /// <summary>First start of the program.</summary>
    HostClub,
}

/// <summary>Which role has which rights.</summary>
public static class Roles
{
    private static readonly HashSet<Right> Visitor = [Right.ComeIn];

    private static readonly HashSet<Right> Builder = [.. Visitor, Right.See, Right.Build];

    private static readonly HashSet<Right> Mentor = [.. Builder, Right.Mentor, Right.Print];

    private static readonly HashSet<Right> Coordinator = [.. Mentor, Right.PlanKits, Right.IssuePlans, Right.RunNights, Right.KeepClub];

    private static readonly HashSet<Right> Host = [Right.ComeIn, Right.HostClub];

    /// <summary>The rights of a role.</summary>
    public static IReadOnlySet<Right> RightsOf(Role role) => role switch
    {
        Role.Builder => Builder,
        Role.Mentor => Mentor,
        Role.Coordinator => Coordinator,
        Role.Host => Host,
        _ => Visitor,
    };
}
