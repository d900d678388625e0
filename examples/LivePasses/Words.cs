using System.Net;

namespace LivePasses;

/// <summary>What the service says on its console.</summary>
internal static partial class Words
{
    public static void Begins(ILogger log, LiveSettings settings)
    {
        string broker = $"{settings.Broker.Host}:{settings.Broker.Port}{(settings.HasOwnBroker ? ", its own, on loopback only" : "")}";
        Page(log, settings.Listen, settings.Generator.Name);
        Broker(log, broker, settings.Topics.Prefix);
        if (settings.SimulatesPlant) Simulated(log, settings.Speed);
        if (!IPAddress.IsLoopback(settings.Listen.Address)) Open(log, settings.Listen);
        if (settings.User is not null && !settings.UsesTls) Clear(log);
        Advisory(log);
    }

    [LoggerMessage(Level = LogLevel.Warning, Message = "The password goes to the broker unencrypted: use --tls.")]
    private static partial void Clear(ILogger log);

    [LoggerMessage(Level = LogLevel.Information, Message = "Page of {Generator}: http://{Listen}/")]
    private static partial void Page(ILogger log, IPEndPoint listen, string generator);

    [LoggerMessage(Level = LogLevel.Information, Message = "Broker {Broker}; tags under {Prefix}/tags, estimates under {Prefix}/estimates")]
    private static partial void Broker(ILogger log, string broker, string prefix);

    [LoggerMessage(Level = LogLevel.Information, Message = "The tags are those of a simulated, invented plant at {Speed} times its time (0: as fast as can be followed).")]
    private static partial void Simulated(ILogger log, double speed);

    [LoggerMessage(Level = LogLevel.Warning, Message = "The page is open beyond this machine ({Listen}): whoever reaches it reads it, without a password.")]
    private static partial void Open(ILogger log, IPEndPoint listen);

    [LoggerMessage(Level = LogLevel.Information, Message = "Advisory only: it writes to no control system and replaces no trip, no limit and no test of the plant.")]
    private static partial void Advisory(ILogger log);

    [LoggerMessage(Level = LogLevel.Information, Message = "{Time:u} {Sentence}")]
    public static partial void Pass(ILogger log, DateTimeOffset? time, string sentence);

    [LoggerMessage(Level = LogLevel.Information, Message = "Connected to the broker")]
    public static partial void Connected(ILogger log);

    [LoggerMessage(Level = LogLevel.Warning, Message = "No broker at {Host}:{Port} ({Reason}); trying again")]
    public static partial void NoBroker(ILogger log, string host, int port, string reason);

    [LoggerMessage(Level = LogLevel.Information, Message = "Goes on from the state saved at {Time:u}")]
    public static partial void Restored(ILogger log, DateTimeOffset time);

    [LoggerMessage(Level = LogLevel.Warning, Message = "Starts anew: {File} cannot be used ({Reason})")]
    public static partial void StartsAnew(ILogger log, string file, string reason);

    [LoggerMessage(Level = LogLevel.Warning, Message = "The state could not be saved: {Reason}")]
    public static partial void NotSaved(ILogger log, string reason);
}
