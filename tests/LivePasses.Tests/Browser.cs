using Microsoft.Playwright;

namespace LivePasses.Tests;

/// <summary>A test in headless Chromium; skipped with the reason where there is none, unless the environment says that there must be one.</summary>
[AttributeUsage(AttributeTargets.Method)]
internal sealed class BrowserFactAttribute : FactAttribute
{
    public BrowserFactAttribute()
    {
        if (Browser.Path is null && Environment.GetEnvironmentVariable("TWOPHASE_BROWSER") != "required") Skip = "There is no Chromium on this machine.";
    }
}

/// <summary>The system's own Chromium: nothing is downloaded.</summary>
internal static class Browser
{
    private static readonly string[] Quiet = ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"];

    public static string? Path { get; } = new[] { "/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome" }.FirstOrDefault(File.Exists);

    /// <summary>An empty page in a browser of its own.</summary>
    public static async Task<OpenPage> Open()
    {
        string path = Path ?? throw new FileNotFoundException("There is no Chromium on this machine, and the environment says that there must be one.");
        IPlaywright playwright = await Playwright.CreateAsync();
        IBrowser browser = await playwright.Chromium.LaunchAsync(new() { ExecutablePath = path, Headless = true, Args = Quiet });
        return new(playwright, browser, await browser.NewPageAsync(new() { ViewportSize = new() { Width = 1240, Height = 1500 } }));
    }
}

/// <summary>A page, and the browser that ends with it.</summary>
internal sealed class OpenPage(IPlaywright playwright, IBrowser browser, IPage page) : IAsyncDisposable
{
    public IPage Page { get; } = page;

    public async ValueTask DisposeAsync()
    {
        await browser.DisposeAsync();
        playwright.Dispose();
    }
}
