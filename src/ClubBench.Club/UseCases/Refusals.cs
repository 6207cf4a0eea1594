using ClubBench.Planning;

namespace ClubBench.Club.UseCases;

/// <summary>Why somebody may not do something.</summary>
internal static class Refusals
{
    /// <summary>The role does not have the right.</summary>
    public static FieldMessage Right() => FieldMessage.Error("", "refused.right");

    /// <summary>The membership has ended, or belongs to another club.</summary>
    public static FieldMessage Membership() => FieldMessage.Error("", "refused.membership");

    /// <summary>The night somebody joined for is over.</summary>
    public static FieldMessage NightOver() => FieldMessage.Error("", "refused.night-over");

    /// <summary>Builders write on their own board only.</summary>
    public static FieldMessage OwnBoardOnly() => FieldMessage.Error("boardId", "refused.own-board-only");

    /// <summary>Nobody signs off their own board.</summary>
    public static FieldMessage OwnSignOff() => FieldMessage.Error("boardId", "refused.own-sign-off");

    /// <summary>Somebody saved in between.</summary>
    public static FieldMessage Stale(string what) => FieldMessage.Error("version", "conflict.stale", ("what", what));
}
