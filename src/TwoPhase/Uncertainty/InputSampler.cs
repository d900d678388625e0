using MathNet.Numerics.Distributions;
using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.Random;

namespace TwoPhase.Uncertainty;

/// <summary>Draws blocks of values of the inputs, each from a random stream of its own.</summary>
/// <remarks>Source: JCGM 101:2008, 6.4 and C.5 (joint normal distribution; here by eigenvalues, since r = ±1 has no Cholesky factor).</remarks>
internal sealed class InputSampler
{
    private const int StreamStride = 7919;   // keeps the streams of neighbouring seeds apart
    private const double Rounding = 1e-12;   // an eigenvalue below is zero: its root would be no small number

    private readonly UncertainInput[] _inputs;
    private readonly MersenneTwister[] _streams;
    private readonly int[] _joint;           // inputs that are correlated with some other
    private readonly double[,] _factor;      // F with F Fᵀ = correlation matrix of those

    public InputSampler(UncertainInput[] inputs, double[,] correlation, int seed)
    {
        _inputs = inputs;
        _streams = new MersenneTwister[inputs.Length];
        for (int i = 0; i < inputs.Length; i++) _streams[i] = new(unchecked((seed * StreamStride) + i), threadSafe: false);

        _joint = [.. Enumerable.Range(0, inputs.Length).Where(i => Enumerable.Range(0, inputs.Length).Any(j => j != i && correlation[i, j] != 0))];
        foreach (int i in _joint)
        {
            if (inputs[i].Distribution is not (null or Normal) || !double.IsInfinity(inputs[i].DegreesOfFreedom))
                throw new ArgumentException($"Input {inputs[i].Name} is correlated with another, so it must be normal with its uncertainty known; it is {inputs[i].Distribution?.ToString() ?? "Student's t"}.");
        }

        _factor = SquareRoot(correlation, _joint);
    }

    public double[][] Draw(int count)
    {
        double[][] draws = new double[_inputs.Length][];
        for (int i = 0; i < _inputs.Length; i++)
        {
            draws[i] = new double[count];
            if (Array.IndexOf(_joint, i) >= 0) Normal.Samples(_streams[i], draws[i], 0, 1);
            else DrawAlone(_inputs[i], _streams[i], draws[i]);
        }

        Correlate(draws, count);
        return draws;
    }

    private static void DrawAlone(UncertainInput input, MersenneTwister stream, double[] draws)
    {
        if (input.Distribution is { } distribution)
        {
            // The caller's object draws from our stream meanwhile; the lock keeps two runs that share it apart.
            lock (distribution)
            {
                System.Random own = distribution.RandomSource;
                distribution.RandomSource = stream;
                try { distribution.Samples(draws); }
                finally { distribution.RandomSource = own; }
            }
        }
        else if (input.StandardUncertainty == 0)
        {
            for (int i = 0; i < draws.Length; i++) draws[i] = input.Estimate;
        }
        else if (double.IsInfinity(input.DegreesOfFreedom)) Normal.Samples(stream, draws, input.Estimate, input.StandardUncertainty);
        else StudentT.Samples(stream, draws, input.Estimate, input.StandardUncertainty, input.DegreesOfFreedom);
    }

    private void Correlate(double[][] draws, int count)
    {
        double[] independent = new double[_joint.Length];
        for (int trial = 0; trial < count; trial++)
        {
            for (int k = 0; k < _joint.Length; k++) independent[k] = draws[_joint[k]][trial];
            for (int k = 0; k < _joint.Length; k++)
            {
                double standard = 0;
                for (int j = 0; j < _joint.Length; j++) standard += _factor[k, j] * independent[j];
                draws[_joint[k]][trial] = _inputs[_joint[k]].Estimate + (standard * _inputs[_joint[k]].StandardUncertainty);
            }
        }
    }

    // The symmetric root V √Λ Vᵀ: a correlation of 1 is allowed, and which input comes first makes no difference.
    private static double[,] SquareRoot(double[,] correlation, int[] joint)
    {
        if (joint.Length == 0) return new double[0, 0];
        var spectrum = Matrix<double>.Build.Dense(joint.Length, joint.Length, (i, j) => correlation[joint[i], joint[j]]).Evd(Symmetricity.Symmetric);
        var roots = spectrum.EigenValues.Map(value => value.Real > Rounding ? Math.Sqrt(value.Real) : 0);
        return (spectrum.EigenVectors * Matrix<double>.Build.DenseOfDiagonalVector(roots) * spectrum.EigenVectors.Transpose()).ToArray();
    }
}
