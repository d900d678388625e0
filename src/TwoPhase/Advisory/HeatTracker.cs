using TwoPhase.Numerics;

namespace TwoPhase.Advisory;

/// <summary>
/// What the meter says of the heat: the logarithm of the heat factor (heat absorbed per firing over that of the calibration) that makes the
/// shadow's differential the measured one, and its long-time base. One gap between both is all that a single pass can show.
/// </summary>
/// <remarks>
/// <para>Kalman filter of one state, a random walk: P ← P + q Δt; K = P L/(L² P + R); a ← a + K r; P ← (1 − K L) P, r = ln(Δp/Δp̂) − L (a − â), with
/// L = ∂ln Δp/∂ln Q and â the factor that the shadow runs with. R is the meter's noise and, while the holdup moves, what the
/// shadow may be wrong by in that, counted as correlated over its time. Source: Kalman, J. Basic Eng. 82, 35-45 (1960).</para>
/// <para>A sample at which nothing was reported says that ln Δp lies within the dead band of the last report: r is then the mean ρ of a normal number between
/// those bounds, σ² its variance over that without them, and P ← (1 − K L (1 − σ²)) P: exact for the mean and the variance of a, which then is normal no longer but
/// is taken so. The truncated normal law: Johnson, Kotz and Balakrishnan, Continuous Univariate Distributions, vol. 1 (1994), section 10.1.</para>
/// </remarks>
internal struct HeatTracker
{
    // Noise of ln Δp from sample to sample; share of the false reading by which a shadow may be wrong, and for how long in one direction [s].
    private const double ShadowShare = 0.15, ShadowTime = 120;

    // The base is the mean of this long at first [s], and then follows over half a day.
    private const double BaseLearnt = 300, BaseTime = 43_200;

    private readonly double _noise, _wander;
    private double _factor, _variance, _memory, _base, _learnt;

    public HeatTracker(double noise, double wander) => (_noise, _wander) = (noise, wander * wander / 3600);

    /// <summary>a, as the meter has it, and its variance.</summary>
    public readonly double Factor => _factor;

    public readonly double Variance => _variance;

    /// <summary>Over how long a is the mean [s].</summary>
    public readonly double Memory => _memory;

    /// <summary>Long-time base of a.</summary>
    public readonly double Base => _base;

    /// <summary>For how long the base has been learnt [s].</summary>
    public readonly double Learnt => _learnt;

    /// <summary>a − base, what heat or meter must have changed by.</summary>
    public readonly double Gap => _factor - _base;

    public void Start(double factor, double variance) => (_factor, _variance, _base, _learnt) = (factor, variance, factor, 0);

    /// <summary>Something else is so uncertain, as a variance of a. The next report takes the place of the last, so doubts do not add up.</summary>
    public void Doubt(double variance) => _variance = Math.Max(_variance, variance);

    /// <summary>Time passes without a differential.</summary>
    public void Coast(double elapsed) => _variance += _wander * elapsed;

    /// <summary>
    /// A measured differential: r₀ = ln(Δp/Δp̂) of the shadow that runs with a factor, and how far to either side of it the truth may be (0 for a value of this
    /// sample); L, how falsely the meter reads by motion (in ln Δp), and the gap that counts as far.
    /// </summary>
    public void Update(double elapsed, double innovation, double band, double slope, double shadowFactor, double motion, double limit)
    {
        // The further from the base, the likelier that something has moved, and the faster it is followed.
        double far = Gap / limit;
        _variance += Math.Min(10, 1 + (40 * far * far)) * _wander * elapsed;
        double shadow = ShadowShare * motion, noise = (_noise * _noise) + (shadow * shadow * 2 * ShadowTime / elapsed);
        double residual = innovation - (slope * (_factor - shadowFactor)), spread = Math.Sqrt((slope * slope * _variance) + noise), told = 1;
        if (band > 0)
        {
            (double mean, double variance) = TruncatedNormal.Between((residual - band) / spread, (residual + band) / spread);
            (residual, told) = (mean * spread, 1 - Math.Min(1, variance));
        }

        // Huber's bound: one wild sample moves the state no more than three standard deviations would.
        residual = Math.Max(-3 * spread, Math.Min(3 * spread, residual));
        double gain = _variance * slope / (spread * spread);
        _memory = elapsed / Math.Max(1e-9, gain * slope * told);
        _factor += gain * residual;
        _variance *= 1 - (gain * slope * told);
    }

    /// <summary>The base follows, while nothing speaks against it.</summary>
    public void LearnBase(double elapsed)
    {
        _learnt += elapsed;
        _base += Math.Min(1, elapsed / (_learnt < BaseLearnt ? _learnt : BaseTime)) * (_factor - _base);
    }

    /// <summary>The base that was known before a gap in the readings.</summary>
    public void KeepBase(double known, double learnt) => (_base, _learnt) = (known, learnt);

    /// <summary>A witness has shown which factor is true: the meter's constant takes the rest.</summary>
    public void Rebase(double factor) => (_factor, _base) = (factor, factor);

    public void List(StateFields state)
    {
        state.Number("factor", ref _factor);
        state.Number("variance", ref _variance);
        state.Number("memory", ref _memory);
        state.Number("base", ref _base);
        state.Number("learnt", ref _learnt);
    }
}
