using TwoPhase.Numerics;
using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

internal static partial class Transport
{
    /// <summary>μ [Pa·s] from density [kg/m³] and temperature [K].</summary>
    /// <remarks>
    /// <para>μ = μ0(T) μ1(ρ,T) · 1 μPa·s; the critical enhancement μ2 = 1, as the release recommends for industrial use.</para>
    /// <para>Range: 273.15 K to 1173.15 K, up to 300 MPa (with temperature up to 1 GPa); extrapolates in a physically reasonable way to 2273 K at low pressure.</para>
    /// <para>Accuracy: 1 % liquid below 373 K, 2 to 3 % in the steam range (release, figure 1).</para>
    /// <para>Source: IAPWS R12-08, equations (10) to (12), Tables 1 and 2, section 3 for industrial use.</para>
    /// </remarks>
    public static double Viscosity(double density, double temperature)
    {
        double ratio = temperature / CriticalTemperature, x = 1 / ratio, delta = density / CriticalDensity;
        double dilute = 100 * Fast.Sqrt(ratio) / (1.67752 + (x * (2.20462 + (x * (0.6366564 + (x * -0.241605))))));
        return 1e-6 * dilute * Math.Exp(delta * Polynomial(ViscosityTable, 7, x - 1, delta - 1));
    }

    // H(i,j), Table 2: a row for each power i of (Tc/T − 1), a column for each power j of (ρ/ρc − 1).
    // An array: a span over static data costs an allocation a call in unoptimised code.
    private static readonly double[] ViscosityTable =
    [
        5.20094e-1, 2.22531e-1, -2.81378e-1, 1.61913e-1, -3.25372e-2, 0, 0,
        8.50895e-2, 9.99115e-1, -9.06851e-1, 2.57399e-1, 0, 0, 0,
        -1.08374, 1.88797, -7.72479e-1, 0, 0, 0, 0,
        -2.89555e-1, 1.26613, -4.89837e-1, 0, 6.98452e-2, 0, -4.35673e-3,
        0, 0, -2.57040e-1, 0, 0, 8.72102e-3, 0,
        0, 1.20573e-1, 0, 0, 0, 0, -5.93264e-4,
    ];

    // Σ over rows i and columns j of c(i,j) x^i y^j, Horner in both.
    private static double Polynomial(ReadOnlySpan<double> table, int columns, double x, double y)
    {
        double sum = 0;
        for (int end = table.Length; end > 0; end -= columns)
        {
            double row = 0;
            for (int k = end - 1; k >= end - columns; k--) row = Fast.MultiplyAdd(row, y, table[k]);
            sum = Fast.MultiplyAdd(sum, x, row);
        }

        return sum;
    }
}
