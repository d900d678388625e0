using Backfill.Plan;

namespace Backfill.Work;

/// <summary>An output folder held for one share of one way of doing the work.</summary>
internal sealed class Claim : IDisposable
{
    private const string SettingsFile = "_settings.txt";

    private readonly FileStream _lock;

    private Claim(FileStream held) => _lock = held;

    /// <summary>Takes the folder; refuses where what stands in it was made otherwise, or another process is at the same share.</summary>
    public static Claim Take(string root, Site site, ChainPlan plan, Share share)
    {
        Directory.CreateDirectory(root);
        string settings = FormattableString.Invariant($"generator {site.Hash}\nchain-days {plan.ChainDays}\nwarm-up-days {plan.WarmUpDays}\n");
        FileStream held = Hold(root, share);
        try
        {
            string file = Path.Combine(root, SettingsFile), aside = Path.Combine(root, FormattableString.Invariant($"{SettingsFile}.{share.Number}-of-{share.Of}.partial"));
            if (!File.Exists(file))
            {
                File.WriteAllText(aside, settings);
                File.Move(aside, file, overwrite: true);
            }

            if (File.ReadAllText(file) != settings) throw new FileFault(root, $"what stands in it was made with another generator file or other chains ({SettingsFile}); choose another --out, or remove the folder");
            return new(held);
        }
        catch
        {
            held.Dispose();
            throw;
        }
    }

    public void Dispose() => _lock.Dispose();

    private static FileStream Hold(string root, Share share)
    {
        try
        {
            return new(Path.Combine(root, FormattableString.Invariant($"_lock-{share.Number}-of-{share.Of}")), FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None, 1, FileOptions.DeleteOnClose);
        }
        catch (IOException)
        {
            throw new FileFault(root, $"another process is at share {share} of it");
        }
    }
}
