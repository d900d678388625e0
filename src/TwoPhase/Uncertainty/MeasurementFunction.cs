using MathNet.Numerics.LinearAlgebra;
using TwoPhase.Units;

namespace TwoPhase.Uncertainty;

/// <summary>
/// A result that is computed from inputs, each known with some uncertainty: y = f(x₁, …, xₙ). <see cref="Propagate"/> gives
/// the budget by the law of propagation; <see cref="Simulate"/> gives the distribution by Monte Carlo.
/// </summary>
/// <remarks>Immutable, and safe to share between threads when the function is.</remarks>
public sealed partial class MeasurementFunction
{
    private readonly Func<InputValues, double> _function;
    private readonly UncertainInput[] _inputs;
    private readonly double[,] _correlation;
    private readonly double?[] _givenSensitivities;

    /// <summary>A result and the inputs that it is computed from.</summary>
    /// <param name="function">f: the result for one set of values, for example <c>v => v["flow"] / v["area"]</c>.</param>
    /// <param name="inputs">The inputs, each with a name of its own.</param>
    /// <exception cref="ArgumentException">No inputs, or two of one name.</exception>
    public MeasurementFunction(Func<InputValues, double> function, params UncertainInput[] inputs)
        : this(Require.NotNull(function, nameof(function)), Distinct(inputs), Identity(inputs.Length), new double?[inputs.Length])
    {
    }

    private MeasurementFunction(Func<InputValues, double> function, UncertainInput[] inputs, double[,] correlation, double?[] givenSensitivities)
    {
        _function = function;
        _inputs = inputs;
        _correlation = correlation;
        _givenSensitivities = givenSensitivities;
    }

    /// <summary>The inputs, in the order given.</summary>
    public IReadOnlyList<UncertainInput> Inputs => Array.AsReadOnly(_inputs);

    /// <summary>The same function with two inputs correlated.</summary>
    /// <param name="first">Name of one input.</param>
    /// <param name="second">Name of another.</param>
    /// <param name="coefficient">r, −1 to 1; 1 for two instruments that share one error.</param>
    /// <exception cref="ArgumentException">A name is unknown, or both are the same, or the coefficients together are impossible.</exception>
    public MeasurementFunction WithCorrelation(string first, string second, double coefficient)
    {
        Require.Within(coefficient, -1, 1, "Correlation coefficient r", Scale.None, nameof(coefficient));
        int i = _inputs.IndexOfName(first), j = _inputs.IndexOfName(second);
        if (i == j) throw new ArgumentException($"An input ('{first}') is not correlated with itself.", nameof(second));

        double[,] correlation = (double[,])_correlation.Clone();
        correlation[i, j] = correlation[j, i] = coefficient;
        double least = Matrix<double>.Build.DenseOfArray(correlation).Evd(Symmetricity.Symmetric).EigenValues.Min(value => value.Real);
        return least < -1e-10
            ? throw new ArgumentException($"With r({first}, {second}) = {Scale.None.Text(coefficient)} the correlations contradict each other: the matrix has an eigenvalue of {Scale.None.Text(least, "G3")}.", nameof(coefficient))
            : new(_function, _inputs, correlation, _givenSensitivities);
    }

    /// <summary>The same function with a sensitivity coefficient that is known, instead of one by central differences.</summary>
    /// <param name="name">Name of the input.</param>
    /// <param name="coefficient">c = ∂f/∂x at the estimates.</param>
    public MeasurementFunction WithSensitivity(string name, double coefficient)
    {
        double?[] given = (double?[])_givenSensitivities.Clone();
        given[_inputs.IndexOfName(name)] = Require.Finite(coefficient, "Sensitivity coefficient", Scale.None, nameof(coefficient));
        return new(_function, _inputs, _correlation, given);
    }

    private double Evaluate(double[] values)
    {
        double result = _function(new InputValues(_inputs, values));
        return double.IsNaN(result) || double.IsInfinity(result) ? throw NotFinite(result, values) : result;
    }

    private ArithmeticException NotFinite(double result, double[] values) =>
        new($"The function gave {Scale.None.Text(result)} at {string.Join(", ", _inputs.Select((input, i) => $"{input.Name} = {Scale.None.Text(values[i])}"))}.");

    private double[] Estimates() => Array.ConvertAll(_inputs, input => input.Estimate);

    private static UncertainInput[] Distinct(UncertainInput[] inputs)
    {
        if (Require.NotNull(inputs, nameof(inputs)).Length == 0) throw new ArgumentException("There are no inputs.", nameof(inputs));
        string? twice = inputs.GroupBy(input => Require.NotNull(input, nameof(inputs)).Name, StringComparer.Ordinal).FirstOrDefault(group => group.Count() > 1)?.Key;
        return twice is null ? (UncertainInput[])inputs.Clone() : throw new ArgumentException($"Two inputs are named '{twice}'.", nameof(inputs));
    }

    private static double[,] Identity(int size)
    {
        double[,] identity = new double[size, size];
        for (int i = 0; i < size; i++) identity[i, i] = 1;
        return identity;
    }
}
