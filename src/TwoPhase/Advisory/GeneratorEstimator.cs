using TwoPhase.Metering;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>The passes of a generator together: what all of them show is heat or a common tag, what one alone shows is that pass.</summary>
/// <remarks>
/// <para>Each pass has its <see cref="QualityEstimator"/>. Their gaps against their bases are split into the median over all passes, which one
/// pass gone wrong hardly moves, and what each has over that. From three known passes on.</para>
/// <para>One thread each; nothing is allocated per update. Advisory only.</para>
/// </remarks>
public sealed class GeneratorEstimator
{
    private const int FewestPasses = 3;

    private readonly QualityEstimator[] _estimators;
    private readonly QualityEstimate[] _estimates;
    private readonly PassShift[] _shifts;
    private readonly double[] _gaps;
    private readonly double _limit;
    private double _common = double.NaN;
    private bool _commonIsFar;

    /// <summary>An estimator that has seen nothing yet.</summary>
    /// <param name="generator">The generator; each pass with its meter.</param>
    /// <param name="options">How, the same for all passes; null for the defaults.</param>
    /// <exception cref="ArgumentException">A pass has no meter or no heated section.</exception>
    public GeneratorEstimator(SteamGenerator generator, EstimatorOptions? options = null)
    {
        Generator = Require.NotNull(generator, nameof(generator));
        _estimators = [.. generator.Passes.Select(pass => new QualityEstimator(pass, pass.Meter ?? throw new ArgumentException($"Pass '{pass.Name}' has no meter.", nameof(generator)), options))];
        _estimates = [.. _estimators.Select(static _ => QualityEstimate.Nothing(default, double.NaN))];
        _shifts = new PassShift[_estimators.Length];
        _gaps = new double[_estimators.Length];
        _limit = (options ?? EstimatorOptions.Default).RawDisagreementLimit;
    }

    /// <summary>The generator.</summary>
    public SteamGenerator Generator { get; }

    /// <summary>The estimator of each pass, in the order of the generator.</summary>
    public IReadOnlyList<QualityEstimator> Estimators => _estimators;

    /// <summary>The last estimate of each pass.</summary>
    public IReadOnlyList<QualityEstimate> Estimates => _estimates;

    /// <summary>The shift of each pass against its base.</summary>
    public IReadOnlyList<PassShift> Shifts => _shifts;

    /// <summary>What all passes share, as a change of heat; null while fewer than three are known.</summary>
    public Ratio? CommonShift => double.IsNaN(_common) ? null : Ratio.FromDecimalFractions(_common);

    /// <summary>Whether the common shift is beyond the limit: heat, or a common tag.</summary>
    public bool IsCommonShiftFar => _commonIsFar;

    /// <summary>Takes one reading of the generator. Never throws for what the instruments say.</summary>
    /// <param name="reading">The reading, with as many passes as the generator.</param>
    /// <exception cref="ArgumentException">The reading has another number of passes.</exception>
    public void Update(GeneratorReading reading)
    {
        if (Require.NotNull(reading, nameof(reading)).Passes.Count != _estimators.Length)
            throw new ArgumentException(FormattableString.Invariant($"A reading of {reading.Passes.Count} passes is given to a generator of {_estimators.Length}."), nameof(reading));
        for (int i = 0; i < _estimators.Length; i++) _estimates[i] = _estimators[i].Update(reading.ReadingOf(i));
        Compare();
    }

    /// <summary>Pairs of passes whose differentials or feed flows look exchanged since the base was learnt: both have shifted, and the other one's value explains it in both.</summary>
    /// <remarks>Seen only where the two values differ by more than the limit of disagreement does. Two passes that answer each other's moves are the proof.</remarks>
    public IReadOnlyList<SwapSuspect> FindSwaps()
    {
        List<SwapSuspect> suspects = [];
        for (int i = 0; i < _estimators.Length; i++)
        {
            for (int j = i + 1; j < _estimators.Length; j++)
            {
                if (_shifts[i].Origin is not (ShiftOrigin.ThisPass or ShiftOrigin.NotSeparable) || _shifts[j].Origin is not (ShiftOrigin.ThisPass or ShiftOrigin.NotSeparable)) continue;
                QualityEstimator one = _estimators[i], other = _estimators[j];
                double differential = other.Smoothed.Differential - one.Smoothed.Differential, flow = other.Smoothed.Flow - one.Smoothed.Flow;
                if (Explains(i, differential) && Explains(j, -differential)) suspects.Add(new(i, j, PassSignal.Differential));
                else if (Explains(i, -flow * one.DifferentialByFlow) && Explains(j, flow * other.DifferentialByFlow)) suspects.Add(new(i, j, PassSignal.FeedFlow));
            }
        }

        return suspects;
    }

    // Whether ln Δp so much higher would leave no shift.
    private bool Explains(int pass, double change) => Math.Abs(_shifts[pass].RawOwn + (change / _estimators[pass].DifferentialByHeat)) < _limit / 2;

    /// <summary>What a later estimator of the same generator needs to go on from here.</summary>
    public EstimatorState Save()
    {
        StateFields state = StateFields.ToSave();
        List(state);
        return new(state.Saved);
    }

    /// <summary>Goes on from a saved state, as if nothing had been in between.</summary>
    /// <param name="state">The state.</param>
    /// <exception cref="FormatException">The state is of another generator, other options or another version. The estimator must then be made anew.</exception>
    public void Restore(EstimatorState state) => List(StateFields.ToTakeUp(Require.NotNull(state, nameof(state)).Fields));

    private void List(StateFields state)
    {
        state.Flag("common is far", ref _commonIsFar);
        for (int i = 0; i < _estimators.Length; i++)
        {
            int origin = (int)_shifts[i].Origin;
            StateFields pass = state.Part(FormattableString.Invariant($"pass {i + 1}"));
            pass.Number("origin", ref origin);
            _shifts[i] = _shifts[i] with { Origin = (ShiftOrigin)origin };
            _estimators[i].List(pass);
        }
    }

    private void Compare()
    {
        int known = 0;
        for (int i = 0; i < _estimators.Length; i++)
        {
            if (_estimators[i].KnowsGap) _gaps[known++] = _estimators[i].Gap;
        }

        Array.Sort(_gaps, 0, known);
        _common = known < FewestPasses ? double.NaN : known % 2 == 1 ? _gaps[known / 2] : (_gaps[(known / 2) - 1] + _gaps[known / 2]) / 2;
        _commonIsFar = Far(_common, _commonIsFar);
        for (int i = 0; i < _estimators.Length; i++) _shifts[i] = ShiftOf(_estimators[i], _shifts[i].Origin);
    }

    private PassShift ShiftOf(QualityEstimator estimator, ShiftOrigin before)
    {
        if (!estimator.KnowsGap) return new() { RawOwn = double.NaN, RawAsDifferential = double.NaN };
        double gap = estimator.Gap, own = double.IsNaN(_common) ? gap : gap - _common;
        bool far = Far(own, before is ShiftOrigin.ThisPass or ShiftOrigin.NotSeparable);
        return new()
        {
            Origin = far ? (double.IsNaN(_common) ? ShiftOrigin.NotSeparable : ShiftOrigin.ThisPass) : _commonIsFar ? ShiftOrigin.Common : ShiftOrigin.None,
            RawOwn = own,
            RawAsDifferential = own * estimator.DifferentialByHeat,
        };
    }

    // Called at the limit, dropped at half of it.
    private bool Far(double shift, bool before) => Math.Abs(shift) > (before ? _limit / 2 : _limit);
}
