using System.Text.Json;
using LivePasses.Live;
using LivePasses.Tags;
using MQTTnet;
using MQTTnet.Exceptions;
using TwoPhase.Metering;

namespace LivePasses.Mqtt;

/// <summary>Tags in, estimates out.</summary>
internal sealed class TagLink : BackgroundService
{
    private static readonly TimeSpan Beat = TimeSpan.FromSeconds(1);

    private readonly PassWatch _watch;
    private readonly TagBoard _board;
    private readonly Topics _topics;
    private readonly ILogger<TagLink> _log;
    private readonly Connection _connection;
    private readonly Lock _lock = new();
    private long _read, _refused;
    private string _lastRefused = "";

    public TagLink(LiveSettings settings, PassWatch watch, TagBoard board, ILogger<TagLink> log)
    {
        (_watch, _board, _topics, _log) = (watch, board, settings.Topics, log);
        _connection = new(settings, "live-passes", (_topics.Online, Online(false)));
        _connection.Client.ApplicationMessageReceivedAsync += Take;
    }

    /// <summary>How the link stands.</summary>
    public LinkView Look()
    {
        lock (_lock) return new(_connection.Client.IsConnected, _read, _refused, _lastRefused);
    }

    public override void Dispose()
    {
        _connection.Dispose();
        base.Dispose();
    }

    protected override async Task ExecuteAsync(CancellationToken stoppingToken)
    {
        Task link = _connection.Keep(Greet, reason => Words.NoBroker(_log, _connection.Endpoint.Host, _connection.Endpoint.Port, reason), stoppingToken);
        Task news = PublishEstimates(stoppingToken);
        try
        {
            await Task.WhenAll(link, news);
        }
        catch (OperationCanceledException)
        {
            await _connection.Publish(_topics.Online, Online(false), retain: true, CancellationToken.None);
        }
    }

    private static byte[] Online(bool online) => JsonSerializer.SerializeToUtf8Bytes(new { online }, LiveJson.Options);

    private async Task Greet()
    {
        var all = new MqttClientSubscribeOptionsBuilder();
        foreach (string topic in _board.Topics) all = all.WithTopicFilter(topic);
        MqttClientSubscribeResult answer = await _connection.Client.SubscribeAsync(all.Build());
        if (answer.Items.FirstOrDefault(static item => item.ResultCode > MqttClientSubscribeResultCode.GrantedQoS2) is { } refused)
            throw new MqttCommunicationException($"it refuses {refused.TopicFilter.Topic}: {refused.ResultCode}");
        await _connection.Publish(_topics.Online, Online(true), retain: true, CancellationToken.None);
        Words.Connected(_log);
    }

    private Task Take(MqttApplicationMessageReceivedEventArgs arrived)
    {
        string topic = arrived.ApplicationMessage.Topic;
        GeneratorReading? reading = null;
        bool isRead = TagMessage.TryRead(arrived.ApplicationMessage.Payload, out TagMessage message, out string fault);
        if (isRead && arrived.ApplicationMessage.Retain && message.Time is null) fault = "kept by the broker and without a time: its age is not known";
        else if (isRead) reading = _board.Take(topic, message, DateTimeOffset.UtcNow, out fault);
        lock (_lock)
        {
            _read++;
            if (fault.Length > 0) (_refused, _lastRefused) = (_refused + 1, $"{topic}: {fault}");
        }

        if (reading is not null) _watch.Take(reading);
        return Task.CompletedTask;
    }

    private async Task PublishEstimates(CancellationToken cancellation)
    {
        using var timer = new PeriodicTimer(Beat);
        long[] seen = _watch.NothingSeen();
        while (await timer.WaitForNextTickAsync(cancellation))
        {
            // Also when nothing came: what is retained must not stay the last good value.
            foreach (PassView pass in _watch.Look(seen).Passes)
                await _connection.Publish(_topics.Estimate(pass.Pass), JsonSerializer.SerializeToUtf8Bytes(pass, LiveJson.Options), retain: true, cancellation);
        }
    }
}

/// <summary>How the link to the broker stands.</summary>
/// <param name="Connected">Whether it stands.</param>
/// <param name="MessagesRead">Messages that came.</param>
/// <param name="MessagesRefused">Those of them that could not be used.</param>
/// <param name="LastRefused">Topic of the last of these, and why.</param>
internal sealed record LinkView(bool Connected, long MessagesRead, long MessagesRefused, string LastRefused);
