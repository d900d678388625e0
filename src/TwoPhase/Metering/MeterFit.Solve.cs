using MathNet.Numerics;
using MathNet.Numerics.Distributions;
using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

public sealed partial class MeterFit
{
    // A lumped constant off by 2 % is a quality off by some three points.
    private const double OpenConstant = 0.02;

    /// <summary>Fits the lumped constant k of ṁ = k √(Δp ρe).</summary>
    /// <remarks>k takes up everything that is constant: coefficient, bore, and the bias of the wet model at the qualities tested.</remarks>
    /// <param name="model">The wet-steam model, one that needs no geometry.</param>
    /// <param name="readings">At least two readings with reference qualities, taken in steady state.</param>
    /// <exception cref="ArgumentException">Fewer than two readings, or the model needs a geometry.</exception>
    public static MeterFit LumpedConstant(WetSteamModel model, IEnumerable<ReferenceReading> readings)
    {
        ReferenceReading[] points = Points(readings);
        QualityMeter unit = new(new SiteConstantMeter(Area.FromSquareMeters(1)), model);
        var (low, high) = RangeOfFactors(unit, points);
        return Solve("k [m²]", k => new QualityMeter(new SiteConstantMeter(Area.FromSquareMeters(k)), model), low, high, OpenConstant * low, points);
    }

    /// <summary>Fits the discharge coefficient C of an element in place.</summary>
    /// <remarks>The element's own C keeps its course over the Reynolds number and is scaled; the value is C at the mean of the readings.</remarks>
    /// <param name="meter">An element with geometry and the wet-steam model it is read through.</param>
    /// <param name="readings">At least two readings with reference qualities, taken in steady state.</param>
    /// <exception cref="ArgumentException">Fewer than two readings, or the meter has no geometry.</exception>
    public static MeterFit DischargeCoefficient(QualityMeter meter, IEnumerable<ReferenceReading> readings)
    {
        if (Require.NotNull(meter, nameof(meter)).Meter is not PrimaryElement element)
            throw new ArgumentException($"A {meter.Meter.Name} has no discharge coefficient of its own; fit its constant.", nameof(meter));
        ReferenceReading[] points = Points(readings);
        double c = points.Average(point => meter.DryCoefficient(point.Flow, point.Pressure, point.Quality));   // of the standard, uncalibrated
        meter = meter.With(element.Calibrated(1));
        var (low, high) = RangeOfFactors(meter, points);
        return Solve("C [-]", value => meter.With(element.Calibrated(value / c)), c * low, c * high, OpenConstant * c, points);
    }

    /// <summary>Fits one parameter of a meter or model of one's own.</summary>
    /// <remarks>One at a time: a constant and a slip exponent, say, cannot be parted by readings at one quality, and their separate values would mean nothing.</remarks>
    /// <param name="parameter">Name of the parameter, with its unit.</param>
    /// <param name="meter">The meter for a value of the parameter.</param>
    /// <param name="low">Lowest value that makes sense.</param>
    /// <param name="high">Highest value that makes sense, above the lowest.</param>
    /// <param name="readings">At least two readings with reference qualities, taken in steady state.</param>
    /// <exception cref="ArgumentException">Fewer than two readings, or the range is not in order.</exception>
    public static MeterFit OneParameter(string parameter, Func<double, QualityMeter> meter, double low, double high, IEnumerable<ReferenceReading> readings)
    {
        Require.Finite(low, "Lowest value", Scale.None, nameof(low));
        Require.Finite(high, "Highest value", Scale.None, nameof(high));
        Require.Below(low, high, "Lowest value", Scale.None, nameof(low));
        return Solve(Require.NotNull(parameter, nameof(parameter)), Require.NotNull(meter, nameof(meter)), low, high, (high - low) / 4, Points(readings));
    }

    // Weighted least squares in quality; weights by the references' uncertainties against each other.
    private static MeterFit Solve(string parameter, Func<double, QualityMeter> meterOf, double low, double high, double openHalfWidth, ReferenceReading[] points)
    {
        double meanWeight = points.Average(point => point.Weight);
        double[] weights = Array.ConvertAll(points, point => point.Weight / meanWeight);
        double value = GoldenSection.Minimum(SumOfSquares, low, high, 1e-7 * (high - low));
        bool atLimit = value == low || value == high;

        double step = 1e-4 * (high - low), moment = 0, curvature = 0;
        double right = Math.Min(value + step, high), left = Math.Max(value - step, low);   // never where the caller said no value makes sense
        double[] residuals = Residual(value), above = Residual(right), below = Residual(left);
        for (int i = 0; i < points.Length; i++)
        {
            double slope = (above[i] - below[i]) / (right - left);
            moment += weights[i] * slope * residuals[i];
            curvature += weights[i] * slope * slope;
        }

        // The golden section stops at half of the digits; one step of Gauss-Newton finds the rest.
        if (!atLimit && curvature > 0) residuals = Residual(value -= moment / curvature);
        double deviation = Math.Sqrt(Sum(residuals) / (points.Length - 1));
        double standard = curvature > 0 ? deviation / Math.Sqrt(curvature) : double.PositiveInfinity;
        double half = StudentT.InvCDF(0, 1, points.Length - 1, 0.975) * standard;
        FitWarnings warnings = (half <= openHalfWidth ? FitWarnings.None : FitWarnings.NotDetermined)
            | (atLimit ? FitWarnings.AtLimit : FitWarnings.None)
            | (points.Length < 4 ? FitWarnings.FewReadings : FitWarnings.None)
            | (HasTrend(points, residuals) ? FitWarnings.Trend : FitWarnings.None);
        QualityMeter fitted = meterOf(value);
        double scatter = deviation * Math.Sqrt(1 + (1.0 / points.Length));   // of one more reading, the parameter's own part included
        return new(parameter, value, standard, residuals, deviation, warnings, fitted.WithModelUncertainty(ModelUncertainty(fitted, points, scatter)));

        double[] Residual(double at)
        {
            QualityMeter meter = meterOf(at);
            return Array.ConvertAll(points, point => meter.Quality(point.Flow, point.Pressure, point.Differential).QualityCore - point.QualityCore);
        }

        double Sum(double[] of) => of.Select((residual, i) => weights[i] * residual * residual).Sum();
        double SumOfSquares(double at) => Sum(Residual(at));
    }

    // What scatter and parameter leave of the quality, as a share of the differential: by dx/dlnΔp at the readings.
    private static Ratio ModelUncertainty(QualityMeter meter, ReferenceReading[] points, double scatter)
    {
        const double least = 0.005;    // common practice, no source: no reference is better than that
        const double most = 0.5;
        const double step = 1e-3;
        double slope = points.Average(point => (At(point, 1 + step) - At(point, 1 - step)) / (2 * step));
        return Ratio.FromDecimalFractions(Fast.Clamp(scatter / Math.Abs(slope), least, most));

        double At(ReferenceReading point, double factor) =>
            meter.Quality(point.Flow, point.Pressure, Pressure.FromPascals(point.DifferentialCore * factor)).QualityCore;
    }

    // Slope of the residuals over lnΔp against its own standard deviation, at 99 %.
    private static bool HasTrend(ReferenceReading[] points, double[] residuals)
    {
        const int fewest = 5;
        if (points.Length < fewest) return false;
        double[] load = Array.ConvertAll(points, point => Math.Log(point.DifferentialCore));
        double r = GoodnessOfFit.R(load, residuals);
        double t = Math.Abs(r) * Math.Sqrt((points.Length - 2) / Math.Max(1 - (r * r), 1e-300));
        return t > StudentT.InvCDF(0, 1, points.Length - 2, 0.995);
    }

    // What each reading alone would make of the constant: the fit lies between the ends.
    private static (double Low, double High) RangeOfFactors(QualityMeter meter, ReferenceReading[] points)
    {
        const double margin = 1.02;
        double[] factors = Array.ConvertAll(points, point => point.FlowCore / meter.TotalFlow(point.Pressure, point.Quality, point.Differential).Si());
        return (factors.Min() / margin, factors.Max() * margin);
    }

    private static ReferenceReading[] Points(IEnumerable<ReferenceReading> readings)
    {
        ReferenceReading[] points = [.. Require.NotNull(readings, nameof(readings))];
        return points.Length >= 2 ? points : throw new ArgumentException($"{points.Length} readings; a fit with an interval needs at least 2.", nameof(readings));
    }
}
