namespace TwoPhase.Steam;

internal static partial class Region2
{
    // Table 19, the border of subregions 2b and 2c: π = n1 + n2 η + n3 η², solved for η = n4 + √((π − n5) / n3).
    private const double N1 = 0.90584278514723e3, N2 = -0.67955786399241, N3 = 0.12809002730136e-3, N4 = 0.26526571908428e4, N5 = 0.45257578905948e1;
    private const double LowestOf2c = 6.54670e6;

    /// <summary>p(h) of the border between 2b and 2c, equation (20) of R7-97(2012).</summary>
    public static double Border2bcPressure(double enthalpy)
    {
        double eta = enthalpy / 1e3;
        return 1e6 * (N1 + (eta * (N2 + (N3 * eta))));
    }

    /// <summary>h(p) of the border between 2b and 2c, equation (21) of R7-97(2012).</summary>
    public static double Border2bcEnthalpy(double pressure) => 1e3 * (N4 + Math.Sqrt(((pressure / 1e6) - N5) / N3));

    /// <summary>T(p,h) of region 2, equations (22) to (24) of R7-97(2012); good to 25 mK, a starting value for the forward equation.</summary>
    public static double BackwardTemperature(double pressure, double enthalpy)
    {
        double pi = pressure / 1e6, eta = enthalpy / 2e6;
        if (pressure <= 4e6) return PowerTable.Sum(TemperatureFromEnthalpy2a, pi, eta - 2.1);

        // Below 6.5467 MPa the border parabola has no real point: all is 2b. Above, 2c is the side of the lower enthalpy.
        bool in2c = pressure > LowestOf2c && enthalpy < Border2bcEnthalpy(pressure);
        return in2c
            ? PowerTable.Sum(TemperatureFromEnthalpy2c, pi + 25, eta - 1.8)
            : PowerTable.Sum(TemperatureFromEnthalpy2b, pi - 2, eta - 2.6);
    }

    // Table 20: Σ n π^I (η − 2.1)^J, π = p / 1 MPa, η = h / 2000 kJ/kg, T in K.
    private static readonly Term[] TemperatureFromEnthalpy2a =
    [
        new(0, 0, 0.10898952318288e4), new(0, 1, 0.84951654495535e3), new(0, 2, -0.10781748091826e3), new(0, 3, 0.33153654801263e2),
        new(0, 7, -0.74232016790248e1), new(0, 20, 0.11765048724356e2), new(1, 0, 0.18445749355790e1), new(1, 1, -0.41792700549624e1),
        new(1, 2, 0.62478196935812e1), new(1, 3, -0.17344563108114e2), new(1, 7, -0.20058176862096e3), new(1, 9, 0.27196065473796e3),
        new(1, 11, -0.45511318285818e3), new(1, 18, 0.30919688604755e4), new(1, 44, 0.25226640357872e6), new(2, 0, -0.61707422868339e-2),
        new(2, 2, -0.31078046629583), new(2, 7, 0.11670873077107e2), new(2, 36, 0.12812798404046e9), new(2, 38, -0.98554909623276e9),
        new(2, 40, 0.28224546973002e10), new(2, 42, -0.35948971410703e10), new(2, 44, 0.17227349913197e10), new(3, 24, -0.13551334240775e5),
        new(3, 44, 0.12848734664650e8), new(4, 12, 0.13865724283226e1), new(4, 32, 0.23598832556514e6), new(4, 44, -0.13105236545054e8),
        new(5, 32, 0.73999835474766e4), new(5, 36, -0.55196697030060e6), new(5, 42, 0.37154085996233e7), new(6, 34, 0.19127729239660e5),
        new(6, 44, -0.41535164835634e6), new(7, 28, -0.62459855192507e2),
    ];

    // Table 21: Σ n (π − 2)^I (η − 2.6)^J.
    private static readonly Term[] TemperatureFromEnthalpy2b =
    [
        new(0, 0, 0.14895041079516e4), new(0, 1, 0.74307798314034e3), new(0, 2, -0.97708318797837e2), new(0, 12, 0.24742464705674e1),
        new(0, 18, -0.63281320016026), new(0, 24, 0.11385952129658e1), new(0, 28, -0.47811863648625), new(0, 40, 0.85208123431544e-2),
        new(1, 0, 0.93747147377932), new(1, 2, 0.33593118604916e1), new(1, 6, 0.33809355601454e1), new(1, 12, 0.16844539671904),
        new(1, 18, 0.73875745236695), new(1, 24, -0.47128737436186), new(1, 28, 0.15020273139707), new(1, 40, -0.21764114219750e-2),
        new(2, 2, -0.21810755324761e-1), new(2, 8, -0.10829784403677), new(2, 18, -0.46333324635812e-1), new(2, 40, 0.71280351959551e-4),
        new(3, 1, 0.11032831789999e-3), new(3, 2, 0.18955248387902e-3), new(3, 12, 0.30891541160537e-2), new(3, 24, 0.13555504554949e-2),
        new(4, 2, 0.28640237477456e-6), new(4, 12, -0.10779857357512e-4), new(4, 18, -0.76462712454814e-4), new(4, 24, 0.14052392818316e-4),
        new(4, 28, -0.31083814331434e-4), new(4, 40, -0.10302738212103e-5), new(5, 18, 0.28217281635040e-6), new(5, 24, 0.12704902271945e-5),
        new(5, 40, 0.73803353468292e-7), new(6, 28, -0.11030139238909e-7), new(7, 2, -0.81456365207833e-13), new(7, 28, -0.25180545682962e-10),
        new(9, 1, -0.17565233969407e-17), new(9, 40, 0.86934156344163e-14),
    ];

    // Table 22: Σ n (π + 25)^I (η − 1.8)^J.
    private static readonly Term[] TemperatureFromEnthalpy2c =
    [
        new(-7, 0, -0.32368398555242e13), new(-7, 4, 0.73263350902181e13), new(-6, 0, 0.35825089945447e12), new(-6, 2, -0.58340131851590e12),
        new(-5, 0, -0.10783068217470e11), new(-5, 2, 0.20825544563171e11), new(-2, 0, 0.61074783564516e6), new(-2, 1, 0.85977722535580e6),
        new(-1, 0, -0.25745723604170e5), new(-1, 2, 0.31081088422714e5), new(0, 0, 0.12082315865936e4), new(0, 1, 0.48219755109255e3),
        new(1, 4, 0.37966001272486e1), new(1, 8, -0.10842984880077e2), new(2, 4, -0.45364172676660e-1), new(6, 0, 0.14559115658698e-12),
        new(6, 1, 0.11261597407230e-11), new(6, 4, -0.17804982240686e-10), new(6, 10, 0.12324579690832e-6), new(6, 12, -0.11606921130984e-5),
        new(6, 16, 0.27846367088554e-4), new(6, 20, -0.59270038474176e-3), new(6, 22, 0.12918582991878e-2),
    ];
}
