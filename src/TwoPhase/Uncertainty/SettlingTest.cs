namespace TwoPhase.Uncertainty;

/// <summary>Whether the averages over blocks of trials have settled to a number of digits of the standard uncertainty.</summary>
/// <remarks>Source: JCGM 101:2008, 7.9.4, steps f) to k).</remarks>
internal sealed class SettlingTest(int significantDigits)
{
    private const int Watched = 4;   // mean, standard uncertainty, low end, high end

    private readonly double[] _sums = new double[Watched];
    private readonly double[] _squares = new double[Watched];
    private readonly double[] _origin = new double[Watched];
    private int _blocks;

    public bool Add(double mean, double standardUncertainty, double low, double high)
    {
        double[] block = [mean, standardUncertainty, low, high];
        if (_blocks++ == 0) block.CopyTo(_origin, 0);
        for (int i = 0; i < Watched; i++)
        {
            double fromOrigin = block[i] - _origin[i];   // differences: the mean may be large against its spread
            _sums[i] += fromOrigin;
            _squares[i] += fromOrigin * fromOrigin;
        }

        return _blocks >= 2 && Enumerable.Range(0, Watched).All(i => 2 * SpreadOfAverage(i) < Tolerance(_origin[1] + (_sums[1] / _blocks)));
    }

    private double SpreadOfAverage(int i) =>
        Math.Sqrt(Math.Max(_squares[i] - (_sums[i] * _sums[i] / _blocks), 0) / (_blocks * (_blocks - 1.0)));

    // δ = ½·10^l where u = c·10^l and c has the wanted number of digits.
    private double Tolerance(double standardUncertainty) => standardUncertainty > 0
        ? 0.5 * Math.Pow(10, Math.Floor(Math.Log10(standardUncertainty)) + 1 - significantDigits)
        : double.PositiveInfinity;
}
