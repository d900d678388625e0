using TwoPhase.Steam;

namespace TwoPhase.Tests.Steam;

/// <summary>Every door against states that python3-iapws computed from the basic equations.</summary>
public class DoorTests
{
    [Fact]
    public void AtPressureTemperature_IndependentGrid_Agrees() => EachRow("if97-pT", row =>
    {
        WaterCore state = Water.AtPressureTemperature(row["p_Pa"], row["T_K"]);
        double tolerance = Tolerance(row);
        Assert.Equal(row["region"], state.Region);
        Approx.Relative(row["v_m3_kg"], state.SpecificVolume, tolerance, $"v {row}");
        Approx.Relative(row["h_J_kg"], state.Enthalpy, tolerance, $"h {row}");
        Approx.Relative(row["u_J_kg"], state.Phase.InternalEnergy, tolerance, $"u {row}");
        Approx.Relative(row["s_J_kgK"], state.Entropy, tolerance, $"s {row}");
        Approx.Relative(row["cp_J_kgK"], state.Phase.IsobaricHeatCapacity, 10 * tolerance, $"cp {row}");
        Approx.Relative(row["cv_J_kgK"], state.Phase.IsochoricHeatCapacity, tolerance, $"cv {row}");
        Approx.Relative(row["w_m_s"], state.Phase.SpeedOfSound, tolerance, $"w {row}");
    });

    [Fact]
    public void AtPressureEnthalpy_IndependentGrid_Agrees() => EachRow("if97-ph", row =>
    {
        WaterCore state = Water.AtPressureEnthalpy(row["p_Pa"], row["h_J_kg"]);
        Common(row, state);
        Approx.Relative(row["s_J_kgK"], state.Entropy, Tolerance(row), $"s {row}");
    });

    [Fact]
    public void AtPressureEntropy_IndependentGrid_Agrees() => EachRow("if97-ps", row =>
    {
        WaterCore state = Water.AtPressureEntropy(row["p_Pa"], row["s_J_kgK"]);
        Common(row, state);
        Approx.Relative(row["h_J_kg"], state.Enthalpy, Tolerance(row), $"h {row}");
    });

    [Fact]
    public void AtEnthalpyEntropy_IndependentGrid_Agrees() => EachRow("if97-hs", row =>
    {
        WaterCore state = Water.AtEnthalpyEntropy(row["h_J_kg"], row["s_J_kgK"]);
        Common(row, state);

        // Cold liquid is so stiff that 12 digits of h and s leave seven of p.
        Approx.Relative(row["p_Pa"], state.Pressure, row["region"] == 1 ? 1e-5 : Tolerance(row), $"p {row}");
    });

    [Fact]
    public void AtPressureDensity_IndependentGrid_GivesBackTheTemperature() => EachRow("if97-pT", row =>
    {
        if (row["region"] == 1 && row["T_K"] < 280) return;
        WaterCore state = Water.AtPressureDensity(row["p_Pa"], 1 / row["v_m3_kg"]);
        Assert.Equal(row["region"], state.Region);
        Approx.Relative(row["T_K"], state.Temperature, 1e-8, row.ToString());
    });

    [Fact]
    public void AtTemperatureDensity_IndependentGrid_GivesBackThePressure() => EachRow("if97-pT", row =>
    {
        WaterCore state = Water.AtTemperatureDensity(row["T_K"], 1 / row["v_m3_kg"]);
        Assert.Equal(row["region"], state.Region);

        // dp/p = K/p dρ/ρ: liquid water is stiff, and the table has 12 digits.
        double stiffness = state.Phase.BulkModulus / state.Pressure;
        Approx.Relative(row["p_Pa"], state.Pressure, 1e-11 * Math.Max(1, stiffness), row.ToString());
    });

    [Fact]
    public void Transport_IndependentGrid_Agrees() => EachRow("transport", row =>
    {
        PhaseCore phase = Water.AtPressureTemperature(row["p_Pa"], row["T_K"]).Phase;
        double tolerance = Tolerance(row);
        Approx.Relative(row["rho_kg_m3"], phase.Density, tolerance, $"rho {row}");
        Approx.Relative(row["mu_Pa_s"], Transport.Viscosity(phase.Density, phase.Temperature), tolerance, $"mu {row}");
        Approx.Relative(row["k_industrial_W_mK"], Transport.Conductivity(phase), 10 * tolerance, $"k {row}");
        Approx.Relative(row["k_no_enhancement_W_mK"], Transport.ConductivityWithoutEnhancement(phase.Density, phase.Temperature), tolerance, $"k0 {row}");
    });

    private static void Common(ReferenceTable.Row row, in WaterCore state)
    {
        double tolerance = Tolerance(row);
        Assert.True(row["region"] == state.Region, $"region {state.Region} for {row}");
        Approx.Relative(row["T_K"], state.Temperature, tolerance, $"T {row}");
        Approx.Relative(row["v_m3_kg"], state.SpecificVolume, tolerance, $"v {row}");
        if (state.IsWet) Approx.Absolute(row["x"], state.Quality, 10 * tolerance, $"x {row}");
    }

    // The printed inputs have 12 digits; beside the critical point the last of them is worth more.
    private static double Tolerance(ReferenceTable.Row row) => row["near_crit"] == 1 ? 1e-6 : row["region"] >= 3 ? 1e-8 : 1e-9;

    private static void EachRow(string table, Action<ReferenceTable.Row> check)
    {
        ReferenceTable reference = ReferenceTable.Load($"Steam/Data/{table}.csv");
        Assert.NotEmpty(reference.Rows);
        foreach (ReferenceTable.Row row in reference.Rows) check(row);
    }
}
