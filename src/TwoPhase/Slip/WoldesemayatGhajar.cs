using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>Woldesemayat and Ghajar (2007): Dix's form with inclination, fitted to a large bank of data.</summary>
    /// <remarks>
    /// <para>α = jg / {jg [1 + (jl/jg)^b] + Vgj}, b = (ρg/ρl)^0.1,
    /// Vgj = 2.9 [g D σ (1 + cos θ) (ρl − ρg)/ρl²]^(1/4) (1.22 + 1.22 sin θ)^(pa/p).</para>
    /// <para>α void fraction [-], jg = x G/ρg and jl = (1 − x) G/ρl superficial velocities [m/s], D bore [m], σ surface tension [N/m],
    /// ρl and ρg saturated densities [kg/m³], θ inclination [rad], p pressure and pa = 101 325 Pa, g standard gravity [m/s²].
    /// The coefficient 2.9 carries the unit m^(−1/4).</para>
    /// <para>Range: horizontal to vertical upflow, bores 12.7 to 102.3 mm (those of its data, as remembered). The drift does not vanish with the liquid,
    /// so α ends a little below 1; at low x the slip may fall below 1.</para>
    /// <para>Accuracy: 85 % of 2845 points within 15 % (as remembered), mostly air-water near atmospheric pressure.</para>
    /// <para>Source: Woldesemayat and Ghajar, Int. J. Multiphase Flow 33(4), 347-370 (2007). Some prints show the exponent as p/pa, which
    /// gives nonsense at pressure.</para>
    /// </remarks>
    public static VoidFractionModel WoldesemayatGhajar { get; } = new WoldesemayatGhajarModel();

    private sealed class WoldesemayatGhajarModel : VoidFractionModel
    {
        private const double Atmosphere = 101325;

        public override string Name => "Woldesemayat-Ghajar";

        protected internal override double VoidFractionCore(in FlowState flow)
        {
            double vapour = flow.Quality * flow.MassFlux / flow.VapourDensity, liquid = (1 - flow.Quality) * flow.MassFlux / flow.LiquidDensity;
            if (vapour <= 0) return 0;

            double b = Math.Pow(flow.VapourDensity / flow.LiquidDensity, 0.1);
            double buoyancy = SiDoor.StandardGravity * flow.Bore * flow.SurfaceTension * (1 + Math.Cos(flow.Inclination)) * (flow.LiquidDensity - flow.VapourDensity);
            double drift = 2.9 * Fast.Sqrt(Fast.Sqrt(buoyancy) / flow.LiquidDensity) * Math.Pow(1.22 + (1.22 * Math.Sin(flow.Inclination)), Atmosphere / flow.Pressure);
            return vapour / ((vapour * (1 + Math.Pow(liquid / vapour, b))) + drift);
        }

        protected internal override Applicability CheckCore(in FlowState flow) => Applicability.Inside
            .Check(ApplicabilityLimits.Inclination, flow.Inclination, 0, Math.PI / 2)
            .Check(ApplicabilityLimits.Bore, flow.Bore, 0.0127, 0.1023);
    }
}
