using System.Reflection;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Tests.Conventions;

/// <summary>Every method of calculation is checked in three different ways.</summary>
public class EvidenceConventions
{
    private const int Wanted = 3;

    // Tables are read, not calculated: their rows carry sources, and table conventions check them.
    private static readonly string[] NotMethods = ["ClubBench.Calculation.Quantities", "ClubBench.Calculation.Tables"];

    private static readonly ILookup<Type, EvidenceKind> Evidence =
        typeof(EvidenceConventions).Assembly.GetTypes()
            .SelectMany(t => t.GetMethods(BindingFlags.Instance | BindingFlags.Static | BindingFlags.Public))
            .SelectMany(m => m.GetCustomAttributes<EvidenceAttribute>())
            .ToLookup(e => e.Method, e => e.Kind);

    public static TheoryData<Type> Methods => [.. typeof(Sources).Assembly.GetExportedTypes().Where(IsMethod)];

    [Theory]
    [MemberData(nameof(Methods))]
    public void Method_HasThreeKindsOfEvidence(Type method)
    {
        var kinds = Evidence[method].Distinct().Order().ToList();

        Assert.True(kinds.Count >= Wanted, $"{method.Name} has {kinds.Count} of {Wanted}: {string.Join(", ", kinds)}");
    }

    [Fact]
    public void Evidence_All_StandsAtTests()
    {
        var elsewhere = from type in typeof(EvidenceConventions).Assembly.GetTypes()
                        from method in type.GetMethods(BindingFlags.Instance | BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.DeclaredOnly)
                        where method.IsDefined(typeof(EvidenceAttribute)) && !method.IsDefined(typeof(FactAttribute), inherit: true)
                        select $"{type.Name}.{method.Name}";

        Assert.Empty(elsewhere);
    }

    private static bool IsMethod(Type type) =>
        type is { IsEnum: false, IsInterface: false } && !NotMethods.Contains(type.Namespace) && type.GetMethods(BindingFlags.Instance | BindingFlags.Static | BindingFlags.Public | BindingFlags.DeclaredOnly).Any(Calculates);

    private static bool Calculates(MethodInfo method) =>
        !method.IsSpecialName && !method.IsVirtual && method.Name is not ("Equals" or "Deconstruct" or "<Clone>$") && method.ReturnType != typeof(void) && !IsLookUp(method);

    private static bool IsLookUp(MethodInfo method) => method.Name.StartsWith("Find", StringComparison.Ordinal);
}
