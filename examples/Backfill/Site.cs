using System.Security.Cryptography;
using System.Text;
using TwoPhase.Json;
using TwoPhase.Passes;

namespace Backfill;

/// <summary>The user's generator file: its passes, each with the columns that its history has.</summary>
internal sealed class Site
{
    private readonly Dictionary<string, MeasuredPass> _passes;

    private Site(SteamGenerator generator, string hash)
    {
        _passes = generator.Passes.ToDictionary(static pass => pass.Name, pass => new MeasuredPass(generator, pass), StringComparer.Ordinal);
        (Generator, Hash) = (generator, hash);
    }

    public SteamGenerator Generator { get; }

    /// <summary>SHA-256 of the file.</summary>
    public string Hash { get; }

    public MeasuredPass this[string pass] => _passes[pass];

    public static Site Read(string file)
    {
        if (!File.Exists(file)) throw new FileFault(file, "there is no such file");
        byte[] bytes = File.ReadAllBytes(file);
        try
        {
            return new(GeneratorJson.Read(Encoding.UTF8.GetString(bytes)), Convert.ToHexStringLower(SHA256.HashData(bytes)));
        }
        catch (Exception error) when (error is DocumentException or ArgumentException or FormatException)
        {
            throw new FileFault(file, error.Message);
        }
    }
}
