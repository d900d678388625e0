using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Steam;

/// <summary>Five saturated properties over the cells of <see cref="SaturationTable"/>, for columns; raw SI.</summary>
/// <remarks>
/// Number by number and free of the runtime's vector types, on purpose: to load those takes a fresh process 4 ms, longer than a column
/// of 262,144. Made when first asked for, 40 KiB.
/// </remarks>
internal sealed class SaturationCells
{
    private const int Bits = 4;
    private const int Degree = 7;
    private const int Terms = Degree + 1;
    private const int Properties = (int)SaturatedProperty.VapourVolume + 1;

    private static SaturationCells? _shared;

    private readonly int _first;
    private readonly double[] _coefficients;

    [MethodImpl(Fast.Hot)]
    private SaturationCells()
    {
        _first = OctaveGrid.Locate(SaturationTable.LowestPressure, Bits, out _);
        int cells = OctaveGrid.Locate(SaturationTable.HighestPressure, Bits, out _) - _first + 1;
        var polynomial = new ChebyshevCell(Degree);
        var coefficients = new double[cells * Properties * Terms];
        for (int row = 0; row < cells * Properties; row++)
        {
            int cell = _first + (row / Properties);
            double start = OctaveGrid.Start(cell, Bits), half = (OctaveGrid.Start(cell + 1, Bits) - start) / 2;
            for (int node = 0; node <= Degree; node++)
            {
                double pressure = start + (half * (1 + polynomial.Nodes[node]));
                polynomial.Add(ref coefficients[row * Terms], node, SaturationSeries.At((SaturatedProperty)(row % Properties), pressure));
            }
        }

        _coefficients = coefficients;
    }

    /// <summary>The cells; whoever comes first makes them.</summary>
    public static SaturationCells Shared => _shared ??= new();

    /// <summary>The cell of a pressure inside the table, and the place in it.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public ref double Locate(double pressure, out double place) =>
        ref _coefficients[(OctaveGrid.Locate(pressure, Bits, out place) - _first) * Properties * Terms];

    /// <summary>One property at a place in a cell.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double At(ref double cell, double place, SaturatedProperty property)
    {
        ref double c = ref Unsafe.Add(ref cell, (int)property * Terms);
#if NET
        // In pairs, then pairs of pairs: a third of the wait of one chain. Spelled out, since each call that is taken in costs a fresh process.
        double two = place * place;
        double low = Math.FusedMultiplyAdd(Math.FusedMultiplyAdd(Unsafe.Add(ref c, 3), place, Unsafe.Add(ref c, 2)), two, Math.FusedMultiplyAdd(Unsafe.Add(ref c, 1), place, c));
        double high = Math.FusedMultiplyAdd(Math.FusedMultiplyAdd(Unsafe.Add(ref c, 7), place, Unsafe.Add(ref c, 6)), two, Math.FusedMultiplyAdd(Unsafe.Add(ref c, 5), place, Unsafe.Add(ref c, 4)));
        return Math.FusedMultiplyAdd(high, two * two, low);
#else
        double sum = Unsafe.Add(ref c, Degree);
        for (int power = Degree - 1; power >= 0; power--) sum = (sum * place) + Unsafe.Add(ref c, power);
        return sum;
#endif
    }
}
