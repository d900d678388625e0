using TwoPhase.Metering;
using TwoPhase.Units;

namespace TwoPhase.Json;

/// <summary>Names in documents: members of enumerations in camel case, and models by the name that the trade cites.</summary>
internal static class Names
{
    public static string Of<TEnum>(TEnum value)
        where TEnum : struct, Enum => Camel(value.ToString());

    public static TEnum Read<TEnum>(string? text, Place place)
        where TEnum : struct, Enum
    {
        string name = place.Required(text);
        string[] names = All<TEnum>();
        return Array.Exists(names, candidate => Camel(candidate) == name) && Enum.TryParse(name, ignoreCase: true, out TEnum value)
            ? value
            : throw place.Fault($"'{name}' is none of {string.Join(", ", names.Where(candidate => candidate != "None").Select(Camel))}");
    }

    /// <summary>A wet-steam model by its name, or by the start of it that no other model shares; signs and small words do not count.</summary>
    public static WetSteamModel WetModel(string text, Place place)
    {
        string wanted = Letters(text);
        WetSteamModel[] found = [.. WetSteamModel.All.Where(model => Letters(model.Name) == wanted)];
        if (found.Length == 0 && wanted.Length > 0) found = [.. WetSteamModel.All.Where(model => Letters(model.Name).StartsWith(wanted, StringComparison.Ordinal))];
        return found.Length == 1
            ? found[0]
            : throw place.Fault($"'{text}' is {(found.Length == 0 ? "none" : "more than one")} of {string.Join("; ", WetSteamModel.All.Select(model => model.Name))}");
    }

    /// <summary>Tags by their signals; a unit that a tag states must be one of its signal.</summary>
    public static TagSet<TSignal> Tags<TSignal>(Dictionary<string, string>? texts, TagSet<TSignal> tags, UnitBasis basis, Place place)
        where TSignal : struct, Enum
    {
        foreach (KeyValuePair<string, string> entry in texts ?? [])
        {
            Place member = place.Member(entry.Key);
            TSignal signal = Read<TSignal>(entry.Key, member);
            string text = member.Required(entry.Value);
            Tag tag = member.Make(() => Tag.Parse(text));
            if (tag.Unit.Length > 0) member.Make(() => tag.Map(SignalKinds.Of(signal), basis));
            tags = member.Make(() => tags.With(signal, tag));
        }

        return tags;
    }

    public static Dictionary<string, string>? Of<TSignal>(TagSet<TSignal> tags)
        where TSignal : struct, Enum => tags.Count == 0 ? null : tags.ToDictionary(entry => Of(entry.Key), entry => entry.Value.ToString());

    private static string[] All<TEnum>()
        where TEnum : struct, Enum =>
#if NET
        Enum.GetNames<TEnum>();
#else
        Enum.GetNames(typeof(TEnum));
#endif

    private static string Camel(string name) => char.ToLowerInvariant(name[0]) + name[1..];

    private static string Letters(string name) =>
        new([.. name.Split(' ', ',', '-').Where(word => word != "and").SelectMany(word => word).Where(char.IsLetterOrDigit).Select(char.ToLowerInvariant)]);
}
