namespace ClubBench.Web.Commands;

/// <summary>Options of the command line that stand alone, written out as the configuration reads them.</summary>
public static class StartArguments
{
    public static string[] Of(string[] arguments) => [.. arguments.Select(a => a == "--demo" ? "--demo=true" : a)];
}
