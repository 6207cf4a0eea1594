using System.Buffers.Text;
using System.Security.Cryptography;
using System.Text;

namespace ClubBench.Club.Access;

/// <summary>Tokens and codes from the system's random source. Tokens carry 256 bits; only their hash is stored.</summary>
public static class Secrets
{
    /// <summary>Letters and digits that are not mistaken for one another when spoken or read: 31 symbols.</summary>
    public const string SpokenAlphabet = "23456789ABCDEFGHJKMNPQRSTUVWXYZ";

    private const int SpokenLength = 6;

    /// <summary>A new token, safe in an address.</summary>
    public static string NewToken() => Base64Url.EncodeToString(RandomNumberGenerator.GetBytes(32));

    /// <summary>A new code to be spoken in the room.</summary>
    public static string NewSpokenCode() => RandomNumberGenerator.GetString(SpokenAlphabet, SpokenLength);

    /// <summary>What is stored of a token. The token is random over its full length, so a plain hash is enough.</summary>
    public static string HashOf(string token) => Convert.ToHexString(SHA256.HashData(Encoding.UTF8.GetBytes(token)));

    /// <summary>The code as it was meant: capitals, without blanks and hyphens.</summary>
    public static string Normalise(string code) => string.Concat(code.Where(char.IsLetterOrDigit)).ToUpperInvariant();
}
