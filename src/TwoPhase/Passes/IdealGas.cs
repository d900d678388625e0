namespace TwoPhase.Passes;

/// <summary>Enthalpy of the gases in air and flue gas, above that at 25 °C.</summary>
/// <remarks>
/// <para>H(T) − H(T0) = R [−a1 (1/T − 1/T0) + a2 ln(T/T0) + a3 (T − T0) + a4 (T² − T0²)/2 + … + a7 (T⁵ − T0⁵)/5] [J/mol].</para>
/// <para>Range: 200 K to 1000 K. Source: McBride, Zehe and Gordon, NASA/TP-2002-211556.</para>
/// </remarks>
internal sealed class IdealGas(double a1, double a2, double a3, double a4, double a5, double a6, double a7)
{
    public const double Lowest = 200, Highest = 1000, Reference = 298.15;

    public static readonly IdealGas Nitrogen = new(2.210371497e4, -3.818461820e2, 6.082738360, -8.530914410e-3, 1.384646189e-5, -9.625793620e-9, 2.519705809e-12);
    public static readonly IdealGas Oxygen = new(-3.425563420e4, 4.847000970e2, 1.119010961, 4.293889240e-3, -6.836300520e-7, -2.023372700e-9, 1.039040018e-12);
    public static readonly IdealGas CarbonDioxide = new(4.943650540e4, -6.264116010e2, 5.301725240, 2.503813816e-3, -2.127308728e-7, -7.689988780e-10, 2.849677801e-13);
    public static readonly IdealGas Water = new(-3.947960830e4, 5.755731020e2, 9.317826530e-1, 7.222712860e-3, -7.342557370e-6, 4.955043490e-9, -1.336933246e-12);
    public static readonly IdealGas SulphurDioxide = new(-5.310842140e4, 9.090311670e2, -2.356891244, 2.204449885e-2, -2.510781471e-5, 1.446300484e-8, -3.369070940e-12);
    public static readonly IdealGas Argon = new(0, 0, 2.5, 0, 0, 0, 0);

    /// <summary>J/mol.</summary>
    public double Heat(double t)
    {
        // The R by which the report divided; a later one would shift every enthalpy.
        const double reported = 8.314510;
        return reported * (Integral(t) - Integral(Reference));
    }

    private double Integral(double t) =>
        (-a1 / t) + (a2 * Math.Log(t)) + (t * (a3 + (t * ((a4 / 2) + (t * ((a5 / 3) + (t * ((a6 / 4) + (t * a7 / 5)))))))));
}
