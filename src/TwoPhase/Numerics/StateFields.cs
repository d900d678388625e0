namespace TwoPhase.Numerics;

/// <summary>
/// The named numbers that a running calculation needs to go on where it stood. Whoever has such numbers lists each of them once, and the list
/// serves for saving and for taking up again.
/// </summary>
internal sealed class StateFields
{
    private readonly List<KeyValuePair<string, double[]>>? _saved;
    private readonly IReadOnlyDictionary<string, double[]>? _given;
    private readonly string _prefix;

    private StateFields(List<KeyValuePair<string, double[]>>? saved, IReadOnlyDictionary<string, double[]>? given, string prefix) => (_saved, _given, _prefix) = (saved, given, prefix);

    public static StateFields ToSave() => new([], null, "");

    public static StateFields ToTakeUp(IEnumerable<KeyValuePair<string, double[]>> given) => new(null, given.ToDictionary(static field => field.Key, static field => field.Value), "");

    /// <summary>Whether the list is for saving, and not for taking up again.</summary>
    public bool IsSaving => _saved is not null;

    /// <summary>What has been saved, in the order of the lists.</summary>
    public IReadOnlyList<KeyValuePair<string, double[]>> Saved => _saved ?? [];

    /// <summary>The fields of a part, whose names begin with its own.</summary>
    public StateFields Part(string name) => new(_saved, _given, $"{_prefix}{name}.");

    public void Number(string name, ref double value)
    {
        if (_saved is not null) Save(name, [value]);
        else value = Given(name, 1)[0];
    }

    public void Number(string name, ref int value)
    {
        double number = value;
        Number(name, ref number);
        value = (int)number;
    }

    public void Flag(string name, ref bool value)
    {
        double number = value ? 1 : 0;
        Number(name, ref number);
        value = number != 0;
    }

    /// <summary>As many numbers as the array has.</summary>
    public void Numbers(string name, double[] values)
    {
        if (_saved is not null) Save(name, [.. values]);
        else Given(name, values.Length).CopyTo(values, 0);
    }

    /// <summary>Numbers of something that writes and reads them in an order of its own.</summary>
    public void Block(string name, Action<StateWriter> save, Action<StateReader> load)
    {
        if (_saved is not null)
        {
            StateWriter to = new();
            save(to);
            Save(name, to.ToArray());
            return;
        }

        StateReader from = new(Given(name));
        load(from);
        if (!from.IsAtEnd) throw new FormatException($"A saved state has more numbers in '{_prefix}{name}' than this pass needs: it is of another pass.");
    }

    private void Save(string name, double[] numbers) => _saved!.Add(new(_prefix + name, numbers));

    private double[] Given(string name) => _given!.TryGetValue(_prefix + name, out double[]? numbers)
        ? numbers
        : throw new FormatException($"A saved state has no '{_prefix}{name}': it is of another kind of estimator.");

    private double[] Given(string name, int count)
    {
        double[] numbers = Given(name);
        return numbers.Length == count ? numbers : throw new FormatException($"A saved state has {numbers.Length} numbers in '{_prefix}{name}' where {count} belong: it is of another pass.");
    }
}
