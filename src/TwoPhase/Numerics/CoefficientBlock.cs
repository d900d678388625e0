using System.Diagnostics;
using System.Runtime.CompilerServices;
#if NET
using System.Runtime.InteropServices;
#endif

namespace TwoPhase.Numerics;

/// <summary>Doubles that begin on a cache line, so that a whole register is loaded from one line.</summary>
internal readonly struct CoefficientBlock
{
    private readonly double[] _values;
    private readonly int _start;

    public CoefficientBlock(int length)
    {
        Length = length;
#if NET
        const int line = 64;
        _values = GC.AllocateArray<double>(length + (line / sizeof(double)), pinned: true);
        nint address = Marshal.UnsafeAddrOfPinnedArrayElement(_values, 0);
        _start = (int)((line - (address % line)) % line) / sizeof(double);
#else
        _values = new double[length];
        _start = 0;
#endif
    }

    public int Length { get; }

    /// <summary>The number at an index, to read on from; unchecked.</summary>
    public ref double this[int index]
    {
        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        get
        {
            Debug.Assert(index >= 0 && index < Length);
#if NET
            return ref Unsafe.Add(ref MemoryMarshal.GetArrayDataReference(_values), _start + index);
#else
            return ref _values[index];
#endif
        }
    }

    public Span<double> Slice(int start, int length) => _values.AsSpan(_start + start, length);
}
