using ClubBench.Web.Commands;
using ClubBench.Web.Hosting;

var builder = WebApplication.CreateBuilder(StartArguments.Of(args));
builder.AddClubBench();

var app = builder.Build();
app.MapClubBench();
await app.PrepareDataAsync();
await app.RunAsync();

/// <summary>Entry point; public so that tests can host the application.</summary>
public partial class Program;
