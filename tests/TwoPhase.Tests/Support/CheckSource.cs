using System.Collections.Concurrent;
using System.Text.RegularExpressions;
using TwoPhase.Tests.House;

namespace TwoPhase.Tests.Support;

/// <summary>The source that a test names for its values: the head of its table, the comments of its method, or the words above its class.</summary>
internal static partial class CheckSource
{
    private static readonly ConcurrentDictionary<string, string[]> Files = new();

    /// <summary>The source; empty where the test names none, as a check of the library against itself.</summary>
    public static string Of(string file, int line, string table)
    {
        if (table.Length > 0) return OfTable(table);
        string[] lines = Files.GetOrAdd(file, static path => File.ReadAllLines(Path.Combine(Repository.Root, path)));
        int start = line - 1;
        while (start > 0 && !Method().IsMatch(lines[start])) start--;
        string inside = Comments(lines[start..line]), above = Comments(Above(lines, start)), words = $"{above} {inside}".Trim();
        if (Named().IsMatch(words)) return words;
        int type = Array.FindIndex(lines, static text => Type().IsMatch(text));
        string ofClass = type < 0 ? "" : Comments(Above(lines, type));
        return Named().IsMatch(ofClass) ? ofClass : "";
    }

    private static string OfTable(string path) => string.Join(' ', File.ReadLines(Path.Combine(AppContext.BaseDirectory, path)).TakeWhile(static text => text.StartsWith('#')).Select(static text => text.TrimStart('#', ' ')));

    private static string[] Above(string[] lines, int line)
    {
        int first = line;
        while (first > 0 && Head().IsMatch(lines[first - 1])) first--;
        return lines[first..line];
    }

    private static string Comments(string[] lines) => string.Join(' ', lines.Select(static text => Comment().Match(text)).Where(static match => match.Success).Select(static match => Markup().Replace(match.Groups["text"].Value, "").Trim()));

    [GeneratedRegex(@"^    (public|private|internal) .*\(")]
    private static partial Regex Method();

    [GeneratedRegex(@"^(public|internal) .*class ")]
    private static partial Regex Type();

    [GeneratedRegex(@"^\s*(//|\[)")]
    private static partial Regex Head();

    [GeneratedRegex("(^|[^:\"])//+(?<text>.*)$")]
    private static partial Regex Comment();

    [GeneratedRegex("</?[a-z]+[^>]*>")]
    private static partial Regex Markup();

    [GeneratedRegex(@"IAPWS|\bR\d+-\d\d|\bSR\d|ISO|IEC|VDI|NIST|JCGM|API |python3-|library|[Ss]ource|[Tt]able \d|handbook|Handbook|worked example|from memory|common practice|\b(18|19|20)\d\d\b")]
    private static partial Regex Named();
}
