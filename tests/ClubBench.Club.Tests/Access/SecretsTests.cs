using System.Buffers.Text;
using System.Text.RegularExpressions;
using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Planning.Text;
using ClubBench.Club.Tests.Support;

namespace ClubBench.Club.Tests.Access;

public sealed partial class SecretsTests
{
    [Fact]
    public void NewSpokenCode_HasSixSymbolsOfThirtyOne()
    {
        Assert.Equal(31, Secrets.SpokenAlphabet.Distinct().Count());
        Assert.All(Enumerable.Range(0, 50).Select(_ => Secrets.NewSpokenCode()), c => Assert.Matches("^[" + Secrets.SpokenAlphabet + "]{6}$", c));
    }

    [Fact]
    public void NewToken_CarriesTwoHundredFiftySixBits() => Assert.Equal(32, Base64Url.DecodeFromChars(Secrets.NewToken()).Length);

    [Fact]
    public void HashOf_APassword_IteratesAtLeastAsOftenAsPromised()
    {
        var person = new Person { DisplayName = "Ingrid" };
        person.PasswordHash = Passwords.HashOf(person, "a long enough password");

        // Format marker, then the pseudo-random function and the iteration count as big-endian words.
        var iterations = System.Buffers.Binary.BinaryPrimitives.ReadInt32BigEndian(Convert.FromBase64String(person.PasswordHash).AsSpan(5));

        Assert.True(iterations >= 220_000);
        Assert.True(Passwords.Match(person, "a long enough password"));
        Assert.False(Passwords.Match(person, "a long enough passwore"));
    }

    [Fact]
    public void Codes_OfTheClub_AllHaveWords()
    {
        var sources = Directory.EnumerateFiles(Path.Combine(SourceFolder.Root, "src", "ClubBench.Club", "UseCases"), "*.cs", SearchOption.AllDirectories);
        var codes = sources.SelectMany(f => MessageCode().Matches(File.ReadAllText(f))).Select(m => m.Groups["code"].Value).Append("not-found").Distinct(StringComparer.Ordinal).ToList();

        Assert.True(codes.Count > 40);
        Assert.All(codes, c => Assert.True(Phrases.Has(c), c));
    }

    [GeneratedRegex("(?:Error|Failure)\\([^;]*?\"[^\"]*\", \"(?<code>[a-z.-]+)\"", RegexOptions.NonBacktracking | RegexOptions.ExplicitCapture)]
    private static partial Regex MessageCode();
}
