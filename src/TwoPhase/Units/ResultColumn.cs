namespace TwoPhase.Units;

/// <summary>Where a column of results is wanted, and in which unit. <c>default</c>, an empty column, says that it is not wanted.</summary>
/// <typeparam name="TUnit">A unit enumeration of UnitsNet, such as <c>TemperatureUnit</c>.</typeparam>
public readonly ref struct ResultColumn<TUnit>
    where TUnit : struct, Enum
{
    /// <summary>A column to be filled.</summary>
    /// <param name="values">Where the results go.</param>
    /// <param name="unit">The unit that they are wanted in.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="unit"/> is none, the default of its enumeration.</exception>
    public ResultColumn(Span<double> values, TUnit unit)
    {
        Unit = Column.Known(unit);
        Values = values;
    }

    /// <summary>Where the results go, in <see cref="Unit"/>.</summary>
    public Span<double> Values { get; }

    /// <summary>The unit of every result.</summary>
    public TUnit Unit { get; }

    /// <summary>Whether nothing is wanted.</summary>
    public bool IsEmpty => Values.IsEmpty;
}
