using TwoPhase.Steam.Backward;

namespace TwoPhase.Tests.Steam.Backward;

/// <summary>The backward equations over all their subregions, against an independent program (python3-iapws 1.5.2).</summary>
public class BackwardGridTests
{
    // The table prints 12 digits; sums with terms of 1e30 and more that cancel lose some in either program.
    private const double Tolerance = 1e-9;

    [Fact]
    public void FromEnthalpy_Grid_MatchesTheIndependentProgram() => EachRow("if97-backward-ph.csv", row =>
    {
        (double p, double h) = (row["p_Pa"], row["h_J_kg"]);
        double temperature = row.Text("region") switch
        {
            "1" => Backward1.TemperatureFromEnthalpy(p, h),
            "2" => Backward2.TemperatureFromEnthalpy(p, h),
            _ => Backward3.TemperatureFromEnthalpy(p, h),
        };
        Approx.Relative(row["T_backward_K"], temperature, Tolerance, row.ToString());
        if (row.Text("region") == "3") Approx.Relative(row["v_backward_m3_kg"], Backward3.VolumeFromEnthalpy(p, h), Tolerance, row.ToString());
    });

    [Fact]
    public void FromEntropy_Grid_MatchesTheIndependentProgram() => EachRow("if97-backward-ps.csv", row =>
    {
        (double p, double s) = (row["p_Pa"], row["s_J_kgK"]);
        double temperature = row.Text("region") switch
        {
            "1" => Backward1.TemperatureFromEntropy(p, s),
            "2" => Backward2.TemperatureFromEntropy(p, s),
            _ => Backward3.TemperatureFromEntropy(p, s),
        };
        Approx.Relative(row["T_backward_K"], temperature, Tolerance, row.ToString());
        if (row.Text("region") == "3") Approx.Relative(row["v_backward_m3_kg"], Backward3.VolumeFromEntropy(p, s), Tolerance, row.ToString());
    });

    [Fact]
    public void FromEnthalpyEntropy_Grid_MatchesTheIndependentProgram() => EachRow("if97-backward-hs.csv", row =>
    {
        (double h, double s) = (row["h_J_kg"], row["s_J_kgK"]);
        if (row.Text("region") == "4")
        {
            Approx.Relative(row["Tsat_backward_K"], Boundaries.SaturationTemperatureFromEnthalpyEntropy(h, s), Tolerance, row.ToString());
            return;
        }

        double pressure = row.Text("region") switch
        {
            "1" => Backward1.PressureFromEnthalpyEntropy(h, s),
            "2" => Backward2.PressureFromEnthalpyEntropy(h, s),
            _ => Backward3.PressureFromEnthalpyEntropy(h, s),
        };
        Approx.Relative(row["p_backward_Pa"], pressure, Tolerance, row.ToString());
    });

    [Fact]
    public void TermTable_PartMissing_Throws() =>
        Assert.Throws<ArgumentException>(() => new TermTable([0, 1], [0], [1.0, 2.0]));

    [Fact]
    public void TemperatureFromEnthalpy_AllocatesNothing() =>
        Assert.Equal(0, AllocationProbe.Bytes(() => Backward3.TemperatureFromEnthalpy(30e6, 2100e3)));

    private static void EachRow(string file, Action<ReferenceTable.Row> check)
    {
        IReadOnlyList<ReferenceTable.Row> rows = ReferenceTable.Load("Steam/Data/" + file).Rows;
        Assert.NotEmpty(rows);
        foreach (ReferenceTable.Row row in rows) check(row);
    }
}
