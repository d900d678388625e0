using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;
using LivePasses.Live;
using Microsoft.Playwright;
using MQTTnet;

namespace LivePasses.Tests;

/// <summary>The whole service, from its broker to its page, in a browser.</summary>
public class PageTests
{
    [BrowserFact]
    public async Task Page_WholeService_ShowsEveryPassInWordsAndPictures()
    {
        await using Rig rig = await Rig.Start(Rig.Usual(0));
        await using OpenPage open = await Browser.Open();
        IPage page = open.Page;
        List<string> foreign = [], faults = [];
        page.Request += (_, request) =>
        {
            if (!request.Url.StartsWith(rig.Page, StringComparison.Ordinal) && !request.Url.StartsWith("data:", StringComparison.Ordinal)) foreign.Add(request.Url);
        };
        page.PageError += (_, error) => faults.Add(error);
        page.Console += (_, message) =>
        {
            if (message.Type == "error") faults.Add(message.Text);
        };
        await page.GotoAsync(rig.Page);
        await page.WaitForFunctionAsync("() => [...document.querySelectorAll('h2')].length === 6 && [...document.querySelectorAll('h2')].every(head => /reads 0\\.\\d\\d/.test(head.textContent))");

        // Seventeen minutes of plant time, so that there is a trend to look at.
        DateTimeOffset begin = rig.Part<PassWatch>().Time!.Value;
        await Rig.Until(() => rig.Part<PassWatch>().Time > begin.AddMinutes(17), "seventeen minutes of plant time");
        await page.WaitForTimeoutAsync(1500);
        Assert.Equal(6, await page.Locator("article").CountAsync());
        Assert.Contains("Marten 2", await page.TitleAsync(), StringComparison.Ordinal);
        Assert.Contains("invented plant", await page.Locator("#clock").TextContentAsync(), StringComparison.Ordinal);
        Assert.Matches("liquid water for \\d+ m, then wet steam to its outlet at 692 m", await page.Locator("article svg").First.GetAttributeAsync("aria-label"));
        Assert.Matches("boils from \\d+ m", await page.Locator("article svg").First.TextContentAsync());
        Assert.True((await page.Locator("path.is").First.GetAttributeAsync("d"))!.Length > 100);
        await page.EmulateMediaAsync(new() { ColorScheme = ColorScheme.Light });
        await Picture(page, "page");
        await AssertAccessible(page);
        await page.EmulateMediaAsync(new() { ColorScheme = ColorScheme.Dark });
        await AssertAccessible(page);
        await Picture(page, "page-dark");
        Assert.Empty(foreign);
        Assert.Empty(faults);
    }

    [BrowserFact]
    public async Task Page_KeyboardAlone_ReachesEverything()
    {
        await using Rig rig = await Rig.Start(Rig.Usual(200));
        await using OpenPage open = await Browser.Open();
        IPage page = open.Page;
        await page.GotoAsync(rig.Page);
        await page.WaitForSelectorAsync("article");
        await page.Keyboard.PressAsync("Tab");
        Assert.Equal("Hold still", await Focused("document.activeElement.textContent"));
        await page.Keyboard.PressAsync("Enter");
        Assert.Equal("true", await Focused("document.activeElement.getAttribute('aria-pressed')"));
        await page.Keyboard.PressAsync("Tab");
        Assert.Equal("pass-0", await Focused("document.activeElement.getAttribute('aria-labelledby')"));
        await page.Keyboard.PressAsync("ArrowDown");
        Assert.Equal("pass-1", await Focused("document.activeElement.getAttribute('aria-labelledby')"));
        await page.Keyboard.PressAsync("Tab");
        await page.Keyboard.PressAsync("Enter");
        Assert.True(await page.Locator("details").Nth(1).EvaluateAsync<bool>("details => details.open"));

        Task<string> Focused(string script) => page.EvaluateAsync<string>(script);
    }

    [BrowserFact]
    public async Task Page_HeldStill_MovesNoMoreAndCatchesUp()
    {
        await using Rig rig = await Rig.Start(Rig.Usual(200));
        await using OpenPage open = await Browser.Open();
        IPage page = open.Page;
        await page.GotoAsync(rig.Page);
        await page.WaitForFunctionAsync("() => /UTC/.test(document.getElementById('clock').textContent)");
        await page.ClickAsync("#hold");
        string? held = await page.Locator("#clock").TextContentAsync();
        await page.WaitForTimeoutAsync(2500);
        Assert.Equal(held, await page.Locator("#clock").TextContentAsync());
        await page.ClickAsync("#hold");
        Assert.NotEqual(held, await page.Locator("#clock").TextContentAsync());
    }

    [BrowserFact]
    public async Task Page_HostileNames_AreShownAsText()
    {
        LiveSettings usual = Rig.Usual(200);
        const string hostile = "<img src=x onerror=\"document.title='taken'\">&amp;#+/";
        var generator = new TwoPhase.Passes.SteamGenerator(hostile, usual.Generator.Passes.Select((pass, i) => i == 0 ? Renamed(pass, hostile) : pass))
            .WithTags(usual.Generator.Tags).WithBasis(usual.Generator.Basis);
        await using Rig rig = await Rig.Start(usual with { Generator = generator });
        await using OpenPage open = await Browser.Open();
        IPage page = open.Page;
        await page.GotoAsync(rig.Page);
        await page.WaitForFunctionAsync("() => /UTC/.test(document.getElementById('clock').textContent)");
        Assert.Equal(hostile, await page.Locator("#generator").TextContentAsync());
        Assert.Contains(hostile, await page.Locator("h2").First.TextContentAsync(), StringComparison.Ordinal);

        // A payload as hostile as the names: refused, and what it holds is quoted as text.
        using IMqttClient client = await rig.Connect();
        await client.PublishAsync(new MqttApplicationMessageBuilder().WithTopic(rig.Settings.Topics.Tag("MT-P1-FEED")).WithPayload("{\"value\":1,\"unit\":\"<img src=x onerror=alert(1)>\"}").Build());
        await page.WaitForFunctionAsync("() => document.getElementById('link').textContent.includes('<img src=x')");
        Assert.Equal(0, await page.Locator("img").CountAsync());
        Assert.NotEqual("taken", await page.TitleAsync());

        static TwoPhase.Passes.Pass Renamed(TwoPhase.Passes.Pass pass, string name) =>
            new TwoPhase.Passes.Pass(name, pass.Sections).WithHeat(pass.Heat!).WithHeatAtFullFiring(pass.HeatAtFullFiring!.Value).WithMeter(pass.Meter!).WithTags(pass.Tags);
    }

    [Fact]
    public async Task Page_OtherHostName_IsRefused()
    {
        await using Rig rig = await Rig.Start(Rig.Usual(1));
        using var client = new HttpClient();
        using var request = new HttpRequestMessage(HttpMethod.Get, rig.Page) { Headers = { Host = "elsewhere.example" } };
        Assert.Equal(System.Net.HttpStatusCode.BadRequest, (await client.SendAsync(request)).StatusCode);
    }

    [Fact]
    public async Task Page_EveryAnswer_ForbidsWhatIsNotItsOwn()
    {
        await using Rig rig = await Rig.Start(Rig.Usual(1));
        using var client = new HttpClient();
        foreach (string path in new[] { "", "live.js", "live.css", "generator", "passes" })
        {
            HttpResponseMessage answer = await client.GetAsync(new Uri(rig.Page + path));
            Assert.True(answer.IsSuccessStatusCode, path);
            Assert.StartsWith("default-src 'none'", Assert.Single(answer.Headers.GetValues("Content-Security-Policy")), StringComparison.Ordinal);
        }
    }

    private static async Task AssertAccessible(IPage page)
    {
        AxeResult result = await page.RunAxe();
        Assert.True(result.Violations.Length == 0, string.Join("\n", result.Violations.Select(violation => $"{violation.Id}: {violation.Help}: {string.Join("; ", violation.Nodes.Select(node => node.Html))}")));
    }

    // Kept where the gate asks for it, to be looked at by eye.
    private static async Task Picture(IPage page, string name)
    {
        if (Environment.GetEnvironmentVariable("TWOPHASE_PICTURES") is { Length: > 0 } folder) await page.ScreenshotAsync(new() { Path = Path.Combine(folder, $"live-{name}.png"), FullPage = true });
    }
}
