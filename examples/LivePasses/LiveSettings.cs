using System.Globalization;
using System.Net;
using LivePasses.Tags;
using TwoPhase.Advisory;
using TwoPhase.Json;
using TwoPhase.Metering;
using TwoPhase.Passes;
using UnitsNet;

namespace LivePasses;

/// <summary>What the service was told, checked.</summary>
/// <param name="Generator">The generator; each pass with a meter and its tags.</param>
/// <param name="Broker">Where the broker is.</param>
/// <param name="Listen">Where the page is.</param>
/// <param name="Topics">Names of the topics.</param>
/// <param name="Speed">Plant seconds a second, 0 for as fast as can be followed.</param>
/// <param name="Options">How the quality is estimated.</param>
/// <param name="StateFile">File of the saved state.</param>
internal sealed record LiveSettings(SteamGenerator Generator, DnsEndPoint Broker, IPEndPoint Listen, Topics Topics, double Speed, EstimatorOptions Options, string StateFile)
{
    /// <summary>The environment variable of the broker's password: a command line can be read by everybody on the machine.</summary>
    public const string PasswordVariable = "LIVEPASSES_BROKER_PASSWORD";

    private const int OwnBrokerPort = 18830;

    /// <summary>Whether the broker is the service's own.</summary>
    public bool HasOwnBroker { get; init; }

    /// <summary>Whether the tags come from the simulated plant.</summary>
    public bool SimulatesPlant { get; init; }

    /// <summary>Seconds of the simulated plant between two values of a tag.</summary>
    public int PlantSampling { get; init; } = 1;

    /// <summary>User name at the broker; null for none.</summary>
    public string? User { get; init; }

    /// <summary>Whether the broker is spoken to by TLS.</summary>
    public bool UsesTls { get; init; }

    /// <summary>How long the last value of a tag stands for it; longer ago, the tag counts as missing.</summary>
    public TimeSpan Hold { get; init; } = TimeSpan.FromSeconds(10);

    public static LiveSettings Of(string? generatorFile, string? broker, string listen, string? topic, double speed, double limit, string stateFolder, bool plant = false, int sampling = 1)
    {
        if (plant && generatorFile is not null) throw new SettingsException("--plant with --generator: the simulated plant publishes invented values, under the tags of the invented generator only.");
        if (sampling is < 1 or > 10) throw new SettingsException($"--sampling {sampling} is not between 1 and 10.");
        if (generatorFile is not null && broker is null) throw new SettingsException("--generator needs --broker: the simulated plant is that of the invented generator.");
        SteamGenerator generator = Read(generatorFile);
        if (!(speed >= 0 && speed <= 1e6)) throw new SettingsException(string.Create(CultureInfo.InvariantCulture, $"--speed {speed} is not between 0 and 1,000,000."));
        if (!(limit > 0 && limit <= 1)) throw new SettingsException(string.Create(CultureInfo.InvariantCulture, $"--quality-limit {limit} is not above 0 and up to 1."));
        if (!IPEndPoint.TryParse(listen, out IPEndPoint? page) || !listen.Contains(':', StringComparison.Ordinal))
            throw new SettingsException($"--listen {listen} is no address:port such as 127.0.0.1:5080.");
        var topics = new Topics(topic ?? Topics.Plain(generator.Name));
        var options = EstimatorOptions.Default.WithQualityLimit(MassFraction.FromDecimalFractions(limit));
        return new(generator, BrokerOf(broker), page, topics, speed, options, Path.Combine(stateFolder, topics.Prefix.Replace('/', '_') + ".json")) { HasOwnBroker = broker is null, SimulatesPlant = plant || broker is null, PlantSampling = sampling };
    }

    private static DnsEndPoint BrokerOf(string? text)
    {
        if (text is null) return new(IPAddress.Loopback.ToString(), OwnBrokerPort);
        int colon = text.LastIndexOf(':');
        return colon > 0 && ushort.TryParse(text.AsSpan(colon + 1), NumberStyles.None, CultureInfo.InvariantCulture, out ushort port) && port > 0
            ? new(text[..colon], port)
            : throw new SettingsException($"--broker {text} is no host:port such as broker.example:1883.");
    }

    private static string? Lack(SteamGenerator generator, Pass pass) =>
        pass.Meter is null ? "has no meter"
        : pass.Heat is null ? "has no heated section"
        : pass.Interchanger is not null ? "has a feed interchanger, which the estimate does not model"
        : generator.TagsOf(pass)[PassSignal.FeedFlow] is null || generator.TagsOf(pass)[PassSignal.Differential] is null ? "names no tag of its feed flow or its differential"
        : null;

    private static SteamGenerator Read(string? file)
    {
        SteamGenerator generator;
        try
        {
            generator = GeneratorJson.Read(file is null ? Service.Resource("generator.json") : File.ReadAllText(file));
        }
        catch (Exception error) when (error is DocumentException or IOException or UnauthorizedAccessException)
        {
            throw new SettingsException($"{file}: {error.Message}");
        }

        foreach (Pass pass in generator.Passes)
        {
            if (Lack(generator, pass) is { } lack) throw new SettingsException($"{file}: pass '{pass.Name}' {lack}, so its quality cannot be estimated.");
        }

        return generator;
    }
}
