using Bunit;
using ClubBench.Club.UseCases.Kits;
using ClubBench.Planning.Kits;
using ClubBench.Web.Components.Pages.Kits;
using ClubBench.Web.Tests.Api;
using Microsoft.AspNetCore.Components;
using Microsoft.Extensions.DependencyInjection;

namespace ClubBench.Web.Tests.Components.Pages.Kits;

[Collection(ClubPageCollection.Name)]
public sealed class StageEditorTests(DemoInterface demo) : ClubPageContext(demo)
{
    private const string Field = "C15-capacitanceF";

    [Fact]
    public async Task Save_ChangedValue_GoesIntoTheNextRevisionOfTheKit()
    {
        var kit = await Demo.NewKitAsync();
        var editor = Editor(kit.Id);

        editor.Find($"#{Field}").Input("0,33 nF");
        editor.Find("form").Submit();

        var navigation = Services.GetRequiredService<NavigationManager>();
        editor.WaitForAssertion(() => Assert.Equal($"kits/{kit.Id}?stage=A5", navigation.ToBaseRelativePath(navigation.Uri)));
        var stored = await StoredAsync(kit.Id);
        Assert.Equal(kit.Revision + 1, stored.Revision);
        Assert.Equal(330e-12, stored.Stage("A5").Part("C15").Need(PartValue.Capacitance), 1e-18);
        Assert.Equal(Written(kit), Written(stored.With(stored.Stage("A5").With(kit.Stage("A5").Part("C15"))) with { Revision = kit.Revision }));
    }

    [Theory]
    [InlineData("-270")]
    [InlineData("270 uH")]
    [InlineData("")]
    public async Task Save_WrongValue_IsRefusedAtItsFieldAndTheKitStays(string typed)
    {
        var kit = await Demo.NewKitAsync();
        var editor = Editor(kit.Id);

        editor.Find($"#{Field}").Input(typed);
        editor.Find("form").Submit();

        var words = editor.WaitForElement($"#{Field}-note .error-text").TextContent;
        Assert.Equal(words, editor.Find($".error-list a[href$='#{Field}']").TextContent);
        Assert.Equal([Field], editor.FindAll("input[aria-invalid=true]").Select(i => i.Id));
        Assert.Equal(Written(kit), Written(await StoredAsync(kit.Id)));
    }

    private IRenderedComponent<StageEditor> Editor(Guid kit)
    {
        var editor = Render<StageEditor>(p => p.Add(e => e.Id, kit).Add(e => e.Key, "A5"));
        editor.WaitForElement("form");
        return editor;
    }

    private async Task<Kit> StoredAsync(Guid kit) =>
        (await Services.GetRequiredService<OpenKit>().Run(Demo.Coordinator, new OpenKitInput(kit), Xunit.TestContext.Current.CancellationToken)).Value.Kit;

    private static string Written(Kit kit)
    {
        using var file = new MemoryStream();
        KitFile.Write(kit, file);
        return System.Text.Encoding.UTF8.GetString(file.ToArray());
    }
}
