using System.Globalization;
using MathNet.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Metering;

/// <summary>The signature of a square root extracted twice or not at all: over a stretch of readings, the power with which the differential follows what it should be.</summary>
/// <remarks>
/// <para>ln Δp = a + n ln Δpₑ, with Δpₑ the differential that flow, pressure and an independent quality give: n = 1 with one root, ½ with two, 2 with none.</para>
/// <para>The qualities may come from the heat balance: a constant error of theirs moves a, not n. Readings at one load tell nothing.</para>
/// <para>Range: steady readings whose flow spans at least some ten per cent. Accuracy: the standard error of the slope.</para>
/// <para>Source: least squares; the powers follow from ṁ = K √(2 ρe Δp). A suspicion, not an instruction: prove it at the transmitter under the site's work permit.</para>
/// </remarks>
public sealed class SquareRootCheck
{
    private const int Fewest = 5;
    private const double HalfwayToNext = 0.25;     // from ½ to 1 and back; taken for 2 as well
    private const double DecidingErrors = 3;       // standard errors from the power to the border

    private SquareRootCheck(double power, double standardUncertainty)
    {
        Power = power;
        StandardUncertainty = standardUncertainty;
    }

    /// <summary>n; NaN when there are too few readings.</summary>
    public double Power { get; }

    /// <summary>u(n), one standard deviation (k = 1).</summary>
    public double StandardUncertainty { get; }

    /// <summary>What the power says, when it lies three standard errors clear of the alternatives.</summary>
    public SquareRootFinding Finding =>
        Near(0.5) ? SquareRootFinding.Twice
        : Near(1) ? SquareRootFinding.Once
        : Near(2) ? SquareRootFinding.Missing
        : SquareRootFinding.Undecided;

    /// <summary>Checks a stretch of readings.</summary>
    /// <param name="meter">The meter and its model.</param>
    /// <param name="readings">Steady readings with independent qualities, at several loads.</param>
    public static SquareRootCheck Of(QualityMeter meter, IEnumerable<ReferenceReading> readings)
    {
        Require.NotNull(meter, nameof(meter));
        ReferenceReading[] points = [.. Require.NotNull(readings, nameof(readings))];
        double[] expected = Array.ConvertAll(points, point => Math.Log(meter.Differential(point.Flow, point.Pressure, point.Quality).Si()));
        double[] read = Array.ConvertAll(points, point => Math.Log(point.DifferentialCore));
        double spread = points.Length < Fewest ? 0 : Spread(expected);
        if (spread == 0) return new(double.NaN, double.PositiveInfinity);

        (double intercept, double slope) = Fit.Line(expected, read);
        double residuals = expected.Zip(read, (x, y) => y - intercept - (slope * x)).Sum(residual => residual * residual);
        return new(slope, Math.Sqrt(residuals / (points.Length - 2) / spread));
    }

    internal object ToDump() => ToString();

    /// <summary>The finding in one line.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture, "square root extracted: {0} (power {1:F3}, standard error {2:G2})", Finding, Power, StandardUncertainty);

    private bool Near(double power) => Math.Abs(Power - power) + (DecidingErrors * StandardUncertainty) < HalfwayToNext;

    private static double Spread(double[] values)
    {
        double mean = values.Average();
        return values.Sum(value => (value - mean) * (value - mean));
    }
}
