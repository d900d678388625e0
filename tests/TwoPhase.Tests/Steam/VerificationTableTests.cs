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
    public void Region5_Table42_MatchesPrintedDigits() =>
        EachRow("r7-97-table42", row => Property(Region5.At(row["p_MPa"] * 1e6, row["T_K"]), row.Text("out")));

    [Fact]
    public void Metastable_Table18_MatchesPrintedDigits() =>
        EachRow("r7-97-table18", row => Property(Region2.Metastable(row["p_MPa"] * 1e6, row["T_K"]), row.Text("out")));

    [Fact]
    public void Border23_PublishedPoint_MatchesPrintedDigits()
    {
        // R7-97(2012), section 4: 623.15 K and 16.5291643 MPa.
        Approx.Absolute(16.5291643e6, Border23.Pressure(623.15), 0.05);
        Approx.Absolute(623.150000, Border23.Temperature(16.5291643e6), 5e-7);
    }

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
        EachRow("r15-11-table8", row => Transport.Conductivity(Water.AtPressureTemperature(row["p_MPa"] * 1e6, row["T_K"]).Phase));

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
