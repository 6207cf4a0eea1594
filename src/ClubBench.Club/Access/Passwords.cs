using ClubBench.Club.Entities;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.Options;

namespace ClubBench.Club.Access;

/// <summary>Passwords of people who sign in as themselves.</summary>
public static class Passwords
{
    /// <summary>Fewest characters; length is what makes a password hard to guess.</summary>
    public const int LeastLength = 12;

    private const int Iterations = 220_000;

    private static readonly PasswordHasher<Person> Hasher = new(Options.Create(new PasswordHasherOptions { IterationCount = Iterations }));

    /// <summary>What is stored of a password (PBKDF2 with HMAC-SHA512, salted).</summary>
    public static string HashOf(Person person, string password) => Hasher.HashPassword(person, password);

    /// <summary>Whether this is the person's password.</summary>
    public static bool Match(Person person, string password) =>
        person.PasswordHash is { } hash && Hasher.VerifyHashedPassword(person, hash, password) != PasswordVerificationResult.Failed;
}
