using System.Diagnostics;

namespace Backfill.Tests;

/// <summary>The program as a user runs it, and folders to compare.</summary>
internal static class Support
{
    public static async Task<(int Code, string Output, string Error)> RunAsync(params string[] args)
    {
        using var output = new StringWriter();
        using var error = new StringWriter();
        int code = await Program.RunAsync(args, output, error, isTerminal: false);
        return (code, output.ToString(), error.ToString());
    }

    /// <summary>The built program in a process of its own.</summary>
    public static Process Start(params string[] args) => Process.Start(new ProcessStartInfo("dotnet", [Path.Combine(AppContext.BaseDirectory, "Backfill.dll"), .. args]) { RedirectStandardOutput = true, RedirectStandardError = true })!;

    public static void Copy(string from, string to)
    {
        foreach (string file in Directory.EnumerateFiles(from, "*", SearchOption.AllDirectories))
        {
            string target = Path.Combine(to, Path.GetRelativePath(from, file));
            Directory.CreateDirectory(Path.GetDirectoryName(target)!);
            File.Copy(file, target);
        }
    }

    /// <summary>Every file and every folder, byte for byte.</summary>
    public static void AreEqual(string expected, string actual)
    {
        Assert.Equal(Names(expected), Names(actual));
        foreach (string file in Directory.EnumerateFiles(expected, "*", SearchOption.AllDirectories))
        {
            string name = Path.GetRelativePath(expected, file);
            Assert.True(File.ReadAllBytes(file).AsSpan().SequenceEqual(File.ReadAllBytes(Path.Combine(actual, name))), $"{name} differs");
        }
    }

    private static string[] Names(string folder) => [.. Directory.EnumerateFileSystemEntries(folder, "*", SearchOption.AllDirectories).Select(entry => Path.GetRelativePath(folder, entry)).Order(StringComparer.Ordinal)];
}
