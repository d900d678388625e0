using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Advisory;

// Saved and taken up again without a bump.
public sealed partial class QualityEstimator
{
    /// <summary>What a later estimator of the same pass needs to go on from here.</summary>
    public EstimatorState Save()
    {
        StateFields state = StateFields.ToSave();
        List(state);
        return new(state.Saved);
    }

    /// <summary>Goes on from a saved state, as if nothing had been in between.</summary>
    /// <param name="state">The state.</param>
    /// <exception cref="FormatException">The state is of another pass, other options or another version; the message says what is missing. The estimator must then be made anew.</exception>
    public void Restore(EstimatorState state) => List(StateFields.ToTakeUp(Require.NotNull(state, nameof(state)).Fields));

    /// <summary>Everything that goes on, each once.</summary>
    internal void List(StateFields state)
    {
        _clock.List(state.Part("clock"));
        _flow.List(state.Part("feed flow"));
        _temperature.List(state.Part("feed temperature"));
        _pressure.List(state.Part("outlet pressure"));
        _firing.List(state.Part("firing"));
        _differential.List(state.Part("differential"));
        _heat.List(state.Part("heat"));
        _state.List(state.Part("operation"));
        _warm.List(state.Part("warm-up"));
        _skew.List(state.Part("skew"));
        _shadow.List(state.Part("shadow"));
        state.Number("heat in shadow", ref _heatInShadow);
        state.Number("heat per firing", ref _learntHeat);
        state.Number("running", ref _running);
        state.Number("error", ref _error);
        state.Number("motion", ref _motion);
        state.Number("lagged differential", ref _laggedDifferential);
        state.Number("meter factor", ref _meterFactor);
        state.Number("gain variance", ref _gainVariance);
        state.Number("moved", ref _moved);
        state.Number("disagrees since", ref _disagreesSince);
        state.Number("stir", ref _stir);
        state.Number("linger", ref _linger);
        state.Number("last moving", ref _lastMoving);
        int trust = (int)_trust;
        state.Number("trust", ref trust);
        _trust = (Trust)trust;

        // What was said last is not saved: a reading that comes again after the restart is told nothing.
        if (!state.IsSaving) _last = QualityEstimate.Nothing(default, double.NaN);
    }
}
