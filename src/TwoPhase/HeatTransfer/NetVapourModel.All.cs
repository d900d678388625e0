namespace TwoPhase.HeatTransfer;

public abstract partial class NetVapourModel
{
    /// <summary>Every model of this class that needs no parameters, for reports that show the spread.</summary>
    public static IReadOnlyList<NetVapourModel> All => Catalogue.Models;

    // A class of its own: the statics of a partial class over several files are initialised in no stated order.
    private static class Catalogue
    {
        public static readonly IReadOnlyList<NetVapourModel> Models = [SahaZuber];
    }
}
