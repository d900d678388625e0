using System.Net.ServerSentEvents;
using System.Runtime.CompilerServices;
using System.Text.Json;
using LivePasses.Live;
using LivePasses.Mqtt;
using TwoPhase.Passes;

namespace LivePasses.Page;

/// <summary>The page and what feeds it. It only reads: there is nothing to send to it.</summary>
internal static class PageEndpoints
{
    private static readonly TimeSpan Beat = TimeSpan.FromSeconds(1);

    // Nothing from elsewhere, nothing inline: a name or a payload that holds markup cannot run.
    private const string Policy = "default-src 'none'; script-src 'self'; style-src 'self'; connect-src 'self'; img-src 'self' data:; base-uri 'none'; form-action 'none'; frame-ancestors 'none'";

    public static void MapPage(this WebApplication application)
    {
        application.Use(static (context, next) =>
        {
            IHeaderDictionary headers = context.Response.Headers;
            (headers.ContentSecurityPolicy, headers.XContentTypeOptions, headers["Referrer-Policy"], headers.CacheControl) = (Policy, "nosniff", "no-referrer", "no-store");
            return next(context);
        });
        Serve("/", "index.html", "text/html; charset=utf-8");
        Serve("/live.css", "live.css", "text/css; charset=utf-8");
        Serve("/live.js", "live.js", "text/javascript; charset=utf-8");
        application.MapGet("/generator", static (LiveSettings settings) => Results.Json(GeneratorView.Of(settings), LiveJson.Options));
        application.MapGet("/passes", static (PassWatch watch, TagLink link) => Results.Json(NewsOf(watch, link, watch.NothingSeen()), LiveJson.Options));
        application.MapGet("/news", static (PassWatch watch, TagLink link, IHostApplicationLifetime life, CancellationToken gone) => TypedResults.ServerSentEvents(News(watch, link, life.ApplicationStopping, gone)));

        void Serve(string path, string resource, string type)
        {
            string content = Service.Resource(resource);
            application.MapGet(path, () => Results.Content(content, type));
        }
    }

    private static async IAsyncEnumerable<SseItem<string>> News(PassWatch watch, TagLink link, CancellationToken stopping, [EnumeratorCancellation] CancellationToken gone)
    {
        using var either = CancellationTokenSource.CreateLinkedTokenSource(stopping, gone);
        using var timer = new PeriodicTimer(Beat);
        long[] seen = watch.NothingSeen();
        do
        {
            yield return new(JsonSerializer.Serialize(NewsOf(watch, link, seen), LiveJson.Options), "news") { ReconnectionInterval = Beat };
        }
        while (await Goes(timer, either.Token));
    }

    private static async Task<bool> Goes(PeriodicTimer timer, CancellationToken cancellation)
    {
        try
        {
            return await timer.WaitForNextTickAsync(cancellation);
        }
        catch (OperationCanceledException)
        {
            return false;
        }
    }

    private static object NewsOf(PassWatch watch, TagLink link, long[] seen)
    {
        WatchView view = watch.Look(seen);
        return new { view.Time, Link = link.Look(), view.Passes, view.Trends };
    }

    /// <summary>What does not change while the service runs.</summary>
    private sealed record GeneratorView(string Name, bool Simulated, double Speed, double QualityLimit, IReadOnlyList<PassShape> Passes)
    {
        public static GeneratorView Of(LiveSettings settings) => new(
            settings.Generator.Name,
            settings.SimulatesPlant,
            settings.Speed,
            settings.Options.QualityLimit.DecimalFractions,
            [.. settings.Generator.Passes.Select(PassShape.Of)]);
    }

    private sealed record PassShape(string Name, Quantity FlowLength, IReadOnlyList<SectionShape> Sections)
    {
        public static PassShape Of(Pass pass)
        {
            double length = 0;
            List<SectionShape> sections = [];
            foreach (TubeSection section in pass.Sections)
            {
                sections.Add(new(section.Name, Quantity.Of(length, "m", 2)));
                length += section.FlowLength.Meters;
            }

            return new(pass.Name, Quantity.Of(length, "m", 2), sections);
        }
    }

    private sealed record SectionShape(string Name, Quantity Starts);
}
