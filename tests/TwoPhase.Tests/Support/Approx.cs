using System.Globalization;
using System.Runtime.CompilerServices;

namespace TwoPhase.Tests.Support;

/// <summary>Comparisons whose failure says what was expected, what came, and how far apart; each is on record for the validation report.</summary>
internal static class Approx
{
    public static void Relative(
        double expected, double actual, double tolerance, string? what = null, [CallerFilePath] string file = "", [CallerLineNumber] int line = 0, [CallerArgumentExpression(nameof(actual))] string expression = "")
    {
        double error = Math.Abs(actual - expected) / Math.Abs(expected);
        ValidationReport.Add(file, line, new(what ?? expression, expected, actual, error, tolerance, IsRelative: true));
        Assert.True(expected == actual || error <= tolerance, Message(expected, actual, error, tolerance, "relative", what));
    }

    public static void Absolute(
        double expected, double actual, double tolerance, string? what = null, [CallerFilePath] string file = "", [CallerLineNumber] int line = 0, [CallerArgumentExpression(nameof(actual))] string expression = "")
    {
        double error = Math.Abs(actual - expected);
        ValidationReport.Add(file, line, new(what ?? expression, expected, actual, error, tolerance, IsRelative: false));
        Assert.True(error <= tolerance, Message(expected, actual, error, tolerance, "absolute", what));
    }

    private static string Message(double expected, double actual, double error, double tolerance, string kind, string? what) =>
        string.Format(CultureInfo.InvariantCulture, "{0}expected {1:R}, got {2:R}: {3} error {4:G3}, tolerance {5:G3}", what is null ? "" : what + ": ", expected, actual, kind, error, tolerance);
}
