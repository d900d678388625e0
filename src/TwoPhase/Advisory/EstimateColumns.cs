namespace TwoPhase.Advisory;

/// <summary>What an estimator made of the history of one pass, in columns as long as the history: mass fractions, NaN where nothing is known.</summary>
public sealed class EstimateColumns
{
    private readonly double[] _indicated, _quality, _motion, _absolute;
    private readonly Trust[] _trust;

    internal EstimateColumns(int count)
    {
        (_indicated, _quality, _motion, _absolute) = (new double[count], new double[count], new double[count], new double[count]);
        _trust = new Trust[count];
    }

    /// <summary>Quality as flow and meter indicate it.</summary>
    public ReadOnlyMemory<double> Indicated => _indicated;

    /// <summary>Quality as it is estimated.</summary>
    public ReadOnlyMemory<double> Quality => _quality;

    /// <summary>Its standard uncertainty by motion and noise.</summary>
    public ReadOnlyMemory<double> Motion => _motion;

    /// <summary>Its standard uncertainty with all of the meter's.</summary>
    public ReadOnlyMemory<double> Absolute => _absolute;

    /// <summary>Whether the indicated quality could be believed.</summary>
    public ReadOnlyMemory<Trust> Trust => _trust;

    /// <summary>Where the estimator stood after the last sample, to go on with the next part of the history.</summary>
    public EstimatorState EndState { get; internal set; } = new([]);

    internal void Set(int index, in QualityEstimate estimate) =>
        (_indicated[index], _quality[index], _motion[index], _absolute[index], _trust[index]) = (estimate.RawIndicated, estimate.RawQuality, estimate.RawMotion, estimate.RawAbsolute, estimate.Trust);
}
