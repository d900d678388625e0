using TwoPhase.Flow;

namespace TwoPhase.HeatTransfer;

public abstract partial class FilmModel
{
    /// <summary>Chen (1966): flow boiling as enhanced convection plus Forster and Zuber's nucleate boiling, suppressed by the flow.</summary>
    /// <remarks>
    /// <para>h = F hl + S hfz; hl Dittus-Boelter of the liquid share; F = 2.35 (1/Xtt + 0.213)^0.736 and
    /// never less than 1, as below 1/Xtt = 0.1; S = 1 / (1 + 2.53·10⁻⁶ (Rel F^1.25)^1.17); hfz = 0.00122 kl^0.79 cpl^0.45 ρl^0.49 ΔT^0.24 Δp^0.75 / (σ^0.5 μl^0.29 hfg^0.24 ρg^0.24).</para>
    /// <para>h film coefficient [W/(m²·K)], Xtt Martinelli parameter of turbulent phases, Rel = G(1 − x)D/μl, ΔT = Tw − Ts wall
    /// superheat [K], Δp rise of saturation pressure over ΔT [Pa], by Clausius-Clapeyron from the properties at Ts. ΔT is solved from
    /// h ΔT = q. Towards dry steam the result is never less than Dittus-Boelter for all the flow as vapour.</para>
    /// <para>Range: 0.055 to 3.5 MPa for water, x 0.01 to 0.71, q 6 to 2400 kW/m², vertical; range of the paper's data, from memory.</para>
    /// <para>Accuracy: mean deviation 11 % on the paper's own data; from memory.</para>
    /// <para>Source: Chen, Ind. Eng. Chem. Process Des. Dev. 5(3), 322-329 (1966); F and S in the forms fitted to its curves that
    /// Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), section 7.4, give.</para>
    /// </remarks>
    public static FilmModel Chen { get; } = new ChenModel();

    private sealed class ChenModel : FilmModel
    {
        public override string Name => "Chen";

        protected internal override double CoefficientCore(in FlowState flow, double heatFlux)
        {
            double wet = LiquidShare(flow);
            SinglePhase liquid = SinglePhase.Liquid(flow, flow.MassFlux * wet);
            double enhancement = ChenEnhancement(Math.Exp(LogInverseMartinelli(flow, wet)));
            double suppression = ChenSuppression(liquid.Reynolds * Math.Pow(enhancement, 1.25));
            double single = SinglePhaseFilm.DittusBoelterCore(liquid), convective = enhancement * single;
            double h = heatFlux > 0
                ? heatFlux / Superheat(flow, heatFlux, convective, suppression * ForsterZuber(flow))
                : convective;
            return NotBelowDrySteam(flow, wet, single, h);
        }

        protected internal override Applicability CheckCore(in FlowState flow, double heatFlux) => Applicability.Inside
            .Check(ApplicabilityLimits.Pressure, flow.Pressure, 0.055e6, 3.5e6)
            .Check(ApplicabilityLimits.Quality, flow.Quality, 0.01, 0.71)
            .Check(ApplicabilityLimits.HeatFlux, heatFlux, 6e3, 2.4e6);

        /// <summary>ΔT with q = a ΔT^1.24 Δp^0.75 + b ΔT, by Newton in ln ΔT, where the equation is nearly a straight line.</summary>
        private static double Superheat(in FlowState flow, double heatFlux, double b, double a)
        {
            double saturation = flow.SaturationTemperature;
            double slope = flow.LatentHeat / (saturation * ((1 / flow.VapourDensity) - (1 / flow.LiquidDensity)));   // dp/dT [Pa/K]
            double scale = saturation * slope / flow.Pressure;   // ln(psat/p) = scale ΔT/Tw

            // With Δp linear and ΔT^1.99 taken as ΔT², a quadratic: within a per cent or so of the root.
            double square = a * Math.Exp(0.75 * Math.Log(slope));
            double superheat = 2 * heatFlux / (b + Math.Sqrt((b * b) + (4 * square * heatFlux)));
            for (int i = 0; i < 20; i++)
            {
                double wall = saturation + superheat;
                double half = Math.Tanh(0.5 * scale * superheat / wall);   // exp(u) − 1 = 2 tanh(u/2) / (1 − tanh(u/2)), good at small u
                double rise = flow.Pressure * 2 * half / (1 - half);
                double nucleate = a * Math.Exp((1.24 * Math.Log(superheat)) + (0.75 * Math.Log(rise)));
                double total = nucleate + (b * superheat);
                double riseSlope = (flow.Pressure + rise) * scale * saturation / (wall * wall) * superheat / rise;   // dlnΔp/dlnΔT
                double step = Math.Log(heatFlux / total) * total / ((nucleate * (1.24 + (0.75 * riseSlope))) + (b * superheat));
                superheat *= Math.Exp(step);
                if (Math.Abs(step) < 1e-6) break;   // quadratic, and nearly straight: the next step would be 1e-13 or less
            }

            return superheat;
        }
    }

    internal static double ChenEnhancement(double inverseMartinelli) =>
        Math.Max(1, 2.35 * Math.Pow(inverseMartinelli + 0.213, 0.736));

    internal static double ChenSuppression(double twoPhaseReynolds) => 1 / (1 + (2.53e-6 * Math.Pow(twoPhaseReynolds, 1.17)));

    // hfz over ΔT^0.24 Δp^0.75
    internal static double ForsterZuber(in FlowState flow) => 0.00122 * Math.Exp(
        (0.79 * Math.Log(flow.LiquidConductivity)) + (0.45 * Math.Log(flow.LiquidHeatCapacity)) + (0.49 * Math.Log(flow.LiquidDensity))
        - (0.5 * Math.Log(flow.SurfaceTension)) - (0.29 * Math.Log(flow.LiquidViscosity)) - (0.24 * Math.Log(flow.LatentHeat * flow.VapourDensity)));
}
