using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.Steam;

public class SaturationTests
{
    private static readonly ReferenceTable Grid = ReferenceTable.Load("Steam/Data/if97-saturation.csv");

    [Fact]
    public void FromPressure_IndependentGrid_Agrees()
    {
        foreach (ReferenceTable.Row row in Grid.Rows)
        {
            SaturationCore steam = Saturation.FromPressure(Pressure.FromPascals(row["p_Pa"])).Core;
            double tolerance = row["near_crit"] == 1 ? 1e-6 : row["basis_region"] == 3 ? 2e-8 : 1e-9;
            Approx.Relative(row["Tsat_K"], steam.Temperature, 1e-11, "Ts");
            Phase(row, "l", steam.Liquid, tolerance);
            Phase(row, "v", steam.Vapour, tolerance);
            Approx.Relative(row["sigma_N_m"], Transport.SurfaceTension(steam.Temperature), 1e-9, "σ");
        }
    }

    [Fact]
    public void FromTemperature_SaturationTemperature_GivesBackThePressure()
    {
        foreach (ReferenceTable.Row row in Grid.Rows)
            Approx.Relative(row["p_Pa"], Saturation.FromTemperature(Temperature.FromKelvins(row["Tsat_K"])).Pressure.Pascals, 1e-9);
    }

    [Theory]
    [InlineData(22.065)]
    [InlineData(0.0006)]
    [InlineData(-1)]
    public void FromPressure_OutsideTheLine_ThrowsNamingValueAndLimits(double megapascals)
    {
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => Saturation.FromPressure(Pressure.FromMegapascals(megapascals)));
        Assert.Contains("22.064 MPa", error.Message, StringComparison.Ordinal);
        Assert.Equal("pressure", error.ParamName);
    }

    private static void Phase(ReferenceTable.Row row, string suffix, in PhaseCore phase, double tolerance)
    {
        Approx.Relative(row[$"v{suffix}_m3_kg"], phase.SpecificVolume, tolerance, $"v{suffix} {row}");
        Approx.Relative(row[$"h{suffix}_J_kg"], phase.Enthalpy, tolerance, $"h{suffix} {row}");
        Approx.Relative(row[$"s{suffix}_J_kgK"], phase.Entropy, tolerance, $"s{suffix} {row}");
        Approx.Relative(row[$"cp{suffix}_J_kgK"], phase.IsobaricHeatCapacity, 50 * tolerance, $"cp{suffix} {row}");
        Approx.Relative(row[$"cv{suffix}_J_kgK"], phase.IsochoricHeatCapacity, tolerance, $"cv{suffix} {row}");
        Approx.Relative(row[$"w{suffix}_m_s"], phase.SpeedOfSound, tolerance, $"w{suffix} {row}");
        Approx.Relative(row[$"mu{suffix}_Pa_s"], Transport.Viscosity(phase.Density, phase.Temperature), tolerance, $"mu{suffix} {row}");
        Approx.Relative(row[$"k{suffix}_W_mK"], Transport.Conductivity(phase), 50 * tolerance, $"k{suffix} {row}");
    }
}
