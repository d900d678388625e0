using TwoPhase.Numerics;
using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

internal static partial class Transport
{
    /// <summary>k [W/(m·K)] of one phase, with the critical enhancement in the form for industrial use.</summary>
    /// <remarks>
    /// <para>k = (λ0(T) λ1(ρ,T) + λ2) · 1 mW/(m·K); λ2 takes cp, cv and (∂ρ/∂p)T from the formulation, and the viscosity without its own enhancement.</para>
    /// <para>Range: 273.15 K to 1173.15 K up to 100 MPa (with temperature up to 785 MPa); extrapolates in a physically reasonable way to 2273 K at low pressure.</para>
    /// <para>Accuracy: 1 to 2 % in water and low-pressure steam, 3 to 6 % elsewhere (release, figure 1).</para>
    /// <para>Source: IAPWS R15-11, equations (15) to (24) with Tables 1 to 3; reference compressibility of section 3, equation (25) with Table 6.</para>
    /// </remarks>
    public static double Conductivity(in PhaseCore phase) =>
        ConductivityWithoutEnhancement(phase.Density, phase.Temperature) + Enhancement(phase);

    /// <summary>λ0 λ1 [W/(m·K)]: the conductivity without critical enhancement.</summary>
    public static double ConductivityWithoutEnhancement(double density, double temperature)
    {
        double ratio = temperature / CriticalTemperature, x = 1 / ratio, delta = density / CriticalDensity;
        double resistance = 2.443221e-3 + (x * (1.323095e-2 + (x * (6.770357e-3 + (x * (-3.454586e-3 + (x * 4.096266e-4)))))));
        return 1e-3 * Fast.Sqrt(ratio) / resistance * Math.Exp(delta * Polynomial(ConductivityTable, 6, x - 1, delta - 1));
    }

    // λ2, equations (18) to (23), with the constants of Table 3.
    private static double Enhancement(in PhaseCore phase)
    {
        const double amplitude = 177.8514, correlation = 0.13, susceptibility = 0.06, exponent = 0.63 / 1.239, cutoff = 0.4, referenceTemperature = 1.5;
        const double conductivityGasConstant = 461.51805;

        double delta = phase.Density / CriticalDensity, ratio = phase.Temperature / CriticalTemperature;
        double compressibility = delta * CriticalPressure / phase.BulkModulus;
        double excess = delta * (compressibility - (ReferenceCompressibility(delta) * referenceTemperature / ratio));
        if (!(excess > 0)) return 0;

        double y = correlation * Math.Pow(excess / susceptibility, exponent) / cutoff;
        if (y < 1.2e-7) return 0;

        double cp = phase.IsobaricHeatCapacity, inverseKappa = phase.IsochoricHeatCapacity / cp;
        double crossover = 1 - Math.Exp(-1 / ((1 / y) + (y * y / (3 * delta * delta))));
        double z = 2 / (Math.PI * y) * (((1 - inverseKappa) * Math.Atan(y)) + (inverseKappa * y) - crossover);
        double viscosity = Viscosity(phase.Density, phase.Temperature) / 1e-6;
        return 1e-3 * amplitude * delta * ratio * cp / (conductivityGasConstant * viscosity) * z;
    }

    // ζ(TR,ρ) of equation (25), a piecewise fit along the reference isotherm 1.5 Tc.
    private static double ReferenceCompressibility(double delta)
    {
        int row = delta <= 0.310559006 ? 0 : delta <= 0.776397516 ? 1 : delta <= 1.242236025 ? 2 : delta <= 1.863354037 ? 3 : 4;
        return 1 / Polynomial(ReferenceTable.AsSpan(6 * row, 6), 6, 0, delta);
    }

    // L(i,j), Table 2: a row for each power i of (Tc/T − 1), a column for each power j of (ρ/ρc − 1).
    private static readonly double[] ConductivityTable =
    [
        1.60397357, -0.646013523, 0.111443906, 0.102997357, -0.0504123634, 0.00609859258,
        2.33771842, -2.78843778, 1.53616167, -0.463045512, 0.0832827019, -0.00719201245,
        2.19650529, -4.54580785, 3.55777244, -1.40944978, 0.275418278, -0.0205938816,
        -1.21051378, 1.60812989, -0.621178141, 0.0716373224, 0, 0,
        -2.7203370, 4.57586331, -3.18369245, 1.1168348, -0.19268305, 0.012913842,
    ];

    // A(i,j), Table 6, a row for each density range.
    private static readonly double[] ReferenceTable =
    [
        6.53786807199516, -5.61149954923348, 3.39624167361325, -2.27492629730878, 10.2631854662709, 1.97815050331519,
        6.52717759281799, -6.30816983387575, 8.08379285492595, -9.82240510197603, 12.1358413791395, -5.54349664571295,
        5.35500529896124, -3.96415689925446, 8.91990208918795, -12.0338729505790, 9.19494865194302, -2.16866274479712,
        1.55225959906681, 0.464621290821181, 8.93237374861479, -11.0321960061126, 6.16780999933360, -0.965458722086812,
        1.11999926419994, 0.595748562571649, 9.88952565078920, -10.3255051147040, 4.66861294457414, -0.503243546373828,
    ];
}
