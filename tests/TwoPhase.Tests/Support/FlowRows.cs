using TwoPhase.Flow;

namespace TwoPhase.Tests.Support;

/// <summary>Flow states from the rows of the two-phase reference tables, with the properties as printed there.</summary>
internal static class FlowRows
{
    public static FlowState ToFlowState(this ReferenceTable.Row row) => new()
    {
        Pressure = row["p_Pa"],
        SaturationTemperature = row["T_K"],
        LiquidDensity = row["rhol_kg_m3"],
        VapourDensity = row["rhog_kg_m3"],
        LiquidViscosity = row["mul_Pa_s"],
        VapourViscosity = row["mug_Pa_s"],
        SurfaceTension = row["sigma_N_m"],
        Quality = row["x"],
        MassFlux = row["G_kg_m2s"],
        Bore = row["D_m"],
    };
}
