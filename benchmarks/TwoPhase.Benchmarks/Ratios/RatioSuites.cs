namespace TwoPhase.Benchmarks.Ratios;

/// <summary>The cases of one folder of the library; a new suite is one new class, found by reflection.</summary>
internal interface IRatioSuite
{
    /// <summary>The name on the command line.</summary>
    string Name { get; }

    IEnumerable<RatioCase> Cases();

    /// <summary>A call whose first time in a fresh process matters, and its number of states; null where none does.</summary>
    (string What, Action Call)? Cold => null;
}

internal static class RatioSuites
{
    public static IEnumerable<IRatioSuite> All { get; } =
        [.. typeof(IRatioSuite).Assembly.GetTypes()
            .Where(type => type.IsClass && type.IsAssignableTo(typeof(IRatioSuite)))
            .Select(type => (IRatioSuite)Activator.CreateInstance(type)!)
            .OrderBy(suite => suite.Name, StringComparer.Ordinal)];

    /// <summary>The suites of these names; all of them where no name is given.</summary>
    public static IEnumerable<IRatioSuite> Named(string[] names) => names.Length == 0 ? All : [.. names.Select(Named)];

    public static IRatioSuite Named(string name) =>
        All.FirstOrDefault(suite => string.Equals(suite.Name, name, StringComparison.OrdinalIgnoreCase))
        ?? throw new ArgumentException($"No suite '{name}'; there are: {string.Join(", ", All.Select(suite => suite.Name))}.", nameof(name));
}
