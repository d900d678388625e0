namespace TwoPhase.Units;

/// <summary>Makes columns of data; the unit type is inferred: <c>Column.Of(samples, PressureUnit.Kilopascal)</c>.</summary>
public static class Column
{
    /// <summary>A column over samples that are all in one unit; nothing is copied.</summary>
    /// <typeparam name="TUnit">A unit enumeration of UnitsNet, such as <c>PressureUnit</c>.</typeparam>
    /// <param name="values">The samples; NaN marks a missing one.</param>
    /// <param name="unit">The unit of every sample.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="unit"/> is no member of its enumeration.</exception>
    public static Column<TUnit> Of<TUnit>(ReadOnlySpan<double> values, TUnit unit)
        where TUnit : struct, Enum => new(values, unit);

    /// <summary>A column to be filled with results in a unit.</summary>
    /// <typeparam name="TUnit">A unit enumeration of UnitsNet, such as <c>TemperatureUnit</c>.</typeparam>
    /// <param name="values">Where the results go.</param>
    /// <param name="unit">The unit that they are wanted in.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="unit"/> is no member of its enumeration.</exception>
    public static ResultColumn<TUnit> Into<TUnit>(Span<double> values, TUnit unit)
        where TUnit : struct, Enum => new(values, unit);
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
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="unit"/> is no member of its enumeration.</exception>
    public Column(ReadOnlySpan<double> values, TUnit unit)
    {
#if NET
        bool known = Enum.IsDefined(unit);
#else
        // Enum.IsDefined allocates there; no unit of UnitsNet is numbered zero.
        bool known = !EqualityComparer<TUnit>.Default.Equals(unit, default);
#endif
        if (!known)
            throw new ArgumentOutOfRangeException(nameof(unit), $"{unit} is no member of {typeof(TUnit).Name}.");
        Values = values;
        Unit = unit;
    }

    /// <summary>The samples, in <see cref="Unit"/>.</summary>
    public ReadOnlySpan<double> Values { get; }

    /// <summary>The unit of every sample.</summary>
    public TUnit Unit { get; }

    /// <summary>How many samples there are.</summary>
    public int Length => Values.Length;
}
