using System.Runtime.CompilerServices;

namespace TwoPhase.Units;

/// <summary>Makes columns of data; the unit type is inferred: <c>Column.Of(samples, PressureUnit.Kilopascal)</c>.</summary>
public static class Column
{
    /// <summary>A column over samples that are all in one unit; nothing is copied.</summary>
    /// <typeparam name="TUnit">A unit enumeration of UnitsNet, such as <c>PressureUnit</c>.</typeparam>
    /// <param name="values">The samples; NaN marks a missing one.</param>
    /// <param name="unit">The unit of every sample.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="unit"/> is none, the default of its enumeration.</exception>
    public static Column<TUnit> Of<TUnit>(ReadOnlySpan<double> values, TUnit unit)
        where TUnit : struct, Enum => new(values, unit);

    /// <summary>A column to be filled with results in a unit.</summary>
    /// <typeparam name="TUnit">A unit enumeration of UnitsNet, such as <c>TemperatureUnit</c>.</typeparam>
    /// <param name="values">Where the results go.</param>
    /// <param name="unit">The unit that they are wanted in.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="unit"/> is none, the default of its enumeration.</exception>
    public static ResultColumn<TUnit> Into<TUnit>(Span<double> values, TUnit unit)
        where TUnit : struct, Enum => new(values, unit);

    /// <summary>
    /// The unit, unless it is zero, which none is. Any other number that no unit has is refused by whoever reads the column: to look it up
    /// among the names, by reflection, costs a fresh process a millisecond for each kind of unit.
    /// </summary>
    internal static TUnit Known<TUnit>(TUnit unit)
        where TUnit : struct, Enum
    {
        long number = 0;
        Unsafe.As<long, TUnit>(ref number) = unit;
        return number == 0 ? throw NoUnit(typeof(TUnit), nameof(unit)) : unit;
    }

    private static ArgumentOutOfRangeException NoUnit(Type enumeration, string parameter) => new(parameter, $"0 is no member of {enumeration.Name}.");
}

/// <summary>
/// A column of data: a span of numbers and the unit that they are in, named once, so that history is as safe in its units as a
/// single quantity. Nothing is copied; a missing sample is NaN.
/// </summary>
/// <typeparam name="TUnit">A unit enumeration of UnitsNet, such as <c>PressureUnit</c>.</typeparam>
public readonly ref struct Column<TUnit>
    where TUnit : struct, Enum
{
    /// <summary>A column over samples that are all in one unit.</summary>
    /// <param name="values">The samples; NaN marks a missing one.</param>
    /// <param name="unit">The unit of every sample.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="unit"/> is none, the default of its enumeration.</exception>
    public Column(ReadOnlySpan<double> values, TUnit unit)
    {
        Unit = Column.Known(unit);
        Values = values;
    }

    /// <summary>The samples, in <see cref="Unit"/>.</summary>
    public ReadOnlySpan<double> Values { get; }

    /// <summary>The unit of every sample.</summary>
    public TUnit Unit { get; }

    /// <summary>How many samples there are.</summary>
    public int Length => Values.Length;
}
