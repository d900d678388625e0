using TwoPhase.Friction;

namespace TwoPhase.Tests.Friction;

/// <summary>Every friction correlation against the tables of an independent implementation (see the headers of the files).</summary>
public class FrictionGradientTableTests
{
    private static readonly ReferenceTable.Row[] Rows =
    [
        .. ReferenceTable.Load("Friction/Data/two-phase-gradient.csv").Rows,
        .. ReferenceTable.Load("Friction/Data/two-phase-gradient-low.csv").Rows,
    ];

    public static TheoryData<string, FrictionModel> Columns => new()
    {
        { "muller_steinhagen_heck", FrictionModel.MullerSteinhagenHeck },
        { "friedel", FrictionModel.Friedel },
        { "chisholm_b", FrictionModel.ChisholmB },
        { "lockhart_martinelli", FrictionModel.LockhartMartinelli },
        { "gronnerud", FrictionModel.Gronnerud },
        { "homogeneous_mcadams", FrictionModel.HomogeneousMcAdams },
        { "homogeneous_cicchitti", FrictionModel.HomogeneousCicchitti },
        { "homogeneous_dukler", FrictionModel.HomogeneousDukler },
    };

    [Theory, MemberData(nameof(Columns), DisableDiscoveryEnumeration = true)]
    public void GradientCore_ReferenceRows_MatchesToPrintedDigits(string column, FrictionModel model)
    {
        foreach (ReferenceTable.Row row in Rows)
            Approx.Relative(row[$"dpdz_{column}_Pa_m"], model.GradientCore(row.ToFlowState(), row["roughness_m"]), 1e-9, column + " at " + row);
    }
}
