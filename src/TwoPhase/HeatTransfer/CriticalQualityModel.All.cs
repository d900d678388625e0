namespace TwoPhase.HeatTransfer;

public abstract partial class CriticalQualityModel
{
    /// <summary>Every model of this class that needs no parameters, for reports that show the spread.</summary>
    public static IReadOnlyList<CriticalQualityModel> All => Catalogue.Models;

    /// <summary>
    /// The default where a pass names none: <see cref="KeferKohlerKastner"/>, which is <see cref="Konkov"/> in a vertical tube and
    /// tells top from bottom in any other.
    /// </summary>
    public static CriticalQualityModel Default => KeferKohlerKastner;

    // A class of its own: the statics of a partial class over several files are initialised in no stated order.
    private static class Catalogue
    {
        public static readonly IReadOnlyList<CriticalQualityModel> Models = [Konkov, KeferKohlerKastner];
    }
}
