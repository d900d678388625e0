using System.CommandLine;

namespace LivePasses;

/// <summary>The command line.</summary>
internal static class Program
{
    private const int Done = 0, BadSettings = 2;

    public static async Task<int> Main(string[] args)
    {
        Option<FileInfo?> generator = new("--generator") { Description = "JSON file of the generator; the invented one when left out." };
        Option<string?> broker = new("--broker") { Description = "host:port of a broker that carries the tags. Left out, a broker of its own and a simulated plant run on loopback." };
        Option<string?> user = new("--user") { Description = $"User name at the broker; its password comes from the environment variable {LiveSettings.PasswordVariable}." };
        Option<bool> tls = new("--tls") { Description = "Speak TLS to the broker." };
        Option<bool> plant = new("--plant") { Description = "Run the simulated plant against the broker of --broker too. Never at a broker that carries a real plant." };
        Option<double> speed = new("--speed") { Description = "Seconds of the simulated plant in a second; 0 for as fast as the estimates follow.", DefaultValueFactory = _ => 20 };
        Option<int> sampling = new("--sampling") { Description = "Seconds of the simulated plant between two values of a tag.", DefaultValueFactory = _ => 1 };
        Option<string> listen = new("--listen") { Description = "address:port of the page.", DefaultValueFactory = _ => "127.0.0.1:5080" };
        Option<string?> topic = new("--topic") { Description = "First part of every topic; the generator's name when left out." };
        Option<double> limit = new("--quality-limit") { Description = "The site's own limit of quality, 0 to 1.", DefaultValueFactory = _ => 0.80 };
        Option<DirectoryInfo> state = new("--state") { Description = "Folder of the saved state.", DefaultValueFactory = _ => new DirectoryInfo("out/live") };
        RootCommand command = new("Estimates the quality of every pass of a steam generator from tags that arrive by MQTT, publishes the estimates and shows them on a page. Advisory only: it writes to no control system and is no safety function.")
        {
            generator, broker, user, tls, plant, speed, sampling, listen, topic, limit, state,
        };
        command.SetAction((parsed, cancellation) => Run(
            () => LiveSettings.Of(
                parsed.GetValue(generator)?.FullName,
                parsed.GetValue(broker),
                parsed.GetValue(listen)!,
                parsed.GetValue(topic),
                parsed.GetValue(speed),
                parsed.GetValue(limit),
                parsed.GetValue(state)!.FullName,
                parsed.GetValue(plant),
                parsed.GetValue(sampling)) with
            {
                User = parsed.GetValue(user),
                UsesTls = parsed.GetValue(tls),
            },
            cancellation));
        return await command.Parse(args).InvokeAsync();
    }

    private static async Task<int> Run(Func<LiveSettings> settings, CancellationToken cancellation)
    {
        try
        {
            await using WebApplication application = Service.Build(settings());
            await application.RunAsync(cancellation);
            return Done;
        }
        catch (Exception fault) when (fault is SettingsException or IOException or System.Net.Sockets.SocketException)
        {
            await Console.Error.WriteLineAsync(fault.Message);
            return BadSettings;
        }
    }
}
