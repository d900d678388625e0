using TwoPhase.Units;

namespace TwoPhase.Passes;

/// <summary>A once-through steam generator: parallel passes in one fire.</summary>
public sealed partial class SteamGenerator
{
    private readonly Pass[] _passes;

    /// <summary>A generator from its passes.</summary>
    /// <param name="name">Name of the generator.</param>
    /// <param name="passes">Its passes, at least one, each with its own name.</param>
    /// <exception cref="ArgumentException">There is no pass, or two share a name.</exception>
    public SteamGenerator(string name, IEnumerable<Pass> passes)
    {
        Name = string.IsNullOrWhiteSpace(name) ? throw new ArgumentException("A generator needs a name.", nameof(name)) : name;
        _passes = [.. Require.NotNull(passes, nameof(passes))];
        if (_passes.Length == 0) throw new ArgumentException($"Generator '{name}' has no pass.", nameof(passes));
        if (_passes.GroupBy(pass => pass.Name).FirstOrDefault(group => group.Count() > 1) is { } twice) throw new ArgumentException($"Generator '{name}' has two passes named '{twice.Key}'.", nameof(passes));
    }

    /// <summary>Name of the generator.</summary>
    public string Name { get; }

    /// <summary>Its passes.</summary>
    public IReadOnlyList<Pass> Passes => _passes;

    /// <summary>How its fire heats it; null unless given.</summary>
    public HeatModel? Firing { get; private set; }

    /// <summary>The pass of a name; null when there is none.</summary>
    /// <param name="name">Name of the pass.</param>
    public Pass? Find(string name) => Array.Find(_passes, pass => pass.Name == name);

    /// <summary>The generator with its fire.</summary>
    /// <param name="model">From fuel and stack to absorbed heat.</param>
    public SteamGenerator WithFiring(HeatModel model)
    {
        var copy = (SteamGenerator)MemberwiseClone();
        copy.Firing = Require.NotNull(model, nameof(model));
        return copy;
    }

    internal object ToDump() => ToString();

    /// <summary>The name.</summary>
    public override string ToString() => Name;
}
