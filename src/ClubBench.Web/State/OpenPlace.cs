namespace ClubBench.Web.State;

/// <summary>The kit and plan a person looked at last in this tab, so that the flags lead back to them.</summary>
public sealed class OpenPlace
{
    public event EventHandler? Changed;

    public Guid? Kit { get; private set; }

    public Guid? Plan { get; private set; }

    public void Open(Guid? kit, Guid? plan = null)
    {
        if (Kit == kit && (plan is null || Plan == plan)) return;
        if (Kit != kit) Plan = null;
        Kit = kit;
        Plan = plan ?? Plan;
        Changed?.Invoke(this, EventArgs.Empty);
    }
}
