using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Advisory;

// Saved and taken up again without a bump.
public sealed partial class QualityEstimator
{
    // Changes with every change of what is saved.
    private const double StateVersion = 1;

    /// <summary>What a later estimator of the same pass needs to go on from here.</summary>
    public EstimatorState Save()
    {
        var to = new StateWriter();
        to.Add(StateVersion);
        _clock.Save(to);
        _flow.Save(to);
        _temperature.Save(to);
        _pressure.Save(to);
        _firing.Save(to);
        _differential.Save(to);
        _heat.Save(to);
        _state.Save(to);
        foreach (double number in (double[])[_heatInShadow, _learntHeat, _running, _error, _motion, _laggedDifferential, _meterFactor, _gainVariance, _moved, _disagreesSince, _stir, _linger, _lastMoving, (double)_trust]) to.Add(number);
        _shadow.Save(to);
        return new(to.ToArray());
    }

    /// <summary>Goes on from a saved state, as if nothing had been in between.</summary>
    /// <param name="state">The state.</param>
    /// <exception cref="FormatException">The state is of another pass, other options or another version.</exception>
    public void Restore(EstimatorState state)
    {
        StateReader from = Require.NotNull(state, nameof(state)).Reader();
        double version = from.Next();
        if (version != StateVersion) throw new FormatException(FormattableString.Invariant($"A saved state of version {version} is not of this library, which writes version {StateVersion}."));
        _clock.Load(from);
        _flow.Load(from);
        _temperature.Load(from);
        _pressure.Load(from);
        _firing.Load(from);
        _differential.Load(from);
        _heat.Load(from);
        _state.Load(from);
        (_heatInShadow, _learntHeat, _running, _error, _motion) = (from.Next(), from.Next(), from.Next(), from.Next(), from.Next());
        (_laggedDifferential, _meterFactor, _gainVariance, _moved, _disagreesSince, _stir, _linger, _lastMoving) = (from.Next(), from.Next(), from.Next(), from.Next(), from.Next(), from.Next(), from.Next(), from.Next());
        _trust = (Trust)from.Next();
        _shadow.Load(from);
        if (!from.IsAtEnd) throw new FormatException("A saved state is longer than this pass needs: it is of another pass.");
        _warm.Clear();
        _last = QualityEstimate.Nothing(default, double.NaN);
    }
}
