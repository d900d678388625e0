using TwoPhase.Flow;
using TwoPhase.HeatTransfer;

namespace TwoPhase.Tests.HeatTransfer;

public class FilmTests
{
    // Recomputed in Python from the formulas as printed; Nu for k/D = 1.
    [Theory]
    [InlineData(1e4, 0.7, 29.77282, 31.60582)]
    [InlineData(1e5, 7, 598.53388, 500.91848)]
    [InlineData(5e5, 0.95, 790.80108, 816.56974)]
    public void SinglePhase_Nusselt_MatchesIndependentArithmetic(double reynolds, double prandtl, double gnielinski, double dittusBoelter)
    {
        SinglePhase phase = new(reynolds, 1, 1, 1, prandtl);
        Approx.Relative(gnielinski, SinglePhaseFilm.GnielinskiCore(phase), 2e-7);
        Approx.Relative(dittusBoelter, SinglePhaseFilm.DittusBoelterCore(phase), 2e-7);
    }

    [Fact]
    public void GungorWinterton1986_TenMegapascals_MatchesIndependentArithmetic() =>
        Approx.Relative(28631, FilmModel.GungorWinterton1986.CoefficientCore(HeatTransferFlows.TenMegapascals(0.5), 150e3), 2e-5);
}
