using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.HeatTransfer;

public abstract partial class CriticalQualityModel
{
    /// <summary>Kefer, Köhler and Kastner (1989) about the mean of <see cref="Konkov"/>: top and bottom of a horizontal or inclined tube apart.</summary>
    /// <remarks>
    /// <para>Δx = 16 / (2 + Fr)², Fr = xcr G / √(g D cos θ ρg (ρl − ρg)); top xcr − Δx/2, bottom xcr + Δx/2.</para>
    /// <para>xcr critical quality of the vertical tube [kg/kg], G mass flux [kg/(m²·s)], D bore [m], θ inclination against the
    /// horizontal, ρl and ρg saturated densities [kg/m³], g = 9.80665 m/s². Vertical tubes have Δx = 0.</para>
    /// <para>Range: tubes of 24.3 mm bore, 2.5 to 20 MPa, G 500 to 2500 kg/(m²·s), and the range of the mean. In the wider tubes
    /// of most evaporators Fr is smaller and the spread larger than in any data: an indicator only.</para>
    /// <para>Accuracy: none stated in the sources at hand.</para>
    /// <para>Source: Kefer, Köhler and Kastner, Int. J. Multiphase Flow 15(3), 385-392 (1989); coefficients and range from memory, and
    /// no second source found to check them against.</para>
    /// </remarks>
    public static CriticalQualityModel KeferKohlerKastner { get; } = new KeferKohlerKastnerModel(new KonkovModel());

    /// <summary>Kefer, Köhler and Kastner (1989) about the mean of another model: top and bottom of a horizontal or inclined tube apart.</summary>
    /// <param name="mean">The model for the vertical tube, which gives the mean of the perimeter.</param>
    /// <remarks><inheritdoc cref="KeferKohlerKastner" path="/remarks/node()"/></remarks>
    /// <exception cref="ArgumentNullException"><paramref name="mean"/> is null.</exception>
    public static CriticalQualityModel KeferKohlerKastnerAbout(CriticalQualityModel mean) =>
        new KeferKohlerKastnerModel(Require.NotNull(mean, nameof(mean)));

    private sealed class KeferKohlerKastnerModel(CriticalQualityModel mean) : CriticalQualityModel
    {
        public override string Name => $"Kefer-Köhler-Kastner about {mean.Name}";

        protected internal override double MeanCore(in FlowState flow, double heatFlux) => mean.MeanCore(flow, heatFlux);

        protected internal override double SpreadCore(in FlowState flow, double mean)
        {
            double buoyancy = SiDoor.StandardGravity * flow.Bore * Math.Cos(flow.Inclination) * flow.VapourDensity * (flow.LiquidDensity - flow.VapourDensity);
            double froude = mean * flow.MassFlux / Fast.Sqrt(buoyancy);
            double denominator = 2 + froude;
            return 16 / (denominator * denominator);
        }

        // The paper's tube is 24.3 mm; a tenth either way counts as that tube.
        protected internal override Applicability CheckCore(in FlowState flow, double heatFlux) => Applicability.Inside
            .Check(ApplicabilityLimits.Bore, flow.Bore, 0.022, 0.027)
            .Check(ApplicabilityLimits.Pressure, flow.Pressure, 2.5e6, 20e6)
            .Check(ApplicabilityLimits.MassFlux, flow.MassFlux, 500, 2500)
            .And(mean.CheckCore(flow, heatFlux));
    }
}
