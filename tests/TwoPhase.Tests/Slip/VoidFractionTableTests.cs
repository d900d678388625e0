using TwoPhase.Flow;
using TwoPhase.Slip;

namespace TwoPhase.Tests.Slip;

/// <summary>Every void-fraction correlation against the table of an independent implementation (see the header of the file).</summary>
public class VoidFractionTableTests
{
    private static readonly ReferenceTable Table = ReferenceTable.Load("Slip/Data/slip.csv");

    public static TheoryData<string, VoidFractionModel> Columns => new()
    {
        { "alpha_homogeneous", VoidFractionModel.Homogeneous },
        { "alpha_zivi", VoidFractionModel.Zivi },
        { "alpha_smith", VoidFractionModel.Smith },
        { "alpha_rouhani_1", VoidFractionModel.RouhaniAxelsson },
        { "alpha_rouhani_2", VoidFractionModel.RouhaniAxelssonMassFlux },
        { "alpha_rouhani_vertical", VoidFractionModel.RouhaniAxelssonVertical },
        { "alpha_steiner", VoidFractionModel.Steiner },
        { "alpha_fauske", VoidFractionModel.Fauske },
        { "alpha_chisholm", VoidFractionModel.Chisholm },
        { "alpha_chisholm_armand", VoidFractionModel.ChisholmArmand },
        { "alpha_baroczy", VoidFractionModel.Baroczy },
        { "alpha_thom", VoidFractionModel.Thom },
        { "alpha_turner_wallis", VoidFractionModel.TurnerWallis },
        { "alpha_lockhart_martinelli", VoidFractionModel.LockhartMartinelli },
        { "alpha_dix", VoidFractionModel.Dix },
        { "alpha_woldesemayat_ghajar_0", VoidFractionModel.WoldesemayatGhajar },
        { "alpha_premoli", VoidFractionModel.Premoli },
    };

    [Theory, MemberData(nameof(Columns), DisableDiscoveryEnumeration = true)]
    public void VoidFractionCore_ReferenceRows_MatchesToPrintedDigits(string column, VoidFractionModel model)
    {
        foreach (ReferenceTable.Row row in Table.Rows)
            Approx.Relative(row[column], model.VoidFractionCore(row.ToFlowState()), 1e-9, column + " at " + row);
    }

    [Fact]
    public void WoldesemayatGhajar_VerticalReferenceRows_MatchesToPrintedDigits()
    {
        foreach (ReferenceTable.Row row in Table.Rows)
            Approx.Relative(row["alpha_woldesemayat_ghajar_90"], VoidFractionModel.WoldesemayatGhajar.VoidFractionCore(row.ToFlowState() with { Inclination = Math.PI / 2 }), 1e-9, row.ToString());
    }

    [Theory, MemberData(nameof(Columns), DisableDiscoveryEnumeration = true)]
    public void SlipRatioCore_ReferenceRows_GivesTheVoidFractionBack(string column, VoidFractionModel model)
    {
        foreach (ReferenceTable.Row row in Table.Rows)
        {
            FlowState flow = row.ToFlowState();
            double y = (1 - flow.Quality) / flow.Quality * flow.VapourDensity / flow.LiquidDensity;
            Approx.Relative(row[column], 1 / (1 + (model.SlipRatioCore(flow) * y)), 1e-9, column + " at " + row);
        }
    }
}
