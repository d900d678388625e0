using System.Text;

namespace TwoPhase.Units;

/// <summary>One spelling for what plants write in several ways.</summary>
internal static class Spelling
{
    /// <summary>Plain letters and digits for °, ², ³, µ, middle dots and hard spaces.</summary>
    public static string Plain(string text)
    {
        var plain = new StringBuilder(text.Length);
        foreach (char c in text.Trim())
        {
            if (c is '°' or 'º') continue;
            plain.Append(c switch { '³' => '3', '²' => '2', 'µ' or 'μ' => 'u', '·' or '⋅' => '.', '\u00a0' => ' ', _ => c });
        }

        return plain.ToString().Trim();
    }

    public static string WithoutSpaces(string text)
    {
        var compact = new StringBuilder(text.Length);
        foreach (char c in text)
        {
            if (c != ' ') compact.Append(c);
        }

        return compact.ToString();
    }

    public static bool Same(string a, string b) => string.Equals(a, b, StringComparison.OrdinalIgnoreCase);

    public static bool Starts(string text, string start) => text.StartsWith(start, StringComparison.OrdinalIgnoreCase);

    public static bool Ends(string text, string end) => text.EndsWith(end, StringComparison.OrdinalIgnoreCase);
}
