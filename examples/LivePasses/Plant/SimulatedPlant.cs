using System.Diagnostics;
using LivePasses.Live;
using LivePasses.Mqtt;
using LivePasses.Tags;
using MathNet.Numerics.Distributions;
using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace LivePasses.Plant;

/// <summary>The invented plant: publishes the tags of the invented generator, noise and faults included, as a plant's own gateway would.</summary>
internal sealed class SimulatedPlant : BackgroundService
{
    private const int Seed = 20310309;
    private const double Atmosphere = 93e3, Span = 75e3;

    // How far it may run ahead of the estimates, how often it looks, and how long it waits for them.
    private static readonly TimeSpan Lead = TimeSpan.FromSeconds(20), Look = TimeSpan.FromMilliseconds(20), Patience = TimeSpan.FromSeconds(5);

    private readonly LiveSettings _settings;
    private readonly PassWatch _watch;
    private readonly Connection _connection;
    private readonly Random _random = new(Seed);

    public SimulatedPlant(LiveSettings settings, PassWatch watch)
    {
        (_settings, _watch) = (settings, watch);
        _connection = new(settings, "simulated-plant");
    }

    public override void Dispose()
    {
        _connection.Dispose();
        base.Dispose();
    }

    protected override Task ExecuteAsync(CancellationToken stoppingToken) => Task.WhenAll(
        _connection.Keep(static () => Task.CompletedTask, static _ => { }, stoppingToken),
        Task.Run(() => Live(stoppingToken), stoppingToken));

    private async Task Live(CancellationToken cancellation)
    {
        PlantPass[] passes = [.. _settings.Generator.Passes.AsParallel().AsOrdered().Select(static (pass, i) => new PlantPass(pass, i))];
        DateTimeOffset start = Start();
        var clock = Stopwatch.StartNew();
        int step = _settings.PlantSampling;
        for (int second = step; ; second += step)
        {
            DateTimeOffset time = start.AddSeconds(second);
            await Wait(second, time, clock, cancellation);
            PassInstant[] instants = [.. passes.Select(pass => pass.Advance(second, step))];
            await Publish(instants, second, time, cancellation);
        }
    }

    // A plant's clock never goes back: behind a saved state it begins where that one ended.
    private DateTimeOffset Start()
    {
        DateTimeOffset now = DateTimeOffset.UtcNow;
        if (_watch.Time is { } last && last > now) now = last;
        return new(now.UtcTicks / TimeSpan.TicksPerSecond * TimeSpan.TicksPerSecond, TimeSpan.Zero);
    }

    private async Task Wait(int second, DateTimeOffset time, Stopwatch clock, CancellationToken cancellation)
    {
        while (!_connection.Client.IsConnected || clock.Elapsed.TotalSeconds * _settings.Speed < second * Math.Sign(_settings.Speed)) await Task.Delay(Look, cancellation);

        // As fast as can be followed; what was lost with a broker is not waited for.
        var waiting = Stopwatch.StartNew();
        while (_settings.Speed == 0 && time - _watch.Time > Lead && waiting.Elapsed < Patience) await Task.Delay(Look, cancellation);
    }

    private async Task Publish(PassInstant[] instants, int second, DateTimeOffset time, CancellationToken cancellation)
    {
        SteamGenerator generator = _settings.Generator;
        await Send(generator.Tags[GeneratorSignal.FeedTemperature], Story.FeedTemperatureAt(second) - 273.15 + Noise(0.1));
        await Send(generator.Tags[GeneratorSignal.Firing], 100 * Story.FiringAt(second));
        for (int i = 0; i < instants.Length; i++)
        {
            TagSet<PassSignal> tags = generator.Passes[i].Tags;
            PassInstant instant = instants[i];
            await Send(tags[PassSignal.FeedFlow], instant.FeedFlow.TonnesPerHour * (1 + Noise(0.003)));
            await Send(tags[PassSignal.OutletPressure], (instant.OutletPressure.Pascals - Atmosphere + Noise(3e3)) / 1e3);
            double differential = (instant.Differential?.Pascals ?? double.NaN) * Story.MeterFactor(i, second) * (1 + Noise(0.005));
            await Send(tags[PassSignal.Differential], Story.IsOutOfService(i, second) ? double.NaN : 100 * differential / Span);
        }

        async Task Send(Tag? tag, double value)
        {
            if (tag is not null) await _connection.Publish(_settings.Topics.Tag(tag.Name), TagMessage.Payload(Math.Round(value, 4), tag.Unit, time), retain: false, cancellation);
        }
    }

    private double Noise(double deviation) => deviation * Normal.Sample(_random, 0, 1);
}
