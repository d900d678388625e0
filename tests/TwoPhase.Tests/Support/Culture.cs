using System.Globalization;

namespace TwoPhase.Tests.Support;

/// <summary>Runs an action under another culture, one with a decimal comma for instance.</summary>
internal static class Culture
{
    public static void Run(string name, Action action)
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(name);
            action();
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
