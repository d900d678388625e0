namespace TwoPhase.Units;

/// <summary>Guards of the public doors: each message names the quantity, its value with unit, and the limit.</summary>
internal static class Require
{
    public static double Finite(double value, string quantity, Scale scale, string parameter) =>
        double.IsNaN(value) || double.IsInfinity(value)
            ? throw OutOfRange(value, quantity, scale, parameter, "must be a finite number")
            : value;

    public static double Positive(double value, string quantity, Scale scale, string parameter) =>
        value > 0 && !double.IsInfinity(value)
            ? value
            : throw OutOfRange(value, quantity, scale, parameter, "must be greater than zero");

    public static double NotNegative(double value, string quantity, Scale scale, string parameter) =>
        value >= 0 && !double.IsInfinity(value)
            ? value
            : throw OutOfRange(value, quantity, scale, parameter, "must not be negative");

    public static double Within(double value, double low, double high, string quantity, Scale scale, string parameter) =>
        value >= low && value <= high
            ? value
            : throw OutOfRange(value, quantity, scale, parameter, $"must lie between {scale.Text(low)} and {scale.Text(high)}");

    public static double Below(double value, double limit, string quantity, Scale scale, string parameter) =>
        value < limit
            ? value
            : throw OutOfRange(value, quantity, scale, parameter, $"must be below {scale.Text(limit)}");

    public static T NotNull<T>(T? value, string parameter)
        where T : class =>
        value ?? throw new ArgumentNullException(parameter);

    public static ArgumentOutOfRangeException OutOfRange(double value, string quantity, Scale scale, string parameter, string limit) =>
        new(parameter, $"{quantity} = {scale.Text(value)} {limit}.");
}
