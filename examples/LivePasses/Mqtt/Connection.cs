using System.Net;
using System.Net.Sockets;
using MQTTnet;
using MQTTnet.Exceptions;

namespace LivePasses.Mqtt;

/// <summary>A connection to the broker that comes back by itself.</summary>
internal sealed class Connection : IDisposable
{
    private static readonly TimeSpan Timeout = TimeSpan.FromSeconds(5), Pause = TimeSpan.FromSeconds(1);

    private readonly MqttClientOptions _options;

    public Connection(LiveSettings settings, string name, (string Topic, byte[] Payload)? lastWord = null)
    {
        MqttClientOptionsBuilder options = new MqttClientOptionsBuilder()
            .WithTcpServer(settings.Broker.Host, settings.Broker.Port)
            .WithClientId($"{name}-{Environment.ProcessId}-{Guid.NewGuid():N}")
            .WithTimeout(Timeout)
            .WithCleanSession();
        if (settings.User is not null) options = options.WithCredentials(settings.User, Environment.GetEnvironmentVariable(LiveSettings.PasswordVariable));
        if (settings.UsesTls) options = options.WithTlsOptions(static tls => tls.UseTls());
        if (lastWord is { } word) options = options.WithWillTopic(word.Topic).WithWillPayload(word.Payload).WithWillRetain();
        _options = options.Build();
        Endpoint = settings.Broker;
    }

    public IMqttClient Client { get; } = new MqttClientFactory().CreateMqttClient();

    public DnsEndPoint Endpoint { get; }

    /// <summary>Keeps connected until cancelled.</summary>
    /// <param name="connected">What to do each time the connection stands.</param>
    /// <param name="failed">Told once for each time the broker is lost.</param>
    /// <param name="cancellation">Ends it.</param>
    public async Task Keep(Func<Task> connected, Action<string> failed, CancellationToken cancellation)
    {
        bool told = false;
        while (!cancellation.IsCancellationRequested)
        {
            if (!Client.IsConnected)
            {
                try
                {
                    MqttClientConnectResult answer = await Client.ConnectAsync(_options, cancellation);
                    if (answer.ResultCode != MqttClientConnectResultCode.Success) throw new MqttCommunicationException($"it refuses: {answer.ResultCode}");
                    await connected();
                    told = false;
                }
                catch (Exception fault) when (IsLoss(fault) && !cancellation.IsCancellationRequested)
                {
                    if (!told) failed(fault.InnerException?.Message ?? fault.Message);
                    told = true;
                    await Client.TryDisconnectAsync();   // a link that is only half made is made anew
                }
            }

            await Task.Delay(Pause, cancellation);
        }
    }

    /// <summary>Publishes; what cannot be sent is dropped, and the next value takes its place.</summary>
    public async Task<bool> Publish(string topic, byte[] payload, bool retain, CancellationToken cancellation)
    {
        if (!Client.IsConnected) return false;
        try
        {
            await Client.PublishAsync(new MqttApplicationMessageBuilder().WithTopic(topic).WithPayload(payload).WithRetainFlag(retain).Build(), cancellation);
            return true;
        }
        catch (Exception fault) when (IsLoss(fault) && !cancellation.IsCancellationRequested)
        {
            return false;
        }
    }

    public void Dispose() => Client.Dispose();

    private static bool IsLoss(Exception fault) => fault is MqttCommunicationException or MqttClientDisconnectedException or SocketException or IOException or TimeoutException or OperationCanceledException or InvalidOperationException;
}
