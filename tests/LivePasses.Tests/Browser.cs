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

    public static async Task<IBrowser> Launch(IPlaywright playwright) =>
        await playwright.Chromium.LaunchAsync(new() { ExecutablePath = Path ?? throw new FileNotFoundException("There is no Chromium on this machine, and the environment says that there must be one."), Headless = true, Args = Quiet });
}
