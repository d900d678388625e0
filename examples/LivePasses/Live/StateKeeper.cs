using System.Text.Json;

namespace LivePasses.Live;

/// <summary>Keeps the state of the estimators on disk, so that a service that was killed goes on where it stood.</summary>
internal sealed class StateKeeper(LiveSettings settings, PassWatch watch, ILogger<StateKeeper> log) : BackgroundService
{
    private static readonly TimeSpan Every = TimeSpan.FromSeconds(5);
    private static readonly JsonSerializerOptions Options = new(JsonSerializerDefaults.Web) { WriteIndented = true };

    public override Task StartAsync(CancellationToken cancellationToken)
    {
        Restore();
        return base.StartAsync(cancellationToken);
    }

    protected override async Task ExecuteAsync(CancellationToken stoppingToken)
    {
        using var timer = new PeriodicTimer(Every);
        try
        {
            while (await timer.WaitForNextTickAsync(stoppingToken)) Save();
        }
        catch (OperationCanceledException)
        {
            Save();
        }
    }

    private void Restore()
    {
        try
        {
            if (!File.Exists(settings.StateFile)) return;
            SavedState saved = JsonSerializer.Deserialize<SavedState>(File.ReadAllText(settings.StateFile), Options) ?? throw new FormatException("it is empty");
            watch.Restore(saved);
            if (saved.Time is { } time) Words.Restored(log, time);
        }
        catch (Exception fault) when (fault is JsonException or FormatException or IOException or UnauthorizedAccessException)
        {
            Words.StartsAnew(log, settings.StateFile, fault.Message);
        }
    }

    // Written aside, then renamed: a kill leaves the old state or the new one, never half of one.
    private void Save()
    {
        if (watch.Time is null) return;
        try
        {
            Directory.CreateDirectory(Path.GetDirectoryName(settings.StateFile)!);
            string aside = settings.StateFile + ".part";
            File.WriteAllText(aside, JsonSerializer.Serialize(watch.Save(), Options));
            File.Move(aside, settings.StateFile, overwrite: true);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            Words.NotSaved(log, fault.Message);
        }
    }
}
