using System.Net;
using System.Reflection;
using LivePasses.Live;
using LivePasses.Mqtt;
using LivePasses.Page;
using LivePasses.Plant;
using LivePasses.Tags;

namespace LivePasses;

/// <summary>The parts of the service, put together.</summary>
internal static class Service
{
    /// <summary>A service that has not started yet.</summary>
    public static WebApplication Build(LiveSettings settings)
    {
        WebApplicationBuilder builder = WebApplication.CreateSlimBuilder(new WebApplicationOptions { ContentRootPath = AppContext.BaseDirectory });
        builder.Logging.ClearProviders().AddSimpleConsole(static console => console.SingleLine = true).AddFilter("Microsoft", LogLevel.Warning);
        builder.WebHost.ConfigureKestrel(server =>
        {
            server.AddServerHeader = false;
            server.Listen(settings.Listen);
        });
        builder.Services.AddSingleton(settings);
        builder.Services.AddSingleton<PassWatch>();
        builder.Services.AddSingleton<TagBoard>();
        builder.Services.AddSingleton<TagLink>();
        if (settings.HasOwnBroker) builder.Services.AddHostedService<OwnBroker>();
        builder.Services.AddHostedService<StateKeeper>();
        builder.Services.AddHostedService(static services => services.GetRequiredService<TagLink>());
        if (settings.SimulatesPlant) builder.Services.AddHostedService<SimulatedPlant>();

        // A page on loopback answers only to loopback's own names, so that no web page elsewhere reaches it under another.
        if (IPAddress.IsLoopback(settings.Listen.Address)) builder.Services.AddHostFiltering(static filter => filter.AllowedHosts = ["localhost", "127.0.0.1", "[::1]"]);
        WebApplication application = builder.Build();
        application.UseHostFiltering();
        application.MapPage();
        application.Lifetime.ApplicationStarted.Register(() => Words.Begins(application.Logger, settings));
        return application;
    }

    /// <summary>A file that the program carries.</summary>
    public static string Resource(string name)
    {
        using Stream stream = Assembly.GetExecutingAssembly().GetManifestResourceStream(name) ?? throw new InvalidOperationException($"There is no resource {name}.");
        using var reader = new StreamReader(stream);
        return reader.ReadToEnd();
    }
}
