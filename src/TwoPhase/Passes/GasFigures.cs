namespace TwoPhase.Passes;

/// <summary>One component of a fuel gas: atoms, molar mass M [kg/mol], gross heat of combustion at 25 °C [J/mol], summation factor s at 15 °C.</summary>
/// <remarks>Source: ISO 6976:2016, tables 1 to 3; latent heat and gas constant from its annex A.</remarks>
internal readonly record struct GasFigures(double MolarMass, double Carbon, double Hydrogen, double Oxygen, double Nitrogen, double Sulphur, double Gross, double Summation)
{
    public const double GasConstant = 8.3144621;

    /// <summary>Heat of evaporation of water at 25 °C [J/mol]: between gross and net.</summary>
    public const double WaterLatent = 44.013e3;

    private static readonly GasFigures[] Table =
    [
        default,
        new(16.04246e-3, 1, 4, 0, 0, 0, 890.58e3, 0.04452),
        new(30.06904e-3, 2, 6, 0, 0, 0, 1560.69e3, 0.0919),
        new(44.09562e-3, 3, 8, 0, 0, 0, 2219.17e3, 0.1344),
        new(58.12220e-3, 4, 10, 0, 0, 0, 2877.40e3, 0.1840),
        new(58.12220e-3, 4, 10, 0, 0, 0, 2868.20e3, 0.1722),
        new(72.14878e-3, 5, 12, 0, 0, 0, 3535.77e3, 0.2361),
        new(72.14878e-3, 5, 12, 0, 0, 0, 3528.83e3, 0.2251),
        new(86.17536e-3, 6, 14, 0, 0, 0, 4194.95e3, 0.3001),
        new(28.05316e-3, 2, 4, 0, 0, 0, 1411.18e3, 0.0799),
        new(2.01588e-3, 0, 2, 0, 0, 0, 285.83e3, -0.01),
        new(28.0101e-3, 1, 0, 1, 0, 0, 282.98e3, 0.0217),
        new(34.08088e-3, 0, 2, 0, 0, 1, 562.01e3, 0.0923),
        new(44.0095e-3, 1, 0, 2, 0, 0, 0, 0.0752),
        new(28.0134e-3, 0, 0, 0, 2, 0, 0, 0.0170),
        new(31.9988e-3, 0, 0, 2, 0, 0, 0, 0.0276),
    ];

    /// <summary>The figures of a mixture by mole: every one is a sum.</summary>
    public static GasFigures Mix(FuelShare[] shares)
    {
        var sum = default(GasFigures);
        foreach (FuelShare share in shares)
        {
            GasFigures part = Table[(int)share.Component];
            double x = share.RawShare;
            sum = new(
                sum.MolarMass + (x * part.MolarMass),
                sum.Carbon + (x * part.Carbon),
                sum.Hydrogen + (x * part.Hydrogen),
                sum.Oxygen + (x * part.Oxygen),
                sum.Nitrogen + (x * part.Nitrogen),
                sum.Sulphur + (x * part.Sulphur),
                sum.Gross + (x * part.Gross),
                sum.Summation + (x * part.Summation));
        }

        return sum;
    }
}
