using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>
/// A differential-pressure meter on wet steam whose total flow is known: quality from flow, pressure and differential, or
/// either of the others from the rest, through one wet-steam model.
/// </summary>
/// <remarks>
/// <para>ṁ = C ε E A √(2 ρe Δp) with ρe from the model, C dry or from the model, ε of the saturated vapour at p and Δp; both phases saturated at p (IAPWS-IF97).</para>
/// <para>An element that was measured cold is taken at the saturation temperature. The Reynolds number of the pipe is 4 ṁ/(π D) · [x/μg + (1 − x)/μl]:
/// that of the liquid at x = 0, of the vapour at x = 1.</para>
/// <para>The reading is right only while as much steam and water leaves the pass as feed enters it, and only as good as the model: the models differ by more than any instrument errs,
/// see <see cref="CompareModels"/>. Advisory only.</para>
/// <para>Immutable, safe to share between threads. Doors allocate nothing when they do not throw.</para>
/// </remarks>
public sealed partial class QualityMeter
{
    /// <summary>Relative standard uncertainty (k = 1) of the differential that a model predicts, as long as it has not been fitted to the site.</summary>
    internal const double UnfittedModelUncertainty = 0.03;

    private readonly double _modelUncertainty = UnfittedModelUncertainty;

    // k² of the closed form; NaN where the meter has a geometry or the model is another.
    private readonly double _lumpedSquare = double.NaN;

    /// <summary>A meter read through a wet-steam model.</summary>
    /// <param name="meter">The meter.</param>
    /// <param name="model">The wet-steam model.</param>
    /// <exception cref="ArgumentNullException">An argument is null.</exception>
    /// <exception cref="ArgumentException">The model needs the geometry of the meter, and the meter is known by its constant alone.</exception>
    public QualityMeter(DifferentialPressureMeter meter, WetSteamModel model)
    {
        Meter = Require.NotNull(meter, nameof(meter));
        Model = Require.NotNull(model, nameof(model));
        if (model.NeedsGeometry && !meter.HasGeometry)
            throw new ArgumentException($"The wet-steam model '{model.Name}' needs the diameters of the meter, and a {meter.Name} has none.", nameof(model));
        if (meter is SiteConstantMeter site && model == WetSteamModel.Homogeneous) _lumpedSquare = site.K.Si() * site.K.Si();
    }

    private QualityMeter(QualityMeter other, double modelUncertainty)
        : this(other.Meter, other.Model) => _modelUncertainty = modelUncertainty;

    /// <summary>The meter.</summary>
    public DifferentialPressureMeter Meter { get; }

    /// <summary>The wet-steam model.</summary>
    public WetSteamModel Model { get; }

    /// <summary>Relative standard uncertainty (k = 1) of the differential that the model predicts: 3 % until it is fitted, never zero.</summary>
    public Ratio ModelUncertainty => Ratio.FromDecimalFractions(_modelUncertainty);

    /// <summary>The same meter with another uncertainty of its model, such as a fit to reference qualities leaves.</summary>
    /// <param name="differential">Relative standard uncertainty (k = 1) of the predicted differential, above zero and below 1.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="differential"/> is outside its limits.</exception>
    public QualityMeter WithModelUncertainty(Ratio differential)
    {
        double value = Require.Positive(differential.Si(), "Model uncertainty", Scale.None, nameof(differential));
        return new QualityMeter(this, Require.Below(value, 1, "Model uncertainty", Scale.None, nameof(differential)));
    }

    private bool HasLumpedForm => !double.IsNaN(_lumpedSquare);

    /// <summary>The quality that a flow, a pressure and a differential imply.</summary>
    /// <remarks>Where two qualities fit the reading the lower is returned, and the applicability has <see cref="ApplicabilityLimits.SecondRoot"/> with the other as its value.</remarks>
    /// <param name="flow">ṁ, total mass flow through the meter, greater than zero.</param>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping, on the saturation line of water.</param>
    /// <param name="differential">Δp, greater than zero and below the pressure.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    /// <exception cref="Numerics.ConvergenceException">The model gives no finite density where the search looked.</exception>
    public QualityReading Quality(MassFlow flow, Pressure pressure, Pressure differential)
    {
        double m = CheckedFlow(flow, nameof(flow));
        double p = CheckedPressure(pressure, nameof(pressure));
        double dp = CheckedDifferential(differential, p, nameof(differential));
        QualityReading reading = ReadCore(m, p, dp);
        return reading.Status == ReadingStatus.NotSolved ? throw NotSolved("quality", m, p, dp) : reading;
    }

    /// <summary>The differential that a flow, a pressure and a quality give.</summary>
    /// <param name="flow">ṁ, total mass flow through the meter, greater than zero.</param>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping, on the saturation line of water.</param>
    /// <param name="quality">x, at most 2, and high enough for the continued formula to leave a volume; outside 0..1 by the homogeneous slope.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits, or the flow would need a differential at which the meter chokes.</exception>
    /// <exception cref="Numerics.ConvergenceException">The model gives no finite density where the search looked.</exception>
    public Pressure Differential(MassFlow flow, Pressure pressure, MassFraction quality)
    {
        double m = CheckedFlow(flow, nameof(flow));
        double p = CheckedPressure(pressure, nameof(pressure));
        double x = CheckedQuality(quality, nameof(quality));
        return Pressure.FromPascals(DifferentialCore(m, p, x));
    }

    /// <summary>The total flow that a pressure, a quality and a differential imply.</summary>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping, on the saturation line of water.</param>
    /// <param name="quality">x, at most 2, and high enough for the continued formula to leave a volume; outside 0..1 by the homogeneous slope.</param>
    /// <param name="differential">Δp, greater than zero and below the pressure.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    /// <exception cref="Numerics.ConvergenceException">The model gives no finite density where the search looked.</exception>
    public MassFlow TotalFlow(Pressure pressure, MassFraction quality, Pressure differential)
    {
        double p = CheckedPressure(pressure, nameof(pressure));
        double x = CheckedQuality(quality, nameof(quality));
        double dp = CheckedDifferential(differential, p, nameof(differential));
        return MassFlow.FromKilogramsPerSecond(TotalFlowCore(p, x, dp));
    }

    internal object ToDump() => ToString();

    /// <summary>Meter and model.</summary>
    public override string ToString() => $"{Meter.Name}, {Model.Name}";
}
