using System.Text.RegularExpressions;

namespace ClubBench.Web.Tests.SignIn;

/// <summary>Fills a form of the door as a browser does: loads the page, takes its antiforgery token along.</summary>
internal static partial class DoorForm
{
    public static async Task<HttpResponseMessage> PostFormAsync(this HttpClient browser, string page, string action, params (string Name, string Value)[] fields)
    {
        var html = await browser.GetStringAsync(page);
        var token = Token().Match(html).Groups["token"].Value;
        return await browser.PostAsync(action, new FormUrlEncodedContent([.. fields.Select(f => KeyValuePair.Create(f.Name, f.Value)), KeyValuePair.Create("__RequestVerificationToken", token)]));
    }

    [GeneratedRegex("name=\"__RequestVerificationToken\"[^>]*value=\"(?<token>[^\"]+)\"", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Token();
}
