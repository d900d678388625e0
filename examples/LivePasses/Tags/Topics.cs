namespace LivePasses.Tags;

/// <summary>Names of the topics, all under one prefix.</summary>
internal sealed class Topics
{
    // What a level of a topic cannot hold (MQTT 5.0, 4.7).
    private static readonly char[] Reserved = ['/', '+', '#', '\0'];

    public Topics(string prefix)
    {
        if (prefix.Length is 0 or > 200 || prefix.AsSpan().ContainsAny('+', '#', '\0') || prefix[0] == '$' || prefix.Split('/').Any(static level => level.Length == 0))
            throw new SettingsException($"--topic '{prefix}' is no beginning of a topic: 1 to 200 characters, no +, no #, no empty level, no $ at its start.");
        Prefix = prefix;
    }

    public string Prefix { get; }

    /// <summary>Whether the service is there, retained.</summary>
    public string Online => Prefix + "/service";

    public string Tag(string name) => $"{Prefix}/tags/{Level(name)}";

    public string Estimate(string pass) => $"{Prefix}/estimates/{Level(pass)}";

    /// <summary>A name in small letters, digits and hyphens.</summary>
    public static string Plain(string name)
    {
        string[] words = string.Concat(name.Select(static letter => char.IsAsciiLetterOrDigit(letter) ? char.ToLowerInvariant(letter) : ' ')).Split(' ', StringSplitOptions.RemoveEmptyEntries);
        return words.Length == 0 ? "generator" : string.Join('-', words);
    }

    private static string Level(string name) => string.Join('_', name.Split(Reserved));
}
