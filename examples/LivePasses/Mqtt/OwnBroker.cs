using System.Net;
using MQTTnet.Server;

namespace LivePasses.Mqtt;

/// <summary>A broker on loopback, for a look at the service without one.</summary>
internal sealed class OwnBroker(LiveSettings settings) : IHostedService, IDisposable
{
    // So many messages may wait for a reader before the oldest is dropped.
    private const int Waiting = 10_000;

    private readonly MqttServer _server = new MqttServerFactory().CreateMqttServer(new MqttServerOptionsBuilder()
        .WithDefaultEndpoint()
        .WithDefaultEndpointBoundIPAddress(IPAddress.Loopback)
        .WithDefaultEndpointBoundIPV6Address(IPAddress.None)
        .WithDefaultEndpointPort(settings.Broker.Port)
        .WithMaxPendingMessagesPerClient(Waiting)
        .Build());

    public async Task StartAsync(CancellationToken cancellationToken)
    {
        try
        {
            await _server.StartAsync();
        }
        catch (System.Net.Sockets.SocketException taken)
        {
            throw new SettingsException($"The broker cannot listen on port {settings.Broker.Port}: {taken.Message}");
        }
    }

    public Task StopAsync(CancellationToken cancellationToken) => _server.StopAsync();

    public void Dispose() => _server.Dispose();
}
