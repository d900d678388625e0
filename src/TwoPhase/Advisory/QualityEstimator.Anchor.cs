using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

// What an independent test of the quality says of the meter.
public sealed partial class QualityEstimator
{
    /// <summary>
    /// Takes an independent test of the quality, by solids or by the separator, at about the time of the last reading: it tells heat from meter,
    /// and narrows the absolute uncertainty.
    /// </summary>
    /// <remarks>
    /// With a prior variance V of the logarithm of the meter's constant and a test that finds it off by d with variance T, both by Bayes' rule for
    /// normal laws: b ← b + d V/(V + T), V ← V T/(V + T).
    /// </remarks>
    /// <param name="quality">Quality by the test.</param>
    /// <param name="standardUncertainty">Its standard uncertainty, greater than zero.</param>
    /// <returns>Whether it was taken: an estimate must be there, and at rest.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The quality is outside 0 to 1, or the uncertainty is not greater than zero.</exception>
    public bool Anchor(MassFraction quality, MassFraction standardUncertainty)
    {
        double tested = Require.Within(quality.Si(), 0, 1, "Tested quality", Scale.None, nameof(quality));
        double uncertainty = Require.Positive(standardUncertainty.Si(), "Standard uncertainty of the test", Scale.None, nameof(standardUncertainty));
        if (!_shadow.Runs || !(_differential.IsKnown && Firing > 0) || _trust is Trust.Settling or Trust.ReadsHigh or Trust.ReadsLow) return false;
        double flow = Math.Exp(_flow.Level), pressure = _pressure.Level, byDifferential = _shadow.QualityByDifferential;
        double off = _differential.Level - _meterFactor - Math.Log(Meter.DifferentialOrNaN(flow, pressure, tested)), variance = uncertainty * uncertainty / (byDifferential * byDifferential);

        // A gap against the base says that meter or heat has moved by so much more than the budget knows.
        double gap = double.IsNaN(_disagreesSince) ? 0 : _heat.Gap * DifferentialByHeat, prior = _gainVariance + (gap * gap);
        _meterFactor += off * prior / (prior + variance);
        _gainVariance = prior * variance / (prior + variance);
        double known = Meter.QualityOrNaN(flow, pressure, Math.Exp(_differential.Level - _meterFactor));
        _heat.Rebase(Math.Log(_shadow.HeatFor(known, flow, _temperature.Level, pressure) / (Firing * _learntHeat)));
        _heatInShadow = _heat.Factor;

        // The water in the pass has been what the test says all the time.
        _shadow.Start(Inputs());
        _disagreesSince = double.NaN;
        return true;
    }
}
