using TwoPhase.Metering;
using TwoPhase.Units;

namespace TwoPhase.Advisory;

/// <summary>The history of one pass in columns, as a historian hands it out: a time and five numbers for each sample, NaN where one is missing.</summary>
public sealed class PassColumns
{
    private readonly ReadingFormat _format;
    private readonly ReadOnlyMemory<DateTimeOffset> _times;
    private readonly ReadOnlyMemory<double> _flow, _feedTemperature, _firing, _pressure, _differential;

    /// <summary>Columns of equal length; they are not copied.</summary>
    /// <param name="format">The units of the columns.</param>
    /// <param name="times">When, in the order in which the samples are taken.</param>
    /// <param name="flow">Feed flow.</param>
    /// <param name="feedTemperature">Feed temperature.</param>
    /// <param name="firing">Firing.</param>
    /// <param name="pressure">Outlet pressure.</param>
    /// <param name="differential">Differential of the outlet meter.</param>
    /// <exception cref="ArgumentException">A column is of another length than the times.</exception>
    public PassColumns(ReadingFormat format, ReadOnlyMemory<DateTimeOffset> times, ReadOnlyMemory<double> flow, ReadOnlyMemory<double> feedTemperature, ReadOnlyMemory<double> firing, ReadOnlyMemory<double> pressure, ReadOnlyMemory<double> differential)
    {
        _format = Require.NotNull(format, nameof(format));
        _times = times;
        _flow = Column(flow, nameof(flow));
        _feedTemperature = Column(feedTemperature, nameof(feedTemperature));
        _firing = Column(firing, nameof(firing));
        _pressure = Column(pressure, nameof(pressure));
        _differential = Column(differential, nameof(differential));
    }

    /// <summary>Number of samples.</summary>
    public int Count => _times.Length;

    /// <summary>One sample.</summary>
    internal PassReading this[int index] =>
        _format.Read(_times.Span[index], _flow.Span[index], _feedTemperature.Span[index], _firing.Span[index], _pressure.Span[index], _differential.Span[index]);

    private ReadOnlyMemory<double> Column(ReadOnlyMemory<double> column, string name) => column.Length == _times.Length
        ? column
        : throw new ArgumentException($"The column has {column.Length} samples where there are {_times.Length} times.", name);
}
