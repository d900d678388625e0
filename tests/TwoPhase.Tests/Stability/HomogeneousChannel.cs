using System.Numerics;

namespace TwoPhase.Tests.Stability;

/// <summary>
/// The neutral stability of a uniformly heated homogeneous channel at constant pressure drop, from its linearised equations in the frequency domain:
/// what the simplified published criterion is compared with.
/// </summary>
/// <remarks>
/// Derivation, with length, inlet velocity and liquid density as units, Ω = Npch, τ = Nsub/Ω, λ = τ, θ = ln(1 + Ω (1 − λ))/Ω. A disturbance e^(pt) of the inlet velocity
/// moves the boiling boundary by δλ = (1 − e^(−pτ))/p and every velocity behind it by δu = 1 − Ω δλ. What began to boil a time a ago stands ζ = ∫u_in(t − s − τ) e^(Ωs) ds
/// behind the boundary, so δζ = e^(−pτ)(e^((Ω−p)a) − 1)/(Ω − p), and at a fixed place δρ = ρ Ω (δλ + δζ)/u with ρ = 1/u, u = e^(Ωa). The momentum balance
/// Δp = ki + λ (du/dt + F) + ∫[ρ (∂u/∂t + u Ω) + F ρ u²] dz + ke ρ u² is linearised; dz = u da. It is zero on the border of stability.
/// </remarks>
internal sealed class HomogeneousChannel(double subcooling, double inlet, double friction, double exit)
{
    private const int Panels = 400;

    /// <summary>Npch − Nsub on the border, and the period over the transit time; by Newton's method on the angular frequency and Npch.</summary>
    public (double Excess, double PeriodOverTransit) Threshold()
    {
        double w = 9, n = subcooling + 12;
        for (int i = 0; i < 100; i++)
        {
            const double d = 1e-6;
            Complex at = PressureDrop(w, n), byFrequency = (PressureDrop(w + d, n) - at) / d, byNumber = (PressureDrop(w, n + d) - at) / d;
            double determinant = (byFrequency.Real * byNumber.Imaginary) - (byFrequency.Imaginary * byNumber.Real);
            double dw = ((at.Real * byNumber.Imaginary) - (at.Imaginary * byNumber.Real)) / determinant, dn = ((byFrequency.Real * at.Imaginary) - (byFrequency.Imaginary * at.Real)) / determinant;
            double share = Math.Min(1, Math.Min(0.2 * w / Math.Abs(dw), 0.2 * n / Math.Abs(dn)));
            w -= share * dw;
            n -= share * dn;
            if (Math.Abs(dw) + Math.Abs(dn) < 1e-10) return (n - subcooling, 2 * Math.PI / w / Transit(n));
        }

        throw new InvalidOperationException("no border found");
    }

    private double Transit(double n) => (subcooling / n) + (Math.Log(1 + n - subcooling) / n);

    private Complex PressureDrop(double w, double n)
    {
        var p = new Complex(0, w);
        double tau = subcooling / n, theta = Math.Log(1 + n - subcooling) / n, h = theta / Panels;
        Complex boundary = (1 - Complex.Exp(-p * tau)) / p, velocity = 1 - (n * boundary), sum = 0;
        for (int i = 0; i <= Panels; i++)
        {
            double a = i * h, u = Math.Exp(n * a), weight = i is 0 or Panels ? 1 : i % 2 == 1 ? 4 : 2;
            Complex density = Density(a);
            sum += weight * u * ((p * velocity / u) + (density * u * n) + (n * velocity / u) + (friction * ((density * u * u) + (2 * velocity))));
        }

        double exitVelocity = Math.Exp(n * theta);
        Complex liquid = (p * tau) + (friction * ((2 * tau) + boundary)) + (2 * inlet);
        return liquid - ((n + friction) * boundary) + (sum * h / 3) + (exit * ((Density(theta) * exitVelocity * exitVelocity) + (2 * velocity)));

        Complex Density(double a)
        {
            double u = Math.Exp(n * a);
            Complex particle = Complex.Exp(-p * tau) * (Complex.Exp((n - p) * a) - 1) / (n - p);
            return n * (boundary + particle) / (u * u);
        }
    }
}
