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
    };

    [Theory, MemberData(nameof(Columns), DisableDiscoveryEnumeration = true)]
    public void VoidFractionCore_ReferenceRows_MatchesToPrintedDigits(string column, VoidFractionModel model)
    {
        foreach (ReferenceTable.Row row in Table.Rows)
            Approx.Relative(row[column], model.VoidFractionCore(row.ToFlowState()), 1e-9, column + " at " + row);
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
