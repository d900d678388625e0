namespace TwoPhase.Numerics;

/// <summary>The numbers that a running calculation needs to go on where it stood, in a fixed order.</summary>
internal sealed class StateWriter
{
    private readonly List<double> _numbers = [];

    public void Add(double number) => _numbers.Add(number);

    public double[] ToArray() => [.. _numbers];
}

/// <summary>Reads back what a <see cref="StateWriter"/> wrote, in the same order.</summary>
internal sealed class StateReader(IReadOnlyList<double> numbers)
{
    private int _next;

    public bool IsAtEnd => _next == numbers.Count;

    /// <exception cref="FormatException">There is none left: the state is of another pass or another version.</exception>
    public double Next() => _next < numbers.Count ? numbers[_next++] : throw new FormatException($"A saved state of {numbers.Count} numbers is too short for this pass.");
}
