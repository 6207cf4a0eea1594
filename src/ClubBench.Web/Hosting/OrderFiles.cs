using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning.Orders;
using ClubBench.Web.Components.Pages.Orders;
using ClubBench.Web.SignIn;

namespace ClubBench.Web.Hosting;

/// <summary>Parts orders as files, for whoever is signed in.</summary>
internal static class OrderFiles
{
    private const string Spreadsheet = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet";

    public static void MapOrderFiles(this WebApplication app)
    {
        app.MapGet("/plans/{id:guid}/parts-order.csv", (Guid id, PartsOrderOf order, HttpContext http) => FileAsync(id, order, http, OrderSheet.Csv, "text/csv", "parts-order.csv"));
        app.MapGet("/plans/{id:guid}/parts-order.xlsx", (Guid id, PartsOrderOf order, HttpContext http) => FileAsync(id, order, http, OrderSheet.Xlsx, Spreadsheet, "parts-order.xlsx"));
    }

    private static async Task<IResult> FileAsync(Guid id, PartsOrderOf order, HttpContext http, Func<PartsOrder, byte[]> write, string type, string name)
    {
        var found = await order.Run(http.User.ToActor(), new PartsOrderOfInput(null, id), http.RequestAborted);
        return found.Succeeded ? Results.File(write(found.Value), type, name) : Results.NotFound();
    }
}
