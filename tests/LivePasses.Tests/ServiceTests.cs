using System.Diagnostics;
using System.Net;
using System.Text.Json;
using LivePasses.Live;
using LivePasses.Mqtt;
using MQTTnet;
using MQTTnet.Server;

namespace LivePasses.Tests;

/// <summary>The service against brokers that come and go, kills, and long runs.</summary>
public class ServiceTests
{
    [Fact]
    public async Task Estimates_AreRetainedWithTheirUnits()
    {
        await using Rig rig = await Rig.Start(Rig.Usual(0));
        await Rig.Until(() => Known(rig), "a known quality");
        await Task.Delay(1500);
        MqttApplicationMessage estimate = await rig.Estimate("Pass 1");
        using var document = JsonDocument.Parse(estimate.Payload.First);
        Assert.True(estimate.Retain);
        Assert.InRange(document.RootElement.GetProperty("quality").GetProperty("value").GetDouble(), 0.6, 0.9);
        Assert.Equal("kg/kg", document.RootElement.GetProperty("quality").GetProperty("unit").GetString());
        foreach (JsonProperty member in document.RootElement.EnumerateObject())
        {
            Assert.NotEqual(JsonValueKind.Number, member.Value.ValueKind);   // no number without its unit
        }
    }

    [Fact]
    public async Task Estimates_WithoutTags_AreRetainedAsNotKnown()
    {
        LiveSettings settings = Rig.Usual(0) with { SimulatesPlant = false };
        await using Rig rig = await Rig.Start(settings);
        MqttApplicationMessage estimate = await rig.Estimate("Pass 1");
        using var document = JsonDocument.Parse(estimate.Payload);
        Assert.Equal("no tags", document.RootElement.GetProperty("trust").GetString());
        Assert.Equal(JsonValueKind.Null, document.RootElement.GetProperty("quality").GetProperty("value").ValueKind);
    }

    [Fact]
    public async Task Broker_Restarted_ServiceGoesOn()
    {
        LiveSettings settings = Rig.Usual(0) with { HasOwnBroker = false };
        MqttServer broker = await Broker(settings);
        await using Rig rig = await Rig.Start(settings);
        await Rig.Until(() => Known(rig), "a known quality");
        await broker.StopAsync();
        broker.Dispose();
        await Rig.Until(() => !rig.Part<TagLink>().Look().Connected, "the loss of the broker");
        await Rig.Until(() => !Known(rig), "nothing known without tags", 30);
        using MqttServer again = await Broker(settings);
        await Rig.Until(() => rig.Part<TagLink>().Look().Connected && Known(rig), "a known quality again");
    }

    [Fact]
    public async Task Service_Killed_GoesOnWithoutABump()
    {
        // The plant, its broker and a service that nothing happens to live on; beside them one is killed and started again.
        LiveSettings settings = Rig.Usual(10) with { HasOwnBroker = false, SimulatesPlant = false };
        using MqttServer broker = await Broker(settings);
        await using Rig steady = await Rig.Start(Rig.Usual(10) with { Broker = settings.Broker, HasOwnBroker = false });
        using HttpClient client = new() { BaseAddress = new Uri($"http://{settings.Listen}/") };

        using Child first = Start(settings);
        await Rig.Until(() => KnownOf(client) is not null && File.Exists(settings.StateFile), "a known and saved quality");
        await Task.Delay(6000);   // a state is saved every five seconds
        await first.KillAsync();

        using Child second = Start(settings);
        await Rig.Until(() => KnownOf(client) is not null, "a known quality again");

        // One that knew nothing would need a minute of plant time, and would begin with the reading of that minute. Both are asked at the same time of the plant.
        (DateTimeOffset Time, double Quality)? expected = null, actual = null;
        await Rig.Until(
            () =>
            {
                (expected, actual) = (KnownOf(steady), KnownOf(client));
                return expected is { } one && actual is { } other && (one.Time - other.Time).Duration() <= TimeSpan.FromSeconds(2);
            },
            "both at the same time of the plant");
        Assert.Equal(expected!.Value.Quality, actual!.Value.Quality, 0.01);
    }

    [Fact]
    public async Task State_OfAnotherGenerator_IsRefusedAndTheServiceStarts()
    {
        LiveSettings settings = Rig.Usual(0);
        await File.WriteAllTextAsync(settings.StateFile, """{"generator":"another","time":null,"passes":[]}""");
        await using Rig rig = await Rig.Start(settings);
        await Rig.Until(() => Known(rig), "a known quality");
    }

    [Fact]
    public async Task Day_AtHighSpeed_NeedsNoMoreMemoryThanItsFirstHours()
    {
        const int sampling = 5;
        await using Rig rig = await Rig.Start(Rig.Usual(0) with { PlantSampling = sampling });
        PassWatch watch = rig.Part<PassWatch>();
        await Rig.Until(() => watch.Time is not null, "a first reading");
        DateTimeOffset begin = watch.Time!.Value;
        await Rig.Until(() => watch.Time > begin.AddHours(8), "eight hours of plant time", 400);
        long early = await Held();
        await Rig.Until(() => watch.Time > begin.AddHours(24), "a day of plant time", 900);
        long late = await Held();

        // 230,000 messages and 70,000 estimates of 300 bytes lie between: 20 to 70 MB, were they kept. The runtime's own pools of buffers grow with its
        // threads, by some megabytes on a busy machine.
        Assert.True(late < early + 20_000_000, $"{early} bytes after eight hours, {late} after a day");
        LinkView link = rig.Part<TagLink>().Look();
        Assert.Equal(0, link.MessagesRefused);
        Assert.True(link.MessagesRead > 20L * 86_000 / sampling, $"{link.MessagesRead} messages read");
    }

    // What is held at the least of ten looks: messages on their way come and go.
    private static async Task<long> Held()
    {
        long least = long.MaxValue;
        for (int i = 0; i < 10; i++)
        {
            await Task.Delay(100);
            least = Math.Min(least, GC.GetTotalMemory(forceFullCollection: true));
        }

        return least;
    }

    private static bool Known(Rig rig) => rig.Part<PassWatch>().Look(rig.Part<PassWatch>().NothingSeen()).Passes.All(static pass => pass.Quality.Value is not null);

    private static (DateTimeOffset Time, double Quality)? KnownOf(Rig rig)
    {
        WatchView view = rig.Part<PassWatch>().Look(rig.Part<PassWatch>().NothingSeen());
        return view.Time is { } time && view.Passes[0].Quality.Value is { } quality ? (time, quality) : null;
    }

    private static async Task<MqttServer> Broker(LiveSettings settings)
    {
        MqttServer broker = new MqttServerFactory().CreateMqttServer(new MqttServerOptionsBuilder().WithDefaultEndpoint().WithDefaultEndpointBoundIPAddress(IPAddress.Loopback).WithDefaultEndpointBoundIPV6Address(IPAddress.None).WithDefaultEndpointPort(settings.Broker.Port).Build());
        await broker.StartAsync();
        return broker;
    }

    private static (DateTimeOffset Time, double Quality)? KnownOf(HttpClient client)
    {
        try
        {
            using var document = JsonDocument.Parse(client.GetStringAsync(new Uri("passes", UriKind.Relative)).GetAwaiter().GetResult());
            JsonElement pass = document.RootElement.GetProperty("passes")[0], quality = pass.GetProperty("quality").GetProperty("value");
            return quality.ValueKind == JsonValueKind.Null ? null : (pass.GetProperty("time").GetDateTimeOffset(), quality.GetDouble());
        }
        catch (HttpRequestException)
        {
            return null;
        }
    }

    private static Child Start(LiveSettings settings)
    {
        string program = Path.Combine(AppContext.BaseDirectory, "LivePasses.dll");
        var start = new ProcessStartInfo("dotnet") { RedirectStandardOutput = true };
        foreach (string word in (string[])[program, "--broker", $"{settings.Broker.Host}:{settings.Broker.Port}", "--listen", settings.Listen.ToString(), "--topic", settings.Topics.Prefix, "--state", Path.GetDirectoryName(settings.StateFile)!]) start.ArgumentList.Add(word);
        var process = Process.Start(start)!;
        process.OutputDataReceived += static (_, _) => { };
        process.BeginOutputReadLine();
        return new(process);
    }

    /// <summary>A process that does not outlive its test.</summary>
    private sealed class Child(Process process) : IDisposable
    {
        public async Task KillAsync()
        {
            process.Kill(entireProcessTree: true);
            await process.WaitForExitAsync();
        }

        public void Dispose()
        {
            if (!process.HasExited) process.Kill(entireProcessTree: true);
            process.Dispose();
        }
    }
}
