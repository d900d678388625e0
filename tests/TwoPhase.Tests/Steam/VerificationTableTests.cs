using TwoPhase.Steam;

namespace TwoPhase.Tests.Steam;

/// <summary>The computer-program verification tables of the IAPWS releases, every printed digit.</summary>
public class VerificationTableTests
{
    [Fact]
    public void Region1_Table5_MatchesPrintedDigits() =>
        EachRow("r7-97-table05", row => Property(Region1.At(row["p_MPa"] * 1e6, row["T_K"]), row.Text("out")));

    [Fact]
    public void Region2_Table15_MatchesPrintedDigits() =>
        EachRow("r7-97-table15", row => Property(Region2.At(row["p_MPa"] * 1e6, row["T_K"]), row.Text("out")));

    [Fact]
    public void Region3_Table33_MatchesPrintedDigits() =>
        EachRow("r7-97-table33", row => Property(Region3.At(row["rho_kg_m3"], row["T_K"]), row.Text("out")));

    [Fact]
    public void Region1BackwardTemperature_Table7_MatchesPrintedDigits() =>
        EachRow("r7-97-table07", row => Region1.BackwardTemperature(row["p_MPa"] * 1e6, row["h_kJ_kg"] * 1e3));

    [Fact]
    public void Region2BackwardTemperature_Table24_MatchesPrintedDigits() =>
        EachRow("r7-97-table24", row => Region2.BackwardTemperature(row["p_MPa"] * 1e6, row["h_kJ_kg"] * 1e3));

    [Fact]
    public void SaturationPressure_Table35_MatchesPrintedDigits() =>
        EachRow("r7-97-table35", row => SaturationLine.Pressure(row["T_K"]));

    [Fact]
    public void SaturationTemperature_Table36_MatchesPrintedDigits() =>
        EachRow("r7-97-table36", row => SaturationLine.Temperature(row["p_MPa"] * 1e6));

    [Fact]
    public void Viscosity_Table4_MatchesPrintedDigits() =>
        EachRow("r12-08-table4", row => Transport.Viscosity(row["rho_kg_m3"], row["T_K"]));

    [Fact]
    public void ConductivityWithoutEnhancement_Table4_MatchesPrintedDigits() =>
        EachRow("r15-11-table4", row => Transport.ConductivityWithoutEnhancement(row["rho_kg_m3"], row["T_K"]));

    [Fact]
    public void Conductivity_Table7_MatchesPrintedDigits() =>
        EachRow("r15-11-table7", row => Transport.Conductivity(Region1.At(row["p_MPa"] * 1e6, row["T_K"])));

    [Fact]
    public void Conductivity_Table8_MatchesPrintedDigits() =>
        EachRow("r15-11-table8", row => Transport.Conductivity(Region2.At(row["p_MPa"] * 1e6, row["T_K"])));

    [Fact]
    public void Conductivity_Table9_MatchesPrintedDigits() =>
        EachRow("r15-11-table9", row => Transport.Conductivity(Region3.At(row["rho_kg_m3"], row["T_K"])));

    [Fact]
    public void SurfaceTension_Table1_MatchesPrintedDigits() =>
        EachRow("r1-76-table1", row => Transport.SurfaceTension(row["t_degC"] + 273.15));

    private static void EachRow(string table, Func<ReferenceTable.Row, double> compute)
    {
        ReferenceTable reference = ReferenceTable.Load($"Steam/Data/{table}.csv");
        Assert.NotEmpty(reference.Rows);
        foreach (ReferenceTable.Row row in reference.Rows) Printed.Matches(row, compute(row));
    }

    private static double Property(in PhaseCore phase, string name) => name switch
    {
        "p" => phase.Pressure,
        "v" => phase.SpecificVolume,
        "h" => phase.Enthalpy,
        "u" => phase.InternalEnergy,
        "s" => phase.Entropy,
        "cp" => phase.IsobaricHeatCapacity,
        "w" => phase.SpeedOfSound,
        _ => throw new ArgumentException($"No property '{name}'.", nameof(name)),
    };
}
