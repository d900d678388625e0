namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Every model of this class that needs no parameters, for reports that show the spread.</summary>
    public static IReadOnlyList<VoidFractionModel> All => Catalogue.Models;

    // A class of its own: the statics of a partial class over several files are initialised in no stated order.
    private static class Catalogue
    {
        public static readonly IReadOnlyList<VoidFractionModel> Models =
        [
            Homogeneous, Zivi, Thom, Baroczy, LockhartMartinelli, TurnerWallis, Smith, Chisholm, ChisholmArmand, Fauske, Premoli,
            RouhaniAxelsson, RouhaniAxelssonMassFlux, RouhaniAxelssonVertical, Steiner, ZuberFindlay, Dix, Bestion, WoldesemayatGhajar,
        ];
    }
}
