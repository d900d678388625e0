namespace TwoPhase.Steam;

internal static partial class Region1
{
    /// <summary>T(p,h) of region 1, equation (11) of R7-97(2012); good to 25 mK, a starting value for the forward equation.</summary>
    public static double BackwardTemperature(double pressure, double enthalpy) =>
        PowerTable.Sum(TemperatureFromEnthalpy, pressure / 1e6, (enthalpy / 2.5e6) + 1);

    // Table 6: Σ n π^I (η + 1)^J, π = p / 1 MPa, η = h / 2500 kJ/kg, T in K.
    private static readonly Term[] TemperatureFromEnthalpy =
    [
        new(0, 0, -0.23872489924521e3), new(0, 1, 0.40421188637945e3), new(0, 2, 0.11349746881718e3), new(0, 6, -0.58457616048039e1),
        new(0, 22, -0.15285482413140e-3), new(0, 32, -0.10866707695377e-5), new(1, 0, -0.13391744872602e2), new(1, 1, 0.43211039183559e2),
        new(1, 2, -0.54010067170506e2), new(1, 3, 0.30535892203916e2), new(1, 4, -0.65964749423638e1), new(1, 10, 0.93965400878363e-2),
        new(1, 32, 0.11573647505340e-6), new(2, 10, -0.25858641282073e-4), new(2, 32, -0.40644363084799e-8), new(3, 10, 0.66456186191635e-7),
        new(3, 32, 0.80670734103027e-10), new(4, 32, -0.93477771213947e-12), new(5, 32, 0.58265442020601e-14), new(6, 32, -0.15020185953503e-16),
    ];
}
