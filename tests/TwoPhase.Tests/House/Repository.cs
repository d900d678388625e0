namespace TwoPhase.Tests.House;

/// <summary>The checkout that the tests run from.</summary>
internal static class Repository
{
    public static string Root { get; } = Find();

    public static string Read(string path) => File.ReadAllText(Path.Combine(Root, path));

    public static IEnumerable<string> LibrarySources() => Directory
        .EnumerateFiles(Path.Combine(Root, "src", "TwoPhase"), "*.cs", SearchOption.AllDirectories)
        .Where(path => !path.Split(Path.DirectorySeparatorChar).Any(part => part is "bin" or "obj"));

    private static string Find()
    {
        DirectoryInfo? folder = new(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "TwoPhase.sln"))) folder = folder.Parent;
        return folder?.FullName ?? throw new InvalidOperationException("The tests run from a checkout: TwoPhase.sln was not found above them.");
    }
}
