using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>How well the inputs of a quality are known: standard uncertainties, k = 1. Halve what a data sheet or a standard prints with k = 2.</summary>
/// <remarks>
/// <para>Left unsaid, the element gives its own coefficient and expansibility (ISO 5167), pipe and throat get the limits of ISO 5167-1:2003, 8.2.2.2
/// (0.4 % and 0.1 % with k = 2, from memory), the constant of a meter without geometry 1 % (common practice, no source), and the
/// densities 0.025 % of liquid and 0.1 % of vapour with k = 2 (Wagner and Pruß, J. Phys. Chem. Ref. Data 31, 387-535 (2002), from memory).</para>
/// <para>The wet-steam model's own is <see cref="QualityMeter.ModelUncertainty"/>. Immutable; <c>With…</c> returns a changed copy.</para>
/// </remarks>
public sealed class MeteringUncertainty
{
    private const double DefaultPipe = 0.002, DefaultThroat = 0.0005, DefaultConstant = 0.01, DefaultLiquid = 0.000125, DefaultVapour = 0.0005;

    private readonly Dictionary<MeteringInput, double> _standard;
    private readonly List<(MeteringInput First, MeteringInput Second, double Coefficient)> _correlations;

    /// <summary>Uncertainty of what the instruments say.</summary>
    /// <param name="flow">Relative standard uncertainty of the feed flow.</param>
    /// <param name="differential">Standard uncertainty of the differential; transmitters state theirs in per cent of span.</param>
    /// <param name="pressure">Standard uncertainty of the absolute pressure at the meter.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is negative or not finite.</exception>
    public MeteringUncertainty(Ratio flow, Pressure differential, Pressure pressure)
        : this([], [])
    {
        _standard[MeteringInput.FeedFlow] = Relative(flow, "Uncertainty of the flow", nameof(flow));
        _standard[MeteringInput.Differential] = Require.NotNegative(differential.Si(), "Uncertainty of the differential", Scale.Kilopascals, nameof(differential));
        _standard[MeteringInput.Pressure] = Require.NotNegative(pressure.Si(), "Uncertainty of the pressure", Scale.Kilopascals, nameof(pressure));
        _standard[MeteringInput.PipeDiameter] = DefaultPipe;
        _standard[MeteringInput.ThroatDiameter] = DefaultThroat;
        _standard[MeteringInput.MeterConstant] = DefaultConstant;
        _standard[MeteringInput.LiquidDensity] = DefaultLiquid;
        _standard[MeteringInput.VapourDensity] = DefaultVapour;
    }

    private MeteringUncertainty(Dictionary<MeteringInput, double> standard, List<(MeteringInput First, MeteringInput Second, double Coefficient)> correlations) =>
        (_standard, _correlations) = (standard, correlations);

    /// <summary>With the discharge coefficient known to a relative standard uncertainty, for example after calibration.</summary>
    /// <param name="relative">u(C)/C.</param>
    public MeteringUncertainty WithDischargeCoefficient(Ratio relative) => With(MeteringInput.DischargeCoefficient, Relative(relative, "Uncertainty of the discharge coefficient", nameof(relative)));

    /// <summary>With the expansibility factor known to a relative standard uncertainty.</summary>
    /// <param name="relative">u(ε)/ε.</param>
    public MeteringUncertainty WithExpansibility(Ratio relative) => With(MeteringInput.Expansibility, Relative(relative, "Uncertainty of the expansibility", nameof(relative)));

    /// <summary>With pipe and throat diameter known to relative standard uncertainties.</summary>
    /// <param name="pipe">u(D)/D.</param>
    /// <param name="throat">u(d)/d.</param>
    public MeteringUncertainty WithDiameters(Ratio pipe, Ratio throat) =>
        With(MeteringInput.PipeDiameter, Relative(pipe, "Uncertainty of the pipe diameter", nameof(pipe)))
        .With(MeteringInput.ThroatDiameter, Relative(throat, "Uncertainty of the throat diameter", nameof(throat)));

    /// <summary>With the constant of a meter without geometry known to a relative standard uncertainty, for example from a fit.</summary>
    /// <param name="relative">u(k)/k.</param>
    public MeteringUncertainty WithMeterConstant(Ratio relative) => With(MeteringInput.MeterConstant, Relative(relative, "Uncertainty of the meter constant", nameof(relative)));

    /// <summary>With the saturated densities known to relative standard uncertainties.</summary>
    /// <param name="liquid">u(ρl)/ρl.</param>
    /// <param name="vapour">u(ρg)/ρg.</param>
    public MeteringUncertainty WithDensities(Ratio liquid, Ratio vapour) =>
        With(MeteringInput.LiquidDensity, Relative(liquid, "Uncertainty of the liquid density", nameof(liquid)))
        .With(MeteringInput.VapourDensity, Relative(vapour, "Uncertainty of the vapour density", nameof(vapour)));

    /// <summary>With the errors of two inputs correlated.</summary>
    /// <param name="first">One input.</param>
    /// <param name="second">Another.</param>
    /// <param name="coefficient">r, −1 to 1.</param>
    public MeteringUncertainty WithCorrelation(MeteringInput first, MeteringInput second, double coefficient) =>
        new(_standard, [.. _correlations, (first, second, Require.Within(coefficient, -1, 1, "Correlation coefficient r", Scale.None, nameof(coefficient)))]);

    internal IReadOnlyList<(MeteringInput First, MeteringInput Second, double Coefficient)> Correlations => _correlations;

    /// <summary>Standard uncertainty: relative, but in pascals for differential and pressure; null where the element gives its own.</summary>
    internal double? Standard(MeteringInput input) => _standard.TryGetValue(input, out double value) ? value : null;

    private MeteringUncertainty With(MeteringInput input, double value) =>
        new(new Dictionary<MeteringInput, double>(_standard) { [input] = value }, _correlations);

    private static double Relative(Ratio relative, string quantity, string parameter) => Require.NotNegative(relative.Si(), quantity, Scale.None, parameter);
}
