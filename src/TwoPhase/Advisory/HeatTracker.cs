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
/// </remarks>
internal struct HeatTracker
{
    // Noise of ln Δp from sample to sample; share of the false reading by which a shadow may be wrong, and for how long in one direction [s].
    private const double ShadowShare = 0.15, ShadowTime = 120;

    // The base is the mean of this long at first [s], and then follows over half a day.
    private const double BaseLearnt = 300, BaseTime = 43_200;

    private double _noise, _wander;

    public HeatTracker(double noise, double wander) => (_noise, _wander) = (noise, wander * wander / 3600);

    /// <summary>a, as the meter has it, and its variance.</summary>
    public double Factor { get; private set; }

    public double Variance { get; private set; }

    /// <summary>Over how long a is the mean [s].</summary>
    public double Memory { get; private set; }

    /// <summary>Long-time base of a.</summary>
    public double Base { get; private set; }

    /// <summary>For how long the base has been learnt [s].</summary>
    public double Learnt { get; private set; }

    /// <summary>a − base, what heat or meter must have changed by.</summary>
    public readonly double Gap => Factor - Base;

    public void Start(double factor, double variance) => (Factor, Variance, Base, Learnt) = (factor, variance, factor, 0);

    /// <summary>Time passes without a differential.</summary>
    public void Coast(double elapsed) => Variance += _wander * elapsed;

    /// <summary>A measured differential: r₀ = ln(Δp/Δp̂) of the shadow that runs with a factor, L, how falsely the meter reads by motion (in ln Δp), and the gap that counts as far.</summary>
    public void Update(double elapsed, double innovation, double slope, double shadowFactor, double motion, double limit)
    {
        // The further from the base, the likelier that something has moved, and the faster it is followed.
        double far = Gap / limit;
        Variance += Math.Min(10, 1 + (40 * far * far)) * _wander * elapsed;
        double shadow = ShadowShare * motion, noise = (_noise * _noise) + (shadow * shadow * 2 * ShadowTime / elapsed);
        double residual = innovation - (slope * (Factor - shadowFactor)), spread = Math.Sqrt((slope * slope * Variance) + noise);

        // Huber's bound: one wild sample moves the state no more than three standard deviations would.
        residual = Math.Max(-3 * spread, Math.Min(3 * spread, residual));
        double gain = Variance * slope / (spread * spread);
        Memory = elapsed / Math.Max(1e-9, gain * slope);
        Factor += gain * residual;
        Variance *= 1 - (gain * slope);
    }

    /// <summary>The base follows, while nothing speaks against it.</summary>
    public void LearnBase(double elapsed)
    {
        Learnt += elapsed;
        Base += Math.Min(1, elapsed / (Learnt < BaseLearnt ? Learnt : BaseTime)) * (Factor - Base);
    }

    /// <summary>The base that was known before a gap in the readings.</summary>
    public void KeepBase(double known, double learnt) => (Base, Learnt) = (known, learnt);

    /// <summary>A witness has shown which factor is true: the meter's constant takes the rest.</summary>
    public void Rebase(double factor)
    {
        Factor = factor;
        Base = factor;
    }

    public readonly void Save(StateWriter to)
    {
        to.Add(Factor);
        to.Add(Variance);
        to.Add(Base);
        to.Add(Memory);
        to.Add(Learnt);
    }

    public void Load(StateReader from) => (Factor, Variance, Base, Memory, Learnt) = (from.Next(), from.Next(), from.Next(), from.Next(), from.Next());
}
