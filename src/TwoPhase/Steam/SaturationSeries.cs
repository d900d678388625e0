using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam;

/// <summary>
/// Saturated properties from pressure as one series each, from which <see cref="SaturationCells"/> are laid. A fresh
/// process compiles the regions' long sums for 10 ms before it has their first value; the series is a loop of a line.
/// </summary>
/// <remarks>
/// <para>y = Σ ck Tk(ξ) with ξ = (β − 40)/24 and β = (p / 1 Pa)^(1/4); Tk Chebyshev polynomials.</para>
/// <para>Range: 2^16 Pa to 2^24 Pa (β from 16 to 64); above ps(623.15 K) regions 1 and 2 continued.</para>
/// <para>Accuracy: within 5e-13 relative of the formulation, half of it the formulation's own round-off.</para>
/// </remarks>
internal static partial class SaturationSeries
{
    private const int Terms = 36;
    private const double Middle = 40, HalfWidth = 24;

    /// <summary>The value at a pressure [Pa]; raw SI.</summary>
    [MethodImpl(Fast.Hot)]
    public static double At(SaturatedProperty property, double pressure)
    {
        ref double coefficients = ref MemoryMarshal.GetReference(Coefficients.Slice((int)property * Terms, Terms));

        // Clenshaw's recurrence.
        double x = (Math.Sqrt(Math.Sqrt(pressure)) - Middle) / HalfWidth, twice = 2 * x, next = 0, afterNext = 0;
        for (int k = Terms - 1; k > 0; k--) (next, afterNext) = (Fast.MultiplyAdd(twice, next, Unsafe.Add(ref coefficients, k) - afterNext), next);
        double sum = (x * next) - afterNext + coefficients;
        return property == SaturatedProperty.VapourVolume ? sum / pressure : sum;
    }
}
