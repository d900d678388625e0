using System.Net;
using System.Net.Sockets;
using Microsoft.AspNetCore.Builder;
using Microsoft.Extensions.DependencyInjection;
using MQTTnet;

namespace LivePasses.Tests;

/// <summary>A service on ports and in a folder of its own, on loopback.</summary>
internal sealed class Rig : IAsyncDisposable
{
    private readonly WebApplication _application;

    private Rig(WebApplication application, LiveSettings settings) => (_application, Settings) = (application, settings);

    public LiveSettings Settings { get; }

    public string Page => $"http://{Settings.Listen}/";

    /// <summary>The usual settings: the service's own broker, the simulated plant.</summary>
    public static LiveSettings Usual(double speed)
    {
        string folder = Directory.CreateTempSubdirectory("live-passes-").FullName;
        LiveSettings settings = LiveSettings.Of(null, null, $"127.0.0.1:{FreePort()}", null, speed, 0.8, folder);
        return settings with { Broker = new("127.0.0.1", FreePort()) };
    }

    public static async Task<Rig> Start(LiveSettings settings)
    {
        WebApplication application = Service.Build(settings);
        await application.StartAsync();
        return new(application, settings);
    }

    /// <summary>A client at the rig's broker.</summary>
    public async Task<IMqttClient> Connect()
    {
        IMqttClient client = new MqttClientFactory().CreateMqttClient();
        await client.ConnectAsync(new MqttClientOptionsBuilder().WithTcpServer(Settings.Broker.Host, Settings.Broker.Port).Build());
        return client;
    }

    /// <summary>The next estimate of a pass on its topic.</summary>
    public async Task<MqttApplicationMessage> Estimate(string pass)
    {
        var arrived = new TaskCompletionSource<MqttApplicationMessage>();
        using IMqttClient client = await Connect();
        client.ApplicationMessageReceivedAsync += message =>
        {
            arrived.TrySetResult(message.ApplicationMessage);
            return Task.CompletedTask;
        };
        await client.SubscribeAsync(Settings.Topics.Estimate(pass));
        return await arrived.Task.WaitAsync(TimeSpan.FromSeconds(60));
    }

    public T Part<T>()
        where T : notnull => _application.Services.GetRequiredService<T>();

    public async ValueTask DisposeAsync()
    {
        await _application.StopAsync();
        await _application.DisposeAsync();
        if (Directory.Exists(Path.GetDirectoryName(Settings.StateFile))) Directory.Delete(Path.GetDirectoryName(Settings.StateFile)!, recursive: true);
    }

    /// <summary>Waits for something that must come, and fails where it does not.</summary>
    public static async Task Until(Func<bool> condition, string what, int seconds = 60)
    {
        for (int i = 0; i < seconds * 20; i++)
        {
            if (condition()) return;
            await Task.Delay(50);
        }

        Assert.Fail($"Waited {seconds} s in vain: {what}");
    }

    public static int FreePort()
    {
        using var socket = new TcpListener(IPAddress.Loopback, 0);
        socket.Start();
        return ((IPEndPoint)socket.LocalEndpoint).Port;
    }
}
