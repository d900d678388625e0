using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Advisory;

/// <summary>Everything that an estimator needs to go on where it stood, after a restart or on another machine. Numbers only; meaningless to look at.</summary>
/// <remarks>Good for the same pass, meter and options in the same version of the library.</remarks>
public sealed class EstimatorState
{
    /// <summary>A state from its numbers, as they were saved.</summary>
    /// <param name="numbers">The numbers, in order.</param>
    public EstimatorState(IEnumerable<double> numbers) => Numbers = [.. Require.NotNull(numbers, nameof(numbers))];

    /// <summary>The numbers, in order; NaN and infinities among them.</summary>
    public IReadOnlyList<double> Numbers { get; }

    /// <summary>As text: the numbers in full, separated by blanks, invariant culture.</summary>
    public override string ToString() => string.Join(" ", Numbers.Select(static number => number.ToString("R", System.Globalization.CultureInfo.InvariantCulture)));

    /// <summary>A state from its text.</summary>
    /// <param name="text">What <see cref="ToString"/> wrote.</param>
    /// <exception cref="FormatException">The text is no state.</exception>
    public static EstimatorState Parse(string text) =>
        new(Require.NotNull(text, nameof(text)).Split([' '], StringSplitOptions.RemoveEmptyEntries).Select(static word => double.Parse(word, System.Globalization.CultureInfo.InvariantCulture)));

    internal StateReader Reader() => new(Numbers);
}
