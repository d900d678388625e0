namespace TwoPhase.Uncertainty;

/// <summary>One set of values of the named inputs, as a measurement function receives it.</summary>
/// <remarks>Valid during the call only: the same store is filled again for the next trial.</remarks>
public readonly struct InputValues : IEquatable<InputValues>
{
    private readonly IReadOnlyList<UncertainInput> _inputs;
    private readonly double[] _values;

    internal InputValues(IReadOnlyList<UncertainInput> inputs, double[] values) => (_inputs, _values) = (inputs, values);

    /// <summary>The value of the input at a position, in the order in which the inputs were given.</summary>
    /// <param name="index">Position, from 0.</param>
    public double this[int index] => _values[index];

    /// <summary>The value of the input with a name.</summary>
    /// <param name="name">The name, case-sensitive.</param>
    /// <exception cref="ArgumentException">No input has that name.</exception>
    public double this[string name] => _values[_inputs.IndexOfName(name)];

    /// <summary>Number of inputs.</summary>
    public int Count => _values?.Length ?? 0;

    /// <inheritdoc/>
    public bool Equals(InputValues other) => ReferenceEquals(_values, other._values);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is InputValues other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => _values?.GetHashCode() ?? 0;

    /// <summary>Whether two are the same store.</summary>
    public static bool operator ==(InputValues left, InputValues right) => left.Equals(right);

    /// <summary>Whether two are different stores.</summary>
    public static bool operator !=(InputValues left, InputValues right) => !left.Equals(right);
}

internal static class UncertainInputs
{
    public static int IndexOfName(this IReadOnlyList<UncertainInput> inputs, string name)
    {
        for (int i = 0; i < inputs.Count; i++)
            if (string.Equals(inputs[i].Name, name, StringComparison.Ordinal)) return i;
        throw new ArgumentException($"No input is named '{name}'; there are: {string.Join(", ", inputs.Select(input => input.Name))}.", nameof(name));
    }
}
